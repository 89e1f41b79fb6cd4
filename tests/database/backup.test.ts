import {
  copyFileSync,
  existsSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  truncateSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, inject, it } from "vitest";
import { backUp, BackupError, restoreBackup, verifyBackup } from "~/db/backup.server";
import { migrations } from "~/db/migrations/index.server";
import { SqliteFile } from "~/db/sqlite-file.server";

let folder: string;
let database: string;
let backup: string;
let former: string;

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "galeprint-backup-"));
  database = path.join(folder, "galeprint.sqlite");
  backup = path.join(folder, "backup.sqlite");
  former = path.join(folder, "former.sqlite");
  copyFileSync(inject("migratedDatabase"), database);
});

afterEach(() => rmSync(folder, { recursive: true, force: true }));

const NOW = "2026-12-01 00:00:00.000 +00:00";

function addUser(file: SqliteFile, id: string): Promise<void> {
  return file.run(
    "INSERT INTO users (id, email, name, passwordHash, createdAt, updatedAt) VALUES (?, ?, ?, '-', ?, ?)",
    id,
    `${id}@example.com`,
    id,
    NOW,
    NOW,
  );
}

async function usersIn(file: string): Promise<string[]> {
  return SqliteFile.using(file, "read", async (opened) =>
    (await opened.all<{ id: string }>("SELECT id FROM users ORDER BY id")).map(({ id }) => id),
  );
}

/** The connection of a running server: it has the database open and has written to it. */
async function asServer<T>(work: (server: SqliteFile) => Promise<T>): Promise<T> {
  return SqliteFile.using(database, "write", async (server) => {
    await server.run("PRAGMA journal_mode = WAL");
    return work(server);
  });
}

async function messageOf(work: Promise<unknown>): Promise<string> {
  const error = await work.then(
    () => undefined,
    (reason: unknown) => reason,
  );
  expect(error).toBeInstanceOf(BackupError);
  return error instanceof BackupError ? error.message : "";
}

describe("backUp", () => {
  it("copies what a running server has committed, also what is still in its log only", async () => {
    await asServer(async (server) => {
      await addUser(server, "ana");
      const contents = await backUp(database, backup);
      await addUser(server, "ben");
      expect(contents).toMatchObject({ migration: migrations.at(-1)?.name });
      expect(await usersIn(backup)).toEqual(["ana"]);
    });
    expect(readdirSync(folder).filter((name) => name.includes("partial"))).toEqual([]);
  });

  it("does not wait for a writer and does not copy what is not committed", async () => {
    await asServer(async (server) => {
      await server.run("BEGIN IMMEDIATE");
      await addUser(server, "ana");
      await backUp(database, backup);
      await server.run("COMMIT");
    });
    expect(await usersIn(backup)).toEqual([]);
    expect(await usersIn(database)).toEqual(["ana"]);
  });

  it("never overwrites a file", async () => {
    writeFileSync(backup, "the only copy");
    expect(await messageOf(backUp(database, backup))).toContain("exists already. Choose a new name");
    expect(readFileSync(backup, "utf8")).toBe("the only copy");
  });

  it("says what to do when there is no database", async () => {
    expect(await messageOf(backUp(path.join(folder, "none.sqlite"), backup))).toContain("run migrate first");
    expect(existsSync(path.join(folder, "none.sqlite"))).toBe(false);
  });
});

