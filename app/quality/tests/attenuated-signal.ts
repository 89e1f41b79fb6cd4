import { FAIL, MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";

export interface AttenuationLimits {
  /** Span that is looked back over, h. */
  hours: number;
  /** Least range over it, in the channel's unit: below it suspect; null: not asked. */
  suspect: number | null;
  /** Below it bad. */
  fail: number | null;
}

const HOUR = 3600;
/** Times that were added up may miss an hour by rounding, s. */
const ROUNDING = 1e-3;

/**
 * Attenuated signal: the values of a span hardly differ, as when a sensor is fouled or sheltered. Not evaluated before the
 * record is as long as the span, nor where a value of the span is missing.
 * @param time seconds, ascending
 * @param values NaN where missing
 * @param exempt values of which it is natural to stay as they are: a calm, no rain, no light
 * @returns 1, 2, 3, 4 or 9 for each value
 * Source: QARTOD wind manual, test 10, by the range.
 */
export function attenuatedSignal(
  time: ArrayLike<number>,
  values: ArrayLike<number>,
  { hours, suspect, fail }: AttenuationLimits,
  exempt: (k: number) => boolean = () => false,
): Flags {
  const ranges = rangesBefore(time, values, hours * HOUR);
  return Uint8Array.from(values, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    if (exempt(k) || Number.isNaN(ranges[k])) return NOT_EVALUATED;
    if (fail !== null && ranges[k] < fail) return FAIL;
    return suspect !== null && ranges[k] < suspect ? SUSPECT : PASS;
  });
}

/** Highest less lowest value of the span that ends at each sample; NaN where it is not known in full. */
function rangesBefore(time: ArrayLike<number>, values: ArrayLike<number>, span: number): Float64Array {
  const ranges = new Float64Array(values.length).fill(Number.NaN);
  // Candidates for the extremes, oldest first: each lower (higher) than all before it would have dropped them.
  let [lowest, highest]: number[][] = [[], []];
  let [first, unbroken] = [0, 0];
  for (let k = 0; k < values.length; k++) {
    if (Number.isNaN(values[k])) {
      unbroken = k + 1;
      [lowest, highest] = [[], []];
      continue;
    }
    while (lowest.length > 0 && values[lowest[lowest.length - 1]] >= values[k]) lowest.pop();
    while (highest.length > 0 && values[highest[highest.length - 1]] <= values[k]) highest.pop();
    lowest.push(k);
    highest.push(k);
    while (time[first] < time[k] - span - ROUNDING) first++;
    while (lowest[0] < first) lowest.shift();
    while (highest[0] < first) highest.shift();
    if (time[unbroken] <= time[k] - span + ROUNDING) ranges[k] = values[highest[0]] - values[lowest[0]];
  }
  return ranges;
}
