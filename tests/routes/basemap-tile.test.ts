import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { gunzipSync } from "node:zlib";
import { VectorTile } from "@mapbox/vector-tile";
import { PbfReader } from "pbf";
import sqlite3 from "sqlite3";
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { BASEMAP_RECIPE, LAND_LAYER } from "~/area/basemap";
import { MAX_ZOOM } from "~/area/cut-tiles";
import { writeBasemap } from "~/area/write-basemap.server";
import type { Position } from "~/ocean/scenario";

/** One island from 10° E 40° N to 12° E 42° N. */
const island: number[][][] = [
  [
    [10, 40],
    [12, 40],
    [12, 42],
    [10, 42],
    [10, 40],
  ],
];
const box = (west: number, south: number, east: number, north: number): Position[] => [
  [west, south],
  [east, south],
  [east, north],
  [west, north],
];

let folder: string;
let file: string;
const progress: number[] = [];

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "galeprint-basemap-"));
  file = path.join(folder, "basemap.mbtiles");
  await writeBasemap([island], file, (share) => progress.push(share));
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** The server's modules, as started with another basemap file. */
async function withBasemap(basemapFile: string) {
  vi.resetModules();
  vi.stubEnv("BASEMAP_FILE", basemapFile);
  const [{ loader }, tiles, { landShare }] = await Promise.all([
    import("~/routes/basemap-tile"),
    import("~/area/tiles.server"),
    import("~/area/land.server"),
  ]);
  const get = (z: string, x: string, y: string, headers: Record<string, string> = {}) => {
    const request = new Request(`http://localhost/basemap/${z}/${x}/${y}`, { headers });
    const args = { request, params: { z, x, y } } as unknown as Parameters<typeof loader>[0];
    return loader(args);
  };
  return { get, state: tiles.basemapState, readTile: tiles.readTile, landShare };
}

describe("GET /basemap/:z/:x/:y", () => {
  let server: Awaited<ReturnType<typeof withBasemap>>;
  beforeEach(async () => {
    server = await withBasemap(file);
  });

  it("sends a gzip-compressed vector tile that may be kept for good", async () => {
    const response = await server.get("8", "135", "95");
    expect(response.status).toBe(200);
    expect(response.headers.get("Content-Encoding")).toBe("gzip");
    expect(response.headers.get("Cache-Control")).toBe("public, max-age=31536000, immutable");
    expect(response.headers.get("ETag")).toMatch(/^"[0-9a-f]{24}"$/);
    const tile = new VectorTile(new PbfReader(gunzipSync(Buffer.from(await response.arrayBuffer()))));
    expect(Object.keys(tile.layers)).toEqual([LAND_LAYER]);
  });

  it("answers 304 to the tag it gave", async () => {
    const tag = (await server.get("8", "135", "95")).headers.get("ETag") ?? "";
    expect((await server.get("8", "135", "95", { "If-None-Match": `W/"other", ${tag}` })).status).toBe(304);
    expect((await server.get("8", "135", "95", { "If-None-Match": '"other"' })).status).toBe(200);
  });

  it("answers 204 for open sea, lastingly", async () => {
    const response = await server.get("8", "0", "0");
    expect(response.status).toBe(204);
    expect(response.headers.get("Cache-Control")).toContain("immutable");
  });

  it.each([
    ["9", "0", "0"],
    ["8", "256", "0"],
    ["0", "0", "1"],
    ["-1", "0", "0"],
    ["8", "1.5", "0"],
    ["8", "x", "0"],
    ["8", "1e2", "0"],
    ["8", "", "0"],
    ["8", "9999999999", "0"],
  ])("answers 400 to %s/%s/%s and says what is asked for", async (z, x, y) => {
    const response = await server.get(z, x, y);
    expect(response.status).toBe(400);
    expect(await response.text()).toContain(`zoom 0 to ${MAX_ZOOM}`);
  });
});

