import type { ProblemList } from "./problem-list";
import type { Stamps } from "./read-stamps";
import {
  CHANNEL_UNITS,
  type ChannelName,
  type ChannelReading,
  type ColumnReading,
  type PreviewRow,
  type ReadingAnswers,
  type ReadingQuestion,
  type ReadingStep,
  type SeriesReading,
  type Understood,
} from "./reading";
import { exactSum, statisticsOf, valuesAt, vectorMeanWind } from "./series-statistics";
import { isoFromSeconds } from "./stamp-text";
import type { FormatKnowledge, TextTable } from "./text-table";
import { timeAxis, type TimeAxis } from "./time-axis";

/** A channel with one value a row of the file. */
export interface RowChannel {
  values: Float64Array;
  /** mm, one a row, where the file gives amounts. */
  amounts: Float64Array | null;
  fromColumns: string[];
}

export interface SeriesParts {
  table: TextTable;
  knowledge: FormatKnowledge;
  fileName: string;
  answers: ReadingAnswers;
  stamps: Stamps;
  /** Rows with an error, and what it is. */
  bad: Map<number, string>;
  channels: Map<ChannelName, RowChannel>;
  columns: ColumnReading[];
  windHeight: number | null;
  averagingMinutes: number | null;
  understood: Understood[];
  questions: ReadingQuestion[];
  steps: ReadingStep[];
  problems: ProblemList;
}

/** Puts rows in time order, one a stamp, and reckons the statistics. */
export function assembleSeries(parts: SeriesParts): SeriesReading {
  const { stamps, channels, answers, table, bad } = parts;
  const utc = stamps.utc;
  const leftOut = answers.leaveOutBadRows === true ? bad : new Map<number, string>();
  const rows: number[] = [];
  for (let row = 0; row < utc.length; row += 1) if (!Number.isNaN(utc[row]) && !leftOut.has(row)) rows.push(row);
  const lists = [...channels.values()].map((channel) => channel.values);
  const axis = timeAxis(utc, rows, (a, b) => lists.every((values) => Object.is(values[a], values[b])));
  const dropped = droppedRows(leftOut, axis, table);
  reportAxis(axis, utc, parts);
  reportBadRows(parts);

  const calm = calmRows(channels, rows);
  const speed = channels.get("windSpeed");
  const from = channels.get("windFrom");
  const windVectorMean =
    speed !== undefined && from !== undefined ? vectorMeanWind(speed.values, from.values, rows) : null;
  const readings: Partial<Record<ChannelName, ChannelReading>> = {};
  for (const [name, channel] of channels) {
    const reading = readChannel(name, channel, utc, rows, axis, windVectorMean?.from ?? null);
    if (name === "windFrom")
      for (const [index, row] of axis.unique.entries()) if (calm.has(row)) reading.values[index] = NaN;
    if (reading.count === 0) {
      parts.problems.add(
        "warning",
        "allMissing",
        "every value is missing",
        "Choose another column on the reading sheet, or do without it.",
        {
          column: channel.fromColumns[0],
        },
      );
    }
    readings[name] = reading;
  }
  if (calm.size > 0) {
    parts.understood.push({
      what: "Calms",
      taken: `${calm.size} of speed 0; a calm has no direction`,
      confidence: "by content",
    });
  }
  const time = valuesAt(utc, axis.unique);
  return {
    kind: "series",
    format: parts.knowledge.id,
    formatLabel: parts.knowledge.label,
    fileName: parts.fileName,
    rows: table.rows.length,
    first: time.length === 0 ? null : isoFromSeconds(time[0] ?? NaN),
    last: time.length === 0 ? null : isoFromSeconds(time.at(-1) ?? NaN),
    order: axis.order,
    duplicates: axis.duplicates,
    zone: stamps.zone,
    windHeight: parts.windHeight,
    averagingMinutes: parts.averagingMinutes,
    medianStepSeconds: axis.medianStepSeconds,
    columns: parts.columns,
    time,
    channels: readings,
    windVectorMean,
    understood: parts.understood,
    questions: parts.questions,
    steps: parts.steps,
    problems: parts.problems.toArray(),
    firstRows: previewRows(parts, 0, Math.min(3, table.rows.length)),
    lastRows: previewRows(parts, Math.max(0, table.rows.length - 3), table.rows.length),
    dropped,
  };
}

function readChannel(
  name: ChannelName,
  channel: RowChannel,
  utc: Float64Array,
  rows: readonly number[],
  axis: TimeAxis,
  meanFrom: number | null,
): ChannelReading {
  const statistics = statisticsOf(channel.values, utc, rows);
  const values = valuesAt(channel.values, axis.unique);
  const reading: ChannelReading = {
    unit: CHANNEL_UNITS[name],
    values,
    ...statistics,
    fromColumns: channel.fromColumns,
  };
  if (name === "windFrom") Object.assign(reading, { mean: meanFrom, min: null, max: null, maxAt: null });
  if (name === "rain" || name === "evaporation") {
    const hours = (axis.medianStepSeconds ?? NaN) / 3600;
    const total =
      channel.amounts === null
        ? exactSum(valuesAt(channel.values, rows)) * hours
        : exactSum(valuesAt(channel.amounts, rows));
    // Twelve digits: the last bits of a long sum of decimals are noise.
    if (Number.isFinite(total)) reading.total = Number(total.toPrecision(12));
  }
  return reading;
}

