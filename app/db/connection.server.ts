import { mkdirSync } from "node:fs";
import path from "node:path";
import { Sequelize, Transaction } from "sequelize";
import sqlite3 from "sqlite3";
import { config } from "~/services/config.server";

/**
 * Sequelize opens one SQLite connection for reads and another for each transaction; each needs its own pragmas.
 * FULL, because an issued memo or a signature lost in a power cut is worse than a slower commit.
 */
class TunedDatabase extends sqlite3.Database {
  constructor(filename: string, mode: number, callback: (error: Error | null) => void) {
    super(filename, mode, callback);
    this.configure("busyTimeout", 5000);
    this.exec("PRAGMA journal_mode = WAL; PRAGMA synchronous = FULL; PRAGMA foreign_keys = ON;");
  }
}

function connect(): Sequelize {
  const storage = config().databaseFile;
  mkdirSync(path.dirname(storage), { recursive: true });
  return new Sequelize({
    dialect: "sqlite",
    dialectModule: { ...sqlite3, Database: TunedDatabase },
    storage,
    logging: false,
    define: { freezeTableName: true, timestamps: true },
  });
}

export const sequelize = connect();

export async function closeDatabase(): Promise<void> {
  await sequelize.close();
}

/** Settles when the last writing transaction that was asked for has ended. */
let lastWriter: Promise<unknown> = Promise.resolve();

/**
 * Every writing transaction takes the write lock at once: a deferred one that reads first and writes later
 * fails with a stale snapshot, whatever the busy timeout.
 * Within the process they take turns here, not at the file: a writer that waits there holds one of the driver's few
 * threads, and four of them would keep the one they wait for from ever finishing.
 */
export function inWriteTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  const turn = lastWriter.then(() => sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, work));
  lastWriter = turn.catch(() => undefined);
  return turn;
}
