import { airState } from "../air/humidity";
import { MM_PER_HOUR } from "../constants";
import { rainHeatLoss } from "./rain-heat";

/** Air over the sea where the storm brings no record of it: cooler than the sea by this, °C, at this humidity, %, and pressure, hPa. Common practice, no source. */
const AIR_COOLER_BY = 1.5;
const HUMIDITY = 90;
const PRESSURE = 1010;

/**
 * Heat that rain takes from the sea under assumed air, W/m², positive cools.
 * @param rain m/s @param seaTemperature °C
 */
export function assumedRainHeatLoss(rain: number, seaTemperature: number): number {
  const air = airState(seaTemperature - AIR_COOLER_BY, PRESSURE, HUMIDITY);
  const sea = airState(seaTemperature, PRESSURE, HUMIDITY);
  return rainHeatLoss({
    rainRateMmPerHour: rain / MM_PER_HOUR,
    airTemperature: seaTemperature - AIR_COOLER_BY,
    seaTemperature,
    q: air.q,
    qsea: sea.qsea,
    airDensity: air.rho,
  });
}
