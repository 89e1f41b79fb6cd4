/**
 * The engine's numbers are the same to the last bit in Node's main thread, a worker thread, a page and a web worker: one
 * bundle, run in all four, whose answers are compared as the 64 bits of every number.
 */
import { once } from "node:events";
import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { fileURLToPath } from "node:url";
import { runInThisContext } from "node:vm";
import { isMainThread, Worker } from "node:worker_threads";
import { build } from "esbuild";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { browserForTests } from "../setup/browser";
import { ulpsBetween } from "./same-numbers/bits";
import type { Everything } from "./same-numbers/everything";

const PLACES = ["Node's main thread", "a worker thread", "a page", "a web worker"] as const;
type Place = (typeof PLACES)[number];
const [MAIN, ...ELSEWHERE] = PLACES;

/** By how many last bits functions that the engine avoids were seen to differ: V8 11.3 of Node 20 against V8 15.0. */
const SEEN_TO_DIFFER_BY = { power: 1, tanh: 3 };

const browser = browserForTests();
let server: Server;
let results: Record<Place, Everything>;

beforeAll(async () => {
  const engine = await bundled();
  server = createServer((request, response) => {
    const isScript = request.url === "/engine.js";
    response.setHeader("Content-Type", isScript ? "text/javascript" : "text/html");
    response.end(
      isScript ? engine : '<!doctype html><link rel="icon" href="data:,"><script src="/engine.js"></script>',
    );
  });
  await once(server.listen(0, "127.0.0.1"), "listening");
  const page = await browser.newPage();
  await page.goto(`http://127.0.0.1:${(server.address() as AddressInfo).port}`);
  results = {
    "Node's main thread": runInThisContext(`${engine}\nengine.everything()`),
    "a worker thread": await inWorkerThread(engine),
    "a page": await page.evaluate<Everything>("engine.everything()"),
    "a web worker": await page.evaluate<Everything>(`new Promise((resolve, reject) => {
      const body = "importScripts('" + location.origin + "/engine.js'); postMessage(engine.everything());";
      const worker = new Worker(URL.createObjectURL(new Blob([body])));
      worker.onmessage = ({ data }) => resolve(data);
      worker.onerror = ({ message }) => reject(new Error(message));
    })`),
  };
});

afterAll(() => {
  server?.close();
});

async function bundled(): Promise<string> {
  const path = (relative: string) => fileURLToPath(new URL(relative, import.meta.url));
  const { outputFiles } = await build({
    entryPoints: [path("same-numbers/everything.ts")],
    bundle: true,
    write: false,
    format: "iife",
    globalName: "engine",
    target: "es2022",
    alias: { "~": path("../../app") },
    logLevel: "warning",
  });
  return outputFiles[0].text;
}

async function inWorkerThread(engine: string): Promise<Everything> {
  const worker = new Worker(`${engine}\nrequire("node:worker_threads").parentPort.postMessage(engine.everything())`, {
    eval: true,
  });
  const [result] = await once(worker, "message");
  return result;
}

/** Names under which two places do not say the same. */
function differing(one: Record<string, string>, other: Record<string, string>): string[] {
  const names = new Set([...Object.keys(one), ...Object.keys(other)]);
  return [...names].filter((name) => one[name] !== other[name]);
}

/** The list of numbers in a text of bits. */
function bitsIn(text: string): bigint[] {
  return text.match(/[0-9a-f]{16}/g)?.map((digits) => BigInt(`0x${digits}`)) ?? [];
}

describe("the engine's numbers", () => {
  test("come from all four models, with and without an ensemble, and from every formula of the check file", () => {
    expect(isMainThread).toBe(true);
    const names = Object.keys(results[MAIN].answers);
    expect(names).toEqual(
      expect.arrayContaining(["budget, ensemble", "slab, coare35", "column, ensemble", "coastal, constant"]),
    );
    expect(names.length).toBeGreaterThan(250);
  });

  test.each(ELSEWHERE)("are to the last bit in %s what they are in Node's main thread", (place) => {
    expect(differing(results[MAIN].answers, results[place].answers)).toEqual([]);
  });

  test.each(ELSEWHERE)("stand on functions of JavaScript that give the same bits in %s", (place) => {
    expect(differing(results[MAIN].mathUsed, results[place].mathUsed)).toEqual([]);
  });

  test.each(ELSEWHERE)("do without those that need not: in %s they differ by a few last bits at most", (place) => {
    for (const [name, most] of Object.entries(SEEN_TO_DIFFER_BY)) {
      const here = bitsIn(results[MAIN].mathAvoided[name]);
      const there = bitsIn(results[place].mathAvoided[name]);
      expect(there).toHaveLength(here.length);
      const apart = here.reduce((worst, bits, k) => Math.max(worst, ulpsBetween(bits, there[k])), 0);
      expect(apart, name).toBeLessThanOrEqual(most);
    }
  });
});
