import { VON_KARMAN } from "../constants";
import { OceanError } from "../errors";
import { requireDepth, requireFinite, requirePositive } from "../guards";
import type { DragLaw } from "../stress/drag-law";

/**
 * Strongest wind under which a stable layer of a given depth survives: u*³ = κBh, turned to wind by the drag law.
 * An indicator to ±25 %.
 * @param depth h, m @param buoyancy flux B, m²/s³, > 0 (stabilising)
 * @param law drag law @param airDensity, waterDensity kg/m³
 * @returns wind at 10 m, m/s, at most 80
 * @throws OceanError NONPOSITIVE_DEPTH; INVALID_INPUT where B does not stabilise
 * @see derived here; the same reasoning as Thompson, Moum, Fairall & Rutledge (2019)
 */
export function stableLayerWindLimit(
  depth: number,
  buoyancy: number,
  law: DragLaw,
  airDensity: number,
  waterDensity: number,
): number {
  requireDepth("depth", depth);
  requireFinite({ buoyancy });
  requirePositive({ airDensity, waterDensity });
  if (buoyancy <= 0) {
    throw new OceanError("INVALID_INPUT", "A wind limit needs a buoyancy flux that stabilises the surface (positive).");
  }
  const limit = Math.cbrt(VON_KARMAN * buoyancy * depth);
  const ustar = (wind: number) => Math.sqrt((airDensity * law(wind)) / waterDensity) * wind;
  let low = 0;
  let high = 80;
  if (ustar(high) < limit) return high;
  for (let halving = 0; halving < 60; halving++) {
    const middle = (low + high) / 2;
    if (ustar(middle) < limit) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
