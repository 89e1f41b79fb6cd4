import type { Position } from "~/ocean/scenario";
import { offsetPosition } from "./offset-position";

export interface DriftTrack {
  name: string;
  /** Longitudes continue across ±180, so that the line stays one. */
  line: Position[];
  dayMarks: { position: Position; label: string }[];
}

const DAY = 86_400;

/**
 * The path that water starting in one place takes by a series of displacements, with a mark at every full day.
 * @param start [longitude, latitude] in degrees
 * @param seconds times, s from any origin, increasing
 * @param east displacement since the start, m, as long as `seconds`
 * @param north displacement since the start, m, as long as `seconds`
 */
export function driftTrack(
  name: string,
  start: Position,
  seconds: readonly number[],
  east: readonly number[],
  north: readonly number[],
): DriftTrack {
  const line = seconds.map((_, i) => offsetPosition(start[0], start[1], east[i], north[i]));
  const dayMarks: DriftTrack["dayMarks"] = [];
  for (let i = 1; i < seconds.length; i++) {
    const before = Math.floor((seconds[i - 1] - seconds[0]) / DAY);
    const now = Math.floor((seconds[i] - seconds[0]) / DAY);
    for (let day = before + 1; day <= now; day++) {
      const share = (seconds[0] + day * DAY - seconds[i - 1]) / (seconds[i] - seconds[i - 1]);
      const at = (series: readonly number[]) => series[i - 1] + share * (series[i] - series[i - 1]);
      dayMarks.push({ position: offsetPosition(start[0], start[1], at(east), at(north)), label: `${day} d` });
    }
  }
  return { name, line, dayMarks };
}
