import { isoFromSeconds } from "~/readers/stamp-text";
import { normalDegrees } from "~/readers/wind-vectors";

/** One hour of an invented storm at an invented station. */
export interface SampleHour {
  /** Seconds since 1970-01-01T00:00:00Z. */
  time: number;
  /** m/s */
  windSpeed: number;
  /** m/s */
  windGust: number;
  /** Degrees true, where the wind comes from. */
  windFrom: number;
  /** mm in the hour up to the stamp */
  rain: number;
  /** hPa */
  airPressure: number;
  /** °C */
  airTemperature: number;
  /** °C */
  dewPoint: number;
  /** °C */
  seaTemperature: number;
  /** W/m², incoming */
  shortwave: number;
}

const START = 1726012800;
export const SAMPLE_HOURS = 168;
const CLOSEST_HOUR = 84;
/** km an hour of the storm's way north; km by which it passes to the west; km from its centre to the strongest wind. */
const STORM = { advance: 18, offset: 60, radiusOfMaximum: 45, maximumWind: 31, deficit: 48 };
/** Degrees by which the wind turns across the isobars, inwards. */
const INFLOW = 20;

/**
 * Hours of an invented tropical storm that passes west of an invented station in the northern hemisphere: a vortex whose
 * wind rises linearly to its radius of maximum wind and falls with its square root outside, with rain around its centre,
 * a daily cycle before and after, and cooler water behind it. Numbers made for demonstration; the same at every call.
 */
export function sampleStormHours(): SampleHour[] {
  return Array.from({ length: SAMPLE_HOURS }, (_, hour) => sampleHour(hour));
}

function sampleHour(hour: number): SampleHour {
  const east = -STORM.offset;
  const north = (hour - CLOSEST_HOUR) * STORM.advance;
  const distance = Math.hypot(east, north);
  const bearing = normalDegrees((Math.atan2(east, north) * 180) / Math.PI);
  const nearness = Math.exp(-((distance / 420) ** 2));
  const profile =
    distance < STORM.radiusOfMaximum ? distance / STORM.radiusOfMaximum : Math.sqrt(STORM.radiusOfMaximum / distance);
  const storm = STORM.maximumWind * profile * nearness;
  const breeze = 4.5 + 1.5 * Math.sin((2 * Math.PI * (hour - 9)) / 24);
  const ripple = noise(hour);
  const windSpeed = Math.max(storm, breeze) + 0.8 * ripple;
  // Counter-clockwise around the centre: with the centre to the west the wind blows from the south-east quarter.
  const cyclonic = normalDegrees(bearing + 180 - 90 + 180 - INFLOW);
  const settled = 110 + 15 * Math.sin((2 * Math.PI * hour) / 24);
  const windFrom = storm > breeze ? cyclonic : settled;
  const daylight = Math.max(0, Math.sin((2 * Math.PI * ((hour % 24) - 11)) / 24));
  const shower = Math.exp(-((distance / 110) ** 2)) * (22 + 9 * noise(hour + 500)) + Math.max(0, nearness - 0.55) * 3;
  const cooled = 1.7 / (1 + Math.exp(-(hour - CLOSEST_HOUR) / 6));
  const airTemperature = 27.4 + 1.3 * daylight - 2.6 * nearness + 0.2 * ripple;
  return {
    time: START + hour * 3600,
    windSpeed: round(windSpeed, 1),
    windGust: round(windSpeed * (1.24 + 0.05 * noise(hour + 900)), 1),
    windFrom: Math.round(normalDegrees(windFrom + 6 * ripple)) % 360,
    rain: round(Math.max(0, shower), 1),
    airPressure: round(
      1013.4 - STORM.deficit * Math.exp(-distance / 150) + 0.9 * Math.cos((2 * Math.PI * (hour - 10)) / 12),
      1,
    ),
    airTemperature: round(airTemperature, 1),
    dewPoint: round(airTemperature - 3.4 + 2.3 * nearness, 1),
    seaTemperature: round(28.9 - cooled + 0.15 * daylight, 1),
    shortwave: Math.round(880 * daylight * (1 - 0.85 * nearness)),
  };
}

/** A fixed, rough number between −1 and 1 for each hour: sines that do not fall into step. */
function noise(hour: number): number {
  return (Math.sin(hour * 12.9898) + Math.sin(hour * 4.1414 + 1)) / 2;
}

function round(value: number, decimals: number): number {
  return Number(value.toFixed(decimals));
}

export interface SampleFile {
  fileName: string;
  text: string;
}

/** The invented storm as CSV with units in the header and times in UTC. */
export function sampleStormFile(): SampleFile {
  const header =
    "time (UTC),wind speed at 10 m (m/s),wind gust at 10 m (m/s),wind from (deg true),rain (mm),air pressure (hPa),air temperature (°C),dew point (°C),sea temperature (°C),shortwave (W/m²)";
  const lines = sampleStormHours().map((hour) =>
    [
      isoFromSeconds(hour.time),
      hour.windSpeed,
      hour.windGust,
      hour.windFrom,
      hour.rain,
      hour.airPressure,
      hour.airTemperature,
      hour.dewPoint,
      hour.seaTemperature,
      hour.shortwave,
    ].join(","),
  );
  return { fileName: "sample-storm.csv", text: `${[header, ...lines].join("\n")}\n` };
}
