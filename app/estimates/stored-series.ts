/** A response's long arrays as flat rows, and back: its series, and the profiles of the column model. */
import { isoTime } from "./build-scenario";
import { SERIES_UNITS, type ResponseColumn, type ResponseSeries, type SeriesName } from "~/ocean/response";
import { epochSeconds } from "~/units/format-time";

/** By time, then depth. */
const PROFILE_UNITS = {
  temperature: "°C",
  salinity: "g/kg",
  density: "kg/m³",
  driftEast: "m/s",
  driftNorth: "m/s",
} as const;
type ProfileName = keyof typeof PROFILE_UNITS;

export type StoredSeriesName = SeriesName | "column.depth" | "column.time" | `column.${ProfileName}`;

export interface StoredSeries {
  name: StoredSeriesName;
  unit: string;
  values: number[];
}

export const SERIES_NAMES = Object.keys(SERIES_UNITS) as SeriesName[];
const PROFILE_NAMES = Object.keys(PROFILE_UNITS) as ProfileName[];

export function storedSeries(series: ResponseSeries, column: ResponseColumn | undefined): StoredSeries[] {
  const rows: StoredSeries[] = SERIES_NAMES.map((name) => ({ name, unit: SERIES_UNITS[name], values: series[name] }));
  if (!column) return rows;
  return [
    ...rows,
    { name: "column.depth", unit: "m", values: column.depth },
    { name: "column.time", unit: "s", values: column.time.map(epochSeconds) },
    ...PROFILE_NAMES.map((name): StoredSeries => ({
      name: `column.${name}`,
      unit: PROFILE_UNITS[name],
      values: column[name].flat(),
    })),
  ];
}

type StoredValues = ReadonlyMap<StoredSeriesName, number[]>;

function valuesOf(stored: StoredValues, name: StoredSeriesName): number[] {
  const values = stored.get(name);
  if (!values) throw new Error(`A stored response lacks its series ${name}.`);
  return values;
}

/** @param seconds since 1970-01-01T00:00:00Z */
export function readSeries(seconds: number[], stored: StoredValues): ResponseSeries {
  const series = Object.fromEntries(SERIES_NAMES.map((name) => [name, valuesOf(stored, name)]));
  return { time: seconds.map(isoTime), ...(series as Record<SeriesName, number[]>) };
}

export function readColumn(stored: StoredValues): ResponseColumn | null {
  const depth = stored.get("column.depth");
  if (!depth) return null;
  const time = valuesOf(stored, "column.time").map(isoTime);
  const profiles = PROFILE_NAMES.map((name) => {
    const flat = valuesOf(stored, `column.${name}`);
    return [name, time.map((_, at) => flat.slice(at * depth.length, (at + 1) * depth.length))];
  });
  return { depth, time, ...(Object.fromEntries(profiles) as Record<ProfileName, number[][]>) };
}
