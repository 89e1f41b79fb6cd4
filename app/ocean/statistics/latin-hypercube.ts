import { OceanError } from "../errors";
import { mulberry32 } from "./mulberry32";

/**
 * Latin hypercube sample: each of the n equal strata of every dimension is hit exactly once.
 * @param n members @param d dimensions @param seed of mulberry32
 * @returns n rows of d numbers in 0…1
 * @throws OceanError INVALID_INPUT
 * @see McKay, Beckman & Conover (1979)
 */
export function latinHypercube(n: number, d: number, seed: number): number[][] {
  if (!Number.isInteger(n) || n < 1 || !Number.isInteger(d) || d < 1) {
    throw new OceanError("INVALID_INPUT", `A sample needs at least one member and one dimension; got ${n} and ${d}.`);
  }
  const random = mulberry32(seed);
  const sample = Array.from({ length: n }, () => new Array<number>(d).fill(0));
  for (let dimension = 0; dimension < d; dimension++) {
    const order = Array.from({ length: n }, (_, i) => i);
    for (let i = n - 1; i >= 1; i--) {
      const k = Math.floor(random() * (i + 1));
      [order[i], order[k]] = [order[k], order[i]];
    }
    for (let i = 0; i < n; i++) sample[i][dimension] = (order[i] + random()) / n;
  }
  return sample;
}
