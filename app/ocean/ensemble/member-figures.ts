import { EFFECT_FIGURES, effectValue, type Headline, type MemberFigures } from "../response";

/** More of them no histogram tells apart. */
const MOST_KEPT = 400;

/**
 * Each headline figure of the members, sorted ascending; left out where no member knows it. Of more than 400 members every
 * so many-th is kept, with the least and the greatest, so that an answer stays of a bounded length.
 */
export function memberFigures(members: readonly Headline[]): MemberFigures {
  return Object.fromEntries(
    EFFECT_FIGURES.flatMap((figure) => {
      const known = members.flatMap((headline) => effectValue(headline, figure) ?? []);
      return known.length === 0 ? [] : [[figure, evenlyKept(known.sort((a, b) => a - b))]];
    }),
  );
}

function evenlyKept(sorted: readonly number[]): number[] {
  const kept = Math.min(sorted.length, MOST_KEPT);
  return Array.from({ length: kept }, (_, k) => sorted[Math.round((k * (sorted.length - 1)) / Math.max(1, kept - 1))]);
}
