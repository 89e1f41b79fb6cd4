import { chooseDateOrder } from "./date-order";
import type { LocalTime, Zone } from "./local-time";
import { numberFromText, tidyCell } from "./number-text";
import type { ProblemList } from "./problem-list";
import type { ReadingAnswers, ReadingQuestion, Understood } from "./reading";
import { columnsOfPlan, type StampPlan } from "./stamp-columns";
import {
  dateFromText,
  daysFromDate,
  fullYear,
  secondsOfDay,
  stampFromText,
  timeFromText,
  type WrittenStamp,
} from "./stamp-text";
import { chooseZone } from "./stamp-zone";
import type { FormatKnowledge, TextTable } from "./text-table";

export interface Stamps {
  /** Seconds since 1970-01-01T00:00:00Z, one a row; NaN where unreadable. */
  utc: Float64Array;
  zone: string;
  understood: Understood[];
  questions: ReadingQuestion[];
  /** Rows whose stamp is an error. */
  bad: Set<number>;
}

const SERIAL_1900 = daysFromDate(1899, 12, 30) ?? 0;
const SERIAL_1904 = daysFromDate(1904, 1, 1) ?? 0;

/**
 * Reads all stamps of a table and turns them to UTC. Unreadable stamps, times that a clock never showed and times that
 * it showed twice (where the order of rows does not settle it) are problems with their line, never guessed.
 */
export function readStamps(
  table: TextTable,
  plan: StampPlan,
  knowledge: FormatKnowledge,
  answers: ReadingAnswers,
  problems: ProblemList,
): Stamps {
  const understood: Understood[] = [];
  const questions: ReadingQuestion[] = [];
  const readRow = rowReader(table, plan, answers, understood, questions);
  const count = table.rows.length;
  const written: (WrittenStamp | null)[] = new Array(count);
  const bad = new Set<number>();
  const names = columnsOfPlan(plan).map((column) => table.names[column] ?? "");
  const column = names.length === 1 ? names[0] : undefined;
  let withOffset = 0;
  let readable = 0;
  for (let row = 0; row < count; row += 1) {
    const stamp = readRow(table.rows[row] ?? []);
    written[row] = stamp;
    if (stamp !== null) {
      readable += 1;
      if (stamp.offset !== null) withOffset += 1;
      continue;
    }
    bad.add(row);
    const cells = columnsOfPlan(plan).map((index) => (table.rows[row]?.[index] ?? "").trim());
    const shown = cells.join(" ").trim().slice(0, 40);
    problems.add(
      "error",
      "unreadableTime",
      shown === "" ? "the time is blank" : `“${shown}” is no date and time`,
      "Correct it in the file, or leave the lines out.",
      { row: table.lines[row] ?? 0, column },
    );
  }
  const choice = chooseZone({
    answers,
    byFormat: knowledge.zone,
    offsetsStated: readable > 0 && withOffset === readable,
    columnNames: names,
    preamble: table.preamble,
    problems,
  });
  understood.push(choice.understood);
  if (choice.question !== null) questions.push(choice.question);
  const utc = toUtc(written, choice.zone, table.lines, bad, problems);
  return { utc, zone: choice.zone.name, understood, questions, bad };
}

function toUtc(
  written: (WrittenStamp | null)[],
  zone: Zone,
  lines: number[],
  bad: Set<number>,
  problems: ProblemList,
): Float64Array {
  const utc = new Float64Array(written.length).fill(NaN);
  const twice: number[] = [];
  const local: (LocalTime | null)[] = [];
  for (const [row, stamp] of written.entries()) {
    if (stamp === null) continue;
    if (stamp.offset !== null) {
      utc[row] = stamp.clock - stamp.offset;
      continue;
    }
    const time = zone.toUtc(stamp.clock);
    if (time.kind === "one") utc[row] = time.utc;
    else if (time.kind === "twice") {
      twice.push(row);
      local[row] = time;
    } else {
      bad.add(row);
      problems.add(
        "error",
        "missingHour",
        `the clock in ${zone.name} never showed this time: summer time began`,
        "If the clock stayed on standard time, answer the time zone with a fixed offset; else correct or leave out the lines.",
        { row: lines[row] ?? 0 },
      );
    }
  }
  for (const block of blocksOf(twice)) settleTwice(block, written, local, utc, zone, lines, bad, problems);
  return utc;
}

