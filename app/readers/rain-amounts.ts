import { isWaterAmount, type FileUnit } from "./file-units";
import type { ProblemList } from "./problem-list";
import type { SettledColumn } from "./settle-columns";

/** Rows of a file that count, in time order, one a stamp, and when each was written. */
export interface RowTimes {
  order: readonly number[];
  /** Seconds, one a row. */
  utc: Float64Array;
  /** Median step between rows, or null where there are fewer than two. */
  stepSeconds: number | null;
}

/** Increments credited at the later of two readings; the first reading has none. */
export function counterIncrements(
  values: Float64Array,
  order: readonly number[],
  settled: SettledColumn,
  lines: readonly number[],
  problems: ProblemList,
): Float64Array {
  const increments = new Float64Array(values.length).fill(NaN);
  let previous = NaN;
  for (const row of order) {
    const value = values[row] ?? NaN;
    if (Number.isNaN(value)) continue;
    if (value < previous) {
      increments[row] = 0;
      problems.add(
        "warning",
        "counterReset",
        "the counter drops; no rain is credited for the step",
        "Check whether it was emptied or reset.",
        {
          row: lines[row] ?? 0,
          column: settled.column.name,
        },
      );
    } else if (!Number.isNaN(previous)) increments[row] = value - previous;
    previous = value;
  }
  return increments;
}

const HOUR = 3600;
const MINUTE = 60;

/**
 * Increments of amounts that count from a reset once an hour, right after the routine report. Special reports between
 * repeat what has fallen since, so within an hour only what was added counts.
 */
export function incrementsSinceReset(values: Float64Array, { order, utc }: RowTimes): Float64Array {
  const increments = new Float64Array(values.length).fill(NaN);
  const reset = routineMinute(utc, order) * MINUTE;
  let hour = NaN;
  let fallen = 0;
  for (const row of order) {
    const value = values[row] ?? NaN;
    const own = Math.ceil(((utc[row] ?? 0) - reset) / HOUR);
    if (own !== hour) [hour, fallen] = [own, 0];
    if (Number.isNaN(value)) continue;
    increments[row] = Math.max(0, value - fallen);
    fallen = Math.max(fallen, value);
  }
  return increments;
}

/** The minute of the hour at which most reports stand. */
function routineMinute(utc: Float64Array, order: readonly number[]): number {
  const counts = new Array<number>(60).fill(0);
  for (const row of order) {
    const minute = Math.floor((((utc[row] ?? 0) % HOUR) + HOUR) / MINUTE) % 60;
    counts[minute] = (counts[minute] ?? 0) + 1;
  }
  return counts.indexOf(Math.max(...counts));
}

/** Whether amounts of a unit are spread over the time since the row before, not over the median step. */
export function isSpread(unit: FileUnit, times: RowTimes): boolean {
  return isWaterAmount(unit) && (unit.quantity === "waterSinceReset" || stepsVary(times));
}

/** Whether more than one step in ten differs from the median by more than a hundredth: a median would then mislead. */
function stepsVary({ order, utc, stepSeconds }: RowTimes): boolean {
  if (stepSeconds === null || order.length < 3) return false;
  let other = 0;
  for (let index = 1; index < order.length; index += 1) {
    const step = (utc[order[index] ?? 0] ?? 0) - (utc[order[index - 1] ?? 0] ?? 0);
    if (Math.abs(step - stepSeconds) > 0.01 * stepSeconds) other += 1;
  }
  return other > 0.1 * (order.length - 1);
}

/**
 * Rates per hour of amounts that each fell since the row before, put at that row: there a rate that holds until the next
 * row keeps the sum. The last row has none, nor has the amount of the first row a place.
 */
export function ratesSinceRowBefore(amounts: Float64Array, { order, utc }: RowTimes): Float64Array {
  const rates = new Float64Array(amounts.length).fill(NaN);
  for (let index = 1; index < order.length; index += 1) {
    const row = order[index] ?? 0;
    const before = order[index - 1] ?? 0;
    rates[before] = ((amounts[row] ?? NaN) * HOUR) / ((utc[row] ?? NaN) - (utc[before] ?? NaN));
  }
  return rates;
}
