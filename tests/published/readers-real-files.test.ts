import { existsSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { readSeries } from "~/readers/read-series";
import type { ChannelName, SeriesReading } from "~/readers/reading";

/**
 * Real files of agencies against facts that were computed independently of this code. They lie outside the repository.
 */
const DATA = "../shared/data";
const present = existsSync(`${DATA}/facts.json`);
if (!present) process.stdout.write(`Skipped: real files against facts, since ${DATA} is absent.\n`);

interface Facts {
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
  valid_wind: number;
  mean_wind_ms: number;
  max_wind_ms: number;
  time_of_max_utc: string;
  max_gust_ms: number;
  time_of_max_gust_utc: string;
  vector_mean: { mean_vector_speed_ms: number; direction_from_deg: number };
  min_pressure_hPa?: number;
  water_temp_C?: { mean: number; min: number; max: number };
  total_rain_mm?: number;
  max_hourly_rain_mm?: number;
  mean_shortwave_Wm2_over_valid_rows?: number;
}

/** The file has bare NaN for what other files lack, which JSON does not know. */
const withoutNaN = (text: string): string => text.replace(/\bNaN\b/g, "null");
const facts: Record<string, Facts> = present ? JSON.parse(withoutNaN(readFileSync(`${DATA}/facts.json`, "utf8"))) : {};
const read = (file: string): SeriesReading => readSeries({ bytes: readFileSync(`${DATA}/${file}`), fileName: file });

const FILES = [
  "buoy_txt/42040h2008.txt",
  "buoy_txt/44013_realtime_MM.txt",
  "buoy_txt/46035h1998.txt",
  "csv/inmet_recife_2019_semicolon_comma.csv",
  "csv/mast_10min_ddmmyyyy_gaps.csv",
];

/** Names by which the facts call the columns of the station file. */
const SHORT_NAMES: Partial<Record<string, ChannelName>> = {
  rain: "rain",
  press: "airPressure",
  rad: "shortwave",
  tair: "airTemperature",
  dewp: "dewPoint",
  rh: "relativeHumidity",
  wdir: "windFrom",
  gust: "windGust",
  wspd: "windSpeed",
};

describe.skipIf(!present).each(FILES)("%s", (file) => {
  it("has the facts' rows, times, order, duplicates, step and gaps", () => {
    const reading = read(file);
    const fact = facts[file] as Facts;
    expect(reading).toMatchObject({
      rows: fact.rows,
      first: fact.first_utc,
      last: fact.last_utc,
      order: fact.file_order,
      duplicates: fact.duplicate_times,
      medianStepSeconds: fact.median_step_s,
    });
    expect(reading.time.length).toBe(fact.rows - fact.duplicate_times);
    expect(reading.time.every((time, index) => index === 0 || time > (reading.time[index - 1] ?? Infinity))).toBe(true);
    const gap = reading.problems.find(({ code }) => code === "timeGap")?.message ?? "0 gaps are longer";
    expect(gap).toContain(`${fact.gaps_gt_1p5_steps} gap`);
    if (fact.gaps_gt_1p5_steps > 0)
      expect(gap).toContain(`${fact.longest_gap_s} s, after ${fact.longest_gap_starts_utc}`);
    expect(reading.problems.filter(({ severity }) => severity === "error")).toEqual([]);
  });

  it("has the facts' wind", () => {
    const { channels, windVectorMean } = read(file);
    const fact = facts[file] as Facts;
    expect(channels.windSpeed).toMatchObject({
      count: fact.valid_wind,
      max: fact.max_wind_ms,
      maxAt: fact.time_of_max_utc,
    });
    expect(channels.windSpeed?.mean).toBeCloseTo(fact.mean_wind_ms, 4);
    expect(channels.windGust).toMatchObject({ max: fact.max_gust_ms, maxAt: fact.time_of_max_gust_utc });
    expect(windVectorMean?.speed).toBeCloseTo(fact.vector_mean.mean_vector_speed_ms, 4);
    expect(windVectorMean?.from).toBeCloseTo(fact.vector_mean.direction_from_deg, 2);
  });

  it("has the facts' missing values in every column", () => {
    const reading = read(file);
    const found = Object.keys(facts[file]?.missing_per_channel ?? {}).map((name) => {
      const channel = SHORT_NAMES[name];
      const column = reading.columns.find(
        (candidate) => candidate.name === name || (channel !== undefined && candidate.role === channel),
      );
      return [name, column?.missing];
    });
    expect(Object.fromEntries(found)).toEqual(facts[file]?.missing_per_channel);
  });

  it("has the facts' other channels", () => {
    const { channels } = read(file);
    const fact = facts[file] as Facts;
    if (fact.min_pressure_hPa !== undefined) expect(channels.airPressure?.min).toBe(fact.min_pressure_hPa);
    if (fact.water_temp_C !== undefined) {
      expect(channels.seaTemperature).toMatchObject({ min: fact.water_temp_C.min, max: fact.water_temp_C.max });
      expect(channels.seaTemperature?.mean).toBeCloseTo(fact.water_temp_C.mean, 4);
    }
    if (fact.total_rain_mm !== undefined) expect(channels.rain?.total).toBe(fact.total_rain_mm);
    if (fact.max_hourly_rain_mm !== undefined) expect(channels.rain?.max).toBe(fact.max_hourly_rain_mm);
    if (fact.mean_shortwave_Wm2_over_valid_rows !== undefined) {
      expect(channels.shortwave?.mean).toBeCloseTo(fact.mean_shortwave_Wm2_over_valid_rows, 3);
    }
    expect(Object.keys(channels).length).toBeGreaterThan(3);
  });
});

describe.skipIf(!present)("the mast file", () => {
  it("takes the wind of the lowest boom, with its own direction and gust, and says so", () => {
    const reading = read("csv/mast_10min_ddmmyyyy_gaps.csv");
    expect(reading.channels.windSpeed?.fromColumns).toEqual(["Spd40mN"]);
    expect(reading.channels.windFrom?.fromColumns).toEqual(["Dir38mS"]);
    expect(reading.channels.windGust?.fromColumns).toEqual(["Spd40mNMax"]);
    expect(reading.windHeight).toBe(40);
    expect(reading.understood.some(({ taken }) => taken.startsWith("“Spd40mN” by the rule"))).toBe(true);
    expect(reading.columns.filter(({ role }) => role === "leftOut").length).toBe(22);
  });

  it("takes another boom when told", () => {
    const first = read("csv/mast_10min_ddmmyyyy_gaps.csv");
    const index = first.columns.find(({ name }) => name === "Spd80mS")?.index ?? -1;
    const bytes = readFileSync(`${DATA}/csv/mast_10min_ddmmyyyy_gaps.csv`);
    const answers = { columns: { [String(index)]: { role: "windSpeed" as const, unit: "m/s" } } };
    const reading = readSeries({ bytes, fileName: "mast.csv", answers });
    expect(reading.channels.windSpeed?.fromColumns).toEqual(["Spd80mS"]);
    expect(reading.channels.windFrom?.fromColumns).toEqual(["Dir78mS"]);
    expect(reading.windHeight).toBe(80);
  });
});
