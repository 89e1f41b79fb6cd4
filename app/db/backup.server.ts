import { existsSync } from "node:fs";
import { mkdir, open, rename, rm, stat } from "node:fs/promises";
import path from "node:path";
import { migrations } from "./migrations/index.server";
import { SqliteFile } from "./sqlite-file.server";

/** What a backup holds, as counted in the file itself. */
export interface BackupContents {
  bytes: number;
  tables: number;
  rows: number;
  /** The last migration that had run. */
  migration: string;
}

/** A backup or restore could not be done; the message says why and what to do. */
export class BackupError extends Error {
  override name = "BackupError";
}

const SQLITE_HEADER = "SQLite format 3\0";

async function startsAsSqlite(file: string): Promise<boolean> {
  const handle = await open(file, "r");
  try {
    const { buffer, bytesRead } = await handle.read(Buffer.alloc(SQLITE_HEADER.length), 0, SQLITE_HEADER.length, 0);
    return buffer.subarray(0, bytesRead).toString("latin1") === SQLITE_HEADER;
  } finally {
    await handle.close();
  }
}

/** A rename or a copy survives a power cut only when file and folder have been flushed. */
async function flush(file: string): Promise<void> {
  for (const target of [file, path.dirname(file)]) {
    const handle = await open(target, "r");
    await handle.sync();
    await handle.close();
  }
}

function quoted(name: string): string {
  return `"${name.replaceAll('"', '""')}"`;
}

/**
 * Reads a backup through: SQLite's own integrity check, the references between tables, the migrations that had run, and
 * the count of rows.
 * @throws BackupError when the file is not a whole backup that this version can restore
 */
export async function verifyBackup(file: string): Promise<BackupContents> {
  const found = await stat(file).catch(() => undefined);
  if (!found?.isFile()) throw new BackupError(`There is no file ${file}.`);
  if (!(await startsAsSqlite(file))) throw new BackupError(`${file} is not a backup: it is not an SQLite database.`);
  try {
    return await SqliteFile.using(file, "read", async (database) => ({
      bytes: found.size,
      ...(await inspect(database, file)),
    }));
  } catch (error) {
    if (error instanceof BackupError) throw error;
    throw new BackupError(`${file} is damaged: ${error instanceof Error ? error.message : String(error)}.`);
  }
}

async function inspect(database: SqliteFile, file: string): Promise<Omit<BackupContents, "bytes">> {
  const integrity = await database.all<{ integrity_check: string }>("PRAGMA integrity_check(5)");
  const faults = integrity.map((row) => row.integrity_check).filter((line) => line !== "ok");
  if (faults.length > 0) throw new BackupError(`${file} is damaged: ${faults.join("; ")}.`);
  const strays = await database.all<{ table: string }>("PRAGMA foreign_key_check");
  if (strays.length > 0) {
    const tables = [...new Set(strays.map((row) => row.table))].join(", ");
    throw new BackupError(`${file} is damaged: ${strays.length} rows refer to rows that are missing (in ${tables}).`);
  }
  const tables = await database.all<{ name: string }>(
    "SELECT name FROM sqlite_schema WHERE type = 'table' AND name NOT LIKE 'sqlite_%' ORDER BY name",
  );
  if (!tables.some(({ name }) => name === "migrations")) {
    throw new BackupError(`${file} is an SQLite database, but not one of Galeprint.`);
  }
  const applied = await database.all<{ name: string }>("SELECT name FROM migrations");
  const known = migrations.map(({ name }) => name);
  const unknown = applied.filter(({ name }) => !known.includes(name));
  if (unknown.length > 0) {
    throw new BackupError(`${file} was made by a newer version of Galeprint (${unknown[0].name}). Update first.`);
  }
  let rows = 0;
  for (const { name } of tables) {
    const [{ count }] = await database.all<{ count: number }>(`SELECT count(*) AS count FROM ${quoted(name)}`);
    rows += count;
  }
  return {
    tables: tables.length,
    rows,
    migration: known.findLast((name) => applied.some((row) => row.name === name)) ?? "none",
  };
}

/**
 * Writes a whole, compact copy of the database as it is at one moment. Others may read and write meanwhile. The copy is
 * made beside its final name and takes that name only after it has been verified.
 */
export async function backUp(databaseFile: string, file: string): Promise<BackupContents> {
  if (!existsSync(databaseFile)) throw new BackupError(`There is no database ${databaseFile} yet: run migrate first.`);
  if (existsSync(file)) throw new BackupError(`${file} exists already. Choose a new name; a backup never overwrites.`);
  await mkdir(path.dirname(path.resolve(file)), { recursive: true });
  const partial = `${file}.${process.pid}.partial`;
  try {
    await SqliteFile.using(databaseFile, "write", (database) => database.run("VACUUM INTO ?", partial));
    const contents = await verifyBackup(partial);
    await rename(partial, file);
    await flush(file);
    return contents;
  } finally {
    await rm(partial, { force: true });
  }
}

/**
 * Puts the content of a backup in the place of the database's.
 *
 * Safe while the server runs: the file is not exchanged under it, its content is replaced in one SQLite transaction, so
 * a request sees the old data or the restored data and never a mixture. What stood before is kept: with the write lock
 * held, so that no last-moment write can be missed, it is copied to `keepAs`.
 * @returns what was restored, and where the former content is kept (undefined when there was no database)
 */
export async function restoreBackup(
  databaseFile: string,
  file: string,
  keepAs: string,
): Promise<BackupContents & { kept?: string }> {
  const contents = await verifyBackup(file);
  if (path.resolve(file) === path.resolve(databaseFile)) {
    throw new BackupError(`${file} is the database itself. Name a backup.`);
  }
  if (existsSync(keepAs)) throw new BackupError(`${keepAs} exists already. Try again.`);
  const kept = existsSync(databaseFile) ? keepAs : undefined;
  await mkdir(path.dirname(databaseFile), { recursive: true });
  await SqliteFile.using(databaseFile, "create", async (database) => {
    // In this mode a reader is not kept out by the writer: the former content can be copied under the lock.
    await database.run("PRAGMA journal_mode = WAL");
    await database.replaceContent(file, async () => {
      if (kept === undefined) return;
      await SqliteFile.using(databaseFile, "write", (former) => former.run("VACUUM INTO ?", kept));
      await flush(kept);
    });
    await database.run("PRAGMA wal_checkpoint(PASSIVE)");
  });
  return { ...contents, kept };
}
