import { requireNotNegative, requireFinite } from "../guards";

/**
 * Wind vector from speed and the direction that the wind comes from.
 * @param speed m/s, ≥ 0 @param from degrees true
 * @returns u east, v north, m/s, pointing where the air goes
 * @throws OceanError INVALID_INPUT
 * @see meteorological convention (common practice)
 */
export function windComponents(speed: number, from: number): { u: number; v: number } {
  requireNotNegative({ speed });
  requireFinite({ from });
  const angle = (from * Math.PI) / 180;
  return { u: -speed * Math.sin(angle), v: -speed * Math.cos(angle) };
}
