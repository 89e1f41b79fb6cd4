import { complex, modulus } from "../complex";
import type { ColumnRecord } from "../models/column-run";
import { coastalResponse } from "../motion/steady-responses";
import { apply } from "../motion/steady-motion";
import { potentialDensityOf } from "../seawater/density";
import { hours, thresholdSource, type FitContext, type Indicator } from "./fit-context";

/** Density of surface and bed this close: one layer, as inside the column. kg/m³ */
const SAME_DENSITY = 1e-4;

/**
 * A column mixed down to its bed has nothing but friction there to hold it: no surface tilts against the wind, so that
 * currents near a coast come out too fast.
 */
export const mixedToBed: Indicator = (context) => {
  const { place, method, column, forcing, peakDrift } = context;
  if (column === null || place.waterDepth === null || place.waterDepth > method.maxDepth) return null;
  let mixed = 0;
  for (let kept = 0; kept + 1 < column.sample.length; kept++) {
    if (!isOneLayer(column, kept)) continue;
    mixed += forcing.seconds[column.sample[kept + 1]] - forcing.seconds[column.sample[kept]];
  }
  if (mixed === 0) return null;
  const steady = steadyShoreSpeed(context);
  const compared =
    steady === null
      ? ""
      : ` A steady balance with the shore gives ${steady.toFixed(2)} m/s at most, where this estimate has ${peakDrift.toFixed(2)} m/s.`;
  const message = `The water is mixed down to its bed for ${hours(mixed)}, and this model has no sea surface that tilts against the wind, so currents near a coast come out too fast.${compared} Use model coastal for the drift near a shore.`;
  return {
    code: "COLUMN_MIXED_TO_BED",
    severity: "caution",
    message,
    value: mixed / 3600,
    threshold: 0,
    source: thresholdSource("fit-mixed-to-bed"),
  };
};

function isOneLayer({ SA, CT, depth }: ColumnRecord, kept: number): boolean {
  const bed = depth.length - 1;
  const surface = potentialDensityOf(SA[kept][0], CT[kept][0]);
  return Math.abs(potentialDensityOf(SA[kept][bed], CT[kept][bed]) - surface) <= SAME_DENSITY;
}

/** Speed of the steady balance at a straight shore under the strongest stress, m/s; null without a shore. */
function steadyShoreSpeed({ place, method, stress, water }: FitContext): number | null {
  if (place.waterDepth === null || place.shoreNormal === null) return null;
  const setting = { f: place.f, eddyViscosity: method.eddyViscosity, depth: place.waterDepth };
  const { drift } = coastalResponse(setting, water.layerDepth, method.waterDensity, place.shoreNormal, method.gravity);
  const speedAt = (tau: number, k: number) => {
    const { x, y } = apply(drift, tau, stress.y[k]);
    return modulus(complex(x, y));
  };
  return stress.x.reduce((most, tau, k) => Math.max(most, speedAt(tau, k)), 0);
}
