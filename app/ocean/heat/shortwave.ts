import { OceanError } from "../errors";
import { requireNotNegative } from "../guards";

export interface WaterClarity {
  /** Share of the light that is absorbed near the surface. */
  R: number;
  /** Attenuation lengths of the two shares, m. */
  z1: number;
  z2: number;
}

/** Paulson & Simpson (1977), table 2, by Jerlov water type; `PS77obs` their own observations, `BALTIC_MOM` as tabulated in MOM5. */
export const WATER_TYPES = {
  I: { R: 0.58, z1: 0.35, z2: 23 },
  IA: { R: 0.62, z1: 0.6, z2: 20 },
  IB: { R: 0.67, z1: 1, z2: 17 },
  II: { R: 0.77, z1: 1.5, z2: 14 },
  III: { R: 0.78, z1: 1.4, z2: 7.9 },
  PS77obs: { R: 0.62, z1: 1.5, z2: 20 },
  BALTIC_MOM: { R: 0.521, z1: 0.15, z2: 3.3 },
} as const satisfies Record<string, WaterClarity>;
export type WaterTypeId = keyof typeof WATER_TYPES;

/** @throws OceanError INVALID_INPUT for a type that is not in the table */
export function waterClarity(type: WaterTypeId): WaterClarity {
  const clarity = Object.hasOwn(WATER_TYPES, type) ? WATER_TYPES[type] : undefined;
  if (!clarity) {
    throw new OceanError(
      "INVALID_INPUT",
      `Unknown water type "${String(type)}"; known are ${Object.keys(WATER_TYPES).join(", ")}.`,
    );
  }
  return clarity;
}

/**
 * Share of the net shortwave radiation that passes a depth.
 * @param clarity of the water @param depth m, positive down, ≥ 0
 * @returns 0…1
 * @throws OceanError INVALID_INPUT
 * @see Paulson & Simpson (1977), Journal of Physical Oceanography 7:952-956
 */
export function shortwaveFraction({ R, z1, z2 }: WaterClarity, depth: number): number {
  requireNotNegative({ depth });
  return R * Math.exp(-depth / z1) + (1 - R) * Math.exp(-depth / z2);
}