describe("the basemap file", () => {
  it("tells its progress and ends near one", () => {
    expect(progress.every((share, i) => share >= (progress[i - 1] ?? 0) && share <= 1)).toBe(true);
  });

  it("keeps to MBTiles 1.3: tiles view, rows from the south, metadata with attribution; equal tiles stored once", async () => {
    const database = new sqlite3.Database(file, sqlite3.OPEN_READONLY);
    const all = <Row>(sql: string) =>
      new Promise<Row[]>((resolve, reject) =>
        database.all<Row>(sql, (error, rows) => (error ? reject(error) : resolve(rows))),
      );
    const metadata = await all<{ name: string; value: string }>("SELECT name, value FROM metadata");
    const facts = Object.fromEntries(metadata.map(({ name, value }) => [name, value]));
    expect(facts).toMatchObject({ format: "pbf", minzoom: "0", maxzoom: "8", recipe: BASEMAP_RECIPE });
    expect(facts.attribution).toBe("© OpenStreetMap contributors, ODbL");
    const [northern] = await all<{ tiles: number }>(
      "SELECT count(*) AS tiles FROM tiles WHERE zoom_level = 8 AND tile_row < 128",
    );
    expect(northern.tiles).toBe(0);
    const [counts] = await all<{ tiles: number; images: number }>(
      "SELECT (SELECT count(*) FROM map) AS tiles, (SELECT count(*) FROM images) AS images",
    );
    expect(counts.tiles).toBeGreaterThan(9);
    expect(counts.images).toBeLessThanOrEqual(counts.tiles);
    await new Promise((resolve) => database.close(resolve));
  });

  it("is told as missing, and nothing fails", async () => {
    const server = await withBasemap(path.join(folder, "nowhere.mbtiles"));
    expect(await server.state()).toMatchObject({
      ready: false,
      reason: "missing",
      message: expect.stringContaining("npm run basemap"),
    });
    expect(await server.readTile(0, 0, 0)).toBeNull();
    expect(await server.landShare(box(10, 40, 11, 41))).toBeNull();
    const response = await server.get("0", "0", "0");
    expect(response.status).toBe(204);
    expect(response.headers.get("Cache-Control")).toBe("no-store");
  });

  it("is found once it has been made while the server runs", async () => {
    const late = path.join(folder, "late.mbtiles");
    const server = await withBasemap(late);
    expect((await server.state()).ready).toBe(false);
    await writeBasemap([island], late, () => {});
    expect((await server.state()).ready).toBe(true);
    expect((await server.get("0", "0", "0")).status).toBe(200);
  });

  it("is told as unreadable when it is something else", async () => {
    const wrong = path.join(folder, "wrong.mbtiles");
    writeFileSync(wrong, "not a database at all, but long enough to be taken for a header".repeat(50));
    const server = await withBasemap(wrong);
    expect(await server.state()).toMatchObject({ ready: false, reason: "unreadable" });
    expect((await server.get("0", "0", "0")).status).toBe(204);
  });

  it("is told as out of date when an older recipe made it", async () => {
    const old = path.join(folder, "old.mbtiles");
    await writeBasemap([island], old, () => {});
    const database = new sqlite3.Database(old);
    await new Promise((resolve) =>
      database.exec("UPDATE metadata SET value = 'land-0' WHERE name = 'recipe'", resolve),
    );
    await new Promise((resolve) => database.close(resolve));
    expect(await (await withBasemap(old)).state()).toMatchObject({ ready: false, reason: "outOfDate" });
  });
});

describe("landShare", () => {
  it.each<[string, Position[], number]>([
    ["all land", box(10.5, 40.5, 11.5, 41.5), 1],
    ["half land", box(11, 40.5, 13, 41.5), 0.5],
    ["open sea", box(20, 40, 21, 41), 0],
  ])("reads %s from the finest tiles", async (_, ring, share) => {
    const { landShare } = await withBasemap(file);
    expect(await landShare(ring)).toBeCloseTo(share, 2);
  });
});
