import { OceanError } from "../errors";
import { requireDepth, requireFinite, requireNotNegative } from "../guards";

/**
 * Change of salinity when fresh water is stirred into a layer: ΔS = -S d/(D + d), exact.
 * @param salinity g/kg, ≥ 0 @param layerDepth D, m, > 0
 * @param freshWater d, m of fresh water added (rain less evaporation, runoff over area); negative concentrates
 * @returns g/kg
 * @throws OceanError NONPOSITIVE_DEPTH where the layer or what is left of it has no depth; INVALID_INPUT
 * @see conservation of salt (common practice)
 */
export function rainDilution(salinity: number, layerDepth: number, freshWater: number): number {
  requireNotNegative({ salinity });
  requireDepth("layerDepth", layerDepth);
  requireFinite({ freshWater });
  if (layerDepth + freshWater <= 0) {
    throw new OceanError(
      "NONPOSITIVE_DEPTH",
      `Evaporation of ${-freshWater} m would use up the whole layer of ${layerDepth} m.`,
    );
  }
  return (-salinity * freshWater) / (layerDepth + freshWater);
}
