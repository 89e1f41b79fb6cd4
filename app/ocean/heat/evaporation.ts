import { FRESH_WATER_DENSITY } from "../constants";
import { requireFinite, requirePositive } from "../guards";

/**
 * Latent heat of vaporisation of water.
 * @param seaTemperature °C
 * @returns J/kg
 * @see COARE algorithm
 */
export function latentHeatOfVaporisation(seaTemperature: number): number {
  return (2.501 - 0.00237 * seaTemperature) * 1e6;
}

/**
 * Evaporation from the latent heat flux.
 * @param latentLoss W/m², positive OUT of the sea @param seaTemperature °C
 * @returns m/s of fresh water
 * @throws OceanError INVALID_INPUT
 */
export function evaporationRate(
  latentLoss: number,
  seaTemperature: number,
  freshDensity = FRESH_WATER_DENSITY,
): number {
  requireFinite({ latentLoss, seaTemperature });
  requirePositive({ freshDensity });
  return latentLoss / (freshDensity * latentHeatOfVaporisation(seaTemperature));
}
