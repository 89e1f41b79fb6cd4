import type { ResolvedMethod } from "../method/resolve-method";
import {
  EFFECT_FIGURES,
  effectValue,
  type EffectFigureName,
  type FactorTrial,
  type FigureEffects,
  type Headline,
} from "../response";
import type { Scenario } from "../scenario";
import { correlationRatio } from "../statistics/correlation-ratio";
import { trialsOf, type Factor } from "./factor";
import { runMember } from "./members";

/** Fewer members than this say too little of a factor's share to be shown. */
export const FEWEST_FOR_INDICES = 64;
const MEMBERS_A_GROUP = 25;

/** What the members of an ensemble drew, and what came out; only those that could be computed. */
export interface Drawn {
  /** By member, then factor: 0…1. */
  rows: number[][];
  headlines: Headline[];
}

/**
 * What each headline figure depends on: how far it moves when one factor alone goes through its range, the widest first,
 * and the share of its spread over all members that each factor alone explains.
 */
export function effectsOf(
  scenario: Scenario,
  method: ResolvedMethod,
  base: Headline,
  factors: readonly Factor[],
  drawn: Drawn,
): FigureEffects[] {
  const trials = factors.map((factor) =>
    trialsOf(factor, method).flatMap((u) => {
      const run = runMember(factor.vary(scenario, u, method));
      return run ? [{ setting: factor.setting(u, method), headline: run.headline }] : [];
    }),
  );
  return EFFECT_FIGURES.flatMap((figure) => {
    const value = effectValue(base, figure);
    if (value === null) return [];
    const bars = factors.flatMap(({ name }, k) => {
      const tried = trials[k].flatMap(({ setting, headline }): FactorTrial[] => {
        const own = effectValue(headline, figure);
        return own === null ? [] : [{ setting, value: own }];
      });
      if (tried.length === 0) return [];
      const sorted = [...tried].sort((a, b) => a.value - b.value);
      return [{ factor: name, low: sorted[0], high: sorted[sorted.length - 1] }];
    });
    bars.sort((a, b) => b.high.value - b.low.value - (a.high.value - a.low.value));
    return [{ figure, value, bars, firstOrder: firstOrder(figure, factors, method, drawn) }];
  });
}

function firstOrder(
  figure: EffectFigureName,
  factors: readonly Factor[],
  method: ResolvedMethod,
  { rows, headlines }: Drawn,
): FigureEffects["firstOrder"] {
  if (rows.length < FEWEST_FOR_INDICES) return [];
  const kept = rows.flatMap((row, member) => {
    const value = effectValue(headlines[member], figure);
    return value === null ? [] : [{ row, value }];
  });
  if (kept.length < FEWEST_FOR_INDICES) return [];
  const y = Float64Array.from(kept, ({ value }) => value);
  const groups = Math.max(4, Math.min(25, Math.round(kept.length / MEMBERS_A_GROUP)));
  const indices = factors.map(({ name, choices }, k) => {
    const x = Float64Array.from(kept, ({ row }) => row[k]);
    return { factor: name, index: correlationRatio(x, y, choices?.(method) ?? groups) };
  });
  return indices.sort((a, b) => (b.index ?? 0) - (a.index ?? 0));
}
