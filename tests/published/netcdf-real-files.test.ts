import { existsSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { readSeries } from "~/readers/read-series";
import type { ReadingAnswers, SeriesReading } from "~/readers/reading";

/**
 * Real NetCDF files of a reanalysis and a mooring against facts that were computed independently of this code. They lie
 * outside the repository.
 */
const DATA = "../shared/data";
const present = existsSync(`${DATA}/facts.json`);
if (!present) process.stdout.write(`Skipped: real NetCDF files against facts, since ${DATA} is absent.\n`);

interface WindFacts {
  valid_wind: number;
  mean_wind_ms: number;
  max_wind_ms: number;
  time_of_max_utc: string;
  vector_mean: { mean_vector_speed_ms: number; direction_from_deg: number };
}
interface FileFacts extends WindFacts {
  rows: number;
  first_utc: string;
  last_utc: string;
  file_order: string;
  duplicate_times: number;
  median_step_s: number;
  gaps_gt_1p5_steps: number;
  longest_gap_s: number;
  longest_gap_starts_utc: string;
  missing_per_channel: Record<string, number>;
  means: Record<string, number>;
  wind_height_m: number[];
  mean_net_heat_flux_into_ocean_Wm2: number;
  components_upward_mean_Wm2: Record<string, number>;
  mean_rain_rate_mm_h: number;
  total_rain_mm_rate_x_1h_per_row: number;
  lat: number;
  lon: number;
  locations: LocationFacts[];
}
interface LocationFacts extends WindFacts {
  location: string;
  lat: number;
  lon: number;
  total_rain_mm: number;
  "mean_net_radiation_Wm2(rss+rls)": number;
  missing: Record<string, number>;
}

const facts: Record<string, FileFacts> = present
  ? JSON.parse(readFileSync(`${DATA}/facts.json`, "utf8").replace(/\bNaN\b/g, "null"))
  : {};
const read = (file: string, answers: ReadingAnswers = {}): SeriesReading =>
  readSeries({ bytes: readFileSync(`${DATA}/${file}`), fileName: file, answers });
const factsOf = (file: string): FileFacts => {
  const found = facts[file];
  if (found === undefined) throw new Error(`No facts of ${file}.`);
  return found;
};

function expectAxis(reading: SeriesReading, fact: FileFacts): void {
  expect(reading).toMatchObject({
    rows: fact.rows,
    first: fact.first_utc,
    last: fact.last_utc,
    order: fact.file_order,
    duplicates: fact.duplicate_times,
    medianStepSeconds: fact.median_step_s,
  });
  const gap = reading.problems.find(({ code }) => code === "timeGap")?.message ?? "0 gaps are longer";
  expect(gap).toContain(`${fact.gaps_gt_1p5_steps} gap`);
  if (fact.gaps_gt_1p5_steps > 0)
    expect(gap).toContain(`${fact.longest_gap_s} s, after ${fact.longest_gap_starts_utc}`);
  expect(reading.problems.filter(({ severity }) => severity === "error")).toEqual([]);
}

function expectWind({ channels, windVectorMean }: SeriesReading, fact: WindFacts): void {
  expect(channels.windSpeed).toMatchObject({ count: fact.valid_wind, maxAt: fact.time_of_max_utc });
  expect(channels.windSpeed?.mean).toBeCloseTo(fact.mean_wind_ms, 4);
  expect(channels.windSpeed?.max).toBeCloseTo(fact.max_wind_ms, 4);
  expect(windVectorMean?.speed).toBeCloseTo(fact.vector_mean.mean_vector_speed_ms, 4);
  expect(windVectorMean?.from).toBeCloseTo(fact.vector_mean.direction_from_deg, 2);
}

function missingIn(reading: SeriesReading, names: string[]): Record<string, number | undefined> {
  return Object.fromEntries(
    names.map((name) => [name, reading.columns.find((column) => column.name === name)?.missing]),
  );
}

const POINT = "netcdf/era5_point_48h_packed_1900.nc";
describe.skipIf(!present)(POINT, () => {
  it("has the facts' times, place and wind", () => {
    const reading = read(POINT);
    const fact = factsOf(POINT);
    expectAxis(reading, fact);
    expectWind(reading, fact);
    expect(reading.windHeight).toBe(10);
    expect(reading.understood.find(({ what }) => what === "Place")?.taken).toBe(
      `${fact.lat.toFixed(3)}° N ${fact.lon.toFixed(3)}° E`,
    );
  });

  it("unpacks to the facts' means, and misses nothing", () => {
    const reading = read(POINT);
    const { means, missing_per_channel: missing } = factsOf(POINT);
    expect(reading.channels.airTemperature?.mean).toBeCloseTo((means.t2m ?? NaN) - 273.15, 4);
    expect(reading.channels.airPressure?.mean).toBeCloseTo((means.sp ?? NaN) / 100, 6);
    expect(reading.channels.shortwave).toMatchObject({ fromColumns: ["msdwswrf"] });
    expect(reading.channels.shortwave?.mean).toBeCloseTo(means.msdwswrf ?? NaN, 4);
    expect(missingIn(reading, Object.keys(missing))).toEqual(missing);
    expect(reading.questions.filter(({ needed }) => needed)).toEqual([]);
  });
});

const CITIES = "netcdf/era5_daily_5cities_1990-1993_nc4.nc";
describe.skipIf(!present)(CITIES, () => {
  it("asks which of the facts' places is wanted, and shows no values before", () => {
    const reading = read(CITIES);
    const question = reading.questions.find(({ key }) => key === "place");
    expect(question?.needed).toBe(true);
    expect(question?.options?.map(({ value }) => value)).toEqual(
      factsOf(CITIES).locations.map(({ lat, lon }) => `${lat},${lon}`),
    );
    expect(reading.channels).toEqual({});
    expectAxis(reading, factsOf(CITIES));
  });

  it.each(present ? factsOf(CITIES).locations : [])("has the facts of $location", (fact) => {
    const reading = read(CITIES, { place: `${fact.lat},${fact.lon}` });
    expectAxis(reading, factsOf(CITIES));
    expectWind(reading, fact);
    expect(reading.understood.find(({ what }) => what === "Place")?.taken).toContain(fact.location);
    expect(reading.channels.rain?.total).toBeCloseTo(fact.total_rain_mm, 2);
    const { shortwave, longwave } = reading.channels;
    expect([shortwave?.fromColumns, longwave?.fromColumns]).toEqual([["rss"], ["rls"]]);
    expect((shortwave?.mean ?? NaN) + (longwave?.mean ?? NaN)).toBeCloseTo(fact["mean_net_radiation_Wm2(rss+rls)"], 4);
    expect(missingIn(reading, Object.keys(fact.missing))).toEqual(fact.missing);
    expect(reading.questions.filter(({ needed }) => needed)).toEqual([]);
  });
});

const MOORING = "netcdf/sofs_mooring_flux_20190520.nc";
describe.skipIf(!present)(MOORING, () => {
  it("has the facts' times, and its wind turned about from where it blows to", () => {
    const reading = read(MOORING);
    expectAxis(reading, factsOf(MOORING));
    expectWind(reading, factsOf(MOORING));
    expect(reading.windHeight).toBe(factsOf(MOORING).wind_height_m[0]);
    expect(reading.channels.windSpeed?.fromColumns).toEqual(["WSPD"]);
  });

  it("has the facts' heat, turned to count into the sea", () => {
    const { channels } = read(MOORING);
    const { components_upward_mean_Wm2: upward, mean_net_heat_flux_into_ocean_Wm2: net } = factsOf(MOORING);
    expect(channels.netHeat?.mean).toBeCloseTo(net, 3);
    expect(channels.shortwave?.mean).toBeCloseTo(-(upward.SW_NET ?? NaN), 4);
    expect(channels.longwave?.mean).toBeCloseTo(-(upward.LW_NET ?? NaN), 4);
    expect(channels.sensible?.mean).toBeCloseTo(-(upward.HS ?? NaN), 4);
    expect(channels.latent?.mean).toBeCloseTo(-(upward.HL ?? NaN), 4);
  });

  it("has the facts' rain and missing values, and asks nothing", () => {
    const reading = read(MOORING);
    const fact = factsOf(MOORING);
    expect(reading.channels.rain?.mean).toBeCloseTo(fact.mean_rain_rate_mm_h, 4);
    expect(reading.channels.rain?.total).toBeCloseTo(fact.total_rain_mm_rate_x_1h_per_row, 6);
    expect(missingIn(reading, Object.keys(fact.missing_per_channel))).toEqual(fact.missing_per_channel);
    expect(reading.questions.filter(({ needed }) => needed)).toEqual([]);
  });
});
