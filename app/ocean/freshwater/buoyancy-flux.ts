import { GRAVITY, HEAT_CAPACITY, REFERENCE_DENSITY } from "../constants";
import { requireFinite, requirePositive } from "../guards";
import { seawaterDensity } from "../seawater/density";

export interface SurfaceFluxes {
  /** W/m², positive into the sea, rain heat included. */
  heatFlux: number;
  /** Evaporation less precipitation, m/s. */
  evaporationMinusRain: number;
  /** Absolute Salinity, g/kg, and Conservative Temperature, °C, of the surface. */
  SA: number;
  CT: number;
}

/**
 * Buoyancy flux into the sea surface: B = g[α Q/(ρ cp) + β S (P - E)].
 * @returns m²/s³, positive stabilises
 * @throws OceanError INVALID_INPUT
 * @see surface buoyancy balance (common practice), coefficients of TEOS-10 at the surface
 */
export function buoyancyFlux(
  { heatFlux, evaporationMinusRain, SA, CT }: SurfaceFluxes,
  gravity = GRAVITY,
  waterDensity = REFERENCE_DENSITY,
  heatCapacity = HEAT_CAPACITY,
): number {
  requireFinite({ heatFlux, evaporationMinusRain });
  requirePositive({ gravity, waterDensity, heatCapacity });
  const { alpha, beta } = seawaterDensity(SA, CT, 0);
  return gravity * ((alpha * heatFlux) / (waterDensity * heatCapacity) - beta * SA * evaporationMinusRain);
}
