import { createServer, type RequestListener, type Server } from "node:http";
import path from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import type { ServerBuild } from "react-router";
import { config, ConfigurationError, type Config } from "~/services/config.server";
import { createApplication } from "~/services/http/application.server";
import { stopGracefully } from "~/services/http/graceful-stop.server";
import { log } from "~/services/log.server";
import { closeEverything, onShutdown } from "~/services/shutdown.server";

/** This file runs as build/start.mjs. */
const ownBuildDirectory = path.dirname(fileURLToPath(import.meta.url));

/** Until the routes are loaded, and only then. */
const answerStarting: RequestListener = (_request, response) => {
  response.writeHead(503, { "Content-Type": "text/plain; charset=utf-8", "Retry-After": "1" });
  response.end("Galeprint is starting.\n");
};

/** @returns the port that was bound */
function listen(server: Server, { port, host }: Config): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, host, () => {
      server.off("error", reject);
      const address = server.address();
      resolve(typeof address === "object" && address !== null ? address.port : port);
    });
  });
}

/** The port is bound first: whether it is free is known at once, and an address left open is known to the routes. */
async function start(settings: Config): Promise<void> {
  const server = createServer(answerStarting);
  const port = await listen(server, settings);
  if (!process.env.PUBLIC_URL) process.env.PUBLIC_URL = `http://localhost:${port}`;

  // Loads React, which picks its build by NODE_ENV: not before that is set.
  const { createRequestHandler } = await import("@react-router/express");
  const { databaseReadiness } = await import("~/db/readiness.server");
  const { closeDatabase } = await import("~/db/connection.server");
  onShutdown("readiness check's database connection", closeDatabase);
  const buildFile = path.join(ownBuildDirectory, "server/index.js");
  const build = (await import(pathToFileURL(buildFile).href)) as ServerBuild;
  const application = createApplication({
    routes: createRequestHandler({ build, mode: settings.nodeEnv === "development" ? "development" : "production" }),
    readiness: databaseReadiness,
    logger: log(),
    clientDirectory: path.join(ownBuildDirectory, "client"),
    uploadLimitBytes: settings.uploadLimitBytes,
    secure: settings.secure,
    trustProxy: settings.trustProxy,
  });
  server.off("request", answerStarting);
  server.on("request", application);
  stopOnSignals(server, settings.shutdownSeconds);
  process.stdout.write(`Galeprint listens on ${process.env.PUBLIC_URL} (port ${port})\n`);
}

function stopOnSignals(server: Server, shutdownSeconds: number): void {
  let stopping = false;
  const stop = async (signal: NodeJS.Signals) => {
    // npm passes a Ctrl+C on to a process that the terminal has told already.
    if (stopping) return;
    stopping = true;
    log().info({ signal }, "stopping: finishing the requests under way");
    const finished = await stopGracefully(server, shutdownSeconds * 1000);
    if (!finished) log().warn({ shutdownSeconds }, "cut the requests that had not finished");
    for (const { name, error } of await closeEverything()) log().error({ part: name, err: error }, "could not close");
    log().info("stopped");
    process.exit(0);
  };
  process.on("SIGTERM", stop);
  process.on("SIGINT", stop);
}

/** What to tell the operator when the start fails for a reason that they can mend. */
function explain(error: unknown, settings: Config | undefined): string | undefined {
  if (error instanceof ConfigurationError) return error.message;
  const code = error instanceof Error && "code" in error ? error.code : undefined;
  if (code === "EADDRINUSE") return `Port ${settings?.port} is in use by another program. Set PORT to a free one.`;
  if (code === "EACCES") return `This account may not listen on port ${settings?.port}. Set PORT to one from 1024 up.`;
  if (code === "EADDRNOTAVAIL" || code === "ENOTFOUND") {
    return `HOST is "${settings?.host}", which is not an address of this machine.`;
  }
  if (code === "ERR_MODULE_NOT_FOUND")
    return "The application is not built, or its packages are missing: run npm run build.";
  return undefined;
}

async function main(): Promise<void> {
  let settings: Config | undefined;
  try {
    settings = config();
    // What the routes' build reads when it is loaded: React picks its build by NODE_ENV.
    process.env.NODE_ENV = settings.nodeEnv;
    process.env.BUILD_DIRECTORY ||= ownBuildDirectory;
    await start(settings);
  } catch (error) {
    const sentence = explain(error, settings);
    if (sentence === undefined) log().fatal({ err: error }, "the start failed");
    else process.stderr.write(`${sentence}\n`);
    process.exit(1);
  }
}

await main();
