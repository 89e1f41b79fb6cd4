import { VON_KARMAN } from "../constants";
import { requireFinite, requireNotNegative } from "../guards";
import { power } from "../power";

/**
 * Monin–Obukhov length in the sea: L = u*³/(κB).
 * @param ustar friction velocity in water, √(τ/ρ), m/s @param buoyancy flux, m²/s³, positive stabilises
 * @returns m, positive where the surface is being stabilised; null without a buoyancy flux
 * @throws OceanError INVALID_INPUT
 * @see Monin & Obukhov (1954), in the ocean's sign (common practice)
 */
export function moninObukhovLength(ustar: number, buoyancy: number): number | null {
  requireNotNegative({ ustar });
  requireFinite({ buoyancy });
  return buoyancy === 0 ? null : power(ustar, 3) / (VON_KARMAN * buoyancy);
}