function calmRows(channels: Map<ChannelName, RowChannel>, rows: readonly number[]): Set<number> {
  const speed = channels.get("windSpeed");
  return new Set(speed === undefined ? [] : rows.filter((row) => speed.values[row] === 0));
}

function droppedRows(leftOut: Map<number, string>, axis: TimeAxis, table: TextTable): SeriesReading["dropped"] {
  const reasons = new Map<string, number[]>();
  for (const [row, reason] of leftOut) {
    const rows = reasons.get(reason);
    if (rows === undefined) reasons.set(reason, [row]);
    else rows.push(row);
  }
  if (axis.identical.length > 0) reasons.set("the same stamp and values as an earlier line", axis.identical);
  if (axis.differing.length > 0) reasons.set("the same stamp as an earlier line, other values", axis.differing);
  return [...reasons].map(([reason, rows]) => ({
    reason,
    count: rows.length,
    firstRow: table.lines[rows[0] ?? 0] ?? 0,
  }));
}

function reportAxis(axis: TimeAxis, utc: Float64Array, parts: SeriesParts): void {
  const { problems, table } = parts;
  const line = (row: number | undefined): { row?: number } => (row === undefined ? {} : { row: table.lines[row] ?? 0 });
  if (axis.order === "descending") {
    parts.understood.push({ what: "Order of lines", taken: "newest first; turned about", confidence: "by content" });
    parts.steps.push({
      id: "reversed",
      label: "lines put in ascending time order",
      channel: "time",
      count: axis.sorted.length,
    });
  }
  if (axis.order === "unsorted") {
    const firstBack = utc.findIndex((time, row) => row > 0 && time < (utc[row - 1] ?? NaN));
    problems.add(
      "warning",
      "unsortedTime",
      "times go backwards",
      "The lines were sorted by time; check that the clock was not set back.",
      line(firstBack < 0 ? undefined : firstBack),
    );
    parts.steps.push({ id: "sorted", label: "lines sorted by time", channel: "time", count: axis.sorted.length });
  }
  if (axis.identical.length > 0) {
    problems.add(
      "note",
      "duplicateTime",
      `${axis.identical.length} lines repeat the stamp and the values of an earlier line`,
      "One of each was kept.",
      line(axis.identical[0]),
    );
  }
  if (axis.differing.length > 0) {
    problems.add(
      "warning",
      "conflictingTime",
      `${axis.differing.length} lines repeat the stamp of an earlier line with other values`,
      "The first of each was kept; check which is right.",
      line(axis.differing[0]),
    );
  }
  if (axis.gaps !== null) {
    const after = isoFromSeconds(utc[axis.gaps.longestAfter] ?? NaN) ?? "";
    problems.add(
      "warning",
      "timeGap",
      `${axis.gaps.count} ${axis.gaps.count === 1 ? "gap is" : "gaps are"} longer than 1.5 steps of ${axis.medianStepSeconds} s; the longest is ${axis.gaps.longestSeconds} s, after ${after}`,
      "Nothing was filled in.",
      line(axis.gaps.longestAfter),
    );
  }
}

/** Errors of rows stop the import until they are left out knowingly. */
function reportBadRows(parts: SeriesParts): void {
  const { bad, answers } = parts;
  if (bad.size === 0) return;
  if (answers.leaveOutBadRows === true) parts.problems.settleRowErrors();
  parts.questions.push({
    key: "leaveOutBadRows",
    needed: answers.leaveOutBadRows !== true,
    message: `${bad.size} of ${parts.table.rows.length} lines have an error. Leave them out, or correct the file and give it again.`,
    options: [{ value: "true", label: "Leave them out" }],
    ...(answers.leaveOutBadRows === true ? { answer: "true" } : {}),
  });
}

function previewRows(parts: SeriesParts, start: number, end: number): PreviewRow[] {
  return Array.from({ length: end - start }, (_, offset) => {
    const row = start + offset;
    const cells = parts.table.rows.row(row);
    const values: Partial<Record<ChannelName, number | null>> = {};
    for (const [name, channel] of parts.channels) {
      const value = channel.values[row] ?? NaN;
      values[name] = Number.isNaN(value) ? null : value;
    }
    return { line: parts.table.lines[row] ?? 0, cells, time: isoFromSeconds(parts.stamps.utc[row] ?? NaN), values };
  });
}
