import { requireSeawater } from "../guards";
import { LAPSE80 } from "./eos80-coefficients";
import { polynomial } from "./polynomial";

/**
 * Adiabatic lapse rate of seawater.
 * @param S Practical Salinity @param t68 °C (IPTS-68) @param p dbar
 * @returns °C/dbar
 * @throws OceanError INVALID_INPUT
 * @see Bryden (1973), Deep-Sea Research 20:401-408; Fofonoff & Millard (1983)
 */
export function adiabaticLapse80(S: number, t68: number, p: number): number {
  requireSeawater(S, t68, p);
  const at = (coefficients: readonly number[]) => polynomial(coefficients, t68);
  const ds = S - 35;
  return at(LAPSE80.a) + at(LAPSE80.b) * ds + (at(LAPSE80.c) + at(LAPSE80.d) * ds) * p + at(LAPSE80.e) * p * p;
}