/** Runs of neighbouring rows. */
function blocksOf(rows: number[]): number[][] {
  const blocks: number[][] = [];
  for (const row of rows) {
    const last = blocks.at(-1);
    if (last !== undefined && last.at(-1) === row - 1) last.push(row);
    else blocks.push([row]);
  }
  return blocks;
}

/** Where the clock steps back once within the run, both passes of the hour are there and the order of rows tells them apart. */
function settleTwice(
  block: number[],
  written: (WrittenStamp | null)[],
  local: (LocalTime | null)[],
  utc: Float64Array,
  zone: Zone,
  lines: number[],
  bad: Set<number>,
  problems: ProblemList,
): void {
  const clocks = block.map((row) => written[row]?.clock ?? NaN);
  const before = written[(block[0] ?? 0) - 1]?.clock;
  const descending = before !== undefined && before > (clocks[0] ?? 0);
  const steps = clocks.slice(1).map((clock, index) => (clock - (clocks[index] ?? 0)) * (descending ? -1 : 1));
  const backSteps = steps.filter((step) => step <= 0).length;
  const turn = steps.findIndex((step) => step <= 0) + 1;
  for (const [index, row] of block.entries()) {
    const time = local[row];
    if (time?.kind !== "twice") continue;
    const where = { row: lines[row] ?? 0 };
    if (backSteps === 1) {
      const firstPass = descending ? index >= turn : index < turn;
      utc[row] = firstPass ? time.utc : time.later;
      problems.add(
        "warning",
        "repeatedHour",
        `the clock in ${zone.name} showed this hour twice: summer time ended; the order of the lines tells the first pass from the second`,
        "Check these lines.",
        where,
      );
      continue;
    }
    bad.add(row);
    problems.add(
      "error",
      "repeatedHour",
      `the clock in ${zone.name} showed this time twice: summer time ended, and nothing in the file says which is meant`,
      "If the clock stayed on standard time, answer the time zone with a fixed offset; else leave out the lines.",
      where,
    );
  }
}

type RowReader = (cells: string[]) => WrittenStamp | null;

function rowReader(
  table: TextTable,
  plan: StampPlan,
  answers: ReadingAnswers,
  understood: Understood[],
  questions: ReadingQuestion[],
): RowReader {
  const cell = (cells: string[], index: number | undefined): string =>
    index === undefined ? "" : tidyCell(cells[index] ?? "").trim();
  const name = (index: number): string => table.names[index] ?? `${index + 1}`;
  const orderOf = (column: number): ReturnType<typeof chooseDateOrder> => {
    const choice = chooseDateOrder(
      table.rows.map((row) => row[column] ?? ""),
      answers,
    );
    if (choice.understood !== null) understood.push(choice.understood);
    if (choice.question !== null) questions.push(choice.question);
    return choice;
  };
  if (plan.kind === "text") {
    const { order } = orderOf(plan.column);
    understood.push({ what: "Time", taken: `column “${name(plan.column)}”`, confidence: "by content" });
    return (cells) => stampFromText(cell(cells, plan.column), order);
  }
  if (plan.kind === "dateAndTime") {
    const { order } = orderOf(plan.date);
    const hoursOnly = table.rows.every((row) => Number(cell(row, plan.time) || "0") <= 24);
    understood.push({
      what: "Time",
      taken: `columns “${name(plan.date)}” and “${name(plan.time)}”`,
      confidence: "by content",
    });
    return (cells) => {
      const day = dateFromText(cell(cells, plan.date), order);
      const text = cell(cells, plan.time);
      const digits = /^\d{1,4}$/.test(text);
      const time = timeFromText(digits ? (hoursOnly ? `${text}:00` : text.padStart(4, "0")) : text);
      return day === null || time === null ? null : { clock: day * 86400 + time.seconds, offset: time.offset };
    };
  }
  if (plan.kind === "parts") return partsReader(table, plan, understood, cell);
  return numberReader(table, plan, answers, understood, questions, cell);
}

