import { closeDatabase } from "~/db/connection.server";
import { migrate } from "~/db/migrate.server";
import { config } from "~/services/config.server";

export async function migrateCommand(args: string[]): Promise<number> {
  if (args.length > 0) {
    process.stderr.write("migrate takes no arguments.\n");
    return 2;
  }
  try {
    const done = await migrate();
    const what = done.length === 0 ? "is current; nothing to do" : `migrated: ${done.join(", ")}`;
    process.stdout.write(`${config().databaseFile} ${what}.\n`);
    return 0;
  } finally {
    await closeDatabase();
  }
}
