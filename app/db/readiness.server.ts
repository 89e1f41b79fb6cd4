import { sequelize } from "./connection.server";
import { pendingMigrations } from "./migrate.server";

export async function databaseReadiness(): Promise<{ ready: boolean; reason?: string }> {
  try {
    await sequelize.query("SELECT 1");
    const pending = await pendingMigrations();
    if (pending.length > 0) return { ready: false, reason: `Migrations are waiting: ${pending.join(", ")}.` };
    return { ready: true };
  } catch {
    return { ready: false, reason: "The database cannot be reached." };
  }
}
