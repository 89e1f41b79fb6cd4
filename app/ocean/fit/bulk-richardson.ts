import { requireDepth, requireNotNegative, requirePositive, requireFinite } from "../guards";

/**
 * Bulk Richardson number of a layer: g Δρ h/(ρ0 ΔU²).
 * @param densityStep kg/m³ @param depth m @param speedStep m/s @param density kg/m³ @param gravity m/s²
 * @returns dimensionless; +Infinity where nothing shears
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 * @see Price (1979); Price, Weller & Pinkel (1986)
 */
export function bulkRichardson(
  densityStep: number,
  depth: number,
  speedStep: number,
  density: number,
  gravity: number,
): number {
  requireFinite({ densityStep });
  requireDepth("depth", depth);
  requireNotNegative({ speedStep });
  requirePositive({ density, gravity });
  if (speedStep === 0) return Number.POSITIVE_INFINITY;
  return (gravity * densityStep * depth) / (density * speedStep * speedStep);
}
