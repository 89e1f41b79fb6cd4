import { zoneClock, type ZoneClock } from "~/units/format-time";
import { figureWidth, type FigureContext } from "./figure-context";
import { timeTicks, type TimeTick } from "./time-ticks";

/** What all panels of one figure through time share. */
export interface TimeFrame {
  context: FigureContext;
  clock: ZoneClock;
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  domain: [from: number, to: number];
  ticks: TimeTick[];
  width: number;
  marginLeft: number;
  marginRight: number;
}

/** A single sample is given an hour to either side. */
export function timeFrame(time: ArrayLike<number>, context: FigureContext): TimeFrame {
  const clock = zoneClock(context.zone);
  const width = figureWidth(context);
  const [marginLeft, marginRight] = [46, 18];
  const first = time[0] ?? 0;
  const last = time[time.length - 1] ?? 0;
  const domain: [number, number] = first < last ? [first, last] : [first - 3600, first + 3600];
  const ticks = timeTicks(...domain, width - marginLeft - marginRight, clock);
  return { context, clock, time, domain, ticks, width, marginLeft, marginRight };
}

/** px from the left edge of the figure. */
export function timePosition(seconds: number, frame: TimeFrame): number {
  const [from, to] = frame.domain;
  return frame.marginLeft + ((seconds - from) / (to - from)) * (frame.width - frame.marginLeft - frame.marginRight);
}

/** Seconds at a position in px from the left edge of the figure. */
export function timeAt(position: number, frame: TimeFrame): number {
  const [from, to] = frame.domain;
  return from + ((position - frame.marginLeft) / (frame.width - frame.marginLeft - frame.marginRight)) * (to - from);
}
