import type { Place } from "../box/place";
import { THINNEST_LAYER } from "../constants";
import type { CastWater, ScenarioWater, TwoLayerWater } from "../scenario";
import { absoluteSalinity, type SalinityRegion } from "../seawater/absolute-salinity";
import { potentialDensityOf } from "../seawater/density";
import { conservativeFromInSitu } from "../seawater/potential-temperature";
import { pressureFromDepth } from "../seawater/pressure-from-depth";
import { meanAbove, valueAt } from "./interpolate";
import { mixedLayerDepth } from "./layer-depth";

/** A profile in the engine's own quantities. */
export interface WaterProfile {
  /** m, positive down, increasing */
  depth: number[];
  /** Conservative Temperature, °C. */
  CT: number[];
  /** Absolute Salinity, g/kg. */
  SA: number[];
}

/** The water before the storm. */
export interface InitialWater {
  /** m */
  layerDepth: number;
  /** The layer that was asked for was deeper than the water, m; null if not. */
  askedDepth: number | null;
  /** Mean of the layer: °C and g/kg. */
  CT: number;
  SA: number;
  /** The water beneath; null where nothing is known of it. */
  below: { CT: number; SA: number } | null;
  /** The whole column; null where nothing is known of the water beneath. */
  profile: WaterProfile | null;
}

/** How far beneath the layer's base a cast is read for the water there, m: past the steepest part of the step. Convention of this engine. */
export const BELOW_BASE = 10;

/** Turns the scenario's water into Conservative Temperature and Absolute Salinity, and finds the layer. */
export function initialWater(water: ScenarioWater, place: Place, layerDensityStep: number): InitialWater {
  return "cast" in water ? fromCast(water, place, layerDensityStep) : fromTwoLayers(water, place);
}

function withinWater(asked: number, place: Place): { layerDepth: number; askedDepth: number | null } {
  if (place.waterDepth === null || asked <= place.waterDepth) return { layerDepth: asked, askedDepth: null };
  return { layerDepth: place.waterDepth, askedDepth: asked };
}

function fromTwoLayers(water: TwoLayerWater, place: Place): InitialWater {
  const { layerDepth, askedDepth } = withinWater(water.layerDepth, place);
  const SA = salinityOf(water, place.region);
  const layer = { SA, CT: conservativeFromInSitu(SA, water.temperature, 0) };
  if (!water.below) return { layerDepth, askedDepth, ...layer, below: null, profile: null };
  const belowSA = salinityOf(water.below, place.region);
  const pressure = pressureFromDepth(layerDepth, place.latitude);
  const below = { SA: belowSA, CT: conservativeFromInSitu(belowSA, water.below.temperature, pressure) };
  const edge = layerDepth * 1e-9;
  const profile = {
    depth: [0, layerDepth, layerDepth + edge],
    CT: [layer.CT, layer.CT, below.CT],
    SA: [layer.SA, layer.SA, below.SA],
  };
  return { layerDepth, askedDepth, ...layer, below, profile };
}

function fromCast(water: CastWater, place: Place, layerDensityStep: number): InitialWater {
  const depth = water.cast.map((level) => level.depth);
  const SA = water.cast.map((level) => salinityOf(level, place.region));
  const CT = water.cast.map((level, k) =>
    conservativeFromInSitu(SA[k], level.temperature, pressureFromDepth(level.depth, place.latitude)),
  );
  const sigma0 = depth.map((_, k) => potentialDensityOf(SA[k], CT[k]));
  // A cast with a step right below the surface has a layer at least a hundredth as deep as its first interval.
  const found =
    water.layerDepth ??
    Math.max(mixedLayerDepth(depth, sigma0, layerDensityStep), depth[0], depth[1] / 100, THINNEST_LAYER);
  const { layerDepth, askedDepth } = withinWater(found, place);
  const base = layerDepth + BELOW_BASE;
  const below =
    layerDepth < depth[depth.length - 1] ? { CT: valueAt(depth, CT, base), SA: valueAt(depth, SA, base) } : null;
  return {
    layerDepth,
    askedDepth,
    CT: meanAbove(depth, CT, layerDepth),
    SA: meanAbove(depth, SA, layerDepth),
    below,
    profile: { depth, CT, SA },
  };
}

function salinityOf(level: { salinity?: number; practicalSalinity?: number }, region: SalinityRegion): number {
  return level.salinity ?? absoluteSalinity(level.practicalSalinity ?? 0, region);
}
