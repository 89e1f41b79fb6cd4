import { read, type CellObject, type WorkBook, type WorkSheet } from "@e965/xlsx";
import { unzipSync, zipSync } from "fflate";
import { seriesFromRows } from "./delimited";
import { isWorkbook } from "./magic-bytes";
import type { ProblemList } from "./problem-list";
import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "./reading";
import { rowsOf } from "./rows";
import { isSizeAllowed } from "./source-file";
import type { FormatKnowledge } from "./text-table";

/** Largest size of a workbook's parts once unpacked, bytes: above, it is a bomb or no record of one storm. */
const MAX_UNPACKED_BYTES = 512 * 1024 * 1024;
const MAX_CELLS = 20_000_000;

interface SheetRows {
  rows: string[][];
  /** Row of the sheet, from 1. */
  lines: number[];
}

/**
 * Reads one sheet of an Excel workbook as a table: numbers in full, dates as their cells show them, formulas by the value
 * that was saved with them. Of several sheets with a table, which one is a question.
 * @throws UnreadableFile where the workbook is damaged, too large, or holds no table
 */
export function readWorkbook(
  bytes: Uint8Array,
  fileName: string,
  answers: ReadingAnswers,
  problems: ProblemList,
): SeriesReading {
  if (!isSizeAllowed(bytes, fileName, problems)) throw new UnreadableFile(problems.toArray());
  const workbook = open(bytes, fileName, problems);
  const sheets = workbook.SheetNames.flatMap((name) => {
    const rows = cellsOf(workbook.Sheets[name], problems);
    return rows.rows.filter((cells) => cells.some((cell) => cell !== "")).length > 1 ? [{ name, rows }] : [];
  });
  const largest = [...sheets].sort((a, b) => b.rows.rows.length - a.rows.rows.length)[0];
  const sheet = sheets.find(({ name }) => name === answers.sheet) ?? largest;
  if (!sheet) {
    problems.add("error", "noTable", `no sheet of “${fileName}” has rows`, "Give a workbook with the table in it.");
    throw new UnreadableFile(problems.toArray());
  }
  const reading = seriesFromRows(
    { ...sheet.rows, rows: rowsOf(sheet.rows.rows) },
    () => knowledgeOf(sheet.name),
    fileName,
    answers,
    problems,
  );
  if (sheets.length === 1) return reading;
  return {
    ...reading,
    questions: [
      {
        key: "sheet",
        needed: answers.sheet === undefined,
        message: `The workbook has ${sheets.length} sheets with rows. Which one holds the record?`,
        options: sheets.map(({ name, rows }) => ({ value: name, label: `${name} (${rows.rows.length} rows)` })),
        suggestion: sheet.name,
        ...(answers.sheet !== undefined && { answer: answers.sheet }),
      },
      ...reading.questions,
    ],
  };
}

function open(bytes: Uint8Array, fileName: string, problems: ProblemList): WorkBook {
  const refuse = (code: string, what: string, toDo: string): never => {
    problems.add("error", code, `“${fileName}” ${what}`, toDo);
    throw new UnreadableFile(problems.toArray());
  };
  const kind = isWorkbook(bytes);
  if (kind === "zipped" && unpackedSize(bytes) > MAX_UNPACKED_BYTES) {
    return refuse(
      "tooLarge",
      `would unpack to more than ${MAX_UNPACKED_BYTES / (1024 * 1024)} MB`,
      "Save only the sheet with the record, without formats and pictures.",
    );
  }
  try {
    // The dates of UTC stand for the clock that the cells show: nothing is shifted by where this runs.
    return read(kind === "zipped" ? zipSync(unzipSync(bytes), { level: 0 }) : bytes, {
      type: "array",
      dense: true,
      cellDates: true,
      UTC: true,
      cellNF: true,
      cellHTML: false,
    });
  } catch {
    return refuse(
      "damagedWorkbook",
      "could not be opened: it is damaged, or locked by a password",
      "Open it in a spreadsheet program, save it anew without a password, or export the sheet as CSV.",
    );
  }
}

/** What the archive says its parts add up to; infinite where it cannot be read. */
function unpackedSize(bytes: Uint8Array): number {
  let size = 0;
  try {
    unzipSync(bytes, {
      filter: ({ originalSize }) => {
        size += originalSize;
        return false;
      },
    });
  } catch {
    return Number.POSITIVE_INFINITY;
  }
  return size;
}

function cellsOf(sheet: WorkSheet | undefined, problems: ProblemList): SheetRows {
  const data: (CellObject[] | undefined)[] = sheet?.["!data"] ?? [];
  const rows: string[][] = [];
  const lines: number[] = [];
  let cells = 0;
  for (let row = 0; row < data.length; row += 1) {
    const source = data[row] ?? [];
    cells += source.length;
    if (cells > MAX_CELLS) {
      problems.add("error", "tooLarge", `a sheet has more than ${MAX_CELLS} cells`, "Cut it to the days of the storm.");
      throw new UnreadableFile(problems.toArray());
    }
    // From the first to the last cell: holes of a sparse row are blank cells.
    rows.push(Array.from(source, (cell) => (cell ? textOf(cell) : "")));
    lines.push(row + 1);
  }
  const width = rows.reduce((most, row) => Math.max(most, row.length), 0);
  for (const row of rows) while (row.length < width) row.push("");
  return { rows, lines };
}

/** A cell as a file of text would have it. */
function textOf({ t: type, v: value, z: format }: CellObject): string {
  if (value === undefined || type === "z") return "";
  if (type === "e") return "#N/A";
  if (value instanceof Date) return clockText(value, typeof format === "string" ? format : "");
  return String(value).replace(/[\t\r\n]+/g, " ");
}

/** A date's text by what its format shows: date, time of day, or both; spreadsheets keep parts of days, so seconds are rounded. */
function clockText(date: Date, format: string): string {
  const iso = new Date(Math.round(date.getTime() / 1000) * 1000).toISOString();
  const bare = format.replace(/"[^"]*"|\[\$?[^\]]*\]/g, "");
  const hasDate = /[yd]/i.test(bare) || !/[hs]/i.test(bare);
  const hasTime = /[hs]/i.test(bare) || iso.slice(11, 19) !== "00:00:00";
  if (!hasDate) return iso.slice(11, 19);
  return hasTime ? `${iso.slice(0, 10)} ${iso.slice(11, 19)}` : iso.slice(0, 10);
}

function knowledgeOf(sheet: string): FormatKnowledge {
  return {
    id: "workbook",
    label: "Excel workbook",
    zone: null,
    columnByName: () => null,
    windHeightHint: {
      suggestion: "10",
      message: "At which height was the wind measured, in m above the ground or the sea? The file does not say.",
    },
    averagingHint: null,
    understood: [{ what: "Sheet", taken: sheet, confidence: "by content" }],
  };
}
