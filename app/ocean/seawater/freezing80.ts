import { requireSeawater } from "../guards";

/**
 * Freezing point of seawater by the 1980 formula.
 * @param S Practical Salinity, 4…40 @param p dbar, 0…500
 * @returns °C (IPTS-68)
 * @throws OceanError INVALID_INPUT
 * @see Fofonoff & Millard (1983)
 */
export function freezing80(S: number, p: number): number {
  requireSeawater(S, 0, p);
  return (-0.0575 + 1.710523e-3 * Math.sqrt(S) - 2.154996e-4 * S) * S - 7.53e-4 * p;
}
