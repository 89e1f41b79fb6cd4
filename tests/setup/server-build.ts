import { copyFileSync, existsSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import type { TestProject } from "vitest/node";
import { buildIsCurrent, root, run, tail } from "../../app/cli/workspace.mjs";

declare module "vitest" {
  export interface ProvidedContext {
    /** The bundled server entry. */
    serverEntry: string;
    /** A database with every migration run and no rows; copy it, never write to it. */
    migratedDatabase: string;
    /** The same with the demonstration organisation in it. */
    seededDatabase: string;
  }
}

async function must(name: string, command: string, args: string[], env: Record<string, string> = {}): Promise<void> {
  const { code, output } = await run(command, args, { env });
  if (code !== 0) throw new Error(`${name} failed:\n${tail(output)}`);
}

/** The server is tested as it ships: from a current build, on a copy of one migrated database a test. */
export default async function setup(project: TestProject): Promise<() => void> {
  if (!buildIsCurrent()) await must("The build", "npm", ["run", "build"], { NODE_ENV: "production" });
  const folder = mkdtempSync(path.join(tmpdir(), "galeprint-tests-"));
  const migrated = path.join(folder, "migrated.sqlite");
  const seeded = path.join(folder, "seeded.sqlite");
  const galeprint = ["run", "--silent", "galeprint", "--"];
  // Not "test": the operator's command must work in the environment that operators have.
  const environment = { NODE_ENV: "production", DATA_DIRECTORY: folder, LOG_LEVEL: "warn" };
  await must("Migrating", "npm", [...galeprint, "migrate"], { ...environment, DATABASE_FILE: migrated });
  copyFileSync(migrated, seeded);
  if (existsSync(`${migrated}-wal`)) throw new Error("The migrated database was not closed.");
  await must("Seeding", "npm", [...galeprint, "seed"], { ...environment, DATABASE_FILE: seeded });
  project.provide("serverEntry", path.join(root, "build/start.mjs"));
  project.provide("migratedDatabase", migrated);
  project.provide("seededDatabase", seeded);
  return () => rmSync(folder, { recursive: true, force: true });
}
