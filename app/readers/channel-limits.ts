import type { ChannelName } from "./reading";

export interface ChannelLimits {
  low: number;
  high: number;
  /** Whether a value beyond is an error of its row, or only worth a look. */
  beyond: "error" | "warning";
  /** What is wrong with a value beyond, as a phrase after the value. */
  because: string;
}

const RECORDS = "outside anything measured; check the unit";

/**
 * What a column could hold as a measurement, in the channel's unit: wide enough for every record on Earth. Used to tell
 * missing codes from values and to stop what no instrument measured. Source: WMO archive of weather extremes (gust
 * 113 m/s, air −89 and 57 °C, pressure 870 and 1084 hPa, rain 38 mm in 1 minute), from memory, with room to spare.
 */
export const CHANNEL_LIMITS: Readonly<Record<ChannelName, ChannelLimits>> = {
  windSpeed: { low: 0, high: 120, beyond: "error", because: "outside 0 to 120 m/s, more than any wind measured" },
  windGust: { low: 0, high: 120, beyond: "error", because: "outside 0 to 120 m/s, more than any gust measured" },
  windFrom: { low: 0, high: 360, beyond: "error", because: "outside 0 to 360°" },
  rain: { low: 0, high: 2400, beyond: "error", because: "no possible rain" },
  evaporation: { low: -10, high: 50, beyond: "warning", because: RECORDS },
  airTemperature: { low: -95, high: 65, beyond: "warning", because: RECORDS },
  dewPoint: { low: -110, high: 50, beyond: "warning", because: RECORDS },
  seaTemperature: { low: -5, high: 50, beyond: "warning", because: RECORDS },
  airPressure: { low: 500, high: 1100, beyond: "warning", because: RECORDS },
  relativeHumidity: { low: 0, high: 115, beyond: "warning", because: RECORDS },
  shortwave: { low: -100, high: 1800, beyond: "warning", because: RECORDS },
  longwave: { low: -800, high: 900, beyond: "warning", because: RECORDS },
  sensible: { low: -3000, high: 3000, beyond: "warning", because: RECORDS },
  latent: { low: -3000, high: 3000, beyond: "warning", because: RECORDS },
  netHeat: { low: -5000, high: 3000, beyond: "warning", because: RECORDS },
};
