import { chooseDateOrder } from "./date-order";
import { numberFromText, tidyCell } from "./number-text";
import type { ReadingAnswers, ReadingQuestion, Understood } from "./reading";
import { columnOf } from "./rows";
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
import type { TextTable } from "./text-table";

const SERIAL_1900 = daysFromDate(1899, 12, 30) ?? 0;
const SERIAL_1904 = daysFromDate(1904, 1, 1) ?? 0;

type RowReader = (row: number) => WrittenStamp | null;
type CellReader = (row: number, column: number | undefined) => string;

/**
 * How the stamp of a row is read under a plan; dates of doubtful order and day numbers ask their questions here.
 * @returns a function of a row's number, null where its stamp is none
 */
export function stampReader(
  table: TextTable,
  plan: StampPlan,
  answers: ReadingAnswers,
  understood: Understood[],
  questions: ReadingQuestion[],
): RowReader {
  const cell: CellReader = (row, column) =>
    column === undefined ? "" : tidyCell(table.rows.cell(row, column) ?? "").trim();
  const name = (index: number): string => table.names[index] ?? `${index + 1}`;
  const orderOf = (column: number): ReturnType<typeof chooseDateOrder> => {
    const choice = chooseDateOrder(columnOf(table.rows, column), answers);
    if (choice.understood !== null) understood.push(choice.understood);
    if (choice.question !== null) questions.push(choice.question);
    return choice;
  };
  if (plan.kind === "text") {
    const { order } = orderOf(plan.column);
    understood.push({ what: "Time", taken: `column “${name(plan.column)}”`, confidence: "by content" });
    return (row) => stampFromText(cell(row, plan.column), order);
  }
  if (plan.kind === "dateAndTime") {
    const { order } = orderOf(plan.date);
    const hoursOnly = everyRow(table, (row) => Number(cell(row, plan.time) || "0") <= 24);
    understood.push({
      what: "Time",
      taken: `columns “${name(plan.date)}” and “${name(plan.time)}”`,
      confidence: "by content",
    });
    return (row) => {
      const day = dateFromText(cell(row, plan.date), order);
      const text = cell(row, plan.time);
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
  cell: CellReader,
): RowReader {
  const { parts } = plan;
  const columns = columnsOfPlan(plan).map((index) => table.names[index] ?? `${index + 1}`);
  understood.push({ what: "Time", taken: `columns ${columns.join(", ")}`, confidence: "by name" });
  const shortYear = !everyRow(table, (row) => !/^\d{2}$/.test(cell(row, parts.year)));
  if (shortYear)
    understood.push({
      what: "Two-digit years",
      taken: "70–99 as 1970–1999, 00–69 as 2000–2069",
      confidence: "assumed",
    });
  const whole = (text: string): number => (/^\d{1,4}(?:\.0*)?$/.test(text) ? Number(text) : NaN);
  const optional = (row: number, column: number | undefined): number =>
    column === undefined ? 0 : Number(cell(row, column) || NaN);
  return (row) => {
    const yearText = cell(row, parts.year);
    const year = fullYear(whole(yearText), yearText.length);
    const day =
      parts.month !== undefined && parts.day !== undefined
        ? daysFromDate(year, whole(cell(row, parts.month)), whole(cell(row, parts.day)))
        : dayOfYear(year, whole(cell(row, parts.dayOfYear)));
    let hour = optional(row, parts.hour);
    let minute = optional(row, parts.minute);
    if (parts.hourMinute !== undefined) {
      const clock = whole(cell(row, parts.hourMinute));
      hour = Math.floor(clock / 100);
      minute = clock % 100;
    }
    const seconds = secondsOfDay(hour, minute, optional(row, parts.second));
    return day === null || seconds === null ? null : { clock: day * 86400 + seconds, offset: null };
  };
}

function everyRow(table: TextTable, test: (row: number) => boolean): boolean {
  for (let row = 0; row < table.rows.length; row += 1) if (!test(row)) return false;
  return true;
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
  cell: CellReader,
): RowReader {
  const name = table.names[plan.column] ?? `${plan.column + 1}`;
  const value = (row: number): number | null => numberFromText(cell(row, plan.column), table.decimal);
  if (plan.scale !== "spreadsheetDays") {
    const perSecond = plan.scale === "epochSeconds" ? 1 : 1000;
    const unit = perSecond === 1 ? "seconds" : "milliseconds";
    understood.push({
      what: "Time",
      taken: `column “${name}”, ${unit} since 1970-01-01 UTC`,
      confidence: "by content",
    });
    return (row) => {
      const number = value(row);
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
  return (row) => {
    const number = value(row);
    // Day numbers carry the time as a fraction that is rarely exact: to the nearest second.
    return number === null ? null : { clock: Math.round((start + number) * 86400), offset: null };
  };
}
