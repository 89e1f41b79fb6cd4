import type { ModelRun } from "../models/run-model";
import type { Headline, ResponseSeries } from "../response";
import type { Scenario } from "../scenario";
import { potentialDensityOf } from "../seawater/density";
import { directionTowards } from "../wind/direction-to";
import { shoreAxes } from "./shore-axes";
import { triggerOutcomes } from "./trigger-outcomes";

/** The figures that a response is read for. */
export function headlineOf(scenario: Scenario, run: ModelRun, series: ResponseSeries): Headline {
  const { motion, layer, place } = run;
  const last = series.time.length - 1;
  const stress = sizes(series.stressX, series.stressY);
  const drift = sizes(series.driftEast, series.driftNorth);
  const stressPeak = indexOfGreatest(stress);
  const driftPeak = indexOfGreatest(drift);
  const freshest = indexOfGreatest(series.salinity.map((salinity) => -salinity));
  const axes = shoreAxes(place.shoreNormal);
  const [east, north] = [series.displacementEast[last], series.displacementNorth[last]];
  return {
    peakStress: { value: stress[stressPeak], time: series.time[stressPeak] },
    peakDrift: {
      value: drift[driftPeak],
      towards: directionTowards(series.driftEast[driftPeak], series.driftNorth[driftPeak]),
      time: series.time[driftPeak],
      inertialShare: motion.inertialShare[driftPeak],
    },
    netDisplacement: { value: Math.hypot(east, north), towards: directionTowards(east, north) },
    transportAlong: { value: motion.volumeEast * axes.along.x + motion.volumeNorth * axes.along.y },
    transportAcross: { value: motion.volumeEast * axes.across.x + motion.volumeNorth * axes.across.y },
    surfaceSalinity: {
      value: series.salinity[freshest],
      time: series.time[freshest],
      change: series.salinity[freshest] - series.salinity[0],
    },
    surfaceTemperature: { value: series.temperature[last], change: series.temperature[last] - series.temperature[0] },
    layerDepth: { value: series.layerDepth[last] },
    densityStep: { value: layer.below && potentialDensityOf(layer.below.SA, layer.below.CT) - series.density[last] },
    triggers: triggerOutcomes(scenario.storm, series, scenario.triggerLevels ?? []),
  };
}

function sizes(x: readonly number[], y: readonly number[]): number[] {
  return x.map((value, k) => Math.hypot(value, y[k]));
}

/** The first of the greatest values. */
function indexOfGreatest(values: readonly number[]): number {
  let at = 0;
  for (let k = 1; k < values.length; k++) if (values[k] > values[at]) at = k;
  return at;
}
