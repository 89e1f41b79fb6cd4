/** A response's long arrays as flat rows, and back: its series, their bands, and the profiles of the column model. */
import { isoTime } from "./build-scenario";
import {
  BAND_NAMES,
  BAND_UNITS,
  EFFECT_FIGURES,
  SERIES_NAMES,
  SERIES_UNITS,
  type BandName,
  type EffectFigureName,
  type MemberFigures,
  type Response,
  type ResponseColumn,
  type ResponseSeries,
  type SeriesBands,
  type SeriesName,
} from "~/ocean/response";
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

const PERCENTILES = ["p10", "p50", "p90"] as const;
type Percentile = (typeof PERCENTILES)[number];

type ProfileRow = "column.depth" | "column.time" | `column.${ProfileName}`;
type BandRow = "band.time" | `band.${Percentile}.${BandName}`;
type MemberRow = `member.${EffectFigureName}`;
export type StoredSeriesName = SeriesName | BandRow | ProfileRow | MemberRow;

export interface StoredSeries {
  name: StoredSeriesName;
  unit: string;
  values: number[];
}

const PROFILE_NAMES = Object.keys(PROFILE_UNITS) as ProfileName[];

/** All that a response has but for its profiles, by far its longest part. */
export const ROWS_WITHOUT_PROFILES: readonly StoredSeriesName[] = [
  ...SERIES_NAMES,
  "band.time",
  ...BAND_NAMES.flatMap((name) => PERCENTILES.map((p): BandRow => `band.${p}.${name}`)),
  ...EFFECT_FIGURES.map((figure): MemberRow => `member.${figure}`),
];

/** The parts of a response that are kept as rows. */
export type LongParts = Pick<Response, "series" | "bands" | "column" | "memberFigures">;

export function storedSeries({ series, bands, column, memberFigures }: LongParts): StoredSeries[] {
  return [
    ...SERIES_NAMES.map((name) => ({ name, unit: SERIES_UNITS[name], values: series[name] })),
    ...(bands ? bandRows(bands) : []),
    ...(column ? profileRows(column) : []),
    ...(memberFigures ? memberRows(memberFigures) : []),
  ];
}

const MEMBER_UNITS: Record<EffectFigureName, string> = {
  peakStress: "N/m²",
  peakDrift: "m/s",
  netDisplacement: "m",
  transportAlong: "m³/m",
  transportAcross: "m³/m",
  surfaceSalinity: "g/kg",
  surfaceTemperature: "°C",
  layerDepth: "m",
  densityStep: "kg/m³",
  salinityChange: "g/kg",
  temperatureChange: "°C",
};

function memberRows(figures: MemberFigures): StoredSeries[] {
  return EFFECT_FIGURES.flatMap((figure) => {
    const values = figures[figure];
    return values ? [{ name: `member.${figure}`, unit: MEMBER_UNITS[figure], values }] : [];
  });
}

function bandRows({ time, series }: SeriesBands): StoredSeries[] {
  return [
    { name: "band.time", unit: "s", values: time.map(epochSeconds) },
    ...BAND_NAMES.flatMap((name) =>
      PERCENTILES.map((p): StoredSeries => ({
        name: `band.${p}.${name}`,
        unit: BAND_UNITS[name],
        values: series[name][p],
      })),
    ),
  ];
}

function profileRows(column: ResponseColumn): StoredSeries[] {
  return [
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

/** Null where no ensemble ran. */
export function readBands(stored: StoredValues): SeriesBands | null {
  const time = stored.get("band.time");
  if (!time) return null;
  const series = BAND_NAMES.map((name) => {
    const band = PERCENTILES.map((p) => [p, valuesOf(stored, `band.${p}.${name}`)] as const);
    return [name, Object.fromEntries(band) as Record<Percentile, number[]>] as const;
  });
  return { time: time.map(isoTime), series: Object.fromEntries(series) as SeriesBands["series"] };
}

/** Null where no ensemble ran. */
export function readMemberFigures(stored: StoredValues): MemberFigures | null {
  const figures = EFFECT_FIGURES.flatMap((figure) => {
    const values = stored.get(`member.${figure}`);
    return values ? [[figure, values] as const] : [];
  });
  return figures.length === 0 ? null : Object.fromEntries(figures);
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
