import { MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";

export interface RateLimits {
  /** Standard deviations of the steps before that a step may have. */
  deviations: number;
  /** How far back those steps are looked for, h. */
  hours: number;
  /** Least standard deviation, in the channel's unit, so that a quiet spell does not flag its end. */
  least: number;
}

const HOUR = 3600;
/** With fewer steps their spread says nothing. */
const FEWEST_STEPS = 8;
/** Times that were added up may miss an hour by rounding, s. */
const ROUNDING = 1e-3;

/** Sample standard deviation of the numbers from `start` to before `end`. */
function sampleDeviation(numbers: Float64Array, start: number, end: number): number {
  let mean = 0;
  for (let k = start; k < end; k++) mean += numbers[k] / (end - start);
  let squares = 0;
  for (let k = start; k < end; k++) squares += (numbers[k] - mean) ** 2;
  return Math.sqrt(squares / (end - start - 1));
}

/**
 * The spread that each step is judged by: the standard deviation of the steps that ended within `hours` before it.
 * @param time seconds, ascending
 * @param values NaN where missing; a step needs a value at both its ends
 * @returns NaN where fewer than 8 steps are there
 */
export function spreadBefore(time: ArrayLike<number>, values: ArrayLike<number>, hours: number): Float64Array {
  const spread = new Float64Array(values.length).fill(Number.NaN);
  const [endedAt, size] = [new Float64Array(values.length), new Float64Array(values.length)];
  let [first, count] = [0, 0];
  for (let k = 1; k < values.length; k++) {
    while (first < count && endedAt[first] < time[k] - hours * HOUR - ROUNDING) first++;
    if (count - first >= FEWEST_STEPS) spread[k] = sampleDeviation(size, first, count);
    const step = values[k] - values[k - 1];
    if (Number.isNaN(step)) continue;
    endedAt[count] = time[k];
    size[count++] = step;
  }
  return spread;
}

/**
 * Rate of change: a step larger than so many standard deviations of the steps before it is suspect, never bad. Not evaluated
 * after a missing value, and before 8 steps are known.
 * @param time seconds, ascending
 * @param values NaN where missing
 * @returns 1, 2, 3 or 9 for each value
 * Source: QARTOD wind manual, test 7; floor of the deviation and least count of steps: common practice, no source.
 */
export function rateOfChange(time: ArrayLike<number>, values: ArrayLike<number>, limits: RateLimits): Flags {
  const spread = spreadBefore(time, values, limits.hours);
  return Uint8Array.from(values, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    const step = Math.abs(value - (values[k - 1] ?? Number.NaN));
    if (Number.isNaN(step) || Number.isNaN(spread[k])) return NOT_EVALUATED;
    return step > limits.deviations * Math.max(spread[k], limits.least) ? SUSPECT : PASS;
  });
}
