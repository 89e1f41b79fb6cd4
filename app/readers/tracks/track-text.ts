/** Pieces that the text forms of best tracks have in common. */

const KNOT = 1852 / 3600;
const NAUTICAL_MILE = 1852;

/** A number, or null where it is blank or one of the codes for missing. */
export function numberOf(text: string | undefined, missing: readonly number[] = []): number | null {
  const trimmed = text?.trim() ?? "";
  if (trimmed === "") return null;
  const value = Number(trimmed);
  return Number.isFinite(value) && !missing.includes(value) ? value : null;
}

export function knots(value: number | null): number | null {
  return value === null ? null : value * KNOT;
}

export function nauticalMiles(value: number | null): number | null {
  return value === null ? null : value * NAUTICAL_MILE;
}

/**
 * Degrees with their hemisphere, `28.0N` or in tenths `172N`.
 * @param perDegree 10 where the text is in tenths of a degree
 * @returns degrees north or east; null where it is no position
 */
export function position(text: string | undefined, perDegree = 1): number | null {
  const match = /^\s*(\d{1,4}(?:\.\d+)?)\s*([NSEW])\s*$/i.exec(text ?? "");
  if (!match) return null;
  const degrees = Number(match[1]) / perDegree;
  const hemisphere = match[2].toUpperCase();
  const limit = hemisphere === "N" || hemisphere === "S" ? 90 : 360;
  if (degrees > limit) return null;
  return hemisphere === "S" || hemisphere === "W" ? -degrees : degrees;
}

/** The same longitude within -180…180. */
export function wrapped(longitude: number): number {
  return longitude >= -180 && longitude <= 180 ? longitude : ((((longitude + 180) % 360) + 360) % 360) - 180;
}

/** Seconds since 1970 UTC of year, month, day, hour and minute; null where there is no such time. */
export function moment(year: number, month: number, day: number, hour: number, minute: number): number | null {
  const date = new Date(Date.UTC(2000, month - 1, day, hour, minute));
  date.setUTCFullYear(year, month - 1, day);
  const real =
    date.getUTCMonth() === month - 1 &&
    date.getUTCDate() === day &&
    hour >= 0 &&
    hour < 24 &&
    minute >= 0 &&
    minute < 60;
  return real && Number.isFinite(date.getTime()) ? date.getTime() / 1000 : null;
}
