import type { ProblemList } from "../problem-list";
import { isValueRole } from "../propose-columns";
import type { ReadingAnswers, ReadingQuestion, ReadingStep, SeriesReading, Understood } from "../reading";
import { rowsOf } from "../rows";
import { seriesFromTable } from "../series-from-table";
import { channelOfRole } from "../settle-columns";
import { isoFromSeconds } from "../stamp-text";
import type { FormatKnowledge, KnownColumn, TextTable } from "../text-table";
import { settleAmounts, type SampledColumn } from "./settle-amounts";
import type { Bounds } from "./cf-amounts";
import type { TimeAxis } from "./cf-axes";
import { cellMethods, columnsOf } from "./cf-columns";
import { atEachLevel, type LeveledColumn } from "./cf-levels";
import { DamagedNetcdf, textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";
import { settlePlace, type SettledPlace } from "./settle-place";
import { leaveFlaggedOut } from "./settle-flags";

/** Cells of a table that are held in memory at once; columns that are not needed are left away beyond. */
const MOST_CELLS = 20_000_000;

export interface Times {
  axis: TimeAxis;
  /** Seconds since 1970, one a record, NaN where missing. */
  utc: Float64Array;
  bounds: Bounds | null;
}

export interface Asking {
  fileName: string;
  answers: ReadingAnswers;
  problems: ProblemList;
  chosen: { understood: Understood[]; questions: ReadingQuestion[] };
}

/**
 * Reads the variables along one time axis at one place, as a table with a record a line, and hands it to the same path
 * as a table of text: so units, missing codes, wind components and the reading sheet work alike for all files.
 */
export function seriesAlong(
  file: NetcdfFile,
  times: Times,
  variables: readonly NetcdfVariable[],
  { fileName, answers, problems, chosen }: Asking,
): SeriesReading {
  const columns = columnsOf(file, variables).flatMap((column) => atEachLevel(file, column));
  const place = settlePlace(file, times.axis.dimension, columns, answers, problems);
  const sampled = orderedByUse(columns, times.utc.length).map((column) => sample(column, place));
  const flags = leaveFlaggedOut(file, sampled, place, answers);
  const amounts = settleAmounts(sampled, times, answers);
  const steps: ReadingStep[] = [...flags.steps, ...amounts.steps, ...turnAbout(sampled), ...takeNoiseForNone(sampled)];
  const { label } = file;
  const units = textOf(times.axis.variable.attributes, "units");
  const knowledge: FormatKnowledge = {
    id: "netcdf",
    label: `${label}, CF conventions`,
    zone: "UTC",
    columnByName: (name) => known.get(name) ?? null,
    windHeightHint: {
      suggestion: "10",
      message: "At which height above the sea was the wind measured? Reanalyses give it for 10 m.",
    },
    averagingHint: null,
    understood: [
      { what: "Times", taken: `“${times.axis.variable.name}”, ${units}`, confidence: "stated in the file" },
      ...chosen.understood,
      ...place.understood,
      ...sampled.flatMap(({ column }) => (column.sense === null ? [] : [column.sense])),
      ...flags.understood,
      ...amounts.understood,
    ],
  };
  const known = new Map<string, KnownColumn>([
    [times.axis.variable.name, { role: "time", unit: null, missingCodes: [] }],
    ...sampled.map(({ column }): [string, KnownColumn] => [column.name, knownColumn(column, times.bounds)]),
  ]);
  const reading = seriesFromTable(tableOf(times, sampled), knowledge, fileName, answers, problems);
  const read: SeriesReading = {
    ...reading,
    questions: [
      ...place.questions,
      ...chosen.questions,
      ...flags.questions,
      ...amounts.questions,
      ...reading.questions,
    ],
    steps: [...steps, ...reading.steps],
  };
  return place.isSettled ? read : withoutValues(read);
}

/** What is used first, in the order of what is wanted most: of equal columns the first is taken. */
function orderedByUse(columns: readonly LeveledColumn[], records: number): LeveledColumn[] {
  const used = columns.filter(({ role }) => role !== "leftOut").sort((a, b) => a.rank - b.rank);
  const rest = columns.filter(({ role }) => role === "leftOut");
  if (used.length * records > MOST_CELLS)
    throw new DamagedNetcdf(
      `holds more than ${MOST_CELLS} values that could be used`,
      "Cut it to the days of the storm.",
    );
  return columns.length * records > MOST_CELLS ? used : [...used, ...rest];
}

function sample(column: LeveledColumn, place: SettledPlace): SampledColumn {
  const values = place.valuesOf(column);
  if ("unread" in values) {
    const unread: LeveledColumn = { ...column, role: "leftOut", unit: null, sense: null, note: values.unread };
    return { column: unread, values: new Float64Array() };
  }
  return { column, values };
}

function turnAbout(sampled: readonly SampledColumn[]): ReadingStep[] {
  return sampled.flatMap(({ column, values }) => {
    if (!column.negated || !isValueRole(column.role)) return [];
    for (let index = 0; index < values.length; index += 1) values[index] = -(values[index] ?? NaN);
    const count = values.filter((value) => !Number.isNaN(value)).length;
    return [{ id: "negated", label: `sign of “${column.name}” turned`, channel: channelOfRole(column.role), count }];
  });
}

/** Rain below this, mm/h or mm, is the rounding of packed values, whatever its sign. */
const NOISE = 0.01;

function takeNoiseForNone(sampled: readonly SampledColumn[]): ReadingStep[] {
  return sampled.flatMap(({ column, values }) => {
    const { role, unit } = column;
    if (role !== "rain" || unit === null) return [];
    let count = 0;
    for (const [index, value] of values.entries()) {
      if (!(value < 0 && value * unit.factor > -NOISE)) continue;
      values[index] = 0;
      count += 1;
    }
    const label = `negative values of “${column.name}” nearer to 0 than ${NOISE} mm, which are rounding, read as 0`;
    return count === 0 ? [] : [{ id: "noise", label, channel: role, count }];
  });
}

function knownColumn(column: LeveledColumn, bounds: Bounds | null): KnownColumn {
  const minutes = averagingOf(column, bounds);
  return {
    role: column.role,
    unit: column.unit?.id ?? null,
    missingCodes: null,
    confidence: column.confidence,
    senseKnown: column.sense !== null || column.role === "windFrom" || column.role === "windTowards",
    net: column.balance === "net",
    ...(column.note === null ? {} : { note: column.note }),
    ...(column.height === null ? {} : { height: column.height }),
    ...(minutes === null ? {} : { averagingMinutes: minutes }),
  };
}

/** Minutes over which a wind is a mean, by its cell methods and the bounds of its time, or its words. */
function averagingOf(column: LeveledColumn, bounds: Bounds | null): number | null {
  const methods = cellMethods(column.variable);
  if (/\btime: mean within days\b/.test(methods)) return 1440;
  const seconds = bounds === null ? NaN : (bounds.end[0] ?? NaN) - (bounds.start[0] ?? NaN);
  if (/\btime: mean\b/.test(methods) && seconds > 0) return seconds / 60;
  const words = /\b(\d{1,2})[ -]?min/i.exec(textOf(column.variable.attributes, "long_name"))?.[1];
  return words === undefined ? null : Number(words);
}

function tableOf({ axis, utc }: Times, sampled: readonly SampledColumn[]): TextTable {
  const rows = Array.from(utc, (seconds, row) => [
    isoFromSeconds(seconds)?.replace("Z", "") ?? "",
    ...sampled.map(({ values }) => {
      const value = values[row] ?? NaN;
      return Number.isNaN(value) ? "" : String(value);
    }),
  ]);
  return {
    names: [axis.variable.name, ...sampled.map(({ column }) => column.name)],
    unitTexts: [null, ...sampled.map(({ column }) => column.unitText)],
    rows: rowsOf(rows),
    lines: rows.map((_, row) => row + 1),
    decimal: ".",
    preamble: [],
    named: true,
  };
}

/** A reading that waits for its place: what the columns are can be said and asked, values cannot be shown. */
function withoutValues(reading: SeriesReading): SeriesReading {
  const blank = (rows: SeriesReading["firstRows"]) =>
    rows.map((row) => ({ ...row, cells: row.cells.slice(0, 1), values: {} }));
  return {
    ...reading,
    channels: {},
    windVectorMean: null,
    columns: reading.columns.map((column) => ({ ...column, missing: 0 })),
    problems: reading.problems.filter(({ column }) => column === undefined),
    steps: [],
    firstRows: blank(reading.firstRows),
    lastRows: blank(reading.lastRows),
  };
}
