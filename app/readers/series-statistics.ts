import { isoFromSeconds } from "./stamp-text";
import { componentsOfWind, windFromComponents } from "./wind-vectors";

/** Sum without growing rounding error (Neumaier 1974, doi:10.1002/zamm.19740540106); NaN is passed over. */
export function exactSum(values: ArrayLike<number>): number {
  let sum = 0;
  let lost = 0;
  for (let index = 0; index < values.length; index += 1) {
    const value = values[index] ?? NaN;
    if (Number.isNaN(value)) continue;
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}

export interface SeriesStatistics {
  count: number;
  missing: number;
  mean: number | null;
  min: number | null;
  max: number | null;
  maxAt: string | null;
}

/**
 * Count, mean and extremes of a channel over the given rows.
 * @param values one a row, NaN where missing
 * @param utc seconds, one a row
 * @param rows rows that count, in the order of the file: of equal maxima the first one's time is given
 */
export function statisticsOf(values: Float64Array, utc: Float64Array, rows: readonly number[]): SeriesStatistics {
  let count = 0;
  let min = Infinity;
  let max = -Infinity;
  let maxAt = NaN;
  for (const row of rows) {
    const value = values[row] ?? NaN;
    if (Number.isNaN(value)) continue;
    count += 1;
    min = Math.min(min, value);
    if (value > max) {
      max = value;
      maxAt = utc[row] ?? NaN;
    }
  }
  if (count === 0) return { count, missing: rows.length, mean: null, min: null, max: null, maxAt: null };
  return {
    count,
    missing: rows.length - count,
    mean: exactSum(valuesAt(values, rows)) / count,
    min,
    max,
    maxAt: isoFromSeconds(maxAt),
  };
}

/** Values at the given rows; a plain loop, since mapping through an iterator takes ten times as long. */
export function valuesAt(values: Float64Array, rows: readonly number[]): Float64Array {
  const picked = new Float64Array(rows.length);
  for (let index = 0; index < rows.length; index += 1) picked[index] = values[rows[index] ?? 0] ?? NaN;
  return picked;
}

/**
 * Vector mean of the wind over rows where speed and direction are both recorded.
 * @returns speed in the unit given and the direction it comes from (null where the mean is a calm); null without any row
 */
export function vectorMeanWind(
  speed: Float64Array,
  from: Float64Array,
  rows: readonly number[],
): { speed: number; from: number | null } | null {
  const u = new Float64Array(rows.length);
  const v = new Float64Array(rows.length);
  let count = 0;
  for (const row of rows) {
    const parts = componentsOfWind(speed[row] ?? NaN, from[row] ?? NaN);
    if (Number.isNaN(parts.u)) continue;
    u[count] = parts.u;
    v[count] = parts.v;
    count += 1;
  }
  if (count === 0) return null;
  const mean = windFromComponents(exactSum(u.subarray(0, count)) / count, exactSum(v.subarray(0, count)) / count);
  return { speed: mean.speed, from: Number.isNaN(mean.from) ? null : mean.from };
}
