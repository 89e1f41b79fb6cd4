/**
 * What the demonstration and the tests have to know about the checkout before its packages are installed: plain Node,
 * no dependencies.
 */
import { spawn } from "node:child_process";
import { accessSync, constants, existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

export const root = fileURLToPath(new URL("../..", import.meta.url)).replace(/[\\/]$/, "");

const BUILD_SOURCES = [
  "app",
  "public",
  "package-lock.json",
  "vite.config.ts",
  "react-router.config.ts",
  "tsconfig.json",
];
const BUILD_RESULTS = [
  "build/server/index.js",
  "build/start.mjs",
  "build/galeprint.mjs",
  "build/worker/estimate-worker.mjs",
];

/** The file of a program on the PATH, or undefined. */
export function findProgram(...names) {
  const folders = (process.env.PATH ?? "").split(path.delimiter).filter(Boolean);
  return names
    .flatMap((name) => folders.map((folder) => path.join(folder, name)))
    .find((file) => {
      try {
        accessSync(file, constants.X_OK);
        return statSync(file).isFile();
      } catch {
        return false;
      }
    });
}

/** The browser for the tests: CHROMIUM_PATH when it is set, else the first on the PATH. */
export function findChromium() {
  return process.env.CHROMIUM_PATH || findProgram("chromium", "chromium-browser", "google-chrome");
}

/** Whether every package that the lock names is installed in its version (optional ones may be left out). */
export function packagesMatchLock() {
  const installedFile = path.join(root, "node_modules/.package-lock.json");
  if (!existsSync(installedFile)) return false;
  const wanted = JSON.parse(readFileSync(path.join(root, "package-lock.json"), "utf8")).packages;
  const installed = JSON.parse(readFileSync(installedFile, "utf8")).packages;
  return Object.entries(wanted).every(
    ([place, { version, optional, devOptional }]) =>
      place === "" || installed[place]?.version === version || (!installed[place] && Boolean(optional || devOptional)),
  );
}

function newest(place) {
  const found = statSync(place);
  if (!found.isDirectory()) return found.mtimeMs;
  return Math.max(0, ...readdirSync(place).map((name) => newest(path.join(place, name))));
}

/** Whether the build is there and no source is newer. */
export function buildIsCurrent() {
  const results = BUILD_RESULTS.map((name) => path.join(root, name));
  if (!results.every((file) => existsSync(file))) return false;
  const sources = BUILD_SOURCES.map((name) => path.join(root, name)).filter((file) => existsSync(file));
  return Math.max(...sources.map(newest)) < Math.min(...results.map((file) => statSync(file).mtimeMs));
}

/** The processes under way, so that a stop of the parent reaches them. */
const running = new Set();

/** Each child leads a group of its own, so that the terminal's Ctrl+C reaches the parent alone and is passed on once. */
export function stopChildren(signal) {
  for (const child of running) {
    try {
      process.kill(-child.pid, signal);
    } catch {
      child.kill(signal);
    }
  }
}

export function start(command, args, options = {}) {
  const child = spawn(command, args, { cwd: root, detached: true, ...options });
  running.add(child);
  child.once("exit", () => running.delete(child));
  child.once("error", () => running.delete(child));
  return child;
}

/**
 * Runs a program to its end.
 * @param show whether its output is passed on as it comes; else it is only kept
 * @returns its exit code (127 when it could not be started) and its output
 */
export function run(command, args, { env, show = false } = {}) {
  return new Promise((resolve) => {
    const stdio = show ? ["ignore", "inherit", "inherit"] : ["ignore", "pipe", "pipe"];
    const child = start(command, args, { env: { ...process.env, ...env }, stdio });
    let output = "";
    const keep = (chunk) => {
      output += chunk;
    };
    child.stdout?.setEncoding("utf8").on("data", keep);
    child.stderr?.setEncoding("utf8").on("data", keep);
    child.once("error", (error) => resolve({ code: 127, output: `${command}: ${error.message}` }));
    child.once("close", (code, signal) => resolve({ code: code ?? (signal ? 1 : 0), output }));
  });
}

/** The end of a long output, where the reason usually stands. */
export function tail(output, lines = 40) {
  return output.trimEnd().split("\n").slice(-lines).join("\n");
}