function partsReader(
  table: TextTable,
  plan: Extract<StampPlan, { kind: "parts" }>,
  understood: Understood[],
  cell: (cells: string[], index: number | undefined) => string,
): RowReader {
  const { parts } = plan;
  const columns = columnsOfPlan(plan).map((index) => table.names[index] ?? `${index + 1}`);
  understood.push({ what: "Time", taken: `columns ${columns.join(", ")}`, confidence: "by name" });
  const shortYear = table.rows.some((row) => /^\d{2}$/.test(cell(row, parts.year)));
  if (shortYear)
    understood.push({
      what: "Two-digit years",
      taken: "70–99 as 1970–1999, 00–69 as 2000–2069",
      confidence: "assumed",
    });
  const whole = (text: string): number => (/^\d{1,4}(?:\.0*)?$/.test(text) ? Number(text) : NaN);
  const optional = (cells: string[], index: number | undefined): number =>
    index === undefined ? 0 : Number(cell(cells, index) || NaN);
  return (cells) => {
    const yearText = cell(cells, parts.year);
    const year = fullYear(whole(yearText), yearText.length);
    const day =
      parts.month !== undefined && parts.day !== undefined
        ? daysFromDate(year, whole(cell(cells, parts.month)), whole(cell(cells, parts.day)))
        : dayOfYear(year, whole(cell(cells, parts.dayOfYear)));
    let hour = optional(cells, parts.hour);
    let minute = optional(cells, parts.minute);
    if (parts.hourMinute !== undefined) {
      const clock = whole(cell(cells, parts.hourMinute));
      hour = Math.floor(clock / 100);
      minute = clock % 100;
    }
    const seconds = secondsOfDay(hour, minute, optional(cells, parts.second));
    return day === null || seconds === null ? null : { clock: day * 86400 + seconds, offset: null };
  };
}

function dayOfYear(year: number, day: number): number | null {
  const start = daysFromDate(year, 1, 1);
  return start === null || !(day >= 1 && day < 367) ? null : start + Math.floor(day) - 1;
}

function numberReader(
  table: TextTable,
  plan: Extract<StampPlan, { kind: "number" }>,
  answers: ReadingAnswers,
  understood: Understood[],
  questions: ReadingQuestion[],
  cell: (cells: string[], index: number | undefined) => string,
): RowReader {
  const name = table.names[plan.column] ?? `${plan.column + 1}`;
  const value = (cells: string[]): number | null => numberFromText(cell(cells, plan.column), table.decimal);
  if (plan.scale !== "spreadsheetDays") {
    const perSecond = plan.scale === "epochSeconds" ? 1 : 1000;
    const unit = perSecond === 1 ? "seconds" : "milliseconds";
    understood.push({
      what: "Time",
      taken: `column “${name}”, ${unit} since 1970-01-01 UTC`,
      confidence: "by content",
    });
    return (cells) => {
      const number = value(cells);
      return number === null ? null : { clock: number / perSecond, offset: 0 };
    };
  }
  const epoch = answers.serialEpoch ?? "1900";
  const confidence = answers.serialEpoch === undefined ? "assumed" : "answered";
  understood.push({
    what: "Time",
    taken: `column “${name}”, spreadsheet day numbers, ${epoch} date system`,
    confidence,
  });
  const question: ReadingQuestion = {
    key: "serialEpoch",
    needed: false,
    message:
      "Day numbers count from 1900 in most spreadsheets and from 1904 in some older ones: the two are 1462 days apart. Check the first date.",
    options: [
      { value: "1900", label: "1900 date system" },
      { value: "1904", label: "1904 date system" },
    ],
    suggestion: "1900",
  };
  questions.push(answers.serialEpoch === undefined ? question : { ...question, answer: epoch });
  const start = epoch === "1904" ? SERIAL_1904 : SERIAL_1900;
  return (cells) => {
    const number = value(cells);
    // Day numbers carry the time as a fraction that is rarely exact: to the nearest second.
    return number === null ? null : { clock: Math.round((start + number) * 86400), offset: null };
  };
}
