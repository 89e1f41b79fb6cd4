import { OceanError } from "../errors";

/**
 * Share of the variance of y that x alone explains: an estimate of the first-order index from a sample that was drawn for
 * something else, so that it costs no further run. y is grouped by equal shares of x; the correlation ratio of the groups
 * (Pearson 1905) is corrected for the groups that chance makes (Kelley 1935).
 * @param x uniform in 0…1, as a Latin hypercube's @param y as many numbers
 * @param groups 2…y.length/2
 * @returns 0…1; null where y does not vary
 * @throws OceanError INVALID_INPUT for unequal lengths, too few numbers or groups
 * @see Plischke, Borgonovo & Smith (2013), European Journal of Operational Research 226:536-550 (from memory)
 */
export function correlationRatio(x: ArrayLike<number>, y: ArrayLike<number>, groups: number): number | null {
  const n = y.length;
  if (x.length !== n || groups < 2 || groups > n / 2) {
    throw new OceanError("INVALID_INPUT", `${n} numbers cannot be parted into ${groups} groups by ${x.length}.`);
  }
  const counts = new Float64Array(groups);
  const sums = new Float64Array(groups);
  // About the first number, so that a small spread about a large mean keeps its digits.
  const origin = y[0];
  let [sum, squares] = [0, 0];
  for (let k = 0; k < n; k++) {
    const group = Math.min(groups - 1, Math.floor(x[k] * groups));
    const value = y[k] - origin;
    counts[group] += 1;
    sums[group] += value;
    sum += value;
    squares += value * value;
  }
  const total = squares - (sum * sum) / n;
  // Below this, differences are those of rounding.
  if (!(total > 1e-24 * n * origin * origin) || total <= 0) return null;
  let between = -(sum * sum) / n;
  let filled = 0;
  for (let group = 0; group < groups; group++) {
    if (counts[group] === 0) continue;
    filled += 1;
    between += (sums[group] * sums[group]) / counts[group];
  }
  if (filled < 2 || filled >= n) return null;
  const unexplained = ((n - 1) / (n - filled)) * (1 - between / total);
  return Math.min(1, Math.max(0, 1 - unexplained));
}

/**
 * The ratio that chance alone exceeds about once in 25 times where x has no effect: two standard deviations of the
 * corrected ratio of independent groups, from the variance 2(m - 1) of χ² with m - 1 degrees of freedom.
 * @param n members @param groups as in `correlationRatio`
 */
export function chanceRatio(n: number, groups: number): number {
  return (2 * Math.sqrt(2 * (groups - 1))) / (n - 1);
}
