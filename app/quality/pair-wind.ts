import { firstNotBefore } from "~/storms/channel-series";
import type { Samples } from "./samples";

/** Wind at the times that have both a speed and a direction. */
export interface PairedWind {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: number[];
  /** m/s */
  speed: number[];
  /** degrees true, where the wind comes from */
  from: number[];
  /** m/s, towards the east. */
  east: number[];
  /** m/s, towards the north. */
  north: number[];
}

const RADIANS = Math.PI / 180;

/**
 * Samples that have both speed and direction; a calm needs no direction.
 * @param speed m/s
 * @param from degrees true, where the wind comes from
 */
export function pairWind(speed: Samples, from: Samples): PairedWind {
  const wind: PairedWind = { time: [], speed: [], from: [], east: [], north: [] };
  for (let index = 0; index < speed.time.length; index++) {
    const moment = speed.time[index];
    const at = firstNotBefore(from.time, moment);
    const bearing = from.time[at] === moment ? from.values[at] : speed.values[index] === 0 ? 0 : Number.NaN;
    if (Number.isNaN(bearing) || Number.isNaN(speed.values[index])) continue;
    wind.time.push(moment);
    wind.speed.push(speed.values[index]);
    wind.from.push(bearing);
    wind.east.push(-speed.values[index] * Math.sin(bearing * RADIANS));
    wind.north.push(-speed.values[index] * Math.cos(bearing * RADIANS));
  }
  return wind;
}
