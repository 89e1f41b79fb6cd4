import type { ClockTick, ZoneClock } from "~/units/format-time";

export interface TimeTick {
  /** Seconds since 1970-01-01T00:00:00Z. */
  seconds: number;
  /** `11-04` at midnight, `12h` between; months as `2026-11` over years. */
  label: string;
  midnight: boolean;
}

const HOUR_STEPS = [1, 2, 3, 6, 12, 24, 48, 120, 240, 720, 1440, 4380, 8760];

/** Round times of the zone's wall clock, at least `spacing` px apart. */
export function timeTicks(from: number, to: number, width: number, clock: ZoneClock, spacing = 44): TimeTick[] {
  const hours = (to - from) / 3600;
  const wanted = (hours * spacing) / Math.max(1, width);
  const step = HOUR_STEPS.find((candidate) => candidate >= wanted) ?? Math.ceil(wanted / 8760) * 8760;
  return clock.multiples(from, to, step).map((tick) => ({
    seconds: tick.seconds,
    label: tickLabel(tick, step),
    midnight: tick.hour === 0,
  }));
}

function tickLabel(tick: ClockTick, step: number): string {
  const two = (value: number) => String(value).padStart(2, "0");
  if (tick.hour !== 0) return `${two(tick.hour)}h`;
  return step >= 720 ? `${tick.year}-${two(tick.month)}` : `${two(tick.month)}-${two(tick.day)}`;
}
