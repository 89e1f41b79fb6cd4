import { createHash } from "node:crypto";
import { mkdirSync, renameSync, rmSync } from "node:fs";
import { dirname } from "node:path";
import { gzipSync } from "node:zlib";
import sqlite3 from "sqlite3";
import { BASEMAP_ATTRIBUTION, BASEMAP_RECIPE, LAND_LAYER } from "./basemap";
import { cutTiles, FINEST_WEIGHT, type LandTile, MAX_ZOOM } from "./cut-tiles";
import { encodeLandTile } from "./encode-land-tile";
import { type LandPolygon, projectPolygon } from "./land-rings";
import { MERCATOR_LATITUDE_LIMIT } from "./mercator";

const SCHEMA = `
  PRAGMA journal_mode = OFF;
  PRAGMA synchronous = OFF;
  PRAGMA page_size = 8192;
  CREATE TABLE metadata (name TEXT PRIMARY KEY, value TEXT NOT NULL) WITHOUT ROWID;
  CREATE TABLE images (tile_id TEXT NOT NULL PRIMARY KEY, tile_data BLOB NOT NULL);
  CREATE TABLE map (
    zoom_level INTEGER NOT NULL, tile_column INTEGER NOT NULL, tile_row INTEGER NOT NULL, tile_id TEXT NOT NULL,
    PRIMARY KEY (zoom_level, tile_column, tile_row)
  ) WITHOUT ROWID;
  CREATE VIEW tiles AS
    SELECT zoom_level, tile_column, tile_row, tile_data FROM map JOIN images ON images.tile_id = map.tile_id;
`;

/** Rows written by one statement. */
const BATCH = 200;

export interface BasemapSummary {
  tiles: number;
  blobs: number;
}

/**
 * Cuts land polygons into vector tiles (zoom 0 to 8) and writes them as an MBTiles 1.3 file: equal tiles are stored
 * once (`images`), `map` says where each belongs, the `tiles` view is what the standard asks for. Written under a
 * temporary name and renamed when whole, so a reader never meets half a file.
 * @param land GeoJSON polygon coordinates, longitude and latitude in degrees; emptied while it is read, to free memory
 * @param onProgress share done, 0…1
 */
export async function writeBasemap(
  land: number[][][][],
  file: string,
  onProgress: (share: number) => void,
): Promise<BasemapSummary> {
  mkdirSync(dirname(file), { recursive: true });
  const unfinished = `${file}.${process.pid}.part`;
  rmSync(unfinished, { force: true });
  try {
    const database = await openForWriting(unfinished);
    try {
      const summary = await writeTiles(database, takePolygons(land), onProgress);
      await execute(database, "COMMIT; ANALYZE;");
      renameSync(unfinished, file);
      return summary;
    } finally {
      await new Promise((resolve) => database.close(resolve));
    }
  } finally {
    rmSync(unfinished, { force: true });
  }
}

function takePolygons(land: number[][][][]): LandPolygon[] {
  const polygons: LandPolygon[] = [];
  for (let next = land.pop(); next; next = land.pop()) polygons.push(projectPolygon(next, FINEST_WEIGHT));
  return polygons;
}

async function writeTiles(
  database: sqlite3.Database,
  polygons: LandPolygon[],
  onProgress: (share: number) => void,
): Promise<BasemapSummary> {
  await execute(database, `${SCHEMA} BEGIN;`);
  await insertRows(database, "metadata", Object.entries(metadata()));
  const known = new Set<string>();
  let tiles = 0;
  let places: (number | string)[][] = [];
  for (const tile of cutTiles(polygons)) {
    const bytes = encodeLandTile(tile.rings);
    const id = createHash("sha256").update(bytes).digest("hex").slice(0, 24);
    if (!known.has(id)) {
      known.add(id);
      await insertRows(database, "images", [[id, gzipSync(bytes)]]);
    }
    for (const [z, x, y] of placesOf(tile)) {
      // MBTiles counts rows from the south, the address scheme from the north.
      places.push([z, x, 2 ** z - 1 - y, id]);
      tiles += 1;
      if (places.length === BATCH) {
        await insertRows(database, "map", places);
        places = [];
        onProgress(shareDone(tile));
      }
    }
  }
  if (places.length > 0) await insertRows(database, "map", places);
  return { tiles, blobs: known.size };
}

/** The tile itself and, for one that is land throughout, every tile below it: all have the same content. */
function* placesOf(tile: LandTile): Generator<[number, number, number]> {
  const deepest = tile.allLand ? MAX_ZOOM : tile.z;
  for (let z = tile.z; z <= deepest; z++) {
    const across = 2 ** (z - tile.z);
    for (let x = tile.x * across; x < (tile.x + 1) * across; x++) {
      for (let y = tile.y * across; y < (tile.y + 1) * across; y++) yield [z, x, y];
    }
  }
}

/** Tiles come depth first, column before row: the place on that walk, 0…1. */
function shareDone({ z, x, y }: LandTile): number {
  let share = 0;
  for (let level = 1; level <= z; level++) {
    const bit = z - level;
    share += (2 * ((x >> bit) & 1) + ((y >> bit) & 1)) / 4 ** level;
  }
  return share;
}

function metadata(): Record<string, string> {
  const limit = MERCATOR_LATITUDE_LIMIT.toFixed(6);
  return {
    name: "Land",
    format: "pbf",
    type: "baselayer",
    version: "1",
    minzoom: "0",
    maxzoom: String(MAX_ZOOM),
    bounds: `-180,-${limit},180,${limit}`,
    center: "0,0,2",
    attribution: BASEMAP_ATTRIBUTION,
    description: "Land at a resolution of 100 m",
    json: JSON.stringify({ vector_layers: [{ id: LAND_LAYER, fields: {}, minzoom: 0, maxzoom: MAX_ZOOM }] }),
    recipe: BASEMAP_RECIPE,
  };
}

function openForWriting(file: string): Promise<sqlite3.Database> {
  return new Promise((resolve, reject) => {
    const database = new sqlite3.Database(file, (error) => (error ? reject(error) : resolve(database)));
  });
}

function execute(database: sqlite3.Database, sql: string): Promise<void> {
  return new Promise((resolve, reject) => database.exec(sql, (error) => (error ? reject(error) : resolve())));
}

function insertRows(database: sqlite3.Database, table: string, rows: (number | string | Buffer)[][]): Promise<void> {
  const row = `(${rows[0].map(() => "?").join(", ")})`;
  const sql = `INSERT INTO ${table} VALUES ${rows.map(() => row).join(", ")}`;
  return new Promise((resolve, reject) =>
    database.run(sql, rows.flat(), (error) => (error ? reject(error) : resolve())),
  );
}
