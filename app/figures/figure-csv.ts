import { csvCell } from "./csv-cell";
import type { FigureTable } from "./figure";

/**
 * The table as CSV after RFC 4180: a header with units, lines that end in CRLF, numbers unrounded with a point and an
 * ASCII minus, missing values empty. Text that a spreadsheet would run as a formula gets an apostrophe before it.
 */
export function figureCsv(table: FigureTable): string {
  const header = table.columns.map(({ name, unit }) => csvCell(unit === "" ? name : `${name} (${unit})`));
  const rows = table.rows.map((row) => row.map(cell));
  return [header, ...rows].map((cells) => `${cells.join(",")}\r\n`).join("");
}

function cell(value: string | number | null): string {
  if (value === null) return "";
  if (typeof value === "number") return Number.isFinite(value) ? String(value) : "";
  return csvCell(value);
}
