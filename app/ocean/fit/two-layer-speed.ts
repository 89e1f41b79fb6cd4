import { requireDepth, requireNotNegative } from "../guards";

/**
 * Speed of long internal waves between two layers: c = √(g' h1 h2/(h1 + h2)).
 * @param reducedGravity g' = g Δρ/ρ, m/s² @param upper, lower thickness, m; `lower` may be infinite
 * @returns m/s
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 * @see two-layer shallow-water theory (common practice)
 */
export function internalWaveSpeed(reducedGravity: number, upper: number, lower: number): number {
  requireNotNegative({ reducedGravity });
  requireDepth("upper", upper);
  if (lower === Number.POSITIVE_INFINITY) return Math.sqrt(reducedGravity * upper);
  requireDepth("lower", lower);
  return Math.sqrt((reducedGravity * upper * lower) / (upper + lower));
}
