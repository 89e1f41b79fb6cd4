import { MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";

const HOUR = 3600;

/**
 * Rate of change against a fixed limit: a step steeper than `perHour` is suspect. The first value passes, as nothing speaks
 * against it; a value after a missing one is not evaluated.
 * @param time seconds, ascending
 * @param values NaN where missing
 * @param perHour in the channel's unit per hour
 * @returns 1, 2, 3 or 9 for each value
 * Source: QARTOD wind manual, test 7, with a fixed threshold as in the open reference implementation.
 */
export function steepestChange(time: ArrayLike<number>, values: ArrayLike<number>, perHour: number): Flags {
  return Uint8Array.from(values, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    if (k === 0) return PASS;
    if (Number.isNaN(values[k - 1])) return NOT_EVALUATED;
    return Math.abs(value - values[k - 1]) / ((time[k] - time[k - 1]) / HOUR) > perHour ? SUSPECT : PASS;
  });
}
