import { requireFinite, requireNotNegative, requirePositive } from "../guards";
import { latentHeatOfVaporisation } from "./evaporation";
import { power } from "../power";

export interface RainHeatInput {
  /** mm/h */
  rainRateMmPerHour: number;
  /** °C */
  airTemperature: number;
  /** °C */
  seaTemperature: number;
  /** Specific humidity of the air and at the sea surface, kg/kg. */
  q: number;
  qsea: number;
  /** kg/m³ */
  airDensity: number;
  /** Cool-skin corrections of temperature (°C) and humidity (kg/kg). */
  coolSkin?: number;
  coolSkinHumidity?: number;
}

/** Constants of the COARE algorithm: gas constant and heat capacity of air, heat capacity of water, J/kg/K; 0 °C in K. */
const GAS = 287.1;
const AIR_HEAT = 1004.67;
const WATER_HEAT = 4000;
const KELVIN = 273.16;

/**
 * Heat that rain takes from the sea, arriving at the wet-bulb temperature.
 * @returns W/m², positive COOLS the sea
 * @throws OceanError INVALID_INPUT
 * @see Gosnell, Fairall & Webster (1995), Journal of Geophysical Research 100:18437-18442, as in the COARE algorithm
 */
export function rainHeatLoss(input: RainHeatInput): number {
  const {
    rainRateMmPerHour,
    airTemperature: ta,
    seaTemperature: ts,
    q,
    qsea,
    airDensity,
    coolSkin = 0,
    coolSkinHumidity = 0,
  } = input;
  requireNotNegative({ rainRateMmPerHour, q, qsea });
  requireFinite({ ta, ts, coolSkin, coolSkinHumidity });
  requirePositive({ airDensity });
  const Lv = latentHeatOfVaporisation(ts);
  const kelvin = ta + KELVIN;
  const vapourDiffusivity = 2.11e-5 * power(kelvin / KELVIN, 1.94);
  const heatDiffusivity = ((1 + 3.309e-3 * ta - 1.44e-6 * ta * ta) * 0.02411) / (airDensity * AIR_HEAT);
  const saturationSlope = (q * Lv) / (GAS * kelvin * kelvin);
  const wetBulbFactor = 1 / (1 + (0.622 * saturationSlope * Lv * vapourDiffusivity) / (AIR_HEAT * heatDiffusivity));
  const contrast = ts - ta - coolSkin + ((qsea - q - coolSkinHumidity) * Lv) / AIR_HEAT;
  return (rainRateMmPerHour / 3600) * wetBulbFactor * WATER_HEAT * contrast;
}
