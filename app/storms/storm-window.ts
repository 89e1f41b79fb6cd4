import { Temporal } from "temporal-polyfill";
import { formatTime, zoneClock } from "~/units/format-time";
import { firstNotBefore, type ChannelSeries } from "./channel-series";

/** Seconds since 1970-01-01T00:00:00Z. */
export interface StormWindow {
  startsAt: number;
  endsAt: number;
}

/** A storm's window; null until a record is confirmed. */
export function windowOf(storm: { startsAt: number | null; endsAt: number | null }): StormWindow | null {
  const { startsAt, endsAt } = storm;
  return startsAt === null || endsAt === null ? null : { startsAt, endsAt };
}

const DAY = 86_400;
/** A record no longer than this is taken whole. Common practice, no source: room for spin-up and for a second system. */
const WHOLE_RECORD_DAYS = 15;
/** Room before and after the strongest wind of a longer record, in days: the spin-up, and a few inertial periods after. */
const DAYS_BEFORE_PEAK = 3;
const DAYS_AFTER_PEAK = 2;

export const MINUTE = 60;
const floorToMinute = (seconds: number) => Math.floor(seconds / MINUTE) * MINUTE;
const ceilToMinute = (seconds: number) => Math.ceil(seconds / MINUTE) * MINUTE;

/** From the earliest to the latest sample, in whole minutes; null without any. */
export function extentOf(series: readonly Pick<ChannelSeries, "time">[]): StormWindow | null {
  const filled = series.filter(({ time }) => time.length > 0);
  if (filled.length === 0) return null;
  return {
    startsAt: floorToMinute(Math.min(...filled.map(({ time }) => time[0]))),
    endsAt: ceilToMinute(Math.max(...filled.map(({ time }) => time[time.length - 1]))),
  };
}

/**
 * What the window has to lie within: the wind where there is any, since nothing can be estimated without it,
 * else whatever the storm has.
 */
export function windowLimits(series: readonly ChannelSeries[]): StormWindow | null {
  const wind = series.filter(({ channel }) => channel === "windSpeed");
  return extentOf(wind.length > 0 ? wind : series);
}

/** The whole record, or where it is longer than 15 days the days around its strongest wind (without wind: its heaviest rain). */
export function proposeWindow(series: readonly ChannelSeries[]): StormWindow | null {
  const limits = windowLimits(series);
  if (!limits) return null;
  const leading =
    series.find(({ channel }) => channel === "windSpeed") ??
    series.find(({ channel }) => channel === "rain") ??
    series[0];
  const around = peakTime(leading);
  if (limits.endsAt - limits.startsAt <= WHOLE_RECORD_DAYS * DAY || around === null) return limits;
  return {
    startsAt: Math.max(limits.startsAt, floorToMinute(around - DAYS_BEFORE_PEAK * DAY)),
    endsAt: Math.min(limits.endsAt, ceilToMinute(around + DAYS_AFTER_PEAK * DAY)),
  };
}

/** A window that lies outside the data in part is cut to it; one that lies outside in full is none. */
export function fitWindow(window: StormWindow, limits: StormWindow): StormWindow | null {
  const startsAt = Math.max(window.startsAt, limits.startsAt);
  const endsAt = Math.min(window.endsAt, limits.endsAt);
  return startsAt < endsAt ? { startsAt, endsAt } : null;
}

export interface WindowProblem {
  field: "startsAt" | "endsAt";
  message: string;
}

/** Says what is wrong with a window, in the project's time zone; empty where nothing is. */
export function windowProblems({ startsAt, endsAt }: StormWindow, limits: StormWindow, zone: string): WindowProblem[] {
  if (startsAt >= endsAt) return [{ field: "endsAt", message: "The end must come after the start." }];
  const problems: WindowProblem[] = [];
  if (startsAt < limits.startsAt) {
    const message = `The wind record begins at ${formatTime(limits.startsAt, zone)}: start there or later.`;
    problems.push({ field: "startsAt", message });
  }
  if (endsAt > limits.endsAt) {
    const message = `The wind record ends at ${formatTime(limits.endsAt, zone)}: end there or earlier.`;
    problems.push({ field: "endsAt", message });
  }
  return problems;
}

/** Time of the greatest value. */
export function peakTime({ time, values }: Pick<ChannelSeries, "time" | "values">): number | null {
  let peak = -1;
  values.forEach((value, index) => {
    if (peak < 0 || value > values[peak]) peak = index;
  });
  return peak < 0 ? null : time[peak];
}

/** The samples inside the window, ends included. */
export function withinWindow<S extends Pick<ChannelSeries, "time" | "values">>(series: S, window: StormWindow): S {
  const from = firstNotBefore(series.time, window.startsAt);
  const to = firstNotBefore(series.time, window.endsAt + 1e-6);
  return { ...series, time: series.time.slice(from, to), values: series.values.slice(from, to) };
}

/** `2026-11-04 20:00` on the zone's wall clock: for fields, with the zone named beside it. */
export function wallClock(seconds: number, zone: string): string {
  return zoneClock(zone).dateTime(seconds);
}

export type ReadClock = { seconds: number } | { problem: string };

/** Reads a wall-clock time of the zone; an hour that the change of clocks repeats or leaves out is refused, not guessed. */
export function readWallClock(text: string, zone: string): ReadClock {
  let plain: Temporal.PlainDateTime;
  try {
    plain = Temporal.PlainDateTime.from(text.trim().replace(" ", "T"));
  } catch {
    return { problem: "Write a date and a time, such as 2026-11-04 20:00." };
  }
  try {
    return { seconds: plain.toZonedDateTime(zone, { disambiguation: "reject" }).epochMilliseconds / 1000 };
  } catch {
    return {
      problem: `The clocks change at this time in ${zone}, so ${plain.toString({ smallestUnit: "minute" }).replace("T", " ")} does not name one moment. Choose a time an hour earlier or later.`,
    };
  }
}
