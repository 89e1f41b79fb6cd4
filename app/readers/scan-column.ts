import { compassDegrees, isVariable, meaningOfO } from "./compass";
import { codeTest, isMissingWord } from "./missing-codes";
import { numberFromText, tidyCell } from "./number-text";
import type { ColumnReading } from "./reading";
import { columnOf } from "./rows";
import type { TextTable } from "./text-table";

/** The cells of one column as numbers, in the file's unit. */
export interface ColumnScan {
  /** NaN where missing or unreadable. */
  values: Float64Array;
  /** Rows whose cell is neither a number nor missing. */
  unreadable: { row: number; text: string }[];
  /** Rows with rain too little to measure (`T`), read as 0. */
  trace: number;
  /** Rows whose wind had no one direction (`VRB`). */
  variable: number;
  /** Rows whose cell means missing. */
  missing: number;
}

/**
 * Reads a column's cells.
 * @param codes the column's own missing codes
 * @param traceCodes its own codes for rain too little to measure
 */
export function scanColumn(
  table: TextTable,
  column: number,
  role: ColumnReading["role"],
  codes: readonly string[],
  traceCodes: readonly string[] = [],
): ColumnScan {
  const values = new Float64Array(table.rows.length).fill(NaN);
  const scan: ColumnScan = { values, unreadable: [], trace: 0, variable: 0, missing: 0 };
  const isCode = codeTest(codes, table.decimal);
  const isTrace = codeTest(traceCodes, table.decimal);
  const direction = role === "windFrom" || role === "windTowards";
  const water = role === "rain" || role === "evaporation";
  const o = direction ? meaningOfO(columnOf(table.rows, column)) : null;
  for (let row = 0; row < table.rows.length; row += 1) {
    const text = tidyCell(table.rows.cell(row, column) ?? "").trim();
    const value = numberFromText(text, table.decimal);
    if (isCode(text, value) || (value === null && isMissingWord(text))) {
      scan.missing += 1;
    } else if (isTrace(text, value)) {
      values[row] = 0;
      scan.trace += 1;
    } else if (value !== null) {
      values[row] = value;
    } else if (water && /^(?:t|tr|trace)$/i.test(text)) {
      values[row] = 0;
      scan.trace += 1;
    } else if (direction && isVariable(text)) {
      scan.variable += 1;
      scan.missing += 1;
    } else {
      const degrees = direction ? compassDegrees(text, o) : null;
      if (degrees === null) scan.unreadable.push({ row, text: text.slice(0, 30) });
      else values[row] = degrees;
    }
  }
  return scan;
}

/** Smallest and largest value, ignoring NaN; null where there is none. */
export function rangeOf(values: Float64Array): { low: number; high: number } | null {
  let low = Infinity;
  let high = -Infinity;
  for (const value of values) {
    if (value < low) low = value;
    if (value > high) high = value;
  }
  return low > high ? null : { low, high };
}

/** Median of the finite values; NaN where there is none. */
export function medianOf(values: Iterable<number>): number {
  // A typed array would be copied through its iterator, which takes ten times as long as filtering it.
  const numbers = values instanceof Float64Array ? values : Float64Array.from(values);
  const sorted = numbers.filter(Number.isFinite).sort();
  const middle = Math.floor(sorted.length / 2);
  if (sorted.length === 0) return NaN;
  return sorted.length % 2 === 1
    ? (sorted[middle] ?? NaN)
    : ((sorted[middle - 1] ?? NaN) + (sorted[middle] ?? NaN)) / 2;
}
