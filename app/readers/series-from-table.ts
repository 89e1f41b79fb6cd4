import { chooseCandidates } from "./choose-candidates";
import { convertColumn, looksLikeCounter, type ConvertedColumn } from "./convert-column";
import { describeColumns } from "./describe-columns";
import { unitById, type FileUnit } from "./file-units";
import type { ProblemList } from "./problem-list";
import { isValueRole, proposeColumns, type ColumnProposal } from "./propose-columns";
import { windQuestions } from "./wind-questions";
import { repeatsDailyTotal } from "./repeated-daily-total";
import { readStamps, type Stamps } from "./read-stamps";
import type { ChannelName, ReadingAnswers, ReadingQuestion, ReadingStep, SeriesReading, Understood } from "./reading";
import { assembleSeries, type RowChannel } from "./assemble-series";
import { scanColumn, type ColumnScan } from "./scan-column";
import { answeredUnit, settleColumn, settleHeatSense, type SettledColumn, type Settling } from "./settle-columns";
import { columnsOfPlan, findStampColumns } from "./stamp-columns";
import { addCautions } from "./record-cautions";
import { columnsSeen, type FormatKnowledge, type TextTable } from "./text-table";
import { timeAxis } from "./time-axis";
import { channelsFromColumns } from "./channels-from-columns";

/**
 * From a table of text to a series: times, columns, units, missing codes, then one ascending axis with its channels.
 * Pure: the same table, knowledge and answers give the same reading.
 * @param problems those met while the table was found; more are added
 */
export function seriesFromTable(
  table: TextTable,
  knowledge: FormatKnowledge,
  fileName: string,
  answers: ReadingAnswers,
  problems: ProblemList,
): SeriesReading {
  const understood: Understood[] = [
    { what: "Format", taken: knowledge.label, confidence: "by content" },
    ...knowledge.understood,
  ];
  const questions: ReadingQuestion[] = [];
  const bad = raggedRows(table, problems);

  const answered = Object.entries(answers.columns ?? {}).map(([index, answer]) => ({
    index: Number(index),
    role: answer.role,
  }));
  const byFormat = table.names.flatMap((name, index) => (knowledge.columnByName(name)?.role === "time" ? [index] : []));
  const assigned = [...answered.filter(({ role }) => role === "time").map(({ index }) => index), ...byFormat];
  const barred = new Set(answered.filter(({ role }) => role !== "time").map(({ index }) => index));
  const plan = findStampColumns(table, assigned, barred);
  const stamps = plan === null ? noStamps(table, problems) : readStamps(table, plan, knowledge, answers, problems);
  understood.push(...stamps.understood);
  questions.push(...stamps.questions);
  for (const row of stamps.bad) bad.set(row, "the time cannot be used");

  const scans = new Map<number, ColumnScan>();
  const proposals = proposeColumns(table, plan === null ? [] : columnsOfPlan(plan), knowledge, answers);
  for (const column of proposals) {
    if (isValueRole(column.role))
      scans.set(
        column.index,
        scanColumn(table, column.index, column.role, column.missingCodes ?? [], column.traceCodes),
      );
  }
  const hasValues = (index: number): boolean => scans.get(index)?.values.some((value) => !Number.isNaN(value)) ?? false;
  const chosen = chooseCandidates(proposals, hasValues, answers);
  understood.push(...chosen.understood);

  const timed: number[] = [];
  for (let row = 0; row < stamps.utc.length; row += 1) if (!Number.isNaN(stamps.utc[row])) timed.push(row);
  const rough = timeAxis(stamps.utc, timed, () => true);
  const state = { answers, problems, lines: table.lines, understood, questions };
  const settled = settleAll(chosen.columns, scans, rough.unique, state);
  const times = { order: rough.unique, utc: stamps.utc, stepSeconds: rough.medianStepSeconds };
  const converted = new Map<SettledColumn, ConvertedColumn>();
  for (const column of settled) {
    const result = convertColumn(column, times, table.lines, problems);
    converted.set(column, result);
    if (column.unit.quantity === "waterAmount" && repeatsDailyTotal(column.scan.values, stamps.utc, rough.unique)) {
      problems.add(
        "warning",
        "dailyTotalRepeated",
        "the same amount stands in every row of a day, as where the day's total is repeated; summed, it counts many times over",
        "Give the rain of each interval, or a file with one row a day.",
        { column: column.column.name },
      );
    }
    for (const row of result.bad) bad.set(row, `an error in “${column.column.name}”`);
  }
  addCautions(settled, times, knowledge.id, problems);
  const wind = windQuestions(settled, knowledge, answers);
  understood.push(...wind.understood);
  questions.push(...wind.questions);
  const steps: ReadingStep[] = [];
  const channels: Map<ChannelName, RowChannel> = channelsFromColumns(settled, converted, answers, times, {
    steps,
    understood,
  });
  sayWhatIsMissing(table, channels, problems);
  const columns = describeColumns(chosen.columns, settled, table);
  return assembleSeries({
    table,
    knowledge,
    fileName,
    answers,
    stamps,
    bad,
    channels,
    columns,
    windHeight: wind.height,
    averagingMinutes: wind.averagingMinutes,
    understood,
    questions,
    steps,
    problems,
  });
}

