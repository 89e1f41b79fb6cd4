import { existsSync, readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { SingleBar } from "cli-progress";
import { BASEMAP_ATTRIBUTION } from "~/area/basemap";
import { basemapState } from "~/area/tiles.server";
import { writeBasemap } from "~/area/write-basemap.server";
import { config } from "~/services/config.server";

const SOURCE = "@geo-maps/earth-lands-100m/map.geo.json";

/** `npm run basemap [-- --force]`: cuts the world's land into the vector tiles that the maps are drawn from. */
async function buildBasemap(options: string[]): Promise<void> {
  const file = config().basemapFile;
  const state = await basemapState();
  if (state.ready && !options.includes("--force")) {
    console.log(`Basemap is current: ${file}`);
    return;
  }
  const started = performance.now();
  console.log("Basemap: reading land (100 m)");
  const land = readLand();
  const bar = new SingleBar({ format: "Basemap: cutting tiles [{bar}] {percentage} %", hideCursor: true });
  bar.start(100, 0);
  const { tiles, blobs } = await writeBasemap(land, file, (share) => bar.update(Math.floor(100 * share)));
  bar.update(100);
  bar.stop();
  const seconds = Math.round((performance.now() - started) / 1000);
  console.log(`Basemap: ${tiles} tiles (${blobs} different) in ${seconds} s: ${file}\n${BASEMAP_ATTRIBUTION}`);
}

function readLand(): number[][][][] {
  const file = createRequire(import.meta.url).resolve(SOURCE);
  if (!existsSync(file)) throw new Error(`${SOURCE} is not installed. Run npm ci and try again.`);
  const collection = JSON.parse(readFileSync(file, "utf8")) as {
    geometries: { type: string; coordinates: number[][][][] }[];
  };
  return collection.geometries.flatMap((geometry) => geometry.coordinates);
}

buildBasemap(process.argv.slice(2)).catch((error: unknown) => {
  console.error(`The basemap could not be made: ${error instanceof Error ? error.message : String(error)}`);
  process.exitCode = 1;
});
