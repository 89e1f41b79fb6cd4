/** A cast as its form hands it on: cells by column, and what the header tells. */
export interface CastTable {
  names: string[];
  /** Units as written, or null. */
  units: (string | null)[];
  rows: string[][];
  /** Line of the file of each row, from 1. */
  lines: number[];
  /** Values that mean missing in any column. */
  missing: number[];
  /** Column of the quality flag that belongs to a column. */
  flagOf: ReadonlyMap<number, number>;
  /** Flags whose values are left out. */
  badFlags: readonly string[];
  time: string | null;
  latitude: number | null;
  longitude: number | null;
}
