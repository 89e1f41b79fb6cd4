import { STANDARD_SALINITY } from "../constants";
import { requireSeawater } from "../guards";
import { DISSOLVED_AIR, FREEZING } from "./freezing-coefficients";

/**
 * Conservative Temperature at which seawater freezes.
 * @param SA Absolute Salinity, g/kg, 0…60 (fitted to 42)
 * @param p sea pressure, dbar
 * @param saturation share of dissolved air, 0…1; 1 for surface water
 * @returns °C
 * @throws OceanError INVALID_INPUT
 * @see IOC, SCOR and IAPSO (2010), section 3.33; polynomial of the GSW toolbox
 */
export function freezingTemperature(SA: number, p: number, saturation = 1): number {
  requireSeawater(SA, 0, p);
  const c = FREEZING;
  const r = SA / 100;
  const x = Math.sqrt(r);
  const P = p / 1e4;
  const ofSalinity = r * (c[1] + x * (c[2] + x * (c[3] + x * (c[4] + x * (c[5] + c[6] * x)))));
  const ofPressure = P * (c[7] + P * (c[8] + c[9] * P));
  const even = P * (c[12] + P * (c[15] + c[21] * r)) + r * (c[13] + c[17] * P + c[19] * r);
  const odd = x * (c[11] + P * (c[14] + c[18] * P) + r * (c[16] + c[20] * P + c[22] * r));
  const ofBoth = r * P * (c[10] + even + odd);
  const ofAir = saturation * 1e-3 * (2.4 - DISSOLVED_AIR.a * SA) * (1 + DISSOLVED_AIR.b * (1 - SA / STANDARD_SALINITY));
  return c[0] + ofSalinity + ofPressure + ofBoth - ofAir;
}
