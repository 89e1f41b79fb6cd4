import Papa from "papaparse";
import type { Delimiter } from "./delimiter";
import type { ProblemList } from "./problem-list";
import { packedRows, rowsOf, type Rows } from "./rows";
import type { SourceFile } from "./source-file";

export interface SplitRows {
  rows: Rows;
  /** Line of the file on which each row starts, from 1. */
  lines: number[];
}

/**
 * Splits a file into rows of cells. Where a quote is never closed, which would swallow the rest of the file, quotes are
 * read as plain characters and a warning says so.
 */
export function splitRows(source: SourceFile, delimiter: Delimiter, problems: ProblemList): SplitRows {
  const text = delimiter === " " ? source.lines.map(oneTab).join("\n") : source.decoded.text;
  const separator = delimiter === " " ? "\t" : delimiter;
  if (!text.includes('"')) {
    const rows = packedRows(text, separator);
    return { rows, lines: Array.from({ length: rows.length }, (_, index) => index + 1) };
  }
  const parse = (fastMode: boolean): Papa.ParseResult<string[]> =>
    Papa.parse<string[]>(text, { delimiter: separator, newline: "\n", fastMode, skipEmptyLines: false });
  let result = parse(false);
  const broken = result.errors.find((error) => error.type === "Quotes");
  if (broken !== undefined) {
    result = parse(true);
    for (const cells of result.data)
      for (const [index, cell] of cells.entries()) if (cell.includes('"')) cells[index] = cell.replaceAll('"', "");
    problems.add(
      "warning",
      "openQuote",
      "a quotation mark is not closed",
      "Quotation marks were passed over; check the line.",
      { row: (broken.row ?? 0) + 1 },
    );
  }
  const lines: number[] = [];
  let line = 1;
  for (const cells of result.data) {
    lines.push(line);
    line += 1;
    for (const cell of cells) line += newlinesIn(cell);
  }
  return { rows: rowsOf(result.data), lines };
}

function oneTab(line: string): string {
  return line.trim().replace(/[ \t]+/g, "\t");
}

function newlinesIn(cell: string): number {
  let count = 0;
  for (let at = cell.indexOf("\n"); at >= 0; at = cell.indexOf("\n", at + 1)) count += 1;
  return count;
}
