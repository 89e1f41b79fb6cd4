import { findDelimiter, type Delimiter } from "./delimiter";
import { decimalSignOf, tidyCell, type DecimalSign } from "./number-text";
import type { ProblemList } from "./problem-list";
import { UnreadableFile, type ReadingAnswers, type SeriesReading, type Understood } from "./reading";
import { chosenRows, type Rows } from "./rows";
import { seriesFromTable } from "./series-from-table";
import type { SourceFile } from "./source-file";
import { splitRows, type SplitRows } from "./split-table";
import { findLayout, type TableLayout } from "./table-layout";
import type { FormatKnowledge, TextTable } from "./text-table";

const DELIMITER_WORDS: Record<Delimiter, string> = {
  "\t": "tab",
  ";": "semicolon",
  "|": "bar",
  ",": "comma",
  " ": "space",
};
const DECIMAL_ROWS = 2000;
/** No station has so many instruments: more are a grid, or not a table of times. */
const MAX_COLUMNS = 1000;

/** Reads delimited text of any kind: finds delimiter, decimal sign, names, units, records and notes. */
export function readDelimited(source: SourceFile, answers: ReadingAnswers, problems: ProblemList): SeriesReading {
  return readDelimitedAs((delimiter, decimal) => knowledgeOf(source, delimiter, decimal), source, answers, problems);
}

/** Reads delimited text of which more is known than its fields: `know` says what, once these have been found. */
export function readDelimitedAs(
  know: (delimiter: Delimiter, decimal: DecimalSign) => FormatKnowledge,
  source: SourceFile,
  answers: ReadingAnswers,
  problems: ProblemList,
): SeriesReading {
  const delimiter = findDelimiter(source.lines);
  if (delimiter === null) {
    refuse(source.lines, problems);
    throw new UnreadableFile(problems.toArray());
  }
  const split = splitRows(source, delimiter, problems);
  return seriesFromRows(split, (decimal) => know(delimiter, decimal), source.fileName, answers, problems);
}

/**
 * From rows of cells, wherever they come from, to a series: finds the layout of the table, its names, units and notes.
 * @throws UnreadableFile where the rows hold no table of times and numbers
 */
export function seriesFromRows(
  split: SplitRows,
  know: (decimal: DecimalSign) => FormatKnowledge,
  fileName: string,
  answers: ReadingAnswers,
  problems: ProblemList,
): SeriesReading {
  let widest = 0;
  for (let row = 0; row < split.rows.length; row += 1) widest = Math.max(widest, split.rows.width(row));
  if (widest > MAX_COLUMNS) {
    problems.add(
      "error",
      "tooManyColumns",
      `a line has ${widest} fields; the limit is ${MAX_COLUMNS}`,
      "Give a table with one line a time and a column a quantity.",
    );
    throw new UnreadableFile(problems.toArray());
  }
  const layout = findLayout(split);
  if (layout === null) {
    refuse(textOfRows(split.rows, split.rows.length), problems);
    throw new UnreadableFile(problems.toArray());
  }
  const records = recordsOf(split, layout, problems);
  const decimal = decimalSignOf(cellsOf(records.rows));
  if (decimal.ambiguous) {
    problems.add(
      "warning",
      "ambiguousDecimal",
      "commas in numbers could be decimal signs or thousands separators; they were taken for decimal signs",
      "Check the values.",
    );
  }
  const table: TextTable = {
    names: layout.names,
    unitTexts: layout.unitTexts,
    rows: records.rows,
    lines: records.lines,
    decimal: decimal.sign,
    preamble: textOfRows(split.rows, layout.firstData),
    named: layout.named,
  };
  if (!layout.named) {
    problems.add("warning", "noHeader", "the columns have no names", "Say on the reading sheet what each column is.", {
      row: records.lines[0] ?? 1,
    });
  }
  return seriesFromTable(table, know(decimal.sign), fileName, answers, problems);
}

function refuse(textLines: readonly string[], problems: ProblemList): void {
  const first = textLines.findIndex((line) => line.trim() !== "");
  const filled = textLines.filter((line) => line.trim() !== "");
  const digits = filled.slice(1).some((line) => /\d/.test(line));
  const shown = (textLines[first] ?? "").trim().slice(0, 120);
  if (!digits) {
    problems.add(
      "error",
      "onlyHeader",
      `the file has a header but no records: “${shown}”`,
      "Give a file with records.",
      { row: first + 1 },
    );
    return;
  }
  problems.add(
    "error",
    "noTable",
    `no table of dates and numbers was found; the first line is “${shown}”`,
    "Give a table with a line of column names, a column of dates and times, and numbers, parted by commas, semicolons, tabs, bars or spaces.",
    { row: first + 1 },
  );
}

/** Rows of the table without blank lines, remarks and repeated headers, each passed over with a note. */
function recordsOf(split: SplitRows, layout: TableLayout, problems: ProblemList): SplitRows {
  const kept: number[] = [];
  const lines: number[] = [];
  for (let index = layout.firstData; index < split.rows.length; index += 1) {
    const cells = split.rows.row(index);
    const row = split.lines[index] ?? 0;
    if (cells.every((cell) => tidyCell(cell).trim() === "")) continue;
    if (index >= layout.endData) {
      problems.add("note", "footer", "notes below the table", "They were passed over.", { row });
    } else if (/^\s*[#%]/.test(cells[0] ?? "")) {
      problems.add("note", "remark", "a remark within the table", "It was passed over.", { row });
    } else if (layout.named && isHeaderAgain(cells, layout.names)) {
      problems.add("note", "repeatedHeader", "the header is repeated within the table", "The line was passed over.", {
        row,
      });
    } else {
      kept.push(index);
      lines.push(row);
    }
  }
  return { rows: chosenRows(split.rows, kept), lines };
}

function textOfRows(rows: Rows, count: number): string[] {
  return Array.from({ length: count }, (_, index) => rows.row(index).join(" "));
}

function isHeaderAgain(cells: readonly string[], names: readonly string[]): boolean {
  return cells.length >= names.length && names.every((name, index) => name === tidyCell(cells[index] ?? "").trim());
}

function* cellsOf(rows: Rows): Iterable<string> {
  const stride = Math.max(1, Math.floor(rows.length / DECIMAL_ROWS));
  for (let index = 0; index < rows.length; index += stride) yield* rows.row(index);
}

function knowledgeOf(source: SourceFile, delimiter: Delimiter, decimal: string): FormatKnowledge {
  const { encoding, byteOrderMark, lineEnds } = source.decoded;
  const understood: Understood[] = [
    {
      what: "Encoding",
      taken: `${encoding}${byteOrderMark ? " with byte order mark" : ""}, line ends ${lineEnds}`,
      confidence: "by content",
    },
    {
      what: "Fields",
      taken: `parted by ${DELIMITER_WORDS[delimiter]}, decimal ${decimal === "," ? "comma" : "point"}`,
      confidence: "by content",
    },
  ];
  return {
    id: "delimited",
    label: "delimited text",
    zone: null,
    columnByName: () => null,
    windHeightHint: {
      suggestion: "10",
      message: "At which height was the wind measured, in m above the ground or the sea? The file does not say.",
    },
    averagingHint: null,
    understood,
  };
}
