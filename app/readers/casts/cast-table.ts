import type { DecimalSign } from "../number-text";
import type { Understood } from "../reading";

/** A cast as its form hands it on: cells by column, and what the header tells. */
export interface CastTable {
  /** Tells it from others of the file: a station, a number. */
  label: string;
  names: string[];
  /** Whether the names stand in the file; else they are made up. */
  named: boolean;
  /** Units as written, or null. */
  units: (string | null)[];
  rows: string[][];
  /** Line of the file of each row, from 1. */
  lines: number[];
  decimal: DecimalSign;
  /** Values that mean missing in any column. */
  missing: number[];
  /** Column of the quality flag that belongs to a column. */
  flagOf: ReadonlyMap<number, number>;
  /** Flags whose values are left out. */
  badFlags: readonly string[];
  /** Flags whose values are kept and told of. */
  doubtfulFlags: readonly string[];
  /** Whether the file marks a whole record as bad, by its cells. */
  isBadRow: (cells: readonly string[]) => boolean;
  time: string | null;
  timeConfidence: Understood["confidence"];
  latitude: number | null;
  longitude: number | null;
}

/** What most forms lack. */
export const PLAIN_TABLE = {
  named: true,
  decimal: ".",
  flagOf: new Map<number, number>(),
  badFlags: [],
  doubtfulFlags: [],
  isBadRow: () => false,
  timeConfidence: "stated in the file",
} as const satisfies Partial<CastTable>;
