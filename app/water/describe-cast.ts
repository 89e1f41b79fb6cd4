/** What a cast says of the water: its layer by the usual thresholds, the water beneath, and where it would turn over. */
import { potentialDensityOf } from "~/ocean/seawater/density";
import { conservativeFromInSitu } from "~/ocean/seawater/potential-temperature";
import { pressureFromDepth } from "~/ocean/seawater/pressure-from-depth";
import { BELOW_BASE } from "~/ocean/water/initial-water";
import { meanAbove, valueAt } from "~/ocean/water/interpolate";
import { mixedLayerDepth } from "~/ocean/water/layer-depth";
import { gramsPerKilogram, type SalinityScale, type TwoLayers } from "./water-density";
import { LAYER_DEPTH } from "./water-schema";

/** One half of a cast, from the surface down; arrays of one length. */
export interface CastLevels {
  /** m, positive down, increasing */
  depth: ArrayLike<number>;
  /** In situ, °C. */
  temperature: ArrayLike<number>;
  salinity: ArrayLike<number>;
  salinityScale: SalinityScale;
}

export interface CastDescription {
  /** Potential density referred to the surface, less 1000 kg/m³, one a level. */
  sigma0: Float64Array;
  /** Depth of the layer by each threshold. */
  layers: { step: number; depth: number; reached: boolean }[];
  /** As two layers, by the first threshold or the depth that was chosen: what a list and a sketch show. */
  twoLayers: TwoLayers;
  /** The greatest fall of density from one level to the next, where there is one beyond the noise of the instrument. */
  inversion: { fall: number; above: number; below: number } | null;
}

/** kg/m³, thresholds of the mixed layer. Source: de Boyer Montégut et al. (2004) for the first; the second is the older habit (from memory). */
export const LAYER_STEPS = [0.03, 0.125] as const;

/** kg/m³: less is the noise of an instrument in mixed water. Common practice, no source. */
const NOISE = 0.02;

/**
 * @param latitude degrees: of the cast where known; it moves pressure by less than 0.6 %
 * @param chosenDepth m: of the layer, where a person set it; null to go by the threshold
 * @throws OceanError INVALID_INPUT for what is no seawater
 */
export function describeCast(levels: CastLevels, latitude: number, chosenDepth: number | null): CastDescription {
  const { depth, temperature, salinity, salinityScale } = levels;
  const sigma0 = Float64Array.from(depth, (metres, k) => {
    const SA = gramsPerKilogram(salinity[k], salinityScale);
    return (
      potentialDensityOf(SA, conservativeFromInSitu(SA, temperature[k], pressureFromDepth(metres, latitude))) - 1000
    );
  });
  const deepest = depth[depth.length - 1];
  const layers = LAYER_STEPS.map((step) => {
    const found = mixedLayerDepth(depth, sigma0, step);
    return {
      step,
      depth: Math.max(found, depth[0], depth[1] / 100, LAYER_DEPTH.min),
      reached: sigma0.some((s) => s >= sigma0[0] + step),
    };
  });
  const layerDepth = chosenDepth ?? layers[0].depth;
  const beneath = layerDepth + BELOW_BASE;
  return {
    sigma0,
    layers,
    twoLayers: {
      temperature: meanAbove(depth, temperature, layerDepth),
      salinity: meanAbove(depth, salinity, layerDepth),
      salinityScale,
      layerDepth,
      below:
        layerDepth < deepest
          ? { temperature: valueAt(depth, temperature, beneath), salinity: valueAt(depth, salinity, beneath) }
          : null,
    },
    inversion: inversionOf(depth, sigma0),
  };
}

function inversionOf(depth: ArrayLike<number>, sigma0: Float64Array): CastDescription["inversion"] {
  let worst: CastDescription["inversion"] = null;
  for (let k = 1; k < sigma0.length; k += 1) {
    const fall = sigma0[k - 1] - sigma0[k];
    if (fall > (worst?.fall ?? NOISE)) worst = { fall, above: depth[k - 1], below: depth[k] };
  }
  return worst;
}
