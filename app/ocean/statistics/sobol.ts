import { OceanError } from "../errors";
import { power } from "../power";
import { mulberry32 } from "./mulberry32";

export interface SobolIndices {
  /** Share of the variance that each input brings alone; null where nothing varies. */
  first: (number | null)[];
  /** Share with all its interactions. */
  total: (number | null)[];
}

/**
 * Variance-based sensitivity of a function of d numbers in 0…1.
 * @param members rows of each of the two sample matrices @param seed of mulberry32
 * @throws OceanError INVALID_INPUT
 * @see Saltelli et al. (2010), Computer Physics Communications 181:259-270; Jansen (1999) for the total indices
 */
export function sobolIndices(
  f: (x: readonly number[]) => number,
  d: number,
  members: number,
  seed: number,
): SobolIndices {
  if (!Number.isInteger(members) || members < 2 || !Number.isInteger(d) || d < 1) {
    throw new OceanError(
      "INVALID_INPUT",
      `Sensitivity needs at least two members and one input; got ${members} and ${d}.`,
    );
  }
  const random = mulberry32(seed);
  const matrix = () => Array.from({ length: members }, () => Array.from({ length: d }, () => random()));
  const [A, B] = [matrix(), matrix()];
  const fA = A.map(f);
  const fB = B.map(f);
  const pooled = [...fA, ...fB];
  const mean = pooled.reduce((sum, value) => sum + value, 0) / pooled.length;
  const variance = pooled.reduce((sum, value) => sum + (value - mean) ** 2, 0) / pooled.length;
  const first: (number | null)[] = [];
  const total: (number | null)[] = [];
  for (let i = 0; i < d; i++) {
    const mixed = A.map((row, k) => f(row.map((value, j) => (j === i ? B[k][j] : value))));
    const alone = mixed.reduce((sum, value, k) => sum + (fB[k] - mean) * (value - fA[k]), 0) / members;
    const together = mixed.reduce((sum, value, k) => sum + (fA[k] - value) ** 2, 0) / (2 * members);
    first.push(variance === 0 ? null : alone / variance);
    total.push(variance === 0 ? null : together / variance);
  }
  return { first, total };
}

/** The Ishigami function on 0…1 stretched to -π…π, the usual test of sensitivity methods: sin x1 + a sin² x2 + b x3⁴ sin x1. */
export function ishigami(x: readonly number[], a: number, b: number): number {
  const [x1, x2, x3] = x.map((u) => Math.PI * (2 * u - 1));
  return Math.sin(x1) + a * Math.sin(x2) ** 2 + b * power(x3, 4) * Math.sin(x1);
}
