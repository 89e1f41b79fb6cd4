import { HEAT_CAPACITY } from "../constants";
import { OceanError } from "../errors";
import { requireSeawater } from "../guards";
import { potentialEnthalpy, potentialEnthalpySlope } from "./gibbs-polynomials";
import { SALINITY_SCALE } from "./specific-volume";

/**
 * Conservative Temperature from potential temperature: potential enthalpy over cp0.
 * @param SA Absolute Salinity, g/kg, 0…60
 * @param pt potential temperature referred to 0 dbar, °C
 * @returns Conservative Temperature, °C
 * @throws OceanError INVALID_INPUT
 * @see IOC, SCOR and IAPSO (2010), eq. 3.3.1
 */
export function conservativeFromPotential(SA: number, pt: number): number {
  requireSeawater(SA, pt, 0);
  return potentialEnthalpy(Math.sqrt(SALINITY_SCALE * SA), pt / 40) / HEAT_CAPACITY;
}

/**
 * Potential temperature from Conservative Temperature: Newton's method on `conservativeFromPotential`, to 1e-12 °C.
 * @param SA g/kg @param CT °C
 * @returns potential temperature referred to 0 dbar, °C
 * @throws OceanError INVALID_INPUT; NOT_CONVERGED far outside the ocean's range
 */
export function potentialFromConservative(SA: number, CT: number): number {
  requireSeawater(SA, CT, 0);
  const x = Math.sqrt(SALINITY_SCALE * SA);
  let pt = CT;
  for (let iteration = 0; iteration < 20; iteration++) {
    const miss = potentialEnthalpy(x, pt / 40) - CT * HEAT_CAPACITY;
    const correction = (40 * miss) / potentialEnthalpySlope(x, pt / 40);
    pt -= correction;
    if (Math.abs(correction) < 1e-12) return pt;
  }
  throw new OceanError("NOT_CONVERGED", `No potential temperature found for SA ${SA} g/kg and CT ${CT} °C.`);
}
