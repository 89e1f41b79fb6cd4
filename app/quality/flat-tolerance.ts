import type { ChannelThresholds } from "./thresholds";

/** A record of steps no larger than this is reported finely, in the channel's unit. */
const REPORTED_FINELY = 0.1;
/** Differences below this are rounding of the conversion to SI. */
const ROUNDING = 1e-9;
/** The least difference between two values of a record: what it is reported to. Infinity where all are the same. */
export function resolutionOf(values: ArrayLike<number>): number {
  const sorted = Float64Array.from(values)
    .filter((value) => !Number.isNaN(value))
    .sort();
  let least = Number.POSITIVE_INFINITY;
  for (let k = 1; k < sorted.length; k++) {
    const difference = sorted[k] - sorted[k - 1];
    if (difference > ROUNDING) least = Math.min(least, difference);
  }
  return least;
}

/**
 * The tolerance of the flat-line test for a record: another one where it is reported to 0.1 or finer and the thresholds have
 * one for that. Null where one step of what the record is reported to is more than the tolerance: rounding alone would make values alike.
 */
export function flatTolerance(
  { flatTolerance: tolerance, flatFineTolerance }: Pick<ChannelThresholds, "flatTolerance" | "flatFineTolerance">,
  resolution: number,
): number | null {
  if (flatFineTolerance !== null && resolution <= REPORTED_FINELY + ROUNDING) return flatFineTolerance;
  if (tolerance === null || tolerance === 0 || resolution === Number.POSITIVE_INFINITY) return tolerance;
  return resolution <= tolerance + ROUNDING ? tolerance : null;
}
