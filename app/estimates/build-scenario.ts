/** One box, one storm, one water column, one method sheet: the scenario that the engine is asked. Pure. */
import type { StormForcing } from "./storm-forcing";
import type {
  Ensemble,
  MethodChoices,
  Position,
  Scenario,
  ScenarioBox,
  ScenarioStorm,
  TriggerLevel,
  TwoLayerWater,
} from "~/ocean/scenario";

export interface BoxInput {
  polygon: Position[];
  /** m */
  waterDepth: number | null;
  /** degrees true, pointing offshore */
  shoreNormal: number | null;
  /** m */
  distanceToShore: number | null;
  triggerLevels: TriggerLevel[];
}

export interface WaterInput {
  /** In-situ, °C. */
  temperature: number;
  salinity: number;
  salinityScale: "absolute" | "practical";
  /** m */
  layerDepth: number;
  belowTemperature: number | null;
  belowSalinity: number | null;
}

export interface EstimateInput {
  box: BoxInput;
  /** From `scenarioStorm`. */
  storm: ScenarioStorm;
  water: WaterInput;
  method: MethodChoices;
  ensemble: Ensemble | null;
}

/** `2026-11-04T20:00:00Z`; milliseconds only where there are any. */
export function isoTime(seconds: number): string {
  return new Date(Math.round(seconds * 1000)).toISOString().replace(".000Z", "Z");
}

/** The name is left out: to rename a box changes no number. */
export function scenarioBox({ polygon, waterDepth, shoreNormal, distanceToShore }: BoxInput): ScenarioBox {
  return {
    polygon,
    ...(waterDepth !== null && { waterDepth }),
    ...(shoreNormal !== null && { shoreNormal }),
    ...(distanceToShore !== null && { distanceToShore }),
  };
}

export function scenarioWater(water: WaterInput): TwoLayerWater {
  const salinity = (value: number) =>
    water.salinityScale === "practical" ? { practicalSalinity: value } : { salinity: value };
  const { temperature, layerDepth, belowTemperature, belowSalinity } = water;
  return {
    temperature,
    layerDepth,
    ...salinity(water.salinity),
    ...(belowTemperature !== null &&
      belowSalinity !== null && { below: { temperature: belowTemperature, ...salinity(belowSalinity) } }),
  };
}

export function scenarioStorm({ time, ...series }: StormForcing): ScenarioStorm {
  return { time: time.map(isoTime), ...series };
}

export function buildScenario({ box, storm, water, method, ensemble }: EstimateInput): Scenario {
  return {
    box: scenarioBox(box),
    water: scenarioWater(water),
    storm,
    method,
    ...(box.triggerLevels.length > 0 && { triggerLevels: box.triggerLevels }),
    ...(ensemble && { ensemble }),
  };
}
