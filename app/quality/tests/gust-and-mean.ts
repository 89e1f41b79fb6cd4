import { MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";

export interface GustLimits {
  /** Gust over mean above which the gust is suspect; null: not asked. */
  ratio: number | null;
  /** m/s; the ratio says something in a mean wind above this. */
  above: number;
}

/**
 * Relation of gust and mean: a gust below the mean, or many times above it, is suspect.
 * @param gust m/s, NaN where missing
 * @param mean m/s at the same times, NaN where missing
 * @returns 1, 2, 3 or 9 for each gust
 * Source: common practice, no source.
 */
export function gustAndMean(gust: ArrayLike<number>, mean: ArrayLike<number>, { ratio, above }: GustLimits): Flags {
  return Uint8Array.from(gust, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    if (Number.isNaN(mean[k])) return NOT_EVALUATED;
    const tooFar = ratio !== null && mean[k] > above && value / mean[k] > ratio;
    return value < mean[k] || tooFar ? SUSPECT : PASS;
  });
}
