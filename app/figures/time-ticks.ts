import type { ClockTick, ZoneClock } from "~/units/format-time";

export interface TimeTick {
  /** Seconds since 1970-01-01T00:00:00Z. */
  seconds: number;
  /** `11-04` at midnight, `12h` between, `11-04 12h` where there is no midnight; months as `2026-11`. */
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
  if (hours !== undefined) return dated(clock.multiples(from, to, hours));
  const months = MONTH_STEPS.find((step) => step * HOURS_PER_MONTH >= wanted) ?? Math.ceil(wanted / 8766) * 12;
  return clock.monthStarts(from, to, months).map((tick) => named(tick, `${tick.year}-${two(tick.month)}`));
}

/** Within one day no midnight names the date: the first tick does. */
function dated(ticks: ClockTick[]): TimeTick[] {
  const undated = ticks.every((tick) => tick.hour !== 0);
  return ticks.map((tick, index) =>
    named(tick, undated && index === 0 ? `${dateLabel(tick)} ${two(tick.hour)}h` : dayLabel(tick)),
  );
}

function named(tick: ClockTick, label: string): TimeTick {
  return { seconds: tick.seconds, label, midnight: tick.hour === 0 };
}

function dayLabel(tick: ClockTick): string {
  return tick.hour === 0 ? dateLabel(tick) : `${two(tick.hour)}h`;
}

function dateLabel(tick: ClockTick): string {
  return `${two(tick.month)}-${two(tick.day)}`;
}

function two(value: number): string {
  return String(value).padStart(2, "0");
}
