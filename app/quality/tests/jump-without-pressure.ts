import { MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";
import { spreadBefore, type RateLimits } from "./rate-of-change";

/** Whether each step is larger than the steps before it allow; null where that is not known. */
function jumps(time: ArrayLike<number>, values: ArrayLike<number>, limits: RateLimits): (boolean | null)[] {
  const spread = spreadBefore(time, values, limits.hours);
  return Array.from(spread, (deviation, k) => {
    const step = Math.abs(values[k] - (values[k - 1] ?? Number.NaN));
    if (Number.isNaN(step) || Number.isNaN(deviation)) return null;
    return step > limits.deviations * Math.max(deviation, limits.least);
  });
}

/**
 * Multi-variate: a jump of the wind without a jump of the air pressure at the same time is suspect.
 * @param time seconds, ascending, of both
 * @param wind m/s, NaN where missing
 * @param pressure hPa, NaN where missing
 * @returns 1, 2, 3 or 9 for each value of the wind
 * Source: QARTOD wind manual, test 9.
 */
export function jumpWithoutPressure(
  time: ArrayLike<number>,
  wind: ArrayLike<number>,
  pressure: ArrayLike<number>,
  limits: { wind: RateLimits; pressure: RateLimits },
): Flags {
  const ofWind = jumps(time, wind, limits.wind);
  const ofPressure = jumps(time, pressure, limits.pressure);
  return Uint8Array.from(wind, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    if (ofWind[k] === false) return PASS;
    if (ofWind[k] === null || ofPressure[k] === null) return NOT_EVALUATED;
    return ofPressure[k] ? PASS : SUSPECT;
  });
}
