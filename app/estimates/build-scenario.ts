/** One box, one storm, one water column, one method sheet: the scenario that the engine is asked. Pure. */
import type { StormForcing } from "./storm-forcing";
import type {
  CastWater,
  Ensemble,
  MethodChoices,
  Position,
  Scenario,
  ScenarioBox,
  ScenarioStorm,
  ScenarioWater,
  TriggerLevel,
  TwoLayerWater,
} from "~/ocean/scenario";
import type { CastLevels } from "~/water/describe-cast";

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
  /** From `twoLayerWater` or `castWater`. */
  water: ScenarioWater;
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

function salinityOn(scale: WaterInput["salinityScale"]) {
  return (value: number) => (scale === "practical" ? { practicalSalinity: value } : { salinity: value });
}

export function twoLayerWater(water: WaterInput): TwoLayerWater {
  const salinity = salinityOn(water.salinityScale);
  const { temperature, layerDepth, belowTemperature, belowSalinity } = water;
  return {
    temperature,
    layerDepth,
    ...salinity(water.salinity),
    ...(belowTemperature !== null &&
      belowSalinity !== null && { below: { temperature: belowTemperature, ...salinity(belowSalinity) } }),
  };
}

/** @param layerDepth m, where a person set it; null where the method's step of density finds it */
export function castWater(
  { depth, temperature, salinity, salinityScale }: CastLevels,
  layerDepth: number | null,
): CastWater {
  const asGiven = salinityOn(salinityScale);
  return {
    cast: Array.from(depth, (metres, k) => ({ depth: metres, temperature: temperature[k], ...asGiven(salinity[k]) })),
    ...(layerDepth !== null && { layerDepth }),
  };
}

export function scenarioStorm({ time, ...series }: StormForcing): ScenarioStorm {
  return { time: time.map(isoTime), ...series };
}

export function buildScenario({ box, storm, water, method, ensemble }: EstimateInput): Scenario {
  return {
    box: scenarioBox(box),
    water,
    storm,
    method,
    ...(box.triggerLevels.length > 0 && { triggerLevels: box.triggerLevels }),
    ...(ensemble && { ensemble }),
  };
}
