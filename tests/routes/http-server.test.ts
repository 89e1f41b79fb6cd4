import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import {
  createServer,
  request as httpRequest,
  type IncomingMessage,
  type RequestOptions,
  type Server,
} from "node:http";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import path from "node:path";
import { brotliDecompressSync, gunzipSync } from "node:zlib";
import type { RequestHandler } from "express";
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { createApplication } from "~/services/http/application.server";
import { createLogger } from "~/services/log.server";

/** What stands in for the product's routes: an answer for each thing that the server has to treat well. */
const routes: RequestHandler = (request, response) => {
  if (request.path === "/fails") throw new Error("the reason, with a secret path /srv/secret");
  if (request.path === "/own-headers") {
    // As React Router's adapter does.
    response.append("Cache-Control", "public, max-age=60");
    response.append("X-Frame-Options", "SAMEORIGIN");
    response.send("own");
    return;
  }
  if (request.path === "/long") response.type("text/html").send("<p>the same again</p>".repeat(500));
  else response.json({ path: request.path, headers: request.headers });
};

interface Answer {
  status: number;
  headers: IncomingMessage["headers"];
  rawHeaders: string[];
  body: Buffer;
}

let folder: string;
let server: Server;
let port: number;
let ready = true;
const logLines: string[] = [];

async function listen(secure: boolean): Promise<Server> {
  const application = createApplication({
    routes,
    readiness: async () => (ready ? { ready } : { ready, reason: "Migrations are waiting: 2026-12-01-first-tables." }),
    logger: createLogger("debug", { write: (line) => void logLines.push(line) }),
    clientDirectory: folder,
    uploadLimitBytes: 1024 * 1024,
    secure,
    trustProxy: 0,
  });
  const listening = createServer(application);
  await new Promise<void>((resolve) => listening.listen(0, "127.0.0.1", resolve));
  return listening;
}

function portOf(listening: Server): number {
  return (listening.address() as AddressInfo).port;
}

function ask(target: string, options: RequestOptions & { body?: Buffer } = {}): Promise<Answer> {
  const { body, ...rest } = options;
  return new Promise((resolve, reject) => {
    const sent = httpRequest({ host: "127.0.0.1", port, path: target, agent: false, ...rest }, (response) => {
      const chunks: Buffer[] = [];
      response.on("data", (chunk: Buffer) => chunks.push(chunk));
      response.on("end", () =>
        resolve({
          status: response.statusCode ?? 0,
          headers: response.headers,
          rawHeaders: response.rawHeaders,
          body: Buffer.concat(chunks),
        }),
      );
    });
    sent.on("error", reject);
    sent.end(body);
  });
}

/** The access log's line is written after the answer has gone out, so it is waited for by the request's id. */
function accessLine(requestId: IncomingMessage["headers"][string]): Promise<string> {
  return vi.waitFor(() => {
    const lines = logLines.filter(
      (line) => JSON.parse(line).requestId === requestId && JSON.parse(line).msg === "request",
    );
    expect(lines).toHaveLength(1);
    return lines[0];
  });
}

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "galeprint-client-"));
  mkdirSync(path.join(folder, "assets"));
  writeFileSync(path.join(folder, "assets/entry-AbCd1234.js"), "export const text = 'wind over water';\n".repeat(200));
  writeFileSync(path.join(folder, "favicon.svg"), "<svg xmlns='http://www.w3.org/2000/svg'/>");
  server = await listen(false);
  port = portOf(server);
});

afterAll(() => {
  server.close();
  rmSync(folder, { recursive: true, force: true });
});

beforeEach(() => {
  ready = true;
});

