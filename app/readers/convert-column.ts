import { CHANNEL_LIMITS } from "./channel-limits";
import { isWaterAmount, type FileUnit } from "./file-units";
import type { ProblemList } from "./problem-list";
import { counterIncrements, incrementsSinceReset, isSpread, ratesSinceRowBefore, type RowTimes } from "./rain-amounts";
import { channelOfRole, type SettledColumn } from "./settle-columns";

export interface ConvertedColumn {
  /** In the channel's unit, one a row. */
  values: Float64Array;
  /** Amounts in mm, one a row, where the file gives amounts per interval. */
  amounts: Float64Array | null;
  /** Rows with a value that cannot be used. */
  bad: number[];
}

/**
 * Turns a column's values into the channel's unit. Amounts per interval are divided by the file's median step, or where
 * steps vary by the time since the row before; counters are differenced in time order, crediting only increases and
 * starting again where the counter drops.
 * @param times unique rows in time order; amounts stay NaN without a step
 */
export function convertColumn(
  settled: SettledColumn,
  times: RowTimes,
  lines: readonly number[],
  problems: ProblemList,
): ConvertedColumn {
  const { unit, scan, column } = settled;
  const raw = perRow(settled, times, lines, problems);
  const converted = raw.map((value) => (value - unit.zero) * unit.factor);
  const amounts = isWaterAmount(unit) ? converted : null;
  const divisor = divisorOf(unit, times.stepSeconds);
  const values =
    amounts !== null && isSpread(unit, times)
      ? ratesSinceRowBefore(amounts, times)
      : divisor === 1
        ? converted
        : converted.map((value) => value / divisor);
  const bad = checkLimits(settled, values, lines, problems);
  for (const { row, text } of scan.unreadable) {
    problems.add(
      "error",
      "unreadableNumber",
      `“${text}” is neither a number nor a known code for missing`,
      "Correct it in the file, name it as a missing code on the reading sheet, or leave the lines out.",
      {
        row: lines[row] ?? 0,
        column: column.name,
      },
    );
  }
  for (const row of bad) {
    values[row] = NaN;
    if (amounts !== null) amounts[row] = NaN;
  }
  return { values, amounts, bad: [...bad, ...scan.unreadable.map(({ row }) => row)] };
}

/** What each row of the file adds. */
function perRow(
  settled: SettledColumn,
  times: RowTimes,
  lines: readonly number[],
  problems: ProblemList,
): Float64Array {
  const { values } = settled.scan;
  if (settled.unit.quantity === "waterCounter") return counterIncrements(values, times.order, settled, lines, problems);
  return settled.unit.quantity === "waterSinceReset" ? incrementsSinceReset(values, times) : values;
}

function divisorOf(unit: FileUnit, stepSeconds: number | null): number {
  const seconds = stepSeconds ?? NaN;
  if (unit.quantity === "energyPerInterval") return seconds;
  return isWaterAmount(unit) ? seconds / 3600 : 1;
}

/** Rounded so that a factor's last bit does not make 360 ° or 0 mm/h fall outside. */
const SLACK = 1e-9;

function checkLimits(
  settled: SettledColumn,
  values: Float64Array,
  lines: readonly number[],
  problems: ProblemList,
): number[] {
  const channel = channelOfRole(settled.role);
  const limits = CHANNEL_LIMITS[channel];
  const component = settled.role === "windU" || settled.role === "windV";
  const low = component ? -limits.high : limits.low;
  const bad: number[] = [];
  for (let row = 0; row < values.length; row += 1) {
    const value = values[row] ?? NaN;
    if (Number.isNaN(value) || (value >= low - SLACK && value <= limits.high + SLACK)) continue;
    const raw = settled.scan.values[row] ?? NaN;
    const where = { row: lines[row] ?? 0, column: settled.column.name };
    const negativeRain = channel === "rain" && value < 0;
    const what = negativeRain ? `rain of ${raw} is negative` : `${raw} ${settled.unit.label} is ${limits.because}`;
    const toDo = negativeRain
      ? "Where it is a code (−1 for a trace, −9 for missing), name it as a missing code on the reading sheet; else correct it or leave the lines out."
      : limits.beyond === "error"
        ? "Correct it in the file, name it as a missing code on the reading sheet, or leave the lines out."
        : "Look at these values before use.";
    problems.add(limits.beyond, negativeRain ? "negativeRain" : "outOfRange", what, toDo, where);
    if (limits.beyond === "error") bad.push(row);
  }
  return bad;
}

const COUNTER_MINIMUM = 24;

/**
 * Whether amounts look like a running total: never falling but for rare resets, standing still above zero more often
 * than rain would repeat, and ending far above the largest step.
 */
export function looksLikeCounter(values: Float64Array, order: readonly number[]): boolean {
  let steps = 0;
  let falls = 0;
  let plateaus = 0;
  let largestRise = 0;
  let high = 0;
  let previous = NaN;
  for (const row of order) {
    const value = values[row] ?? NaN;
    if (Number.isNaN(value)) continue;
    if (!Number.isNaN(previous)) {
      steps += 1;
      if (value < previous) falls += 1;
      else if (value === previous && value > 0) plateaus += 1;
      else largestRise = Math.max(largestRise, value - previous);
    }
    high = Math.max(high, value);
    previous = value;
  }
  return steps >= COUNTER_MINIMUM && falls <= 0.02 * steps + 1 && plateaus > 0.3 * steps && high > largestRise;
}
