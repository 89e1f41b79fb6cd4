/**
 * Writes `files/invented-storm-buoy.txt`: an invented storm at an invented buoy in the archive form of agency buoy text,
 * with nines for what was not measured. The same bytes at every run: `npx tsx tests/factories/make-buoy-file.ts`.
 */
import { writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { sampleStormHours, type SampleHour } from "./sample-storm";

const HEADER = [
  "#YY  MM DD hh mm WDIR WSPD GST  WVHT   DPD   APD MWD   PRES  ATMP  WTMP  DEWP  VIS  TIDE",
  "#yr  mo dy hr mn degT m/s  m/s     m   sec   sec deg    hPa  degC  degC  degC  nmi    ft",
];

/** What was not measured: hours on which single instruments failed, and three hours without any record. */
const FAILED = {
  wind: [30, 31, 120],
  direction: [40],
  gust: [30, 31, 55, 120],
  pressure: [12, 100],
  dewPoint: range(90, 100),
  sea: [61],
};
const LOST_HOURS = [140, 141, 142];

function range(from: number, to: number): number[] {
  return Array.from({ length: to - from }, (_, index) => from + index);
}

function lineOf(hour: SampleHour, index: number): string {
  const date = new Date((hour.time + 50 * 60) * 1000);
  const two = (value: number): string => String(value).padStart(2, "0");
  const stamp = [
    date.getUTCFullYear(),
    two(date.getUTCMonth() + 1),
    two(date.getUTCDate()),
    two(date.getUTCHours()),
    two(date.getUTCMinutes()),
  ];
  const speed = FAILED.wind.includes(index) ? 99 : hour.windSpeed;
  const direction = FAILED.wind.includes(index) || FAILED.direction.includes(index) ? 999 : hour.windFrom;
  const cells = [
    stamp.join(" "),
    String(direction).padStart(3),
    speed.toFixed(1).padStart(4),
    (FAILED.gust.includes(index) ? 99 : hour.windGust).toFixed(1).padStart(4),
    "99.00 99.00 99.00 999",
    (FAILED.pressure.includes(index) ? 9999 : hour.airPressure).toFixed(1).padStart(6),
    hour.airTemperature.toFixed(1).padStart(5),
    (FAILED.sea.includes(index) ? 999 : hour.seaTemperature).toFixed(1).padStart(5),
    (FAILED.dewPoint.includes(index) ? 999 : hour.dewPoint).toFixed(1).padStart(5),
    "99.0 99.00",
  ];
  return cells.join(" ");
}

const lines = sampleStormHours().flatMap((hour, index) => (LOST_HOURS.includes(index) ? [] : [lineOf(hour, index)]));
writeFileSync(
  fileURLToPath(new URL("./files/invented-storm-buoy.txt", import.meta.url)),
  `${[...HEADER, ...lines].join("\n")}\n`,
);
