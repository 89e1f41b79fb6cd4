import { SequelizeStorage, Umzug } from "umzug";
import { inWriteTransaction, sequelize } from "./connection.server";
import { migrations, type Migration, type MigrationContext } from "./migrations/index.server";

type Direction = "up" | "down";

/** SQLite's DDL is transactional: a migration that fails half way leaves nothing behind. */
function inOneTransaction(migration: Migration, direction: Direction) {
  return async () => {
    await inWriteTransaction(async (transaction) => {
      const context: MigrationContext = {
        query: async (statement) => {
          await sequelize.query(statement, { transaction });
        },
      };
      await migration[direction]?.({ name: migration.name, context });
    });
  };
}

const umzug = new Umzug({
  migrations: migrations.map((migration) => ({
    name: migration.name,
    up: inOneTransaction(migration, "up"),
    down: inOneTransaction(migration, "down"),
  })),
  storage: new SequelizeStorage({ sequelize, tableName: "migrations" }),
  logger: undefined,
});

/** Runs what is pending, in order; the names that were run. */
export async function migrate(): Promise<string[]> {
  return (await umzug.up()).map((migration) => migration.name);
}

/** Takes back everything, newest first; the names that were taken back. */
export async function migrateDown(): Promise<string[]> {
  return (await umzug.down({ to: 0 })).map((migration) => migration.name);
}

export async function pendingMigrations(): Promise<string[]> {
  return (await umzug.pending()).map((migration) => migration.name);
}