describe("headers", () => {
  it("protects every kind of answer", async () => {
    for (const target of ["/", "/assets/entry-AbCd1234.js", "/assets/none.js", "/favicon.svg", "/healthz", "/fails"]) {
      const { headers } = await ask(target);
      expect(headers, target).toMatchObject({
        "x-content-type-options": "nosniff",
        "x-frame-options": "DENY",
        "referrer-policy": "same-origin",
        "cross-origin-opener-policy": "same-origin",
        "permissions-policy": expect.stringContaining("geolocation=()"),
      });
      expect(headers, target).not.toHaveProperty("x-powered-by");
      expect(headers, target).not.toHaveProperty("strict-transport-security");
    }
  });

  it("asks for https only where the public address has it", async () => {
    const secured = await listen(true);
    const { headers } = await ask("/", { port: portOf(secured) });
    secured.close();
    expect(headers["strict-transport-security"]).toBe("max-age=31536000; includeSubDomains");
  });

  it("leaves a route's own choice alone, without a second header of the name", async () => {
    const { headers, rawHeaders } = await ask("/own-headers");
    expect(headers["cache-control"]).toBe("public, max-age=60");
    expect(headers["x-frame-options"]).toBe("SAMEORIGIN");
    expect(rawHeaders.filter((name) => name === "Cache-Control")).toHaveLength(1);
  });
});

describe("caching", () => {
  it("keeps hashed files for a year, other files for an hour, and pages not at all", async () => {
    expect((await ask("/assets/entry-AbCd1234.js")).headers["cache-control"]).toBe(
      "public, max-age=31536000, immutable",
    );
    expect((await ask("/favicon.svg")).headers["cache-control"]).toBe("public, max-age=3600");
    expect((await ask("/")).headers["cache-control"]).toBe("no-store");
    expect((await ask("/healthz")).headers["cache-control"]).toBe("no-store");
  });

  it("says so plainly, and without caching, when a hashed file is gone after an update", async () => {
    const gone = await ask("/assets/entry-OldOld12.js");
    expect(gone.status).toBe(404);
    expect(gone.headers["content-type"]).toBe("text/plain; charset=utf-8");
    expect(gone.headers["cache-control"]).toBe("no-store");
  });

  it("answers 304 to a file that the browser has", async () => {
    const { headers } = await ask("/favicon.svg");
    const again = await ask("/favicon.svg", { headers: { "if-none-match": headers.etag } });
    expect(again.status).toBe(304);
  });
});

describe("compression", () => {
  it("compresses text as the browser can read it", async () => {
    const page = "<p>the same again</p>".repeat(500);
    const brotli = await ask("/long", { headers: { "accept-encoding": "gzip, br" } });
    expect(brotli.headers["content-encoding"]).toBe("br");
    expect(brotliDecompressSync(brotli.body).toString()).toBe(page);
    const gzip = await ask("/long", { headers: { "accept-encoding": "gzip" } });
    expect(gzip.headers["content-encoding"]).toBe("gzip");
    expect(gunzipSync(gzip.body).toString()).toBe(page);
    expect(gzip.headers.vary).toContain("Accept-Encoding");
    expect((await ask("/long")).body.toString()).toBe(page);
    expect((await ask("/assets/entry-AbCd1234.js", { headers: { "accept-encoding": "br" } })).headers).toMatchObject({
      "content-encoding": "br",
    });
  });
});

describe("health", () => {
  it("tells that the process is up, whatever the database does", async () => {
    ready = false;
    const { status, body } = await ask("/healthz");
    expect([status, JSON.parse(body.toString())]).toEqual([200, { status: "up" }]);
  });

  it("tells why it is not ready", async () => {
    expect((await ask("/readyz")).status).toBe(200);
    ready = false;
    const { status, body } = await ask("/readyz");
    expect(status).toBe(503);
    expect(JSON.parse(body.toString())).toEqual({
      status: "not ready",
      reason: "Migrations are waiting: 2026-12-01-first-tables.",
    });
  });
});

