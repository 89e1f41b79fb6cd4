import * as constants from "../constants";
import type { Place } from "../box/place";
import type { MethodEntry, MethodUsed } from "../response";
import type { MethodChoices, ModelId } from "../scenario";
import { sourceOf } from "../sources";
import { CONSTANT_DRAG, defaultCap } from "../stress/drag-law";
import { defaultCellSize, defaultEddyViscosity, defaultMaxDepth, defaultTimeStep } from "./defaults";

/** Every law and parameter with the value in use. */
export type ResolvedMethod = Required<MethodChoices>;

const UNITS: Record<keyof MethodChoices, string> = {
  model: "",
  dragLaw: "",
  dragCoefficient: "",
  highWindCap: "m/s",
  airDensity: "kg/m³",
  waterDensity: "kg/m³",
  heatCapacity: "J/kg/K",
  gravity: "m/s²",
  timeStep: "s",
  dampingRate: "1/s",
  ekman: "",
  eddyViscosity: "m²/s",
  penetratingShortwave: "",
  waterType: "",
  heatInterpolation: "",
  rainHeat: "",
  cellSize: "m",
  maxDepth: "m",
  bottomDrag: "",
  gradientMixing: "",
  bulkRichardson: "",
  gradientRichardson: "",
  layerDensityStep: "kg/m³",
};

const MODEL_SOURCES: Record<ModelId, string> = {
  budget: "ekman-transport",
  slab: "slab",
  column: "column",
  coastal: "ekman-coast",
};

const CONVENTION = "convention of this engine";

/** What the defaults hang on. */
export interface MethodSetting {
  place: Place;
  /** m */
  layerDepth: number;
  /** m/s at the anemometer's height over the storm */
  meanWind: number;
}

/** Fills in every choice that was not made. */
export function resolveMethod(choices: MethodChoices, { place, layerDepth, meanWind }: MethodSetting): ResolvedMethod {
  const model = choices.model ?? "slab";
  const dragLaw = choices.dragLaw ?? "largeYeager2009";
  const defaults: ResolvedMethod = {
    model,
    dragLaw,
    dragCoefficient: CONSTANT_DRAG,
    highWindCap: defaultCap(dragLaw, constants.HIGH_WIND_CAP),
    airDensity: constants.AIR_DENSITY,
    waterDensity: constants.REFERENCE_DENSITY,
    heatCapacity: constants.HEAT_CAPACITY,
    gravity: constants.GRAVITY,
    timeStep: defaultTimeStep(model),
    dampingRate: model === "column" ? 0 : constants.DAMPING_RATE,
    ekman: model === "coastal" ? "finiteDepth" : "deep",
    eddyViscosity: defaultEddyViscosity(meanWind),
    penetratingShortwave: model === "column",
    waterType: "IB",
    heatInterpolation: "linear",
    rainHeat: false,
    cellSize: defaultCellSize(place.waterDepth, layerDepth),
    maxDepth: defaultMaxDepth(layerDepth),
    bottomDrag: 2.5e-3,
    gradientMixing: true,
    bulkRichardson: 0.65,
    gradientRichardson: 0.25,
    layerDensityStep: 0.03,
  };
  const made = Object.fromEntries(Object.entries(choices).filter(([, value]) => value !== undefined));
  return { ...defaults, ...made };
}

/** The same as it stands in a response: value, unit, source, and whether it was chosen. */
export function describeMethod(method: ResolvedMethod, choices: MethodChoices): MethodUsed {
  const sources = methodSourceText(method);
  const entries = (Object.keys(UNITS) as (keyof MethodChoices)[]).map((key): [string, MethodEntry] => [
    key,
    {
      value: method[key],
      unit: UNITS[key],
      source: sources[key],
      origin: choices[key] === undefined ? "default" : "chosen",
    },
  ]);
  return Object.fromEntries(entries);
}

function methodSourceText(method: ResolvedMethod): Record<keyof MethodChoices, string> {
  return {
    model: sourceOf(MODEL_SOURCES[method.model]).citation,
    dragLaw: sourceOf(`drag-${method.dragLaw}`).citation,
    dragCoefficient: "order of magnitude in textbook use (common practice, no source)",
    highWindCap: sourceOf("high-wind-cap").citation,
    airDensity: CONVENTION,
    waterDensity: "Boussinesq reference density, convention of this engine",
    heatCapacity: sourceOf("conservative-temperature").citation,
    gravity: CONVENTION,
    timeStep: CONVENTION,
    dampingRate: sourceOf("slab").citation,
    ekman: sourceOf("ekman-transport").citation,
    eddyViscosity: sourceOf("ekman-empirical").citation,
    penetratingShortwave: sourceOf("shortwave").citation,
    waterType: sourceOf("shortwave").citation,
    heatInterpolation: CONVENTION,
    rainHeat: sourceOf("rain-heat").citation,
    cellSize: CONVENTION,
    maxDepth: CONVENTION,
    bottomDrag: "quadratic bottom drag (common practice, from memory)",
    gradientMixing: sourceOf("column").citation,
    bulkRichardson: sourceOf("column").citation,
    gradientRichardson: sourceOf("column").citation,
    layerDensityStep: "de Boyer Montégut et al. (2004), threshold from memory",
  };
}
