import { type ChildProcess, spawn } from "node:child_process";
import { copyFileSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { inject } from "vitest";

export interface RunningServer {
  /** Origin without a trailing slash. */
  url: string;
  /** The server's own copy of the database. */
  databaseFile: string;
  process: ChildProcess;
  /** Everything written so far: the line at start and the log. */
  logs(): string;
  /** Ends the server as an operator would, removes its files and gives its exit code. */
  stop(signal?: NodeJS.Signals): Promise<number | null>;
}

interface Options {
  /** Copied before use; the migrated database without rows when not given. */
  databaseFile?: string;
  env?: Record<string, string>;
}

/** Starts the built server on a free port, with a copy of a database and a data folder of its own. */
export async function startServer({ databaseFile, env }: Options = {}): Promise<RunningServer> {
  const folder = mkdtempSync(path.join(tmpdir(), "galeprint-server-"));
  const ownDatabase = path.join(folder, "galeprint.sqlite");
  copyFileSync(databaseFile ?? inject("migratedDatabase"), ownDatabase);
  const child = spawn(process.execPath, ["--enable-source-maps", inject("serverEntry")], {
    env: {
      PATH: process.env.PATH,
      NODE_ENV: "production",
      HOST: "127.0.0.1",
      PORT: "0",
      DATA_DIRECTORY: folder,
      DATABASE_FILE: ownDatabase,
      BASEMAP_FILE: path.resolve("data/basemap.mbtiles"),
      LOG_LEVEL: "info",
      ...env,
    },
    // A .env of the checkout is not the test's.
    cwd: folder,
    stdio: ["ignore", "pipe", "pipe"],
  });
  let written = "";
  const exited = new Promise<number | null>((resolve) => child.once("close", resolve));
  const port = await new Promise<string>((resolve, reject) => {
    const read = (chunk: string) => {
      written += chunk;
      const announced = /^Galeprint listens on .* \(port (\d+)\)$/m.exec(written);
      if (announced) resolve(announced[1]);
    };
    child.stdout.setEncoding("utf8").on("data", read);
    child.stderr.setEncoding("utf8").on("data", read);
    child.once("error", reject);
    child.once("close", (code) => reject(new Error(`The server ended with ${code} before it listened:\n${written}`)));
  });
  return {
    url: `http://localhost:${port}`,
    databaseFile: ownDatabase,
    process: child,
    logs: () => written,
    async stop(signal = "SIGTERM") {
      child.kill(signal);
      const code = await exited;
      rmSync(folder, { recursive: true, force: true });
      return code;
    },
  };
}
