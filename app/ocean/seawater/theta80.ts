import { requireSeawater } from "../guards";
import { adiabaticLapse80 } from "./adiabatic-lapse80";

/**
 * Potential temperature by a fourth-order Runge–Kutta integration of the adiabatic lapse rate.
 * @param S Practical Salinity @param t68 °C (IPTS-68) @param p dbar @param reference pressure, dbar
 * @returns °C (IPTS-68)
 * @throws OceanError INVALID_INPUT
 * @see Fofonoff & Millard (1983)
 */
export function theta80(S: number, t68: number, p: number, reference: number): number {
  requireSeawater(S, t68, p);
  requireSeawater(S, t68, reference);
  const step = reference - p;
  let pressure = p;
  let t = t68;
  let slope = step * adiabaticLapse80(S, t, pressure);
  t += 0.5 * slope;
  let q = slope;
  pressure += 0.5 * step;
  slope = step * adiabaticLapse80(S, t, pressure);
  t += (1 - Math.SQRT1_2) * (slope - q);
  q = (2 - Math.SQRT2) * slope + (-2 + 3 * Math.SQRT1_2) * q;
  slope = step * adiabaticLapse80(S, t, pressure);
  t += (1 + Math.SQRT1_2) * (slope - q);
  q = (2 + Math.SQRT2) * slope + (-2 - 3 * Math.SQRT1_2) * q;
  pressure += 0.5 * step;
  slope = step * adiabaticLapse80(S, t, pressure);
  return t + (slope - 2 * q) / 6;
}
