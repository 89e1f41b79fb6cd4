import { existsSync } from "node:fs";
import sqlite3 from "sqlite3";
import { config } from "~/services/config.server";
import { BASEMAP_RECIPE } from "./basemap";

/** Whether maps have land to draw. When not, `message` says what to do about it. */
export type BasemapState =
  { ready: true; file: string } | { ready: false; reason: "missing" | "unreadable" | "outOfDate"; message: string };

export interface StoredTile {
  /** Changes with the content: serves as the entity tag. */
  id: string;
  /** A vector tile, gzip-compressed. */
  bytes: Uint8Array;
}

let opened: Promise<sqlite3.Database> | undefined;

/** Opened once, read-only. A failure is not kept: the basemap may be made while the server runs. */
function basemap(): Promise<sqlite3.Database> {
  opened ??= new Promise<sqlite3.Database>((resolve, reject) => {
    const database = new sqlite3.Database(config().basemapFile, sqlite3.OPEN_READONLY, (error) => {
      if (error) reject(error);
      else resolve(database);
    });
  }).catch((error: unknown) => {
    opened = undefined;
    throw error;
  });
  return opened;
}

function firstRow<Row>(database: sqlite3.Database, sql: string, values: unknown[]): Promise<Row | undefined> {
  return new Promise((resolve, reject) => {
    database.get<Row>(sql, values, (error, row) => (error ? reject(error) : resolve(row)));
  });
}

/** What the basemap file is good for; never throws. */
export async function basemapState(): Promise<BasemapState> {
  const file = config().basemapFile;
  if (!existsSync(file)) {
    return { ready: false, reason: "missing", message: "There is no basemap yet. Run npm run basemap to make it." };
  }
  try {
    const recipe = await firstRow<{ value: string }>(
      await basemap(),
      "SELECT value FROM metadata WHERE name = 'recipe'",
      [],
    );
    if (recipe?.value === BASEMAP_RECIPE) return { ready: true, file };
    return {
      ready: false,
      reason: "outOfDate",
      message: "The basemap was made by an older version. Run npm run basemap to make it anew.",
    };
  } catch {
    return {
      ready: false,
      reason: "unreadable",
      message: "The basemap file cannot be read. Run npm run basemap -- --force to make it anew.",
    };
  }
}

/**
 * One tile with its identity.
 * @param z zoom, 0…8
 * @param x column from the west
 * @param y row from the north
 * @returns null where there is no land, and where there is no basemap (`basemapState` tells which)
 */
export async function readStoredTile(z: number, x: number, y: number): Promise<StoredTile | null> {
  if (!existsSync(config().basemapFile)) return null;
  try {
    const row = await firstRow<{ id: string; bytes: Buffer }>(
      await basemap(),
      `SELECT images.tile_id AS id, images.tile_data AS bytes FROM map JOIN images ON images.tile_id = map.tile_id
       WHERE zoom_level = ? AND tile_column = ? AND tile_row = ?`,
      [z, x, 2 ** z - 1 - y],
    );
    return row ?? null;
  } catch {
    return null;
  }
}

/** The gzip-compressed vector tile alone; see {@link readStoredTile}. */
export async function readTile(z: number, x: number, y: number): Promise<Uint8Array | null> {
  return (await readStoredTile(z, x, y))?.bytes ?? null;
}
