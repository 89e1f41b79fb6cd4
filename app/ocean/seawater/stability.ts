import { GRAVITY, PASCAL_PER_DBAR } from "../constants";
import { OceanError } from "../errors";
import { requirePositive, requireSeawater } from "../guards";
import { seawaterDensity } from "./density";

export interface WaterSample {
  /** Absolute Salinity, g/kg. */
  SA: number;
  /** Conservative Temperature, °C. */
  CT: number;
  /** Sea pressure, dbar. */
  p: number;
}

/**
 * Buoyancy frequency squared between two levels, from locally referenced density.
 * @param upper, lower samples; the lower at the greater pressure
 * @param gravity m/s²
 * @returns 1/s², positive when stable
 * @throws OceanError INVALID_INPUT when the levels are not in order
 * @see IOC, SCOR and IAPSO (2010), eq. 3.10.2
 */
export function buoyancyFrequencySquared(upper: WaterSample, lower: WaterSample, gravity = GRAVITY): number {
  const { alpha, beta, v, dSA, dCT, dp } = between(upper, lower);
  requirePositive({ gravity });
  return (gravity * gravity * (beta * dSA - alpha * dCT)) / (v * dp * PASCAL_PER_DBAR);
}

/**
 * Turner angle and density ratio between two levels, from slopes taken upper minus lower.
 * 45…90: salt fingers; -90…-45: diffusive; within ±45: doubly stable; beyond ±90: statically unstable.
 * @returns Tu in degrees; Rrho = α ΔCT / (β ΔSA), null where salinity does not change
 * @throws OceanError INVALID_INPUT when the levels are not in order
 * @see IOC, SCOR and IAPSO (2010), eqs. 3.15.1 and 3.16.1
 */
export function turnerAngle(upper: WaterSample, lower: WaterSample): { Tu: number; Rrho: number | null } {
  const { alpha, beta, dSA, dCT } = between(upper, lower);
  const A = alpha * -dCT;
  const B = beta * -dSA;
  return { Tu: (Math.atan2(A + B, A - B) * 180) / Math.PI, Rrho: B === 0 ? null : A / B };
}

function between(upper: WaterSample, lower: WaterSample) {
  requireSeawater(upper.SA, upper.CT, upper.p);
  requireSeawater(lower.SA, lower.CT, lower.p);
  const dp = lower.p - upper.p;
  if (dp <= 0) {
    throw new OceanError("INVALID_INPUT", "The lower level must lie at a greater pressure than the upper one.");
  }
  const SA = (upper.SA + lower.SA) / 2;
  const CT = (upper.CT + lower.CT) / 2;
  const p = (upper.p + lower.p) / 2;
  const { rho, alpha, beta } = seawaterDensity(SA, CT, p);
  return { alpha, beta, v: 1 / rho, dSA: lower.SA - upper.SA, dCT: lower.CT - upper.CT, dp };
}
