import type { DecimalSign } from "./number-text";
import type { Rows } from "./rows";
import type { ColumnReading, Understood } from "./reading";

/** A table of text as a format reader hands it on: names, units as written, cells, and where each row stands. */
export interface TextTable {
  names: string[];
  /** From a row of units, or null. */
  unitTexts: (string | null)[];
  /** Cells as written; a row may be shorter or longer than `names`. */
  rows: Rows;
  /** Line of the file of each row, from 1. */
  lines: number[];
  decimal: DecimalSign;
  /** Lines above the table. */
  preamble: string[];
  /** Whether the file has a line of names. */
  named: boolean;
}

/** What a format fixes for a column by its definition. */
export interface KnownColumn {
  role: ColumnReading["role"];
  unit: string | null;
  /** Null where the values must tell. */
  missingCodes: string[] | null;
  /** Codes for rain too little to measure. */
  traceCodes?: string[];
  note?: string;
  /** Where the file itself states what the column is; else it is by the format. */
  confidence?: Understood["confidence"];
  /** m above the sea */
  height?: number;
  averagingMinutes?: number;
  /** False where the format leaves open which way a flux counts. */
  senseKnown?: boolean;
  /** Shortwave: whether what is reflected is taken off. */
  net?: boolean;
}

/** What a format fixes for a whole file. */
export interface FormatKnowledge {
  id: string;
  label: string;
  /** Zone of the stamps where the format's definition fixes it. */
  zone: string | null;
  columnByName: (name: string) => KnownColumn | null;
  windHeightHint: { suggestion: string; message: string };
  averagingHint: { suggestion: string; message: string } | null;
  understood: Understood[];
}

const NAMES_SHOWN = 20;

/** The columns of a table for a message: their names, the first twenty. */
export function columnsSeen(table: Pick<TextTable, "names">): string {
  const shown = table.names.slice(0, NAMES_SHOWN).map((name) => `“${name.trim()}”`);
  const more = table.names.length - shown.length;
  return `${shown.join(", ")}${more > 0 ? ` and ${more} more` : ""}`;
}
