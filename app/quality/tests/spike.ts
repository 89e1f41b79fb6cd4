import { FAIL, MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";

export interface SpikeLimits {
  /** Height above which a spike is suspect, in the channel's unit. */
  low: number;
  /** Height above which it is bad. */
  high: number;
  /**
   * `average`: distance from the mean of both neighbours, as the manual has it, which also flags the neighbours of one bad
   * value. `differential`: the smaller of the two steps, where they go opposite ways, which leaves neighbours and fronts alone.
   */
  method: "average" | "differential";
}

function height(before: number, value: number, after: number, method: SpikeLimits["method"]): number {
  if (method === "average") return Math.abs(value - (before + after) / 2);
  const [up, down] = [value - before, value - after];
  return up * down > 0 ? Math.min(Math.abs(up), Math.abs(down)) : 0;
}

/**
 * Spike: a value that stands out from both its neighbours. Not evaluated at the ends and beside a missing neighbour.
 * @param values NaN where missing
 * @param neighbours as `values`, NaN too where a value shall not judge others: one that failed the gross range
 * @returns 1, 2, 3, 4 or 9 for each value
 * Source: QARTOD wind manual, test 6; differential variant as in the open reference implementation.
 */
export function spike(
  values: ArrayLike<number>,
  { low, high, method }: SpikeLimits,
  neighbours: ArrayLike<number> = values,
): Flags {
  return Uint8Array.from(values, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    const [before, after] = [neighbours[k - 1] ?? Number.NaN, neighbours[k + 1] ?? Number.NaN];
    if (Number.isNaN(before) || Number.isNaN(after)) return NOT_EVALUATED;
    const found = height(before, value, after, method);
    return found > high ? FAIL : found > low ? SUSPECT : PASS;
  });
}
