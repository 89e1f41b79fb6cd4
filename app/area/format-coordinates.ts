import type { Position } from "~/ocean/scenario";
import { wrapLongitude } from "./ring";

/** Decimal degrees; degrees and decimal minutes; degrees, minutes and decimal seconds. */
export type CoordinateStyle = "decimal" | "minutes" | "seconds";

/** Decimals of the last part that tell places about 0.1 m apart: enough to read a corner back unchanged. */
export const EXACT_DECIMALS: Record<CoordinateStyle, number> = { decimal: 6, minutes: 4, seconds: 2 };

/** Decimals of the last part for reading: about 100 m, 20 m and 3 m. */
const READING_DECIMALS: Record<CoordinateStyle, number> = { decimal: 3, minutes: 2, seconds: 1 };

/** `54.412° N`, `54° 24.72′ N` or `54° 24′ 43.2″ N`. */
export function formatLatitude(
  latitude: number,
  style: CoordinateStyle = "decimal",
  decimals = READING_DECIMALS[style],
): string {
  return `${formatAngle(Math.abs(latitude), style, decimals)} ${latitude < 0 ? "S" : "N"}`;
}

/** `8.231° W`, and so on; longitudes of any turn are brought to ±180. */
export function formatLongitude(
  longitude: number,
  style: CoordinateStyle = "decimal",
  decimals = READING_DECIMALS[style],
): string {
  const wrapped = wrapLongitude(longitude);
  return `${formatAngle(Math.abs(wrapped), style, decimals)} ${wrapped < 0 ? "W" : "E"}`;
}

/** Latitude first, as in `54.412° N 8.231° W`. */
export function formatPosition(
  [longitude, latitude]: Position,
  style: CoordinateStyle = "decimal",
  decimals?: number,
): string {
  return `${formatLatitude(latitude, style, decimals)} ${formatLongitude(longitude, style, decimals)}`;
}

/** One corner a line, exact enough to be read back by `parseCoordinates`; decimal degrees without needless zeros. */
export function formatCorners(corners: readonly Position[], style: CoordinateStyle): string {
  const decimals = style === "decimal" ? decimalsOf(corners) : EXACT_DECIMALS[style];
  return corners.map((corner) => formatPosition(corner, style, decimals)).join("\n");
}

/** As many decimals as the most exact corner needs, the same for all so that they stand in columns. */
function decimalsOf(corners: readonly Position[]): number {
  const needed = corners.flat().map((angle) => {
    const [, decimals = ""] = angle.toFixed(EXACT_DECIMALS.decimal).split(".");
    return decimals.replace(/0+$/, "").length;
  });
  return Math.max(READING_DECIMALS.decimal, ...needed);
}

function formatAngle(degrees: number, style: CoordinateStyle, decimals: number): string {
  if (style === "decimal") return `${degrees.toFixed(decimals)}°`;
  // Rounded once, in units of the last decimal, so that 59.99 minutes never print as 60.
  const perDegree = (style === "minutes" ? 60 : 3600) * 10 ** decimals;
  const total = Math.round(degrees * perDegree);
  const whole = Math.floor(total / perDegree);
  const rest = (total - whole * perDegree) / 10 ** decimals;
  if (style === "minutes") return `${whole}° ${padded(rest, decimals)}′`;
  const minutes = Math.floor(rest / 60 + 1e-12);
  return `${whole}° ${padded(minutes, 0)}′ ${padded(Math.max(0, rest - minutes * 60), decimals)}″`;
}

function padded(value: number, decimals: number): string {
  return value.toFixed(decimals).padStart(decimals === 0 ? 2 : decimals + 3, "0");
}
