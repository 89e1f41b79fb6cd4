import { placeOf, type Place } from "../box/place";
import { blaming } from "../errors";
import { readForcing, type Forcing } from "../forcing/read-forcing";
import { layerContent } from "../layer/layer-content";
import { runColumn, type ColumnRecord } from "./column-run";
import { resolveMethod, type ResolvedMethod } from "../method/resolve-method";
import type { Motion } from "../motion/motion";
import { slabMotion } from "../motion/slab-motion";
import { steadyMotion } from "../motion/steady-motion";
import { coastalResponse, deepResponse, finiteDepthResponse } from "../motion/steady-responses";
import type { Budget } from "../response";
import type { Scenario } from "../scenario";
import { dragLaw, type DragLaw } from "../stress/drag-law";
import { stressRecord, type StressRecord } from "../stress/stress-record";
import { initialWater, type InitialWater } from "../water/initial-water";

/** The state of the layer at each of the storm's n samples. */
export interface LayerState {
  /** Conservative Temperature, °C, and Absolute Salinity, g/kg, of the surface. */
  CT: Float64Array;
  SA: Float64Array;
  /** m */
  layerDepth: Float64Array;
  /** Water beneath the layer at the end; null where nothing is known of it. */
  below: { CT: number; SA: number } | null;
  /** Heat that a freezing layer could not give, J/m². */
  freezingDeficit: number;
  heat: Budget;
  salt: Budget;
}

/** Everything that one run of a model leaves behind. */
export interface ModelRun {
  place: Place;
  method: ResolvedMethod;
  law: DragLaw;
  forcing: Forcing;
  stress: StressRecord;
  water: InitialWater;
  motion: Motion;
  layer: LayerState;
  /** Model `column` only. */
  column: ColumnRecord | null;
}

/**
 * From a valid scenario to the motion and the state of the layer: the way that every estimate takes.
 * @throws OceanError where the water cannot bear the forcing (a layer that evaporates away)
 */
export function runModel(scenario: Scenario): ModelRun {
  const place = placeOf(scenario.box);
  const choices = scenario.method ?? {};
  const water = initialWater(scenario.water, place, choices.layerDensityStep ?? 0.03);
  const meanWind = scenario.storm.windSpeed.reduce((sum, speed) => sum + speed, 0) / scenario.storm.windSpeed.length;
  const method = resolveMethod(choices, { place, layerDepth: water.layerDepth, meanWind });
  const law = dragLaw(method.dragLaw, {
    coefficient: method.dragCoefficient,
    highWindCap: method.highWindCap,
    gravity: method.gravity,
  });
  const forcing = readForcing(scenario.storm, law, method.heatInterpolation);
  const stress = stressRecord(forcing, law, method.airDensity, method.timeStep);
  const shared = { place, method, law, forcing, stress, water };
  if (method.model === "column") return { ...shared, ...blaming("method.cellSize", () => runColumn(shared)) };
  const layer = "cast" in scenario.water && !scenario.water.layerDepth ? "water.cast" : "water.layerDepth";
  return {
    ...shared,
    column: null,
    motion: layerMotion(place, method, stress, water),
    layer: blaming(layer, () => fixedLayer(forcing, water, method)),
  };
}

function layerMotion(place: Place, method: ResolvedMethod, stress: StressRecord, water: InitialWater): Motion {
  const { f, waterDepth, shoreNormal } = place;
  const { waterDensity, dampingRate, eddyViscosity, gravity } = method;
  const { layerDepth } = water;
  if (method.model === "slab") return slabMotion(stress, { f, dampingRate, layerDepth, waterDensity });
  const setting = { f, eddyViscosity, depth: waterDepth ?? layerDepth };
  if (method.model === "coastal") {
    return steadyMotion(stress, coastalResponse(setting, layerDepth, waterDensity, shoreNormal ?? 0, gravity));
  }
  if (method.ekman === "finiteDepth")
    return steadyMotion(stress, finiteDepthResponse(setting, layerDepth, waterDensity));
  return steadyMotion(stress, deepResponse(f, layerDepth, waterDensity));
}

function fixedLayer(forcing: Forcing, water: InitialWater, method: ResolvedMethod): LayerState {
  const content = layerContent(forcing, water, method);
  const layerDepth = new Float64Array(forcing.seconds.length).fill(water.layerDepth);
  return { ...content, layerDepth, below: water.below };
}