describe("request id and address", () => {
  it("passes a sane id through to the route, the client and the log", async () => {
    const { headers, body } = await ask("/page", { headers: { "x-request-id": "a1b2c3d4e5" } });
    expect(headers["x-request-id"]).toBe("a1b2c3d4e5");
    expect(JSON.parse(body.toString()).headers["x-request-id"]).toBe("a1b2c3d4e5");
    expect(JSON.parse(await accessLine("a1b2c3d4e5"))).toMatchObject({ path: "/page", status: 200 });
  });

  it("replaces an id that is not sane, and an address that the client claims", async () => {
    const { headers, body } = await ask("/page", {
      headers: { "x-request-id": "a b", "x-galeprint-client-address": "203.0.113.9", "x-forwarded-for": "203.0.113.9" },
    });
    expect(headers["x-request-id"]).toMatch(/^[0-9a-f-]{36}$/);
    expect(JSON.parse(body.toString()).headers["x-galeprint-client-address"]).toBe("127.0.0.1");
  });
});

describe("what no route could answer", () => {
  it.each([
    ["a method that is not part of the web", { method: "TRACE" }, "/", 405, "does not answer to TRACE"],
    ["a host that is none", { headers: { host: "a b" } }, "/", 400, "does not name a valid host"],
    ["a path that is not UTF-8", {}, "/%E0%A4%A", 400, "must be followed by a UTF-8 code"],
    [
      "a body that does not tell its length",
      { method: "POST", headers: { "transfer-encoding": "chunked" }, body: Buffer.from("x") },
      "/",
      411,
      "Content-Length",
    ],
  ])("refuses %s", async (_what, options, target, status, sentence) => {
    const answer = await ask(target, options);
    expect(answer.status).toBe(status);
    expect(answer.headers["content-type"]).toBe("text/plain; charset=utf-8");
    expect(answer.body.toString()).toContain(sentence);
  });

  it.each(["/upload", "/upload.data"])("refuses a body over the limit at %s and says what to do", async (target) => {
    const answer = await ask(target, { method: "POST", body: Buffer.alloc(1024 * 1024 + 1) });
    expect(answer.status).toBe(413);
    expect(answer.body.toString()).toMatch(/larger than 1 MB.*Nothing was saved\. Split the file/);
  });

  it("accepts a body of exactly the limit", async () => {
    expect((await ask("/upload", { method: "POST", body: Buffer.alloc(1024 * 1024) })).status).toBe(200);
  });

  it("answers a program with problem details", async () => {
    const { headers, body } = await ask("/api/v1/storms", { method: "POST", body: Buffer.alloc(1024 * 1024 + 1) });
    expect(headers["content-type"]).toBe("application/problem+json; charset=utf-8");
    expect(JSON.parse(body.toString())).toMatchObject({ status: 413, title: "Too large" });
  });
});

describe("an unexpected error", () => {
  it("is recorded whole and told without its details", async () => {
    const { status, headers, body } = await ask("/fails");
    expect(status).toBe(500);
    expect(body.toString()).toContain(headers["x-request-id"]);
    expect(body.toString()).not.toContain("secret");
    const recorded = logLines.map((line) => JSON.parse(line)).findLast((line) => line.err !== undefined);
    expect(recorded).toMatchObject({
      level: "error",
      requestId: headers["x-request-id"],
      err: { message: "the reason, with a secret path /srv/secret" },
    });
  });
});

describe("the access log", () => {
  it("has one line a request, without tokens and query strings", async () => {
    const { headers } = await ask("/s/Zm9vYmFyYmF6?passcode=hidden-1", {
      headers: { cookie: "session=hidden-2", authorization: "Bearer hidden-3" },
    });
    const line = await accessLine(headers["x-request-id"]);
    expect(JSON.parse(line)).toMatchObject({ method: "GET", path: "/s/***", status: 200, address: "127.0.0.1" });
    expect(line).not.toMatch(/Zm9v|hidden/);
  });

  it("mentions probes at the level debug only", async () => {
    const { headers } = await ask("/healthz");
    expect(JSON.parse(await accessLine(headers["x-request-id"]))).toMatchObject({ level: "debug", path: "/healthz" });
  });
});
