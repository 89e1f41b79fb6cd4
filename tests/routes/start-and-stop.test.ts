import { type ChildProcess, spawn } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { Agent, type ClientRequest, createServer, request as httpRequest, type RequestOptions } from "node:http";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, inject, it, vi } from "vitest";
import { startServer } from "../setup/run-server";

const FORM = { "content-type": "application/x-www-form-urlencoded" };

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "galeprint-start-"));
});

afterEach(() => rmSync(folder, { recursive: true, force: true }));

/** Runs the server's entry until it ends by itself. */
function startThatFails(env: Record<string, string>): Promise<{ code: number | null; out: string; error: string }> {
  const child: ChildProcess = spawn(process.execPath, [inject("serverEntry")], {
    env: { PATH: process.env.PATH, DATA_DIRECTORY: folder, ...env },
    cwd: folder,
  });
  let out = "";
  let error = "";
  child.stdout?.on("data", (chunk) => (out += chunk));
  child.stderr?.on("data", (chunk) => (error += chunk));
  return new Promise((resolve) => child.once("close", (code) => resolve({ code, out, error })));
}

interface Exchange {
  request: ClientRequest;
  status: Promise<number>;
}

function open(url: string, options: RequestOptions): Exchange {
  const request = httpRequest(url, options);
  const status = new Promise<number>((resolve, reject) => {
    request.once("response", (response) => {
      response.resume();
      response.once("end", () => resolve(response.statusCode ?? 0));
    });
    request.once("error", reject);
  });
  return { request, status };
}

describe("a start that cannot succeed", () => {
  it("names each setting that is wrong, without a stack", async () => {
    const { code, out, error } = await startThatFails({ PORT: "abc", LOG_LEVEL: "loud" });
    expect({ code, out }).toEqual({ code: 1, out: "" });
    expect(error).toBe(
      'PORT must be a whole number from 1 to 65535 (or 0 for any free port), not "abc".\n' +
        'LOG_LEVEL must be one of fatal, error, warn, info, debug, trace, silent, not "loud".\n',
    );
  });

  it("reads the .env of the working directory, and lets the environment go before it", async () => {
    writeFileSync(path.join(folder, ".env"), "PORT=abc\nLOG_LEVEL=loud\n");
    const { error } = await startThatFails({ PORT: "0" });
    expect(error).toBe('LOG_LEVEL must be one of fatal, error, warn, info, debug, trace, silent, not "loud".\n');
  });

  it("says that the port is taken", async () => {
    const other = createServer();
    await new Promise<void>((resolve) => other.listen(0, "127.0.0.1", resolve));
    const { port } = other.address() as AddressInfo;
    const { code, error } = await startThatFails({ PORT: String(port) });
    other.close();
    expect(code).toBe(1);
    expect(error).toBe(`Port ${port} is in use by another program. Set PORT to a free one.\n`);
  });

  it("says that the host is not this machine's", async () => {
    const { code, error } = await startThatFails({ PORT: "0", HOST: "192.0.2.1" });
    expect(code).toBe(1);
    expect(error).toBe('HOST is "192.0.2.1", which is not an address of this machine.\n');
  });
});

describe("a running server", () => {
  it("is up and ready on a migrated database, and writes nothing but JSON lines to its log", async () => {
    const server = await startServer();
    expect((await fetch(`${server.url}/healthz`)).status).toBe(200);
    const ready = await fetch(`${server.url}/readyz`);
    expect([ready.status, await ready.json()]).toEqual([200, { status: "ready" }]);
    expect((await fetch(`${server.url}/`)).status).toBe(200);
    expect(await server.stop()).toBe(0);
    const [announcement, ...lines] = server.logs().trimEnd().split("\n");
    expect(announcement).toMatch(/^Galeprint listens on http:\/\/localhost:\d+ \(port \d+\)$/);
    for (const line of lines) expect(JSON.parse(line)).toHaveProperty("level");
  });

  it("is up but not ready while migrations wait", async () => {
    const empty = path.join(folder, "empty.sqlite");
    writeFileSync(empty, "");
    const server = await startServer({ databaseFile: empty });
    expect((await fetch(`${server.url}/healthz`)).status).toBe(200);
    const ready = await fetch(`${server.url}/readyz`);
    expect(ready.status).toBe(503);
    expect(await ready.json()).toMatchObject({
      status: "not ready",
      reason: expect.stringContaining("Migrations are waiting"),
    });
    expect(await server.stop()).toBe(0);
  });
});

describe("a stop", () => {
  it.each(["SIGTERM", "SIGINT"] as const)(
    "by %s finishes the request under way and takes no new one",
    async (signal) => {
      const server = await startServer();
      const body = "email=nobody%40example.com&password=not-the-password";
      const { request, status } = open(`${server.url}/sign-in`, {
        method: "POST",
        headers: {
          "content-type": "application/x-www-form-urlencoded",
          "content-length": body.length,
          origin: server.url,
          expect: "100-continue",
        },
      });
      // The server's "continue" proves that it has the request, which waits for its body from here on.
      await new Promise((resolve) => {
        request.once("continue", resolve);
        request.flushHeaders();
      });
      server.process.kill(signal);
      await vi.waitFor(() => expect(server.logs()).toContain("finishing the requests under way"), { timeout: 10_000 });
      await expect(fetch(`${server.url}/healthz`)).rejects.toThrow();
      expect(server.process.exitCode).toBeNull();
      request.end(body);
      expect(await status).toBe(400);
      expect(await server.stop()).toBe(0);
      expect(server.logs()).toContain('"msg":"stopped"');
    },
  );

  it("does not wait for connections that are merely kept open", async () => {
    const server = await startServer({ env: { SHUTDOWN_SECONDS: "600" } });
    const agent = new Agent({ keepAlive: true });
    expect(await endOf(open(`${server.url}/healthz`, { agent }))).toBe(200);
    expect(await server.stop()).toBe(0);
    agent.destroy();
  });

  it("cuts a request that does not finish in the time it is given", async () => {
    const server = await startServer({ env: { SHUTDOWN_SECONDS: "1" } });
    const { request, status } = open(`${server.url}/sign-in`, {
      method: "POST",
      headers: { ...FORM, "content-length": 100, origin: server.url, expect: "100-continue" },
    });
    const cut = expect(status).rejects.toThrow();
    await new Promise((resolve) => {
      request.once("continue", resolve);
      request.flushHeaders();
    });
    expect(await server.stop()).toBe(0);
    await cut;
    expect(server.logs()).toContain("cut the requests that had not finished");
  });
});

function endOf({ request, status }: Exchange): Promise<number> {
  request.end();
  return status;
}
