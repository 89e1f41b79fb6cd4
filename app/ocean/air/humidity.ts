import { OceanError } from "../errors";
import { requireFinite, requireNotNegative } from "../guards";

export interface AirState {
  /** Density of moist air, kg/m³. */
  rho: number;
  /** Specific humidity, kg/kg. */
  q: number;
  /** Vapour pressure, hPa. */
  e: number;
  /** Specific humidity at the surface of seawater of the same temperature, kg/kg. */
  qsea: number;
}

/**
 * Saturation vapour pressure over fresh water.
 * @param t °C, -40…50 @param p air pressure, hPa
 * @returns hPa
 * @see Buck (1981), as used in the COARE algorithm
 */
export function saturationVapourPressure(t: number, p: number): number {
  return 6.1121 * Math.exp((17.502 * t) / (240.97 + t)) * (1.0007 + 3.46e-6 * p);
}

/** Specific humidity of air resting on seawater of temperature t (°C) at pressure p (hPa), kg/kg: 98 % of saturation. */
export function seaSurfaceHumidity(t: number, p: number): number {
  const e = 0.98 * saturationVapourPressure(t, p);
  return (0.622 * e) / (p - 0.378 * e);
}

/**
 * Humidity and density of moist air.
 * @param t air temperature, °C, -40…50
 * @param p air pressure, hPa, 850…1060
 * @param relativeHumidity %, 0…100 (readings up to 105 are taken as 100)
 * @throws OceanError INVALID_INPUT outside those ranges
 * @see Buck (1981); COARE algorithm
 */
export function airState(t: number, p: number, relativeHumidity: number): AirState {
  requireFinite({ t, p });
  requireNotNegative({ relativeHumidity });
  if (t < -40 || t > 50)
    throw new OceanError("INVALID_INPUT", `Air temperature must lie within -40…50 °C; it is ${t}.`);
  if (p < 850 || p > 1060)
    throw new OceanError("INVALID_INPUT", `Air pressure must lie within 850…1060 hPa; it is ${p}.`);
  if (relativeHumidity > 105)
    throw new OceanError("INVALID_INPUT", `Relative humidity must not exceed 100 %; it is ${relativeHumidity}.`);
  const e = (Math.min(100, relativeHumidity) / 100) * saturationVapourPressure(t, p);
  const q = (0.62197 * e) / (p - 0.378 * e);
  return { rho: (100 * p) / (287.1 * (t + 273.16) * (1 + 0.61 * q)), q, e, qsea: seaSurfaceHumidity(t, p) };
}