describe("verifyBackup", () => {
  it("counts what is in the file", async () => {
    await asServer((server) => addUser(server, "ana"));
    await backUp(database, backup);
    const before = await verifyBackup(backup);
    await asServer((server) => addUser(server, "ben"));
    const second = path.join(folder, "second.sqlite");
    await backUp(database, second);
    expect((await verifyBackup(second)).rows).toBe(before.rows + 1);
    expect(before.tables).toBeGreaterThan(10);
  });

  it("finds a file that was cut off", async () => {
    await backUp(database, backup);
    truncateSync(backup, 100_000);
    expect(await messageOf(verifyBackup(backup))).toContain(`${backup} is damaged`);
  });

  it("finds pages that were overwritten", async () => {
    await backUp(database, backup);
    const bytes = readFileSync(backup);
    bytes.fill(0xff, 4096 * 3, 4096 * 6);
    writeFileSync(backup, bytes);
    expect(await messageOf(verifyBackup(backup))).toContain(`${backup} is damaged`);
  });

  it("finds rows whose parents are missing", async () => {
    await SqliteFile.using(database, "write", (file) =>
      file.run("INSERT INTO sessions VALUES ('s', 'nobody', ?, ?, ?, ?)", NOW, NOW, NOW, NOW),
    );
    expect(await messageOf(verifyBackup(database))).toContain("1 rows refer to rows that are missing (in sessions)");
  });

  it("knows what is no database, none of ours, or of a newer version", async () => {
    writeFileSync(backup, "time,wind\n");
    expect(await messageOf(verifyBackup(backup))).toContain("it is not an SQLite database");
    writeFileSync(backup, "");
    expect(await messageOf(verifyBackup(backup))).toContain("it is not an SQLite database");
    expect(await messageOf(verifyBackup(path.join(folder, "none")))).toContain("There is no file");
    expect(await messageOf(verifyBackup(folder))).toContain("There is no file");
    const foreign = path.join(folder, "foreign.sqlite");
    await SqliteFile.using(foreign, "create", (file) => file.run("CREATE TABLE notes (text TEXT)"));
    expect(await messageOf(verifyBackup(foreign))).toContain("not one of Galeprint");
    await SqliteFile.using(database, "write", (file) => file.run("INSERT INTO migrations VALUES ('2999-01-01-later')"));
    expect(await messageOf(verifyBackup(database))).toContain("newer version of Galeprint (2999-01-01-later)");
  });
});

describe("restoreBackup", () => {
  it("brings the content back while a server has the database open, and keeps what stood there", async () => {
    await asServer(async (server) => {
      await addUser(server, "ana");
      await backUp(database, backup);
      await addUser(server, "ben");
      const { kept } = await restoreBackup(database, backup, former);
      expect(kept).toBe(former);
      expect(await server.all("SELECT id FROM users")).toEqual([{ id: "ana" }]);
      await addUser(server, "cora");
      expect(await server.all("PRAGMA integrity_check")).toEqual([{ integrity_check: "ok" }]);
    });
    expect(await usersIn(database)).toEqual(["ana", "cora"]);
    expect(await usersIn(former)).toEqual(["ana", "ben"]);
  });

  it("loses no write of a busy server: each is in the kept file or in the restored database", async () => {
    await backUp(database, backup);
    const written: string[] = [];
    await asServer(async (server) => {
      let restored = false;
      const restoring = restoreBackup(database, backup, former).finally(() => {
        restored = true;
      });
      while (!restored) {
        const id = `user-${String(written.length).padStart(4, "0")}`;
        await addUser(server, id);
        written.push(id);
      }
      await restoring;
    });
    const found = [...(await usersIn(former)), ...(await usersIn(database))];
    expect(written.length).toBeGreaterThan(0);
    expect(found).toEqual(written);
  });

  it("changes nothing when the backup is damaged", async () => {
    await backUp(database, backup);
    await asServer((server) => addUser(server, "ana"));
    truncateSync(backup, 100_000);
    expect(await messageOf(restoreBackup(database, backup, former))).toContain("is damaged");
    expect(await usersIn(database)).toEqual(["ana"]);
    expect(existsSync(former)).toBe(false);
  });

  it("keeps a database whole when the former content cannot be kept", async () => {
    await backUp(database, backup);
    await asServer((server) => addUser(server, "ana"));
    await expect(restoreBackup(database, backup, path.join(folder, "no/such/folder/former"))).rejects.toThrow();
    expect(await usersIn(database)).toEqual(["ana"]);
    await asServer((server) => addUser(server, "ben"));
    expect(await usersIn(database)).toEqual(["ana", "ben"]);
  });

  it("makes the database where there is none yet", async () => {
    await asServer((server) => addUser(server, "ana"));
    await backUp(database, backup);
    const fresh = path.join(folder, "new/galeprint.sqlite");
    const { kept } = await restoreBackup(fresh, backup, former);
    expect(kept).toBeUndefined();
    expect(await usersIn(fresh)).toEqual(["ana"]);
  });

  it("does not take the database for its own backup", async () => {
    expect(await messageOf(restoreBackup(database, database, former))).toContain("is the database itself");
  });
});
