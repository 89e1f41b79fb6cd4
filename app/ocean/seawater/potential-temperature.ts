import { CELSIUS_ZERO, HEAT_CAPACITY, STANDARD_SALINITY } from "../constants";
import { OceanError } from "../errors";
import { requireSeawater } from "../guards";
import { conservativeFromPotential, potentialFromConservative } from "./conservative-temperature";
import { entropyPart, entropyPartAtSurface, gibbsCurvatureAtSurface } from "./gibbs-polynomials";
import { SALINITY_SCALE } from "./specific-volume";

/**
 * Potential temperature referred to the surface, from in-situ temperature: two modified Newton steps on entropy.
 * @param SA Absolute Salinity, g/kg, 0…60
 * @param t in-situ temperature (ITS-90), °C
 * @param p sea pressure, dbar
 * @returns potential temperature, °C
 * @throws OceanError INVALID_INPUT
 * @see IOC, SCOR and IAPSO (2010); McDougall & Wotherspoon (2014) for the modified Newton step
 */
export function potentialFromInSitu(SA: number, t: number, p: number): number {
  requireSeawater(SA, t, p);
  if (p === 0) return t;
  const x = Math.sqrt(SALINITY_SCALE * SA);
  const target = entropyPart(x, t / 40, p / 1e4);
  const entropyMiss = (pt: number) => entropyPartAtSurface(x, pt / 40) - target;

  let pt = firstGuess(SA, t, p);
  let slope = HEAT_CAPACITY / ((CELSIUS_ZERO + pt) * (1 - 0.05 * (1 - SA / STANDARD_SALINITY)));
  for (let iteration = 0; iteration < 2; iteration++) {
    const old = pt;
    const miss = entropyMiss(old);
    pt = old - miss / slope;
    slope = -gibbsCurvatureAtSurface(x, (pt + old) / 80);
    pt = old - miss / slope;
  }
  return pt;
}

function firstGuess(SA: number, t: number, p: number): number {
  const s = (SA * 35) / STANDARD_SALINITY;
  const ofPressure = 8.65483913395442e-6 - s * 1.41636299744881e-6 - p * 7.38286467135737e-9;
  const ofTemperature =
    -8.38241357039698e-6 + s * 2.83933368585534e-8 + t * 1.77803965218656e-8 + p * 1.71155619208233e-10;
  return t + p * (ofPressure + t * ofTemperature);
}

/**
 * In-situ temperature from potential temperature: the inverse of `potentialFromInSitu`, to 1e-11 °C.
 * @param SA g/kg @param pt °C @param p dbar
 * @returns in-situ temperature (ITS-90), °C
 * @throws OceanError INVALID_INPUT; NOT_CONVERGED far outside the ocean's range
 */
export function inSituFromPotential(SA: number, pt: number, p: number): number {
  let t = pt;
  for (let iteration = 0; iteration < 30; iteration++) {
    const miss = potentialFromInSitu(SA, t, p) - pt;
    t -= miss;
    if (Math.abs(miss) < 1e-11) return t;
  }
  throw new OceanError("NOT_CONVERGED", `No in-situ temperature found for SA ${SA} g/kg, ${pt} °C at ${p} dbar.`);
}

/** Conservative from in-situ temperature, °C. Arguments and errors as `potentialFromInSitu`. */
export function conservativeFromInSitu(SA: number, t: number, p: number): number {
  return conservativeFromPotential(SA, potentialFromInSitu(SA, t, p));
}

/** In-situ from Conservative Temperature, °C. Arguments and errors as `inSituFromPotential`. */
export function inSituFromConservative(SA: number, CT: number, p: number): number {
  return inSituFromPotential(SA, potentialFromConservative(SA, CT), p);
}
