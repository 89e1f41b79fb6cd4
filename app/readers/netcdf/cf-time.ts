import { daysFromDate, offsetFromText } from "../stamp-text";
import { numberOf, textOf, type NetcdfVariable } from "./netcdf-file";

/** How the numbers of a time variable are turned to stamps. */
export interface TimeUnits {
  secondsPerUnit: number;
  /** Seconds from 1970-01-01T00:00:00Z to the reference. */
  reference: number;
  /** Whether the reference names its zone; else CF takes UTC. */
  zoneStated: boolean;
}

const SECONDS: Readonly<Record<string, number>> = {
  millisecond: 0.001,
  msec: 0.001,
  ms: 0.001,
  second: 1,
  sec: 1,
  s: 1,
  minute: 60,
  min: 60,
  hour: 3600,
  hr: 3600,
  h: 3600,
  day: 86_400,
  d: 86_400,
};

const SINCE =
  /^([a-z]+) since (-?\d{1,4})-(\d{1,2})-(\d{1,2})(?:(?:t| )?(\d{1,2})(?::(\d{1,2}))?(?::(\d{1,2}(?:\.\d*)?))?)?\s*(z|utc|gmt|(?:utc|gmt)?[+-]\d{1,2}(?::?\d{2})?)?$/;

/** Whether a variable's unit is that of a time coordinate. */
export function isTimeVariable(variable: NetcdfVariable): boolean {
  return variable.kind !== "text" && / since /.test(textOf(variable.attributes, "units").toLowerCase());
}

/**
 * Reads `hours since 1900-01-01 00:00:00.0` with its calendar. CF 1.13, sections 4.4 and 4.4.1: no offset means UTC;
 * months and years are not calendar months and years; the standard calendar is Julian before 15 October 1582.
 * @returns why, as a phrase after the variable's name, where the times are no dates of the calendar in use
 */
export function timeUnitsOf(variable: NetcdfVariable): TimeUnits | { refused: string } {
  const units = textOf(variable.attributes, "units");
  const calendar = (textOf(variable.attributes, "calendar") || "standard").toLowerCase();
  const proleptic = calendar === "proleptic_gregorian";
  if (!proleptic && calendar !== "standard" && calendar !== "gregorian") {
    return { refused: `counts in the calendar “${calendar}”, whose days are not those of any storm` };
  }
  const match = SINCE.exec(units.toLowerCase());
  if (match === null) return { refused: `has the unit “${units}”, which is no time since a date` };
  const word = match[1] ?? "";
  const secondsPerUnit = SECONDS[word] ?? SECONDS[word.replace(/s$/, "")];
  if (secondsPerUnit === undefined) {
    return { refused: `counts in “${word}”, which have no fixed length (give days, hours, minutes or seconds)` };
  }
  const [year, month, day] = [Number(match[2]), Number(match[3]), Number(match[4])];
  const days =
    proleptic || isGregorian(year, month, day) ? daysFromDate(year, month, day) : julianDays(year, month, day);
  if (days === null) return { refused: `counts from “${units}”, which is no date` };
  const clock = Number(match[5] ?? 0) * 3600 + Number(match[6] ?? 0) * 60 + Number(match[7] ?? 0);
  return {
    secondsPerUnit,
    reference: days * 86_400 + clock - (offsetFromText(match[8]) ?? 0),
    zoneStated: match[8] !== undefined,
  };
}

function isGregorian(year: number, month: number, day: number): boolean {
  return year > 1582 || (year === 1582 && (month > 10 || (month === 10 && day >= 15)));
}

/** Days from 1970-01-01 to a date of the Julian calendar, by its day number. Years before 1 are refused. */
function julianDays(year: number, month: number, day: number): number | null {
  if (year < 1 || month < 1 || month > 12 || day < 1 || day > 31) return null;
  const shifted = month > 2 ? month - 3 : month + 9;
  const years = month > 2 ? year : year - 1;
  return Math.floor((153 * shifted + 2) / 5) + day - 1 + 365 * years + Math.floor(years / 4) - 719_470;
}

/**
 * Stamps of a time variable's values.
 * @returns seconds since 1970-01-01T00:00:00Z, NaN where missing; to the second, since days and hours are kept with
 *   rounded decimals, or to the millisecond where the file counts in seconds
 */
export function stampsOf(values: Float64Array, variable: NetcdfVariable, units: TimeUnits): Float64Array {
  const fill = [numberOf(variable.attributes, "_FillValue"), numberOf(variable.attributes, "missing_value")];
  const perSecond = units.secondsPerUnit > 1 ? 1 : 1000;
  return values.map((value) =>
    fill.includes(value) ? NaN : Math.round((value * units.secondsPerUnit + units.reference) * perSecond) / perSecond,
  );
}
