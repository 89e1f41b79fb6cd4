import type { ModelRun } from "../models/run-model";
import type { ResponseSeries } from "../response";
import type { Scenario } from "../scenario";
import { potentialFromConservative } from "../seawater/conservative-temperature";
import { potentialDensityOf } from "../seawater/density";
import { shoreAxes } from "./shore-axes";

/** The response's series at the storm's own times; at the surface potential and in-situ temperature are the same. */
export function responseSeries(scenario: Scenario, { place, motion, stress, layer }: ModelRun): ResponseSeries {
  const axes = shoreAxes(place.shoreNormal);
  const { transportEast: east, transportNorth: north } = motion;
  return {
    time: [...scenario.storm.time],
    stressX: Array.from(stress.sample, (at) => stress.x[at]),
    stressY: Array.from(stress.sample, (at) => stress.y[at]),
    driftEast: Array.from(motion.driftEast),
    driftNorth: Array.from(motion.driftNorth),
    displacementEast: Array.from(motion.displacementEast),
    displacementNorth: Array.from(motion.displacementNorth),
    transportAlong: Array.from(east, (_, k) => east[k] * axes.along.x + north[k] * axes.along.y),
    transportAcross: Array.from(east, (_, k) => east[k] * axes.across.x + north[k] * axes.across.y),
    temperature: Array.from(layer.CT, (CT, k) => potentialFromConservative(layer.SA[k], CT)),
    salinity: Array.from(layer.SA),
    density: Array.from(layer.CT, (CT, k) => potentialDensityOf(layer.SA[k], CT)),
    layerDepth: Array.from(layer.layerDepth),
  };
}
