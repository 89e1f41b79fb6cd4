import type { ClockTick, ZoneClock } from "~/units/format-time";

export interface TimeTick {
  /** Seconds since 1970-01-01T00:00:00Z. */
  seconds: number;
  /** `11-04` at midnight, `12h` between; months as `2026-11`. */
  label: string;
  midnight: boolean;
}

const HOUR_STEPS = [1, 2, 3, 6, 12, 24, 48, 120, 240];
const MONTH_STEPS = [1, 2, 3, 6, 12, 24, 60, 120, 240, 600, 1200];
const HOURS_PER_MONTH = 730.5;

/** Round times of the zone's wall clock, at least about `spacing` px apart. */
export function timeTicks(from: number, to: number, width: number, clock: ZoneClock, spacing = 44): TimeTick[] {
  const wanted = (((to - from) / 3600) * spacing) / Math.max(1, width);
  const hours = HOUR_STEPS.find((step) => step >= wanted);
  if (hours !== undefined) return clock.multiples(from, to, hours).map((tick) => named(tick, dayLabel(tick)));
  const months = MONTH_STEPS.find((step) => step * HOURS_PER_MONTH >= wanted) ?? Math.ceil(wanted / 8766) * 12;
  return clock.monthStarts(from, to, months).map((tick) => named(tick, `${tick.year}-${two(tick.month)}`));
}

function named(tick: ClockTick, label: string): TimeTick {
  return { seconds: tick.seconds, label, midnight: tick.hour === 0 };
}

function dayLabel(tick: ClockTick): string {
  return tick.hour === 0 ? `${two(tick.month)}-${two(tick.day)}` : `${two(tick.hour)}h`;
}

function two(value: number): string {
  return String(value).padStart(2, "0");
}
