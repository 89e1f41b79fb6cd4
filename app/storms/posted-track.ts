import {
  CYCLONE_PROFILES,
  TRACK_NUMBERS,
  type TrackNumber,
  type TrackParameters,
} from "~/ocean/cyclone/track-parameters";
import type { TrackFix } from "~/readers/tracks/track-reading";
import { displayUnit, type QuantityId } from "~/units/quantities";
import { fromDisplay, toDisplay } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";
import { LONGEST_TRACK_DAYS, MOST_FIXES } from "./storm-track";
import type { FormErrorsByField } from "./refusal";
import { readWallClock } from "./storm-window";

/** Columns of the table of fixes, in order. */
export const FIX_COLUMNS = [
  "time",
  "latitude",
  "longitude",
  "centralPressure",
  "maxWind",
  "radiusOfMaximumWind",
] as const;
export type FixColumn = (typeof FIX_COLUMNS)[number];

/** A fix as it stands in the form. */
export type FixRow = Record<FixColumn, string>;

/** The quantity whose unit a column is written in; without one its own. */
export const FIX_QUANTITIES: Partial<Record<FixColumn, QuantityId>> = {
  maxWind: "windSpeed",
  radiusOfMaximumWind: "distance",
};

interface Limits {
  min: number;
  max: number;
  unit: string;
  needed?: true;
}

const LIMITS: Record<Exclude<FixColumn, "time">, Limits> = {
  latitude: { min: -60, max: 60, unit: "°", needed: true },
  longitude: { min: -180, max: 360, unit: "°", needed: true },
  centralPressure: { min: 850, max: 1030, unit: "hPa" },
  maxWind: { min: 0, max: 120, unit: "m/s" },
  radiusOfMaximumWind: { min: 3000, max: 500_000, unit: "m" },
};

export const fixField = (row: number, column: FixColumn) => `${column}-${row}`;

export type PostedFixes = { fixes: TrackFix[] } | { errors: FormErrorsByField };

const DAY = 86_400;

function numberOf(text: string): number {
  const plain = text.trim().replace(",", ".").replace("\u2212", "-");
  return plain === "" ? Number.NaN : Number(plain);
}

/** The rows of a form as they were written, blank ones too. */
export function postedRows(form: FormData): FixRow[] {
  const columns = FIX_COLUMNS.map((column) =>
    form.getAll(column).map((value) => (typeof value === "string" ? value : "")),
  );
  const rows = Math.min(MOST_FIXES, Math.max(0, ...columns.map(({ length }) => length)));
  return Array.from({ length: rows }, (_, row) => {
    const cell = (column: FixColumn) => (columns[FIX_COLUMNS.indexOf(column)][row] ?? "").trim();
    return {
      time: cell("time"),
      latitude: cell("latitude"),
      longitude: cell("longitude"),
      centralPressure: cell("centralPressure"),
      maxWind: cell("maxWind"),
      radiusOfMaximumWind: cell("radiusOfMaximumWind"),
    };
  });
}

/**
 * Reads the table of fixes; rows that are blank throughout are passed over, and what is wrong is told beside its cell.
 * @param known fixes of before: wind radii and the ambient pressure, which the table has no columns for, stay with their times
 */
export function readFixes(rows: readonly FixRow[], units: UnitChoices, known: readonly TrackFix[]): PostedFixes {
  const errors: FormErrorsByField = {};
  const fixes: TrackFix[] = [];
  rows.forEach((row, index) => {
    if (FIX_COLUMNS.every((column) => row[column] === "")) return;
    const refuse = (column: FixColumn, message: string) => {
      errors[fixField(index, column)] = [message];
    };
    const clock = readWallClock(row.time, "UTC");
    if ("problem" in clock) refuse("time", clock.problem);
    const seconds = "seconds" in clock ? clock.seconds : Number.NaN;
    const before = fixes.at(-1);
    if (before && seconds <= before.time) refuse("time", "Must come after the fix above.");
    const number = (column: Exclude<FixColumn, "time">): number | null => {
      const { needed } = LIMITS[column];
      if (row[column] === "" && !needed) return null;
      const quantity = FIX_QUANTITIES[column];
      const written = numberOf(row[column]);
      const value = quantity ? fromDisplay(written, quantity, units) : written;
      const { min, max, unit } = shownLimits(column, units);
      if (!(value >= LIMITS[column].min - 1e-6 && value <= LIMITS[column].max + 1e-6)) {
        refuse(column, `Write ${min} to ${max} ${unit}.`);
      }
      return value;
    };
    const old = known.find(({ time }) => time === seconds);
    const longitude = number("longitude") ?? Number.NaN;
    fixes.push({
      time: seconds,
      latitude: number("latitude") ?? Number.NaN,
      longitude: longitude > 180 ? longitude - 360 : longitude,
      centralPressure: number("centralPressure"),
      maxWind: number("maxWind"),
      radiusOfMaximumWind: number("radiusOfMaximumWind"),
      ambientPressure: old?.ambientPressure ?? null,
      radii: old?.radii ?? [],
    });
  });
  if (fixes.length < 2) errors.fixes = ["Write at least two fixes."];
  else if (Object.keys(errors).length === 0) {
    const days = (fixes[fixes.length - 1].time - fixes[0].time) / DAY;
    if (days > LONGEST_TRACK_DAYS)
      errors.fixes = [`A track may last ${LONGEST_TRACK_DAYS} days; this one has ${Math.ceil(days)}.`];
  }
  return Object.keys(errors).length > 0 ? { errors } : { fixes };
}

function shownLimits(
  column: Exclude<FixColumn, "time">,
  units: UnitChoices,
): { min: number; max: number; unit: string } {
  const limits = LIMITS[column];
  const quantity = FIX_QUANTITIES[column];
  if (!quantity) return limits;
  return {
    min: Math.ceil(toDisplay(limits.min, quantity, units)),
    max: Math.floor(toDisplay(limits.max, quantity, units)),
    unit: displayUnit(quantity, units).unit,
  };
}

/** Apart from the columns of the fixes, one of which has the name of a parameter. */
export const parameterField = (name: keyof TrackParameters) => `parameter-${name}`;

/** A track's parameters from their fields; what is wrong is told beside its field. */
export function postedParameters(form: FormData): { parameters: TrackParameters } | { errors: FormErrorsByField } {
  const errors: FormErrorsByField = {};
  const profile = CYCLONE_PROFILES.find((id) => id === form.get(parameterField("profile")));
  if (!profile) errors[parameterField("profile")] = ["Choose a profile."];
  const number = (name: TrackNumber): number => {
    const field = form.get(parameterField(name));
    const { min, max, unit, toSi } = TRACK_NUMBERS[name];
    const value = numberOf(typeof field === "string" ? field : "");
    if (!(value >= min && value <= max))
      errors[parameterField(name)] = [`Write ${min} to ${max}${unit === "1" ? "" : ` ${unit}`}.`];
    return value * toSi;
  };
  const shape = form.get(parameterField("B"));
  const parameters: TrackParameters = {
    profile: profile ?? CYCLONE_PROFILES[0],
    B: typeof shape === "string" && shape.trim() !== "" ? number("B") : null,
    radiusOfMaximumWind: number("radiusOfMaximumWind"),
    ambientPressure: number("ambientPressure"),
    averagingFactor: number("averagingFactor"),
    reduction: number("reduction"),
    inflowAngle: number("inflowAngle"),
    asymmetry: number("asymmetry"),
    airDensity: number("airDensity"),
    rain: form.get(parameterField("rain")) === "on",
  };
  return Object.keys(errors).length > 0 ? { errors } : { parameters };
}
