/**
 * `npm run demo`: from a fresh clone to a running application with a demonstration project. Every step is skipped when
 * it is done already.
 */
import { existsSync } from "node:fs";
import { createServer } from "node:net";
import path from "node:path";
import { buildIsCurrent, packagesMatchLock, root, run, start, stopChildren, tail } from "./workspace.mjs";

const FIRST_PORT = Number(process.env.PORT || 3000);
const HOST = process.env.HOST || "127.0.0.1";
const READY_WITHIN_MS = 60_000;

let stopping = false;

function say(line) {
  process.stdout.write(`${line}\n`);
}

/** Ends the demonstration with the step that failed, why, and what to do. */
function fail(step, reason, advice) {
  stopChildren("SIGTERM");
  process.stderr.write(`\nStopped at: ${step}\n${reason}\n${advice}\n`);
  process.exit(1);
}

async function step(name, command, args, advice) {
  say(`${name} …`);
  const { code, output } = await run(command, args);
  endIfStopped();
  if (code !== 0) fail(name, tail(output), advice);
  return output;
}

function endIfStopped() {
  if (!stopping) return;
  say("Stopped.");
  process.exit(0);
}

function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once("error", () => resolve(false));
    probe.listen(port, HOST, () => probe.close(() => resolve(true)));
  });
}

async function choosePort() {
  for (let port = FIRST_PORT; port < FIRST_PORT + 100 && port <= 65_535; port += 1) {
    if (await isFree(port)) {
      if (port !== FIRST_PORT) say(`Port ${FIRST_PORT} is in use by another program; taking ${port} instead.`);
      return port;
    }
  }
  return fail("finding a port", `No port from ${FIRST_PORT} up is free on ${HOST}.`, "Set PORT to a free one.");
}

async function untilReady(port, server) {
  const deadline = Date.now() + READY_WITHIN_MS;
  let reason = "It did not answer.";
  while (Date.now() < deadline && server.exitCode === null) {
    try {
      const response = await fetch(`http://${HOST === "0.0.0.0" ? "127.0.0.1" : HOST}:${port}/readyz`);
      if (response.ok) return;
      reason = await response.text();
    } catch {
      reason = "It did not answer.";
    }
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  if (server.exitCode !== null) reason = `The application ended with exit code ${server.exitCode}; see above.`;
  fail("starting the application", reason, "Mend what it names, then run npm run demo again.");
}

/** A mail server that keeps what comes and shows it on a page; the demonstration runs without it where it fails. */
function startMailbox() {
  return new Promise((resolve) => {
    const child = start("npm", ["run", "--silent", "mailbox", "--", "--smtp-port", "0", "--port", "0"], {
      stdio: ["ignore", "pipe", "ignore"],
    });
    let output = "";
    child.stdout.setEncoding("utf8").on("data", (chunk) => {
      output += chunk;
      const [, page, smtp] = /shows what comes at (\S+)\n.*takes mail at (\S+)\n/.exec(output) ?? [];
      if (smtp) resolve({ page, smtp });
    });
    child.once("close", () => resolve(undefined));
    child.once("error", () => resolve(undefined));
  });
}

if (Number(process.versions.node.split(".")[0]) < 20) {
  fail("checking Node", `This is Node ${process.versions.node}.`, "Install Node 20.19 or newer.");
}

for (const signal of ["SIGINT", "SIGTERM"]) {
  process.on(signal, () => {
    if (stopping) return;
    stopping = true;
    stopChildren("SIGTERM");
  });
}

if (!packagesMatchLock()) {
  await step(
    "Installing packages (once; a few minutes)",
    "npm",
    ["ci", "--no-audit", "--no-fund"],
    "Check the connection to the package registry and that a C++ compiler, make and Python 3 are installed, then try again.",
  );
}
if (!existsSync(process.env.BASEMAP_FILE || path.join(root, process.env.DATA_DIRECTORY || "data", "basemap.mbtiles"))) {
  say("Cutting the base map (once; a few minutes) …");
  const { code } = await run("npm", ["run", "--silent", "basemap"], { show: true });
  endIfStopped();
  if (code !== 0) say("The base map could not be made; the application runs without it. Try npm run basemap later.");
}
if (!buildIsCurrent()) {
  await step("Building", "npm", ["run", "build"], "The message above names the file; npm run typecheck tells more.");
}
const command = ["run", "--silent", "galeprint", "--"];
await step("Preparing the database", "npm", [...command, "migrate"], "Check that the data folder can be written to.");
const people = await step(
  "Adding the demonstration project",
  "npm",
  [...command, "seed"],
  "Move the data folder away to start with an empty database.",
);

const mailbox = process.env.SMTP_URL ? undefined : await startMailbox();
const port = await choosePort();
say("Starting …");
const server = start(process.execPath, ["--enable-source-maps", path.join(root, "build/start.mjs")], {
  env: {
    ...process.env,
    NODE_ENV: "production",
    LOG_LEVEL: process.env.LOG_LEVEL || "warn",
    PORT: String(port),
    ...(mailbox ? { SMTP_URL: mailbox.smtp } : {}),
  },
  stdio: ["ignore", "ignore", "inherit"],
});
server.once("exit", (code) => {
  if (stopping) say("Stopped.");
  process.exit(stopping ? 0 : (code ?? 1));
});
await untilReady(port, server);
const mailPlace = mailbox ? `Mail that it sends is shown at ${mailbox.page}` : "Mail is not shown here; see SMTP_URL.";
say(
  `\nGaleprint runs at ${process.env.PUBLIC_URL || `http://localhost:${port}`}\n${people.trimEnd()}\n${mailPlace}\n\nCtrl+C stops it.`,
);
