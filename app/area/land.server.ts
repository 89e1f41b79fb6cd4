import { gunzipSync } from "node:zlib";
import { VectorTile } from "@mapbox/vector-tile";
import { PbfReader } from "pbf";
import type { Position } from "~/ocean/scenario";
import { LAND_LAYER } from "./basemap";
import { MAX_ZOOM, type TileRings } from "./cut-tiles";
import { shareOfLand, type TilePlace, tilesUnder } from "./share-of-land";
import { basemapState, readTile } from "./tiles.server";

/**
 * Share of a box that land covers, 0…1, by the basemap's finest tiles (coast at 100 m); larger lakes count as water.
 * @param polygon [longitude, latitude] in degrees, open or closed, also across ±180
 * @returns null when there is no basemap
 */
export async function landShare(polygon: readonly Position[]): Promise<number | null> {
  if (!(await basemapState()).ready) return null;
  const land = new Map<string, TileRings>();
  await Promise.all(
    tilesUnder(polygon, MAX_ZOOM).map(async (place) => {
      const rings = await landOf(place);
      if (rings) land.set(key(place), rings);
    }),
  );
  return shareOfLand(polygon, MAX_ZOOM, (place) => land.get(key(place)));
}

function key({ x, y }: TilePlace): string {
  return `${x}/${y}`;
}

async function landOf({ x, y }: TilePlace): Promise<TileRings | null> {
  const across = 2 ** MAX_ZOOM;
  const bytes = await readTile(MAX_ZOOM, ((x % across) + across) % across, y);
  return bytes ? decodeLand(gunzipSync(bytes)) : null;
}

/** Rings of the land layer in tile units. */
function decodeLand(bytes: Uint8Array): TileRings {
  const layer = new VectorTile(new PbfReader(bytes)).layers[LAND_LAYER];
  const rings: TileRings = [];
  for (let i = 0; i < (layer?.length ?? 0); i++) {
    for (const ring of layer.feature(i).loadGeometry()) rings.push(ring.map(({ x, y }) => [x, y]));
  }
  return rings;
}
