import { mkdtempSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, inject, it } from "vitest";
import { SqliteFile } from "~/db/sqlite-file.server";
import { run } from "../../app/cli/workspace.mjs";
import { startServer } from "../setup/run-server";

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "galeprint-command-"));
});

afterEach(() => rmSync(folder, { recursive: true, force: true }));

/** As an operator types it: `npm run --silent galeprint -- …`. */
function galeprint(args: string[], env: Record<string, string> = {}): Promise<{ code: number; output: string }> {
  return run("npm", ["run", "--silent", "galeprint", "--", ...args], {
    env: { NODE_ENV: "production", DATA_DIRECTORY: folder, LOG_LEVEL: "warn", ...env },
  });
}

describe("the command line", () => {
  it("explains itself", async () => {
    const { code, output } = await galeprint(["--help"]);
    expect(code).toBe(0);
    for (const name of ["checks", "read", "estimate", "migrate", "seed", "backup", "restore", "verify-backup"]) {
      expect(output).toMatch(new RegExp(`^  ${name}\\b`, "m"));
    }
  });

  it("says which commands there are when it is given none of them", async () => {
    expect(await galeprint(["restoer", "x"])).toEqual({
      code: 2,
      output:
        'There is no command "restoer". Commands: checks, read, estimate, migrate, seed, mails, backup, restore, verify-backup.\n',
    });
    expect((await galeprint(["toString"])).code).toBe(2);
    expect((await galeprint([])).code).toBe(2);
  });

  it("asks for the file that a command needs", async () => {
    expect(await galeprint(["backup"])).toEqual({ code: 2, output: "backup takes one file: backup FILE\n" });
  });

  it("names a setting that is wrong", async () => {
    expect(await galeprint(["backup", "x.sqlite"], { WORKER_THREADS: "many" })).toEqual({
      code: 1,
      output: 'WORKER_THREADS must be a whole number from 1 to 64, not "many".\n',
    });
  });
});

describe("a new installation", () => {
  it("is migrated once, and refuses a seed before", async () => {
    const early = await galeprint(["seed"]);
    expect(early).toEqual({
      code: 1,
      output: "The database does not have this version's form yet: run migrate first.\n",
    });
    const first = await galeprint(["migrate"]);
    expect(first.code).toBe(0);
    expect(first.output).toContain(`${path.join(folder, "galeprint.sqlite")} migrated: 2026-12-01-first-tables`);
    expect(await galeprint(["migrate"])).toEqual({
      code: 0,
      output: `${path.join(folder, "galeprint.sqlite")} is current; nothing to do.\n`,
    });
  });
});

describe("the restore drill", () => {
  it("backs up, verifies and restores under a running server, which stays ready and shows the restored rows", async () => {
    const server = await startServer({ databaseFile: inject("seededDatabase") });
    const env = { DATABASE_FILE: server.databaseFile };
    const backup = path.join(folder, "backup.sqlite");
    const users = () =>
      SqliteFile.using(server.databaseFile, "read", (file) =>
        file.all<{ name: string }>("SELECT name FROM users ORDER BY id"),
      );
    const before = await users();
    expect(before.length).toBeGreaterThan(0);

    const made = await galeprint(["backup", backup], env);
    expect(made.output).toMatch(
      /^Backed up to .*backup\.sqlite \(\d+\.\d MB, \d+ tables, \d+ rows, last migration .+\)\.\n$/,
    );
    expect((await galeprint(["verify-backup", backup], env)).output).toMatch(/backup\.sqlite is a whole backup \(/);
    await SqliteFile.using(server.databaseFile, "write", (file) => file.run("UPDATE users SET name = 'changed'"));

    const restored = await galeprint(["restore", backup], env);
    expect(restored.output).toMatch(
      /^Restored .*backup\.sqlite \(.*\)\. What stood there is kept in .*\.before-restore-.*\.\n$/,
    );
    expect(await users()).toEqual(before);
    expect((await fetch(`${server.url}/readyz`)).status).toBe(200);
    expect((await fetch(`${server.url}/sign-in`)).status).toBe(200);
    const kept = readdirSync(path.dirname(server.databaseFile)).filter((name) => name.includes("before-restore"));
    expect(kept).toHaveLength(1);
    expect(await server.stop()).toBe(0);
  });
});
