/**
 * Exact ratios between units, as [numerator, denominator]: `value × numerator ÷ denominator`.
 * International nautical mile 1852 m, knot 1852/3600 m/s, foot 0.3048 m, inch 25.4 mm: exact by definition
 * (BIPM SI Brochure, 9th ed., and NIST SP 811, appendix B; from memory).
 */
export type Ratio = readonly [numerator: number, denominator: number];

export const SAME: Ratio = [1, 1];
export const METRES_PER_SECOND_TO_KNOTS: Ratio = [3600, 1852];
export const MILLIMETRES_TO_INCHES: Ratio = [10, 254];
export const METRES_TO_FEET: Ratio = [10_000, 3048];
export const METRES_TO_KILOMETRES: Ratio = [1, 1000];
export const METRES_TO_NAUTICAL_MILES: Ratio = [1, 1852];
export const SQUARE_METRES_TO_SQUARE_KILOMETRES: Ratio = [1, 1_000_000];
export const SQUARE_METRES_TO_SQUARE_NAUTICAL_MILES: Ratio = [1, 1852 * 1852];
/** Absolute Salinity of the reference composition to Practical Salinity: 35 ÷ 35.16504 (Millero et al. 2008). */
export const ABSOLUTE_TO_PRACTICAL_SALINITY: Ratio = [35, 35.16504];
/** m³ per metre of shore to million m³ per kilometre of shore. */
export const PER_METRE_TO_MILLION_PER_KILOMETRE: Ratio = [1, 1000];
export const JOULES_TO_MEGAJOULES: Ratio = [1, 1_000_000];
export const FRACTION_TO_PERCENT: Ratio = [100, 1];
export const SECONDS_TO_HOURS: Ratio = [1, 3600];

/** `value` in the ratio's target unit. */
export function convert(value: number, [numerator, denominator]: Ratio): number {
  return (value * numerator) / denominator;
}

/** The way back. */
export function convertBack(value: number, [numerator, denominator]: Ratio): number {
  return (value * denominator) / numerator;
}
