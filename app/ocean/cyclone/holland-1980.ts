import { requireFinite, requireNotNegative, requirePositive } from "../guards";
import { coriolis } from "../ekman/coriolis";
import { power } from "../power";

/** A parametric cyclone. */
export interface Cyclone {
  /** Central and surrounding pressure, Pa. */
  centralPressure: number;
  ambientPressure: number;
  /** m */
  radiusOfMaximumWind: number;
  /** Shape of the pressure profile. */
  B: number;
  /** degrees */
  latitude: number;
  /** kg/m³ */
  airDensity: number;
}

export function requireCyclone(cyclone: Cyclone): void {
  const { centralPressure, ambientPressure, radiusOfMaximumWind, B, airDensity } = cyclone;
  requirePositive({ centralPressure, ambientPressure, radiusOfMaximumWind, B, airDensity });
  requirePositive({ pressureDeficit: ambientPressure - centralPressure });
}

/**
 * Gradient wind and pressure at a distance from the centre.
 * @param r m, ≥ 0
 * @returns v m/s; p Pa. At the centre v = 0 and p the central pressure
 * @throws OceanError INVALID_INPUT
 * @see Holland (1980), Monthly Weather Review 108:1212-1218
 */
export function holland1980(cyclone: Cyclone, r: number): { v: number; p: number } {
  requireCyclone(cyclone);
  requireNotNegative({ r });
  const { centralPressure, ambientPressure, radiusOfMaximumWind, B, airDensity, latitude } = cyclone;
  if (r === 0) return { v: 0, p: centralPressure };
  const deficit = ambientPressure - centralPressure;
  const shape = power(radiusOfMaximumWind / r, B);
  const decay = Math.exp(-shape);
  const turning = (r * Math.abs(coriolis(latitude))) / 2;
  // Deep in the eye the shape overflows before its decay vanishes; the product is zero there.
  const pressureTerm = decay === 0 ? 0 : (B / airDensity) * shape * deficit * decay;
  return { v: Math.sqrt(pressureTerm + turning * turning) - turning, p: centralPressure + deficit * decay };
}

/** Greatest cyclostrophic wind √(B Δp/(ρe)), m/s. @param pressureDeficit Pa */
export function cyclostrophicMaximum(B: number, pressureDeficit: number, airDensity: number): number {
  requirePositive({ B, pressureDeficit, airDensity });
  return Math.sqrt((B * pressureDeficit) / (airDensity * Math.E));
}

/** Shape B = ρ e Vm²/Δp that gives a maximum wind (m/s) at a pressure deficit (Pa); held within 0.8…2.5. */
export function hollandB(maximumWind: number, pressureDeficit: number, airDensity: number): number {
  requirePositive({ maximumWind, pressureDeficit, airDensity });
  requireFinite({ maximumWind });
  return Math.min(2.5, Math.max(0.8, (airDensity * Math.E * maximumWind ** 2) / pressureDeficit));
}
