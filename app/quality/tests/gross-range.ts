import { FAIL, MISSING, PASS, SUSPECT, type Flags } from "../flags";

/** In the channel's unit; null: no limit on this side. */
export interface GrossRange {
  failLow: number | null;
  failHigh: number | null;
  suspectLow: number | null;
  suspectHigh: number | null;
}

const outside = (value: number, low: number | null, high: number | null) =>
  (low !== null && value < low) || (high !== null && value > high);

/**
 * Gross range: what the sensor cannot give fails, what is beyond the range that the user expects is suspect.
 * A limit itself passes.
 * @param values NaN where missing
 * @returns 1, 3, 4 or 9 for each value
 * Source: QARTOD wind manual, test 4.
 */
export function grossRange(values: ArrayLike<number>, limits: GrossRange): Flags {
  return Uint8Array.from(values, (value) => {
    if (Number.isNaN(value)) return MISSING;
    if (outside(value, limits.failLow, limits.failHigh)) return FAIL;
    return outside(value, limits.suspectLow, limits.suspectHigh) ? SUSPECT : PASS;
  });
}
