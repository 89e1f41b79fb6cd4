/**
 * Records of storms that never blew, at a station that is not there: shaped like real ones (a trough, a front that veers
 * the wind, gusts, showers, a few coded gaps) and the same every time.
 */
import { mulberry32, type Random } from "~/ocean/statistics/mulberry32";

export interface InventedStorm {
  /** ISO UTC of the first hour. */
  start: string;
  hours: number;
  peakHour: number;
  /** m/s */
  peakWind: number;
  calmWind: number;
  /** h, from the peak to where the wind has eased to 60 %. */
  width: number;
  /** degrees true, before and after the front. */
  windFromBefore: number;
  windFromAfter: number;
  /** mm/h at the height of the rain. */
  peakRain: number;
  /** hPa */
  lowestPressure: number;
  /** °C */
  seaTemperature: number;
  airTemperature: number;
  /** W/m² at noon under a clear sky. */
  noonSun: number;
  seed: number;
}

interface InventedHour {
  time: Date;
  windSpeed: number;
  windFrom: number;
  gust: number;
  rain: number;
  pressure: number;
  air: number;
  sea: number;
  netHeat: number;
}

/** Centred, of unit variance, close enough to normal: the sum of twelve uniform numbers. */
function noise(random: Random): number {
  let sum = -6;
  for (let i = 0; i < 12; i++) sum += random();
  return sum;
}

function bell(hour: number, centre: number, width: number): number {
  return Math.exp(-0.5 * ((hour - centre) / width) ** 2);
}

function hoursOf(storm: InventedStorm): InventedHour[] {
  const random = mulberry32(storm.seed);
  const start = Date.parse(storm.start);
  let drift = 0;
  return Array.from({ length: storm.hours }, (_, hour) => {
    // Gustiness remembers the hour before.
    drift = 0.7 * drift + 0.5 * noise(random);
    const strength = bell(hour, storm.peakHour, storm.width);
    const windSpeed = Math.max(0.3, storm.calmWind + (storm.peakWind - storm.calmWind) * strength + drift);
    const front = 1 / (1 + Math.exp(-(hour - storm.peakHour - 2) / 3));
    const turn = storm.windFromBefore + (storm.windFromAfter - storm.windFromBefore) * front;
    const rainShape = bell(hour, storm.peakHour - 4, storm.width * 0.6);
    const shower = random() < 0.3 + 0.6 * rainShape ? 0.6 + 0.8 * random() : 0;
    const dayHour = (hour + new Date(start).getUTCHours()) % 24;
    const sun = Math.max(0, Math.sin((Math.PI * (dayHour - 6)) / 12)) * storm.noonSun * (1 - 0.8 * strength);
    const air = storm.airTemperature + 1.5 * Math.sin((Math.PI * (dayHour - 9)) / 12) - 2.5 * front;
    return {
      time: new Date(start + hour * 3_600_000),
      windSpeed,
      windFrom: (((turn + 4 * noise(random)) % 360) + 360) % 360,
      gust: windSpeed * (1.28 + 0.05 * random()),
      rain: rainShape * storm.peakRain * shower,
      pressure:
        1014 - (1014 - storm.lowestPressure) * bell(hour, storm.peakHour - 3, storm.width * 1.2) + 0.2 * noise(random),
      air,
      sea: storm.seaTemperature - 0.4 * (1 / (1 + Math.exp(-(hour - storm.peakHour) / 8))),
      netHeat: sun - 55 - 9 * windSpeed * Math.max(0.2, (storm.seaTemperature - air) / 4),
    };
  });
}

const HEADER = [
  "#YY  MM DD hh mm WDIR WSPD GST  WVHT   DPD   APD MWD   PRES  ATMP  WTMP  DEWP  VIS  TIDE",
  "#yr  mo dy hr mn degT m/s  m/s     m   sec   sec deg    hPa  degC  degC  degC  nmi    ft",
];

/** Wind in the archive form of agency buoy text, with that form's codes where an instrument was silent. */
export function buoyText(storm: InventedStorm): string {
  const random = mulberry32(storm.seed + 1);
  const lines = hoursOf(storm).map((hour) => {
    const stamp = hour.time.toISOString();
    const [date, clock] = [stamp.slice(0, 10).split("-").join(" "), stamp.slice(11, 16).split(":").join(" ")];
    const silent = random() < 0.015;
    const cells = [
      silent ? "999" : String(Math.round(hour.windFrom) % 360).padStart(3),
      silent ? "99.0" : hour.windSpeed.toFixed(1).padStart(4),
      silent ? "99.0" : hour.gust.toFixed(1).padStart(4),
      "99.00 99.00 99.00 999",
      hour.pressure.toFixed(1).padStart(6),
      hour.air.toFixed(1).padStart(5),
      hour.sea.toFixed(1).padStart(5),
      "999.0 99.0 99.00",
    ];
    return `${date} ${clock} ${cells.join(" ")}`;
  });
  return [...HEADER, ...lines, ""].join("\n");
}

/** Rain by the hour, as a gauge's logger exports it. */
export function gaugeCsv(storm: InventedStorm): string {
  const lines = hoursOf(storm).map(({ time, rain }) => `${time.toISOString()},${rain.toFixed(1)}`);
  return ["Time (UTC),Rain (mm)", ...lines, ""].join("\r\n");
}

/** Net surface heat by the hour, positive into the sea. */
export function heatCsv(storm: InventedStorm): string {
  const lines = hoursOf(storm).map(({ time, netHeat }) => `${time.toISOString()},${netHeat.toFixed(0)}`);
  return ["Time (UTC),Net heat into the sea (W/m2)", ...lines, ""].join("\r\n");
}
