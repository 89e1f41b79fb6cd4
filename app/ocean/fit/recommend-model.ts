import { EQUATORIAL_LIMIT } from "../guards";
import type { ModelRun } from "../models/run-model";
import type { ModelId } from "../scenario";
import { fitContext, type FitContext } from "./fit-context";
import { layerRichardson } from "./layer-richardson";
import { coastDistance } from "./coast-distance";

/** Share of the stress's size that must survive in its vector mean for the wind to count as steady. Convention of this engine. */
const STEADY_SHARE = 0.9;

/** The model that suits the case best, and why, in a sentence. */
export function recommendModel(run: ModelRun): { recommendedModel: ModelId; recommendation: string } {
  const context = fitContext(run);
  const coast = coastDistance({ ...context, method: { ...context.method, model: "slab" } });
  if (coast?.severity === "doNotUse" && context.place.waterDepth !== null && context.place.shoreNormal !== null) {
    return because(
      "coastal",
      "The box lies within an internal Rossby radius of the shore, where nothing can pass through the coast.",
    );
  }
  const entrainment = layerRichardson({ ...context, method: { ...context.method, model: "slab" } });
  if (context.water.profile && entrainment && entrainment.severity !== "ok") {
    return because(
      "column",
      "The layer moves fast enough to mix with the water beneath, which only the column model follows.",
    );
  }
  if (Math.abs(context.place.latitude) < EQUATORIAL_LIMIT) {
    return because("slab", "Near the equator there is no steady Ekman drift; the slab needs none.");
  }
  if (
    context.inertialPeriod !== null &&
    context.duration >= 2 * context.inertialPeriod &&
    steadiness(context) >= STEADY_SHARE
  ) {
    return because(
      "budget",
      "The wind stays steady for more than two inertial periods, so the drift settles to the Ekman balance.",
    );
  }
  return because(
    "slab",
    "The wind changes within a few inertial periods, so inertial motion carries a good share of the drift.",
  );
}

function because(recommendedModel: ModelId, recommendation: string) {
  return { recommendedModel, recommendation };
}

/** Size of the mean stress over the mean of its sizes, 0…1; 0 in calm. */
function steadiness({ stress }: FitContext): number {
  let [x, y, size] = [0, 0, 0];
  for (let step = 0; step + 1 < stress.seconds.length; step++) {
    const dt = stress.seconds[step + 1] - stress.seconds[step];
    x += stress.x[step] * dt;
    y += stress.y[step] * dt;
    size += Math.hypot(stress.x[step], stress.y[step]) * dt;
  }
  return size === 0 ? 0 : Math.hypot(x, y) / size;
}
