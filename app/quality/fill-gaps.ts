import { medianStep } from "~/storms/channel-series";
import { GAP_STEPS } from "./gap-rule";
import type { Samples } from "./samples";

export interface Gap {
  /** The samples on either side, seconds since 1970-01-01T00:00:00Z. */
  from: number;
  to: number;
  /** How many samples of the usual step are missing between them. */
  missing: number;
}

export interface FilledSeries {
  time: Float64Array;
  /** NaN where missing. */
  values: Float64Array;
  gaps: Gap[];
  /** s, the middle one of all steps; null for fewer than two samples. */
  step: number | null;
}

/** A record that rests for years shall not fill the memory with what is not there. */
const MOST_FILLED = 100_000;

/**
 * Puts a missing sample wherever a pause is longer than 1.5 usual steps: as many as the usual step has room for, evenly. Pauses
 * of more than 100 000 steps get one.
 * @param samples ascending
 */
export function fillGaps({ time, values }: Samples): FilledSeries {
  const step = medianStep(time);
  const gaps: Gap[] = [];
  const [filledTime, filledValues]: number[][] = [[], []];
  for (let k = 0; k < time.length; k++) {
    const pause = k === 0 ? 0 : time[k] - time[k - 1];
    if (step !== null && pause > GAP_STEPS * step) {
      const missing = Math.round(pause / step) - 1;
      gaps.push({ from: time[k - 1], to: time[k], missing });
      const filled = missing > MOST_FILLED ? 1 : missing;
      for (let j = 1; j <= filled; j++) {
        filledTime.push(time[k - 1] + (j * pause) / (filled + 1));
        filledValues.push(Number.NaN);
      }
    }
    filledTime.push(time[k]);
    filledValues.push(values[k]);
  }
  return { time: Float64Array.from(filledTime), values: Float64Array.from(filledValues), gaps, step };
}
