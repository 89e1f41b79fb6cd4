import { Temporal } from "temporal-polyfill";

/** ISO 8601 text, seconds since 1970-01-01T00:00:00Z, or a Date. */
export type Moment = string | number | Date;

/** Seconds since 1970-01-01T00:00:00Z; NaN where the text is no time. Numbers are taken as such seconds. */
export function epochSeconds(moment: Moment): number {
  if (typeof moment === "number") return moment;
  return (typeof moment === "string" ? Date.parse(moment) : moment.getTime()) / 1000;
}

/** A wall clock in an IANA zone, or `UTC`, or a fixed offset as `+05:30`. */
export interface ZoneClock {
  /** As it is named beside every time. */
  zone: string;
  /** `2026-11-04` */
  date(seconds: number): string;
  /** `2026-11-04 20:00`: only where the zone is named beside it. */
  dateTime(seconds: number): string;
  /** `2026-11-04T20:00:00+00:00`: unambiguous by itself, for tables and files. */
  iso(seconds: number): string;
  /** Times between two moments at which the wall clock shows whole multiples of `hours` (a divisor or multiple of 24). */
  multiples(from: number, to: number, hours: number): ClockTick[];
  /** First midnights of every so many months, counted from January of the year 0, between two moments. */
  monthStarts(from: number, to: number, months: number): ClockTick[];
}

export interface ClockTick {
  /** Seconds since 1970-01-01T00:00:00Z. */
  seconds: number;
  year: number;
  month: number;
  day: number;
  hour: number;
}

/** @throws RangeError for a zone that is not known. */
export function zoneClock(zone: string): ZoneClock {
  const at = (seconds: number) =>
    Temporal.Instant.fromEpochMilliseconds(Math.round(seconds * 1000)).toZonedDateTimeISO(zone);
  const offset = offsets(at);
  const wall = (seconds: number) => new Date((seconds + offset(seconds)) * 1000).toISOString();
  return {
    zone: at(0).timeZoneId,
    date: (seconds) => wall(seconds).slice(0, -14),
    dateTime: (seconds) =>
      wall(Math.round(seconds / 60) * 60)
        .slice(0, -8)
        .replace("T", " "),
    iso(seconds) {
      const whole = Math.round(seconds);
      return wall(whole).slice(0, -5) + (zone === "UTC" ? "Z" : offsetText(offset(whole)));
    },
    multiples: (from, to, hours) =>
      hours >= 24 ? dayMultiples(at(from), to, hours / 24) : hourMultiples(offset, from, to, hours),
    monthStarts: (from, to, months) => monthStarts(at(from), to, months),
  };
}

/** Seconds that the wall clock is ahead of UTC. Kept from one change of the clock to the next: tables are long. */
function offsets(at: (seconds: number) => Temporal.ZonedDateTime): (seconds: number) => number {
  let [from, until, offset] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY, 0];
  return (seconds) => {
    if (seconds >= from && seconds < until) return offset;
    const time = at(seconds);
    // A change at this very moment counts as past.
    const previous = time.add({ nanoseconds: 1 }).getTimeZoneTransition("previous");
    const next = time.getTimeZoneTransition("next");
    from = previous === null ? Number.NEGATIVE_INFINITY : previous.epochMilliseconds / 1000;
    until = next === null ? Number.POSITIVE_INFINITY : next.epochMilliseconds / 1000;
    offset = time.offsetNanoseconds / 1e9;
    return offset;
  };
}

function offsetText(seconds: number): string {
  const minutes = Math.round(Math.abs(seconds) / 60);
  const two = (value: number) => String(value).padStart(2, "0");
  return `${seconds < 0 ? "-" : "+"}${two(Math.floor(minutes / 60))}:${two(minutes % 60)}`;
}

function monthStarts(start: Temporal.ZonedDateTime, to: number, months: number): ClockTick[] {
  const from = start.epochMilliseconds / 1000;
  const ticks: ClockTick[] = [];
  let first = start.with({ day: 1 }).startOfDay();
  first = first.subtract({ months: (first.year * 12 + first.month - 1) % months }).startOfDay();
  while (first.epochMilliseconds / 1000 <= to) {
    if (first.epochMilliseconds / 1000 >= from) ticks.push(tickOf(first));
    first = first.add({ months }).startOfDay();
  }
  return ticks;
}

/** Days are counted from the first midnight on or before the start, so that steps of several days begin with it. */
function dayMultiples(start: Temporal.ZonedDateTime, to: number, days: number): ClockTick[] {
  const from = start.epochMilliseconds / 1000;
  const ticks: ClockTick[] = [];
  let midnight = start.startOfDay();
  if (midnight.epochMilliseconds / 1000 < from) midnight = midnight.add({ days: 1 }).startOfDay();
  while (midnight.epochMilliseconds / 1000 <= to) {
    ticks.push(tickOf(midnight));
    midnight = midnight.add({ days }).startOfDay();
  }
  return ticks;
}

function hourMultiples(offset: (seconds: number) => number, from: number, to: number, hours: number): ClockTick[] {
  const ticks: ClockTick[] = [];
  // A quarter of an hour is the finest offset in use, so every full hour of any zone is met.
  for (let seconds = Math.ceil(from / 900) * 900; seconds <= to; seconds += 900) {
    const wall = seconds + offset(seconds);
    if (wall % (hours * 3600) !== 0) continue;
    const time = new Date(wall * 1000);
    const [year, month, day] = [time.getUTCFullYear(), time.getUTCMonth() + 1, time.getUTCDate()];
    ticks.push({ seconds, year, month, day, hour: time.getUTCHours() });
  }
  return ticks;
}

function tickOf(time: Temporal.ZonedDateTime): ClockTick {
  return {
    seconds: time.epochMilliseconds / 1000,
    year: time.year,
    month: time.month,
    day: time.day,
    hour: time.hour,
  };
}

/** `2026-11-04 20:00 UTC`: ISO date, 24-hour clock, always with the zone's name; `no time` where there is none. */
export function formatTime(moment: Moment | null | undefined, zone: string): string {
  if (moment === null || moment === undefined) return "no time";
  const seconds = epochSeconds(moment);
  if (!isTime(seconds)) return "no time";
  const clock = zoneClock(zone);
  return `${clock.dateTime(seconds)} ${clock.zone}`;
}

/** `2026-11-04 UTC`: the day a moment falls on in the zone. */
export function formatDate(moment: Moment | null | undefined, zone: string): string {
  if (moment === null || moment === undefined) return "no date";
  const seconds = epochSeconds(moment);
  if (!isTime(seconds)) return "no date";
  const clock = zoneClock(zone);
  return `${clock.date(seconds)} ${clock.zone}`;
}

/** `2026-11-03 00:00 to 2026-11-08 00:00 UTC` */
export function formatPeriod(from: Moment, to: Moment, zone: string): string {
  const clock = zoneClock(zone);
  const [start, end] = [epochSeconds(from), epochSeconds(to)];
  if (!isTime(start) || !isTime(end)) return "no time";
  return `${clock.dateTime(start)} to ${clock.dateTime(end)} ${clock.zone}`;
}

/** Within the years that a calendar can hold. */
function isTime(seconds: number): boolean {
  return Math.abs(seconds) < 8.64e12;
}
