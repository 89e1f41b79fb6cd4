import { closeDatabase } from "~/db/connection.server";
import { pendingMigrations } from "~/db/migrate.server";
import { seedDemo } from "~/db/seeders/demo.server";
import { closeEverything, onShutdown } from "~/services/shutdown.server";

export async function seedCommand(args: string[]): Promise<number> {
  if (args.length > 0) {
    process.stderr.write("seed takes no arguments.\n");
    return 2;
  }
  onShutdown("database", closeDatabase);
  try {
    if ((await pendingMigrations()).length > 0) {
      process.stderr.write("The database does not have this version's form yet: run migrate first.\n");
      return 1;
    }
    const { path, users } = await seedDemo();
    process.stdout.write(`The demonstration project is at ${path}\n`);
    for (const { email, password, role } of users) process.stdout.write(`Sign in as ${role}: ${email} / ${password}\n`);
    return 0;
  } finally {
    // The demonstration's estimates have started worker threads, which would keep the command from ending.
    await closeEverything();
  }
}
