import { formatNumber } from "~/units/format-quantity";
import type { FigureTable } from "./figure";

/** Decimals to read a column by: its own, else about six figures for its greatest number, at most three decimals. */
export function columnDecimals(table: FigureTable, column: number): number {
  const own = table.columns[column]?.decimals;
  if (own !== undefined) return own;
  let greatest = 0;
  for (const row of table.rows) {
    const value = row[column];
    if (typeof value === "number") greatest = Math.max(greatest, Math.abs(value));
  }
  if (table.rows.every((row) => row[column] === null || Number.isInteger(row[column]))) return 0;
  return greatest === 0 ? 0 : Math.min(3, Math.max(0, 5 - Math.floor(Math.log10(greatest))));
}

/** A cell as it is read: empty cells say so. */
export function cellText(value: string | number | null, decimals: number): string {
  if (value === null) return "no value";
  return typeof value === "number" ? formatNumber(value, decimals) : value;
}
