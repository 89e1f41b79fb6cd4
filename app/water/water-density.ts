import { absoluteSalinity } from "~/ocean/seawater/absolute-salinity";
import { densityOf, potentialDensityOf } from "~/ocean/seawater/density";
import { freezingTemperature } from "~/ocean/seawater/freezing";
import { conservativeFromInSitu, inSituFromConservative } from "~/ocean/seawater/potential-temperature";
import { pressureFromDepth } from "~/ocean/seawater/pressure-from-depth";

export type SalinityScale = "absolute" | "practical";

/** A two-layer column: in-situ temperatures in °C, salinities on `salinityScale`, depth in m. */
export interface TwoLayers {
  temperature: number;
  salinity: number;
  salinityScale: SalinityScale;
  layerDepth: number;
  below: { temperature: number; salinity: number } | null;
}

export interface LayerDensities {
  /** Potential density referred to the surface, less 1000 kg/m³. */
  layer: number;
  below: number | null;
  /** kg/m³, below less layer; null without water below. */
  step: number | null;
  /** Whether the water below is at least as dense as the layer. */
  stable: boolean;
}

/** Pressure changes by less than 0.6 % with latitude; a column belongs to a project, not to one box. degrees */
const MIDDLE_LATITUDE = 45;
/** Above this depth stability is told from σ0, below it from densities at the pressure of the step, m (specification A.6). */
const DEEP = 200;

/** g/kg, by Reference Composition: the column is not tied to a place, so the Baltic's own line is left to the estimate. */
export function gramsPerKilogram(salinity: number, scale: SalinityScale): number {
  return scale === "absolute" ? salinity : absoluteSalinity(salinity);
}

/**
 * Densities of the two layers and the step between them.
 * @throws OceanError INVALID_INPUT for what is no seawater
 * @see Roquet, Madec, McDougall & Barker (2015), as in `seawater/density`
 */
export function layerDensities({ temperature, salinity, salinityScale, layerDepth, below }: TwoLayers): LayerDensities {
  const SA = gramsPerKilogram(salinity, salinityScale);
  const CT = conservativeFromInSitu(SA, temperature, 0);
  const layer = potentialDensityOf(SA, CT) - 1000;
  if (!below) return { layer, below: null, step: null, stable: true };
  const pressure = pressureFromDepth(layerDepth, MIDDLE_LATITUDE);
  const belowSA = gramsPerKilogram(below.salinity, salinityScale);
  const belowCT = conservativeFromInSitu(belowSA, below.temperature, pressure);
  const under = potentialDensityOf(belowSA, belowCT) - 1000;
  const reference = layerDepth > DEEP ? pressure : 0;
  return {
    layer,
    below: under,
    step: under - layer,
    stable: densityOf(belowSA, belowCT, reference) >= densityOf(SA, CT, reference),
  };
}

/** In-situ temperature at which water of this salinity freezes at the surface, °C. */
export function freezingPoint(salinity: number, scale: SalinityScale): number {
  const SA = gramsPerKilogram(salinity, scale);
  return inSituFromConservative(SA, freezingTemperature(SA, 0), 0);
}
