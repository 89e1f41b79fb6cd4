import { inertialPeriod } from "../ekman/coriolis";
import { ekmanDepth } from "../ekman/spiral";
import { EQUATORIAL_LIMIT } from "../guards";
import type { ModelRun } from "../models/run-model";
import type { FitNote, FitSeverity } from "../response";
import type { Scenario } from "../scenario";
import { potentialDensityOf } from "../seawater/density";
import { sourceOf } from "../sources";
import { internalWaveSpeed } from "./two-layer-speed";

/** What the indicators look at. */
export interface FitContext extends ModelRun {
  scenario: Scenario;
  /** s */
  duration: number;
  /** s; null at the equator */
  inertialPeriod: number | null;
  /** m; null within 2 degrees of the equator */
  ekmanDepth: number | null;
  /** m/s at 10 m */
  peakWind: number;
  /** m/s */
  peakDrift: number;
  /** kg/m³, water beneath less layer, at the start; null where unknown */
  densityStep: number | null;
  /** Speed of long internal waves on the layer's base, m/s; null where unknown. */
  internalSpeed: number | null;
}

/** One test of whether the method fits; null where it does not apply or cannot be judged. */
export type Indicator = (context: FitContext) => FitNote | null;

export function fitContext(scenario: Scenario, run: ModelRun): FitContext {
  const { place, forcing, motion, water, method } = run;
  const densityStep =
    water.below && potentialDensityOf(water.below.SA, water.below.CT) - potentialDensityOf(water.SA, water.CT);
  const peak = (x: Float64Array, y: Float64Array) =>
    x.reduce((most, value, k) => Math.max(most, Math.hypot(value, y[k])), 0);
  const under = place.waterDepth === null ? Number.POSITIVE_INFINITY : place.waterDepth - water.layerDepth;
  return {
    ...run,
    scenario,
    duration: forcing.seconds[forcing.seconds.length - 1],
    inertialPeriod: inertialPeriod(place.f),
    ekmanDepth: Math.abs(place.latitude) < EQUATORIAL_LIMIT ? null : ekmanDepth(method.eddyViscosity, place.f),
    peakWind: peak(forcing.windU, forcing.windV),
    peakDrift: peak(motion.driftEast, motion.driftNorth),
    densityStep,
    internalSpeed:
      densityStep !== null && densityStep > 0 && under > 0
        ? internalWaveSpeed((method.gravity * densityStep) / method.waterDensity, water.layerDepth, under)
        : null,
  };
}

/** Severity of a value that should be large: at least `good` is fine, below `bad` is not. */
export function atLeast(value: number, good: number, bad: number): FitSeverity {
  if (value >= good) return "ok";
  return value >= bad ? "caution" : "doNotUse";
}

/** Severity of a value that should be small. */
export function atMost(value: number, good: number, bad: number): FitSeverity {
  if (value <= good) return "ok";
  return value <= bad ? "caution" : "doNotUse";
}

/** Where a threshold comes from; a source that was not read is said to be from memory. */
export function thresholdSource(id: string): string {
  const { citation, provenance } = sourceOf(id);
  return provenance === "from memory" ? `${citation} (from memory)` : citation;
}

/** Metres as kilometres for a message. */
export function kilometres(metres: number): string {
  return `${(metres / 1000).toFixed(1)} km`;
}

/** Seconds as hours for a message. */
export function hours(seconds: number): string {
  return `${(seconds / 3600).toFixed(1)} h`;
}
