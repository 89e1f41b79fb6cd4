import { CHANNEL_NAMES, type SeriesReading } from "~/readers/reading";
import { CHANNELS } from "./channels";

export interface Difference {
  what: string;
  before: string;
  after: string;
}

/** What an answer changed: the facts of two readings of one file that are not the same. */
export function readingDifference(before: SeriesReading, after: SeriesReading): Difference[] {
  const was = facts(before);
  const is = facts(after);
  return [...new Set([...was.keys(), ...is.keys()])]
    .map((what) => ({ what, before: was.get(what) ?? "none", after: is.get(what) ?? "none" }))
    .filter((line) => line.before !== line.after);
}

function facts(reading: SeriesReading): Map<string, string> {
  const lines = new Map<string, string>([
    ["time zone", reading.zone],
    ["first stamp (UTC)", reading.first ?? "none"],
    ["last stamp (UTC)", reading.last ?? "none"],
    ["rows read", String(reading.rows)],
    ["rows dropped", String(reading.dropped.reduce((sum, { count }) => sum + count, 0))],
    ["height of the wind", reading.windHeight === null ? "not known" : `${reading.windHeight} m`],
    ["averaging of the wind", reading.averagingMinutes === null ? "not known" : `${reading.averagingMinutes} min`],
    ["problems", String(reading.problems.length)],
  ]);
  for (const channel of CHANNEL_NAMES) {
    const read = reading.channels[channel];
    if (!read) continue;
    const name = CHANNELS[channel].label;
    lines.set(`${name}: values`, String(read.count));
    lines.set(`${name}: missing`, String(read.missing));
    lines.set(`${name}: from`, read.fromColumns.join(", "));
    if (channel !== "windFrom") lines.set(`${name}: highest`, inUnit(read.max, read.unit));
    if (channel !== "windFrom") lines.set(`${name}: mean`, inUnit(read.mean, read.unit));
    if (read.total !== undefined) lines.set(`${name}: total`, inUnit(read.total, "mm"));
  }
  const mean = reading.windVectorMean;
  if (mean) {
    const from = mean.from === null ? "no direction" : `${Math.round(mean.from) % 360}°`;
    lines.set("vector mean of the wind", `${inUnit(mean.speed, "m/s")} from ${from}`);
  }
  return lines;
}

function inUnit(value: number | null, unit: string): string {
  return value === null ? "none" : `${Number(value.toPrecision(4))} ${unit}`;
}