function noStamps(table: TextTable, problems: ProblemList): Stamps {
  problems.add(
    "error",
    "noTimeColumn",
    `no column holds dates and times. Columns seen: ${columnsSeen(table)}`,
    "Say on the reading sheet which column is the time, or add one to the file.",
  );
  return {
    utc: new Float64Array(table.rows.length).fill(NaN),
    zone: "UTC",
    understood: [],
    questions: [],
    bad: new Set(),
  };
}

/** A row with too many or too few fields may have slipped sideways, so that no cell of it can be trusted. */
function raggedRows(table: TextTable, problems: ProblemList): Map<number, string> {
  const bad = new Map<number, string>();
  const expected = table.names.length;
  for (let row = 0; row < table.rows.length; row += 1) {
    let length = table.rows.width(row);
    while (length > expected && (table.rows.cell(row, length - 1) ?? "").trim() === "") length -= 1;
    if (length === expected) continue;
    bad.set(row, "the number of fields is wrong");
    problems.add(
      "error",
      "fieldCount",
      `${length} fields where the header has ${expected}`,
      "Correct the lines in the file, or leave them out.",
      {
        row: table.lines[row] ?? 0,
      },
    );
  }
  return bad;
}

function settleAll(
  columns: ColumnProposal[],
  scans: Map<number, ColumnScan>,
  rows: readonly number[],
  state: Settling,
): SettledColumn[] {
  const settled: SettledColumn[] = [];
  let speedUnit: FileUnit | null = null;
  // The wind speed first: a gust without a unit has the speed's.
  const order = [...columns].sort(
    (a, b) => Number(b.role === "windSpeed") - Number(a.role === "windSpeed") || a.index - b.index,
  );
  for (const column of order) {
    const scan = scans.get(column.index);
    const first: SettledColumn | null = scan === undefined ? null : settleColumn(column, scan, speedUnit, state);
    if (first === null) continue;
    if (column.role === "windSpeed") speedUnit = first.unit;
    const turned = settleHeatSense(first, state);
    settled.push(
      turned.role === "rain" && answeredUnit(column, state.answers) === null
        ? settleCounter(turned, rows, state)
        : turned,
    );
  }
  return settled;
}

function settleCounter(settled: SettledColumn, order: readonly number[], state: Settling): SettledColumn {
  const counter = unitById(settled.unit.id === "in" ? "in counter" : "mm counter");
  const amount = settled.unit.quantity === "waterAmount";
  if (!amount || counter === null || !looksLikeCounter(settled.scan.values, order)) return settled;
  state.understood.push({
    what: `“${settled.column.name}”`,
    taken: "a running total; its increases are the rain",
    confidence: "by content",
  });
  state.questions.push({
    key: "columns",
    column: settled.column.index,
    needed: true,
    message: `“${settled.column.name}” never falls but for resets, as a running total does. Say whether it is one, or rain per interval.`,
    options: [counter, settled.unit].map(({ id, label }) => ({ value: id, label })),
    suggestion: counter.id,
  });
  return { ...settled, unit: counter };
}

function sayWhatIsMissing(table: TextTable, channels: Map<ChannelName, RowChannel>, problems: ProblemList): void {
  const seen = columnsSeen(table);
  const ask = "Say on the reading sheet what each column is.";
  if (channels.size === 0)
    problems.add(
      "error",
      "noChannel",
      `no column was recognised as wind, rain, heat or temperature. Columns seen: ${seen}`,
      ask,
    );
  else if (!channels.has("windSpeed")) {
    problems.add(
      "warning",
      "noWindColumn",
      `no wind speed was found${channels.has("windGust") ? " (a gust cannot stand in for the mean wind)" : ""}. Columns seen: ${seen}`,
      ask,
    );
  } else if (!channels.has("windFrom")) {
    problems.add("warning", "noDirectionColumn", `no wind direction was found. Columns seen: ${seen}`, ask);
  }
}
