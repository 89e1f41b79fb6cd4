import { GAP_STEPS } from "~/quality/gap-rule";
import { medianStep } from "./channel-series";
import type { StormWindow } from "./storm-window";

/** From when to when a sample stands for the wind or the sea, in seconds since 1970-01-01T00:00:00Z. */
export interface Stretch {
  from: number;
  to: number;
}

/** A sample alone stands for an hour. */
const ALONE = 3600;

/**
 * What each sample stands for: half-way to its neighbours, half a usual step towards a gap or an end, within the window.
 * So nobody stands for the middle of a gap.
 */
export function stretchesStoodFor(time: Float64Array, window: StormWindow): Stretch[] {
  const step = medianStep(time) ?? ALONE;
  const reach = (pause: number | undefined) => (pause === undefined || pause > GAP_STEPS * step ? step / 2 : pause / 2);
  return Array.from(time, (at, index) => ({
    from: Math.max(window.startsAt, at - reach(index === 0 ? undefined : at - time[index - 1])),
    to: Math.min(window.endsAt, at + reach(index + 1 === time.length ? undefined : time[index + 1] - at)),
  }));
}
