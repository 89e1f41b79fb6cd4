import { copyFileSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { inject } from "vitest";

/**
 * Gives this test file a migrated database of its own. The database layer reads its file from the environment once, so call
 * this first and import what reaches the database afterwards, by `await import(…)`.
 */
export function openOwnDatabase(): { remove(): Promise<void> } {
  const folder = mkdtempSync(path.join(tmpdir(), "galeprint-database-"));
  process.env.DATABASE_FILE = path.join(folder, "galeprint.sqlite");
  process.env.DATA_DIRECTORY = folder;
  copyFileSync(inject("migratedDatabase"), process.env.DATABASE_FILE);
  return {
    async remove() {
      const { closeDatabase } = await import("../../app/db/connection.server");
      await closeDatabase();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
