import { isStampName, nameParts, ruleForName, squashedName } from "./column-names";
import { STAMP_NAMES, type StampPart } from "./column-vocabulary";
import { tidyCell } from "./number-text";
import { dateFromText, stampFromText, timeFromText } from "./stamp-text";
import type { TextTable } from "./text-table";

/** Which columns hold the stamps, and how they are written. */
export type StampPlan =
  | { kind: "text"; column: number }
  | { kind: "dateAndTime"; date: number; time: number }
  | { kind: "parts"; parts: Partial<Record<StampPart | "hourMinute", number>> }
  | { kind: "number"; column: number; scale: "epochSeconds" | "epochMilliseconds" | "spreadsheetDays" };

/** Columns a plan uses. */
export function columnsOfPlan(plan: StampPlan): number[] {
  if (plan.kind === "dateAndTime") return [plan.date, plan.time];
  if (plan.kind === "parts") return Object.values(plan.parts);
  return [plan.column];
}

const SAMPLE = 60;
type Looks = "stamp" | "date" | "time" | "number" | "digits" | "other" | "blank";

/**
 * Finds the columns of date and time, by name and by what the cells look like.
 * @param assigned columns that an answer gave the role of time
 * @param barred columns that an answer gave another role
 */
export function findStampColumns(table: TextTable, assigned: number[], barred: ReadonlySet<number>): StampPlan | null {
  const columns = table.names.map((name, index) => ({ name, index, looks: looksOf(table, index) }));
  const open = columns.filter((column) => !barred.has(column.index));
  if (assigned.length > 0) {
    const chosen = columns.filter((column) => assigned.includes(column.index));
    return partsPlan(chosen, table) ?? textPlan(chosen) ?? numberPlan(chosen, table, true);
  }
  const named = open.filter((column) => isStampName(nameParts(column.name).bare) || isStampName(column.name));
  return (
    partsPlan(open, table) ??
    textPlan(named) ??
    numberPlan(named, table, true) ??
    textPlan(open.filter((column) => ruleForName(column.name)?.role === undefined || column.looks === "stamp")) ??
    numberPlan(table.named ? [] : open.slice(0, 1), table, false)
  );
}

interface Column {
  name: string;
  index: number;
  looks: Looks;
}

function textPlan(columns: Column[]): StampPlan | null {
  const stamps = columns.filter((column) => column.looks === "stamp");
  const stamp = stamps.find((column) => /\b(?:utc|gmt)\b/i.test(column.name.replace(/_/g, " "))) ?? stamps[0];
  if (stamp !== undefined) return { kind: "text", column: stamp.index };
  const date = columns.find((column) => column.looks === "date");
  const times = columns.filter((column) => column.looks === "time" || (column.looks === "digits" && column !== date));
  const time = times.find((column) => /\b(?:utc|gmt)\b/i.test(column.name)) ?? times[0];
  if (date !== undefined && time !== undefined) return { kind: "dateAndTime", date: date.index, time: time.index };
  return date === undefined ? null : { kind: "text", column: date.index };
}

function numberPlan(columns: Column[], table: TextTable, named: boolean): StampPlan | null {
  for (const column of columns.filter(({ looks }) => looks === "number" || looks === "digits")) {
    const values = sampleCells(table, column.index).map((cell) => Number(cell.replace(",", ".")));
    const [low, high] = [Math.min(...values), Math.max(...values)];
    if (values.length === 0 || !Number.isFinite(low) || !Number.isFinite(high)) continue;
    if (low >= 1e8 && high < 5e9) return { kind: "number", column: column.index, scale: "epochSeconds" };
    if (low >= 1e11 && high < 5e12) return { kind: "number", column: column.index, scale: "epochMilliseconds" };
    if (named && low >= 15000 && high < 80000)
      return { kind: "number", column: column.index, scale: "spreadsheetDays" };
  }
  return null;
}

function partsPlan(columns: Column[], table: TextTable): StampPlan | null {
  const parts: Partial<Record<StampPart | "hourMinute", number>> = {};
  const numeric = columns.filter((column) => ["number", "digits", "date", "time"].includes(column.looks));
  for (const column of numeric) {
    const squashed = squashedName(nameParts(column.name).bare);
    for (const part of Object.keys(STAMP_NAMES) as StampPart[]) {
      const names: readonly string[] = STAMP_NAMES[part];
      if (names.includes(squashed) && parts[part] === undefined) parts[part] = column.index;
    }
    if (/^(?:hhmm|hourminute|hrmn|hourmin)$/.test(squashed)) parts.hourMinute = column.index;
    // `MM` is the month where it comes before the day, the minute after the hour.
    if (squashed === "mm" && parts.month === undefined && parts.hour === undefined) parts.month = column.index;
    else if (squashed === "mm" && parts.minute === undefined) parts.minute = column.index;
  }
  const hasDate =
    parts.year !== undefined &&
    ((parts.month !== undefined && parts.day !== undefined) || parts.dayOfYear !== undefined);
  if (!hasDate || table.rows.length === 0) return null;
  return { kind: "parts", parts };
}

function sampleCells(table: TextTable, column: number): string[] {
  const cells: string[] = [];
  const stride = Math.max(1, Math.floor(table.rows.length / SAMPLE));
  for (let row = 0; row < table.rows.length && cells.length < SAMPLE; row += stride) {
    const cell = tidyCell(table.rows.cell(row, column) ?? "");
    if (cell !== "") cells.push(cell);
  }
  return cells;
}

function looksOf(table: TextTable, column: number): Looks {
  const cells = sampleCells(table, column);
  if (cells.length === 0) return "blank";
  const counts: Record<Looks, number> = { stamp: 0, date: 0, time: 0, number: 0, digits: 0, other: 0, blank: 0 };
  for (const cell of cells) counts[looksOfCell(cell)] += 1;
  const [looks, count] = (Object.entries(counts) as [Looks, number][]).reduce((best, next) =>
    next[1] > best[1] ? next : best,
  );
  return count >= 0.7 * cells.length ? looks : "other";
}

function looksOfCell(cell: string): Looks {
  if (/^\d{14}$|^\d{12}$|^(?:19|20)\d{8}$/.test(cell) && stampFromText(cell, "ymd") !== null) return "stamp";
  if (/^(?:19|20)\d{6}$/.test(cell) && dateFromText(cell, "ymd") !== null) return "date";
  if (/^\d{1,6}$/.test(cell)) return "digits";
  if (/^[+-]?(?:\d+[.,]?\d*|[.,]\d+)(?:[eE][+-]?\d+)?$/.test(cell)) return "number";
  if (anyOrder(cell, dateFromText)) return "date";
  if (anyOrder(cell, stampFromText)) return "stamp";
  return timeFromText(cell) !== null ? "time" : "other";
}

function anyOrder(cell: string, read: (text: string, order: "dmy" | "mdy") => unknown): boolean {
  return read(cell, "dmy") !== null || read(cell, "mdy") !== null;
}
