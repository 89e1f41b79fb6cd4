/** What the headline figures depend on, in words and as figures' data. */
import { FIGURE_IDS, labelOf, QUANTITY_OF, type FigureId } from "./headline-figures";
import type { TornadoData } from "~/figures/tornado";
import type { EffectFigureName, FigureEffects, FirstOrderShare, Uncertainty, VariedFactor } from "~/ocean/response";
import { FEWEST_FOR_INDICES } from "~/ocean/ensemble/effects";

export interface EffectView {
  id: FigureId;
  label: string;
  /** Which input matters most, in a sentence. */
  sentence: string;
  tornado: TornadoData;
  /** Inputs with their shares of the spread, the greatest first; empty where the members are too few. */
  shares: { factor: string; share: string }[];
  /** What is true of the inputs that have no share; empty where there is none. */
  others: string;
}

export interface FactorView {
  name: string;
  range: string;
  basis: string;
  /** Settings that could not be computed by themselves, in a sentence; empty where all could. */
  failed: string;
}

export interface UncertaintyView {
  /** `Range from 200 members, seed 1: 10th to 90th percentile.` */
  ensemble: string;
  /** Why members are missing, a sentence a reason. */
  failures: string[];
  /** Why no shares are shown; null where there are. */
  tooFew: string | null;
  factors: FactorView[];
  effects: EffectView[];
}

/** The temperature is told as its change. */
const EFFECT_OF: Partial<Record<FigureId, EffectFigureName>> = { surfaceTemperature: "temperatureChange" };

/** @param shore whether the box has one: transports are then named by it */
export function presentUncertainty(uncertainty: Uncertainty, shore: boolean): UncertaintyView {
  const { computed, seed, factors, effects } = uncertainty;
  return {
    ensemble: `Range from ${computed} members, seed ${seed}: 10th to 90th percentile.`,
    failures: failureSentences(uncertainty),
    tooFew:
      computed < FEWEST_FOR_INDICES
        ? `Shares of the spread need at least ${FEWEST_FOR_INDICES} members; these are ${computed}.`
        : null,
    factors: factors.map(presentFactor),
    effects: FIGURE_IDS.flatMap((id) => {
      const own = effects.find(({ figure }) => figure === (EFFECT_OF[id] ?? id));
      const moves = own?.bars.some(({ low, high }) => high.value > low.value) ?? false;
      return own && moves ? [presentEffect(id, own, shore)] : [];
    }),
  };
}

/** `3 of 64 members could not be computed: Gradient mixing did not settle …` */
function failureSentences({ members, failures = [] }: Uncertainty): string[] {
  return failures.map(
    ({ members: failed, message }) =>
      `${failed} of ${members} members could not be computed and are left out: ${message}`,
  );
}

function presentFactor({ name, range, basis, failed = [] }: VariedFactor): FactorView {
  return {
    name,
    range,
    basis,
    failed: failed.length === 0 ? "" : `By itself it could not be computed at ${failed.join(", ")}.`,
  };
}

function presentEffect(id: FigureId, { value, bars, firstOrder }: FigureEffects, shore: boolean): EffectView {
  const label = labelOf(id, shore);
  const telling = tellingShares(firstOrder);
  const others = firstOrder.length > telling.length && telling.length > 0 ? "no more than chance" : "";
  return {
    id,
    label,
    sentence: sentenceOf(bars[0].factor, firstOrder),
    tornado: { id, name: label, quantity: QUANTITY_OF[id], value, bars },
    shares: telling.map(({ factor, index }) => ({ factor, share: index.toFixed(2) })),
    others,
  };
}

/** Shares beyond what a factor without effect reaches by chance. */
function tellingShares(firstOrder: readonly FirstOrderShare[]): { factor: string; index: number }[] {
  return firstOrder.flatMap(({ factor, index, chance }) =>
    index !== null && index > chance ? [{ factor, index }] : [],
  );
}

function sentenceOf(widest: string, firstOrder: readonly FirstOrderShare[]): string {
  const telling = tellingShares(firstOrder);
  const [first, second] = telling;
  if (!first) return `By itself, ${widest} moves it most.`;
  const told = (entry: { factor: string; index: number }) => `${entry.factor} (share ${entry.index.toFixed(2)})`;
  if (first.index >= 0.5)
    return `Most of the spread comes from ${told(first)}${second ? `, then ${told(second)}` : ""}.`;
  if (!second) return `What stands out is ${told(first)}; the rest comes from several inputs together.`;
  return `The spread comes from several inputs, first of all ${telling.slice(0, 3).map(told).join(", ")}.`;
}
