import { EARTH_ROTATION } from "../constants";
import type { ModelId } from "../scenario";

/** Longest step between which the stress is taken as linear, s. */
export function defaultTimeStep(model: ModelId): number {
  return model === "column" ? 450 : 600;
}

/** Cell of the column, m; finer where the water or the layer is shallow. */
export function defaultCellSize(waterDepth: number | null = null, layerDepth = Number.POSITIVE_INFINITY): number {
  return (waterDepth !== null && waterDepth < 60) || layerDepth < 15 ? 0.5 : 1;
}

/** Depth that the column reaches where the sea is deeper, m: at least 200 and well below the layer. */
export function defaultMaxDepth(layerDepth: number): number {
  return Math.max(200, 4 * layerDepth);
}

/** Least eddy viscosity used where none is given: the lower end of the range in use, m²/s. */
const LEAST_VISCOSITY = 0.005;

/**
 * Eddy viscosity from Ekman's empirical depth, A = |f| D_E²/(2π²) with D_E = 7.6 U/√sin|φ|; the latitude cancels.
 * @param meanWind m/s at 10 m over the storm
 * @returns m²/s, at least 0.005
 */
export function defaultEddyViscosity(meanWind: number): number {
  return Math.max(LEAST_VISCOSITY, (2 * EARTH_ROTATION * (7.6 * meanWind) ** 2) / (2 * Math.PI ** 2));
}
