import { HEAT_CAPACITY, REFERENCE_DENSITY } from "../constants";
import { requireDepth, requireFinite, requireNotNegative, requirePositive } from "../guards";

/**
 * Warming of a layer by a heat flux: ΔCT = Q Δt/(ρ cp D), with cp0 because the temperature is Conservative Temperature.
 * @param heatFlux W/m², positive into the sea @param seconds s @param layerDepth m
 * @returns °C
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 * @see heat balance of a mixed layer (common practice)
 */
export function layerWarming(
  heatFlux: number,
  seconds: number,
  layerDepth: number,
  waterDensity = REFERENCE_DENSITY,
  heatCapacity = HEAT_CAPACITY,
): number {
  requireFinite({ heatFlux });
  requireNotNegative({ seconds });
  requireDepth("layerDepth", layerDepth);
  requirePositive({ waterDensity, heatCapacity });
  return (heatFlux * seconds) / (waterDensity * heatCapacity * layerDepth);
}
