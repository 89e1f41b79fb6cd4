import { OceanError } from "../errors";
import { requireFinite } from "../guards";

/**
 * Quantile by linear interpolation at (n - 1)p, type 7 of Hyndman & Fan (1996).
 * @param values n ≥ 1 numbers in any order @param p 0…1
 * @throws OceanError INVALID_INPUT for no values, no numbers or p outside 0…1
 */
export function quantile(values: ArrayLike<number>, p: number): number {
  return quantileOfSorted(sortedValues(values), p);
}

/** Several quantiles of the same values, which are sorted once; see `quantile`. */
export function quantiles(values: ArrayLike<number>, shares: readonly number[]): number[] {
  const sorted = sortedValues(values);
  return shares.map((p) => quantileOfSorted(sorted, p));
}

function sortedValues(values: ArrayLike<number>): Float64Array {
  if (values.length === 0) throw new OceanError("INVALID_INPUT", "A quantile needs at least one value.");
  const sorted = Float64Array.from(values).sort();
  // Typed arrays sort infinities to their ends, and what is no number behind them.
  requireFinite({ "the least value": sorted[0], "the greatest value": sorted[sorted.length - 1] });
  return sorted;
}

function quantileOfSorted(sorted: Float64Array, p: number): number {
  requireFinite({ p });
  if (p < 0 || p > 1) throw new OceanError("INVALID_INPUT", `A quantile's share must lie within 0…1; it is ${p}.`);
  const position = (sorted.length - 1) * p;
  const below = Math.floor(position);
  const above = Math.min(below + 1, sorted.length - 1);
  return sorted[below] + (position - below) * (sorted[above] - sorted[below]);
}
