import { EQUATORIAL_LIMIT } from "../guards";
import type { FitNote } from "../response";
import type { ModelId } from "../scenario";
import { coastDistance } from "./coast-distance";
import { thresholdSource, type FitContext } from "./fit-context";
import { layerRichardson } from "./layer-richardson";
import { layerStability } from "./layer-stability";
import { stressSteadiness } from "./stress-steadiness";
import { waterDepth } from "./water-depth";

/** Share of the stress's size that must survive in its vector mean for the wind to count as steady. Convention of this engine. */
const STEADY_SHARE = 0.9;
/** Inertial periods in which a drift settles. Convention of this engine. */
const SETTLED = 2;

type Decided = Pick<FitNote, "value" | "threshold" | "source">;

/** A model, why in a sentence, and the number that decided. */
export interface ModelAdvice extends Decided {
  model: ModelId;
  reason: string;
  /** Models that follow all that this one follows, and more. */
  alsoFit: readonly ModelId[];
}

/** The model that suits the case best, whichever was chosen. */
export function recommendModel(context: FitContext): ModelAdvice {
  return coastalAdvice(context) ?? columnAdvice(context) ?? fixedLayerAdvice(context);
}

/** A fixed layer in the open: the model that leaves most out, and so meets every objection there is. */
function asSlab(context: FitContext): FitContext {
  return { ...context, method: { ...context.method, model: "slab" } };
}

function coastalAdvice(context: FitContext): ModelAdvice | null {
  const note = coastDistance(asSlab(context));
  if (note?.severity !== "doNotUse" || context.place.waterDepth === null || context.place.shoreNormal === null) {
    return null;
  }
  const reason =
    "The box lies within an internal Rossby radius of the shore, where nothing can pass through the coast.";
  return advice("coastal", reason, note);
}

function columnAdvice(context: FitContext): ModelAdvice | null {
  if (!context.water.profile) return null;
  const slab = asSlab(context);
  const unstable = layerStability(slab);
  if (unstable) {
    return advice(
      "column",
      "The layer is no lighter than the water beneath, and only the column lets it sink.",
      unstable,
    );
  }
  const entraining = layerRichardson(slab);
  if (!entraining || entraining.severity === "ok") return null;
  const reason = "The layer moves fast enough to mix with the water beneath, which only the column follows.";
  return advice("column", reason, entraining);
}

function fixedLayerAdvice(context: FitContext): ModelAdvice {
  const { place, duration, inertialPeriod, stress } = context;
  if (inertialPeriod === null || Math.abs(place.latitude) < EQUATORIAL_LIMIT) {
    const decided = {
      value: Math.abs(place.latitude),
      threshold: EQUATORIAL_LIMIT,
      source: thresholdSource("fit-equator"),
    };
    const reason = "Near the equator there is no steady Ekman drift; the slab needs none.";
    return advice("slab", reason, decided, ["column"]);
  }
  const periods = duration / inertialPeriod;
  const length = { value: periods, threshold: SETTLED, source: thresholdSource("fit-duration") };
  if (periods < SETTLED) {
    const reason = `The storm lasts only ${periods.toFixed(1)} inertial periods, so inertial motion carries a good share of the drift.`;
    return advice("slab", reason, length, ["column"]);
  }
  const share = stressSteadiness(stress);
  if (share < STEADY_SHARE) {
    const decided = { value: share, threshold: STEADY_SHARE, source: thresholdSource("fit-steadiness") };
    const reason = "The wind changes as it blows, so inertial motion carries a good share of the drift.";
    return advice("slab", reason, decided, ["column"]);
  }
  const steady = `The wind holds steady for ${periods.toFixed(1)} inertial periods, so the drift settles to the Ekman balance`;
  const shallow = waterDepth(asSlab(context))?.severity;
  if (shallow === undefined || shallow === "ok") return advice("budget", `${steady}.`, length, ["slab", "column"]);
  return advice("budget", `${steady}, here that of finite depth, as the bed is felt.`, length, ["column"]);
}

function advice(model: ModelId, reason: string, decided: Decided, alsoFit: readonly ModelId[] = []): ModelAdvice {
  const { value, threshold, source } = decided;
  return { model, reason, value, threshold, source, alsoFit };
}
