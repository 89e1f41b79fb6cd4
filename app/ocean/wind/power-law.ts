import { OceanError, type RangeWarning } from "../errors";
import { requireNotNegative, requirePositive } from "../guards";
import { power } from "../power";

/**
 * Wind at 10 m by the one-seventh power law; near-neutral air.
 * @param speed m/s at `height` @param height m above the sea, 8…12 stated, others used with a warning
 * @returns wind10 in m/s
 * @throws OceanError INVALID_INPUT
 * @see Coastal Engineering Manual (USACE), eq. II-2-9
 */
export function powerLawWind10(speed: number, height: number): { wind10: number; warnings: RangeWarning[] } {
  requireNotNegative({ speed });
  requirePositive({ height });
  if (height > 1000)
    throw new OceanError("INVALID_INPUT", `A wind height of ${height} m lies above the surface layer.`);
  const warnings: RangeWarning[] = [];
  if (height < 8 || height > 12) {
    const message = `Wind height ${height} m lies outside the 8…12 m of the one-seventh power law.`;
    warnings.push({ code: "OUT_OF_RANGE", message, value: height, threshold: height < 8 ? 8 : 12 });
  }
  return { wind10: speed * power(10 / height, 1 / 7), warnings };
}
