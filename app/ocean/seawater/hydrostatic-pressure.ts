import { GRAVITY, PASCAL_PER_DBAR } from "../constants";
import { OceanError } from "../errors";
import { requireNotNegative, requirePositive } from "../guards";

/**
 * Sea pressure down a density profile, by the trapezium rule from the surface.
 * @param depth m, positive down, strictly increasing, n values
 * @param rho in-situ density, kg/m³, n values
 * @param gravity m/s²
 * @returns dbar, n values; water above the first level takes that level's density
 * @throws OceanError INVALID_INPUT for empty or unequal arrays or depths out of order
 * @see hydrostatic balance (common practice)
 */
export function hydrostaticPressure(depth: readonly number[], rho: readonly number[], gravity = GRAVITY): number[] {
  if (depth.length === 0 || depth.length !== rho.length) {
    throw new OceanError(
      "INVALID_INPUT",
      `Depth and density need the same number of values, at least one: ${depth.length} and ${rho.length}.`,
    );
  }
  requirePositive({ gravity });
  const pressure: number[] = [];
  for (let k = 0; k < depth.length; k++) {
    requireNotNegative({ [`depth[${k}]`]: depth[k] });
    requirePositive({ [`rho[${k}]`]: rho[k] });
    if (k > 0 && depth[k] <= depth[k - 1]) {
      throw new OceanError("INVALID_INPUT", `depth[${k}] must be greater than the one above it.`);
    }
    const above = k === 0 ? 0 : pressure[k - 1];
    const thickness = k === 0 ? depth[0] : depth[k] - depth[k - 1];
    const meanDensity = k === 0 ? rho[0] : (rho[k - 1] + rho[k]) / 2;
    pressure.push(above + (meanDensity * gravity * thickness) / PASCAL_PER_DBAR);
  }
  return pressure;
}
