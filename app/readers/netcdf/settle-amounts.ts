import { CHANNEL_UNITS, type ReadingAnswers } from "../reading";
import { isPerInterval, isWaterAmount, unitById } from "../file-units";
import { isValueRole } from "../propose-columns";
import { channelOfRole } from "../settle-columns";
import { amountsOfSteps, looksAccumulated, ratesByBounds, type Accumulation } from "./cf-amounts";
import { cellMethods } from "./cf-columns";
import type { LeveledColumn } from "./cf-levels";
import type { Times } from "./series-along";
import type { Settled } from "./settle-flags";

/** A column with one value a record. */
export interface SampledColumn {
  column: LeveledColumn;
  values: Float64Array;
}

const WORDS: Readonly<Record<Accumulation, string>> = {
  step: "added up over each step, up to its stamp",
  day: "added up from 00 UTC of each day",
  start: "added up from the start of the file or the forecast on",
};

/**
 * Turns amounts, in place, into what each step adds; where the file states the interval of each stamp, into rates.
 * Without stated intervals, how they add up is a question, with what the values look like as suggestion.
 */
export function settleAmounts(sampled: SampledColumn[], times: Times, answers: ReadingAnswers): Settled {
  const settled: Settled = { understood: [], questions: [], steps: [] };
  const amounts = sampled.filter(
    ({ column }) => isValueRole(column.role) && column.unit !== null && isPerInterval(column.unit),
  );
  const order = ascending(times.utc);
  sayStamps(settled, sampled, times);
  if (amounts.length === 0) return settled;
  if (times.bounds !== null) {
    for (const each of amounts) toRates(each, times.bounds, settled);
    return settled;
  }
  const open = amounts.filter(({ column }) => !/\btime: sum (?:within|\(interval)/.test(cellMethods(column.variable)));
  const looks = open.map(({ values }) => looksAccumulated(inOrder(values, order), inOrder(times.utc, order)));
  const suggestion = looks.find((look) => look !== null) ?? "step";
  const accumulation = answers.accumulation ?? suggestion;
  for (const each of open) toSteps(each, accumulation, order, times.utc, settled);
  const names = open.map(({ column }) => `“${column.name}”`).join(", ");
  if (open.length === 0) return settled;
  const confidence =
    answers.accumulation !== undefined ? "answered" : looks.every((look) => look === null) ? "assumed" : "by content";
  settled.understood.push({ what: `Amounts of ${names}`, taken: WORDS[accumulation], confidence });
  settled.questions.push({
    key: "accumulation",
    needed: answers.accumulation === undefined,
    message: `${names}: amounts that were added up over time, and the file does not state over which. Over what does each value add up?`,
    options: [
      { value: "step", label: "Over each step, up to its stamp" },
      { value: "day", label: "From 00 UTC of each day" },
      { value: "start", label: "From the start on" },
    ],
    suggestion,
    ...(answers.accumulation === undefined ? {} : { answer: answers.accumulation }),
  });
  return settled;
}

function toRates({ column, values }: SampledColumn, bounds: NonNullable<Times["bounds"]>, settled: Settled): void {
  const { unit, role } = column;
  if (unit === null || !isValueRole(role)) return;
  const water = isWaterAmount(unit);
  const perSecond = ratesByBounds(values, bounds);
  values.set(perSecond.map((rate) => rate * unit.factor * (water ? 3600 : 1)));
  const rate = unitById(water ? "mm/h" : "W/m²");
  settled.steps.push({
    id: "bounds",
    label: `“${column.name}”: ${unit.label} to ${rate?.label ?? ""}, over the interval that the file states for each stamp`,
    channel: channelOfRole(role),
    count: countOf(values),
  });
  settled.understood.push({
    what: `“${column.name}”`,
    taken: "amounts over the intervals that the file states",
    confidence: "stated in the file",
  });
  column.unit = rate;
}

function toSteps(
  { column, values }: SampledColumn,
  accumulation: Accumulation,
  order: readonly number[],
  utc: Float64Array,
  settled: Settled,
): void {
  if (accumulation === "step" || !isValueRole(column.role)) return;
  const amounts = amountsOfSteps(inOrder(values, order), inOrder(utc, order), accumulation);
  values.fill(NaN);
  for (const [position, row] of order.entries()) values[row] = amounts[position] ?? NaN;
  const channel = channelOfRole(column.role);
  settled.steps.push({
    id: `accumulation:${accumulation}`,
    label: `“${column.name}”: differences of amounts ${WORDS[accumulation]}; ${CHANNEL_UNITS[channel]} follow from them`,
    channel,
    count: countOf(values),
  });
}

/** Where in its interval a stamp stands, which shifts means and sums by up to a step. */
function sayStamps(settled: Settled, sampled: readonly SampledColumn[], { utc, bounds }: Times): void {
  const overIntervals = sampled.filter(
    ({ column }) =>
      column.role !== "leftOut" &&
      (/\btime: (?:mean|sum)\b/.test(cellMethods(column.variable)) ||
        (column.unit !== null && isPerInterval(column.unit))),
  );
  if (overIntervals.length === 0) return;
  const names = overIntervals.map(({ column }) => `“${column.name}”`).join(", ");
  const [stamp, start, end] = [utc[0], bounds?.start[0], bounds?.end[0]];
  const where = start === undefined ? null : stamp === end ? "end" : stamp === start ? "start" : "middle";
  settled.understood.push({
    what: "Stamps",
    taken: `${names}: means or sums over intervals; ${
      where === null
        ? "the file does not say where in its interval a stamp stands, and it is left there"
        : `each stamp stands at its interval’s ${where}`
    }`,
    confidence: where === null ? "assumed" : "stated in the file",
  });
}

function ascending(utc: Float64Array): number[] {
  const rows = Array.from(utc.keys()).filter((row) => !Number.isNaN(utc[row]));
  return rows.sort((a, b) => (utc[a] ?? NaN) - (utc[b] ?? NaN));
}

function inOrder(values: Float64Array, order: readonly number[]): Float64Array {
  return Float64Array.from(order, (row) => values[row] ?? NaN);
}

function countOf(values: Float64Array): number {
  return values.reduce((count, value) => (Number.isNaN(value) ? count : count + 1), 0);
}
