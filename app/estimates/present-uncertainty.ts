/** What the headline figures depend on, in words and as figures' data. */
import { FIGURE_IDS, labelOf, QUANTITY_OF, type FigureId } from "./headline-figures";
import type { TornadoData } from "~/figures/tornado";
import type { EffectFigureName, FigureEffects, Uncertainty } from "~/ocean/response";

export interface EffectView {
  id: FigureId;
  label: string;
  /** Which input matters most, in a sentence. */
  sentence: string;
  tornado: TornadoData;
  /** Inputs with their shares of the spread, the greatest first; empty where the members are too few. */
  shares: { factor: string; share: string }[];
}

export interface UncertaintyView {
  /** `Range from 200 members, seed 1.` */
  ensemble: string;
  factors: { name: string; range: string; basis: string }[];
  effects: EffectView[];
}

/** The temperature is told as its change. */
const EFFECT_OF: Partial<Record<FigureId, EffectFigureName>> = { surfaceTemperature: "temperatureChange" };

/** Shares below this are noise of the estimate. */
const NOTABLE = 0.05;
/** Shares below this would read 0.00. */
const SHOWN = 0.005;

export function presentUncertainty(
  { members, computed, seed, factors, effects }: Uncertainty,
  shore: boolean,
): UncertaintyView {
  const failed = members - computed;
  return {
    ensemble:
      `Range from ${computed} members, seed ${seed}: 10th to 90th percentile.` +
      (failed > 0 ? ` ${failed} more could not be computed, since the water could not bear them.` : ""),
    factors,
    effects: FIGURE_IDS.flatMap((id) => {
      const own = effects.find(({ figure }) => figure === (EFFECT_OF[id] ?? id));
      const moves = own?.bars.some(({ low, high }) => high.value > low.value) ?? false;
      return own && moves ? [presentEffect(id, own, shore)] : [];
    }),
  };
}

function presentEffect(id: FigureId, { value, bars, firstOrder }: FigureEffects, shore: boolean): EffectView {
  const label = labelOf(id, shore);
  return {
    id,
    label,
    sentence: sentenceOf(bars[0].factor, firstOrder),
    tornado: { id, name: label, quantity: QUANTITY_OF[id], value, bars },
    shares: firstOrder.flatMap(({ factor, index }) =>
      index !== null && index >= SHOWN ? [{ factor, share: index.toFixed(2) }] : [],
    ),
  };
}

function sentenceOf(widest: string, firstOrder: FigureEffects["firstOrder"]): string {
  const notable = firstOrder.flatMap(({ factor, index }) =>
    index !== null && index >= NOTABLE ? [{ factor, index }] : [],
  );
  const [first, second] = notable;
  if (!first) return `By itself, ${widest} moves it most.`;
  const told = (entry: { factor: string; index: number }) => `${entry.factor} (share ${entry.index.toFixed(2)})`;
  if (first.index >= 0.5)
    return `Most of the spread comes from ${told(first)}${second ? `, then ${told(second)}` : ""}.`;
  return `The spread comes from several inputs, first of all ${notable.slice(0, 3).map(told).join(", ")}.`;
}
