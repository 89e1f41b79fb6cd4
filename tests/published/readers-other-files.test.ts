/** Real casts, tracks and shapes against facts that were computed independently. The files lie outside the repository. */
import { existsSync, readFileSync } from "node:fs";
import { zipSync } from "fflate";
import { describe, expect, it } from "vitest";
import { readCast } from "~/readers/casts/read-cast";
import { kindOfFile } from "~/readers/kind-of-file";
import { readShape } from "~/readers/shapes/read-shape";
import { readTrack } from "~/readers/tracks/read-track";
import { summaryOfTrack } from "~/readers/tracks/track-summary";

const DATA = "../shared/data";
const present = existsSync(`${DATA}/facts.json`);
if (!present) process.stdout.write(`Skipped: real casts, tracks and shapes, since ${DATA} is absent.\n`);

interface Facts {
  rows: number;
  CTDPRS: { min: number; max: number };
  CTDTMP: { min: number; max: number };
  CTDSAL: { min: number; max: number };
  pressure: [number, number] & { min: number; max: number };
  temp: [number, number];
  sal: [number, number];
  depth: { min: number; max: number };
  temperature: { min: number; max: number };
  lines: number;
  fixes: number;
  first_utc: string;
  last_utc: string;
  max_wind_ms: number;
  first_time_of_max_utc: string;
  min_pressure_hPa: number;
  storms: { id: string; name: string; actual_rows: number; max_wind_kt: number }[];
  polygons: number;
  holes: number;
  vertices: number;
  bbox: number[];
}
const facts: Record<string, Facts> = present
  ? JSON.parse(readFileSync(`${DATA}/facts.json`, "utf8").replace(/\bNaN\b/g, "null"))
  : {};
const fileOf = (name: string) => ({ bytes: new Uint8Array(readFileSync(`${DATA}/${name}`)), fileName: name });

describe.skipIf(!present)("real casts", () => {
  it("an exchange file of 489 depths", () => {
    const name = "ctd/exchange_a22_2003a_ct1.csv";
    const { channels, rows, latitude } = readCast(fileOf(name));
    expect(rows).toBe(facts[name].rows);
    expect(latitude).toBe(11.3358);
    const { CTDPRS, CTDTMP, CTDSAL } = facts[name];
    expect(channels.pressure).toMatchObject({ min: CTDPRS.min, max: CTDPRS.max });
    expect(channels.temperature).toMatchObject({ min: CTDTMP.min, max: CTDTMP.max });
    expect(channels.salinity).toMatchObject({ min: CTDSAL.min, max: CTDSAL.max });
  });

  it("a handheld instrument's table, told from a series by its content", () => {
    const name = "ctd/castaway_data.csv";
    expect(kindOfFile(fileOf(name).bytes, name)).toBe("cast");
    const { channels, rows, time } = readCast(fileOf(name));
    expect([rows, time]).toEqual([facts[name].rows, "2017-08-22T02:39:11Z"]);
    expect(channels.pressure?.max).toBeCloseTo(facts[name].pressure[1], 3);
    expect(channels.temperature?.min).toBeCloseTo(facts[name].temp[0], 3);
    expect(channels.salinity?.max).toBeCloseTo(facts[name].sal[1], 3);
  });

  it("an instrument's text with conductivity alone", () => {
    const name = "ctd/sbe_PIRA001.cnv";
    const { channels, rows, samples } = readCast(fileOf(name));
    expect(rows).toBe(facts[name].rows);
    expect(channels.pressure).toMatchObject({ min: facts[name].pressure.min, max: facts[name].pressure.max });
    expect(channels.depth).toMatchObject({ min: facts[name].depth.min, max: facts[name].depth.max });
    expect(channels.temperature).toMatchObject({
      min: facts[name].temperature.min,
      max: facts[name].temperature.max,
    });
    // Surface water of the tropical Atlantic: 35.5 to 37 (common practice, no source).
    expect(samples.every(({ salinity }) => salinity > 35.5 && salinity < 37)).toBe(true);
  });
});

describe.skipIf(!present)("real tracks", () => {
  it("a deck with radii lines and hours off the synoptic", () => {
    const name = "besttrack/bal092008_ike.dat";
    const track = readTrack(fileOf(name));
    const { channels, first, last } = summaryOfTrack(track);
    const own = facts[name];
    expect([track.rows, track.fixes.length, first, last]).toEqual([own.lines, own.fixes, own.first_utc, own.last_utc]);
    expect(channels.maxWind.max).toBeCloseTo(own.max_wind_ms, 2);
    expect(channels.maxWind.maxAt).toBe(own.first_time_of_max_utc);
    expect(channels.centralPressure.min).toBe(own.min_pressure_hPa);
  });

  it("a hurricane database with six storms, each by itself", () => {
    const name = "besttrack/hurdat2_sample_AL1851_EP1970_CP.txt";
    for (const storm of facts[name].storms) {
      const track = readTrack({ ...fileOf(name), answers: { storm: storm.id } });
      expect(track.fixes).toHaveLength(storm.actual_rows);
      expect(track.storm.name).toBe(storm.name);
      const most = Math.max(...track.fixes.map(({ maxWind }) => maxWind ?? 0));
      expect(most / (1852 / 3600)).toBeCloseTo(storm.max_wind_kt, 6);
    }
  });

  it("the archive's CSV without a row of units", () => {
    const name = "besttrack/ibtracs_v04_sample.csv";
    const track = readTrack(fileOf(name));
    expect(track.rows).toBe(facts[name].rows);
    expect(track.storm).toMatchObject({ id: "2019326S08163", name: "RITA", first: "2019-11-22T00:00:00Z" });
  });
});

describe.skipIf(!present)("real shapes", () => {
  it.each(["area/tampa.geojson", "area/fiji_antimeridian.geo.json", "area/kml_samples_3d_holes.kml"])("%s", (name) => {
    const { polygons, holes, vertices, bbox } = facts[name];
    expect(kindOfFile(fileOf(name).bytes, name)).toBe("shape");
    expect(readShape(fileOf(name)).summary).toEqual({ polygons, holes, vertices, bbox });
  });

  it("a shapefile of lines is refused with the reason, zipped or not", () => {
    const part = (ending: string) => fileOf(`area/gulf_fairway/fairway.${ending}`).bytes;
    expect(() => readShape(fileOf("area/gulf_fairway/fairway.shp"))).toThrow(/no polygon: it holds 566 lines/);
    const zipped = zipSync({ "f.shp": part("shp"), "f.dbf": part("dbf"), "f.prj": part("prj") });
    expect(() => readShape({ bytes: zipped, fileName: "f.zip" })).toThrow(/no polygon/);
  });

  it("a bomb of entities is refused at once", () => {
    expect(() => readShape(fileOf("hostile/billion_laughs.kml"))).toThrow(/declares entities/);
  });
});
