import { requireNotNegative } from "../guards";

/**
 * Mass fractions of the dissolved salts in Reference-Composition seawater (Millero, Feistel, Wright & McDougall 2008),
 * from memory; they sum to 1. Not valid near river mouths: river salts stand in other proportions.
 */
export const SALT_FRACTIONS = {
  chloride: 0.5503396,
  sodium: 0.3065958,
  sulphate: 0.0771319,
  magnesium: 0.0365055,
  calcium: 0.0117186,
  potassium: 0.0113495,
  bicarbonate: 0.0029805,
  bromide: 0.0019134,
  boricAcid: 0.0005527,
  carbonate: 0.0004078,
  strontium: 0.000226,
  borate: 0.0002259,
  fluoride: 0.0000369,
  carbonDioxide: 0.0000121,
  hydroxide: 0.0000038,
} as const;
export type Salt = keyof typeof SALT_FRACTIONS;

/**
 * Grams of each major ion in a kilogram of seawater, by constant proportions.
 * @param SA Absolute Salinity, g/kg, ≥ 0
 * @returns g/kg of each
 * @throws OceanError INVALID_INPUT
 */
export function seawaterComposition(SA: number): Record<Salt, number> {
  requireNotNegative({ SA });
  const grams = Object.entries(SALT_FRACTIONS).map(([salt, fraction]) => [salt, fraction * SA]);
  return Object.fromEntries(grams) as Record<Salt, number>;
}
