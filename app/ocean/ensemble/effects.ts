import type { ResolvedMethod } from "../method/resolve-method";
import {
  EFFECT_FIGURES,
  effectValue,
  type EffectFigureName,
  type FactorTrial,
  type FigureEffects,
  type Headline,
} from "../response";
import { chanceRatio, correlationRatio } from "../statistics/correlation-ratio";
import type { Factor } from "./factor";
import type { Trial } from "./one-at-a-time";

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
 * @param trials of each factor by itself, as `oneAtATime` made them
 */
export function effectsOf(
  base: Headline,
  factors: readonly Factor[],
  method: ResolvedMethod,
  trials: readonly (readonly Trial[])[],
  drawn: Drawn,
): FigureEffects[] {
  return EFFECT_FIGURES.flatMap((figure) => {
    const value = effectValue(base, figure);
    if (value === null) return [];
    const bars = factors.map(({ name }, k) => ({ factor: name, ...extremesOf(figure, value, trials[k]) }));
    bars.sort((a, b) => b.high.value - b.low.value - (a.high.value - a.low.value));
    return [{ figure, value, bars, firstOrder: firstOrder(figure, factors, method, drawn) }];
  });
}

/** The least and the greatest that a figure comes to: at a setting tried, or, where all those lie on one side, as given. */
function extremesOf(figure: EffectFigureName, value: number, trials: readonly Trial[]) {
  const tried = trials.flatMap(({ setting, headline }): FactorTrial[] => {
    const own = headline && effectValue(headline, figure);
    return own === null ? [] : [{ setting, value: own }];
  });
  // Sorting is stable: at a tie with the scenario itself the setting is named.
  const sorted = [...tried].sort((a, b) => a.value - b.value);
  const given = { setting: "as given", value };
  const [low, high] = [sorted.at(0) ?? given, sorted.at(-1) ?? given];
  return { low: value < low.value ? given : low, high: value > high.value ? given : high };
}

function firstOrder(
  figure: EffectFigureName,
  factors: readonly Factor[],
  method: ResolvedMethod,
  { rows, headlines }: Drawn,
): FigureEffects["firstOrder"] {
  const kept = rows.flatMap((row, member) => {
    const value = effectValue(headlines[member], figure);
    return value === null ? [] : [{ row, value }];
  });
  if (kept.length < FEWEST_FOR_INDICES) return [];
  const y = Float64Array.from(kept, ({ value }) => value);
  const evenGroups = Math.max(4, Math.min(25, Math.round(kept.length / MEMBERS_A_GROUP)));
  const indices = factors.map(({ name, choices }, k) => {
    const x = Float64Array.from(kept, ({ row }) => row[k]);
    const groups = choices?.(method) ?? evenGroups;
    return { factor: name, index: correlationRatio(x, y, groups), chance: chanceRatio(y.length, groups) };
  });
  return indices.sort((a, b) => (b.index ?? 0) - (a.index ?? 0));
}
