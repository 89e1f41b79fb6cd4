import { isMissingWord } from "./missing-codes";
import { tidyCell } from "./number-text";

/** What parts the fields of a line; `" "` stands for any run of spaces and tabs. */
export type Delimiter = "\t" | ";" | "|" | "," | " ";

const CANDIDATES: readonly Delimiter[] = ["\t", ";", "|", ",", " "];
const SAMPLE_LINES = 200;

/**
 * Finds the delimiter: the one under which most lines have the same number of fields and most fields are whole numbers,
 * times or blanks (a decimal comma split in two, or a time torn from its date, are not).
 */
export function findDelimiter(lines: readonly string[]): Delimiter | null {
  const sample = sampleOf(lines);
  let best: { delimiter: Delimiter; score: number } | null = null;
  for (const delimiter of CANDIDATES) {
    const score = scoreOf(sample, delimiter);
    if (score > 0 && (best === null || score > best.score + 0.05)) best = { delimiter, score };
  }
  return best?.delimiter ?? null;
}

/** Lines from the start and from the middle, where a long preamble has ended. */
function sampleOf(lines: readonly string[]): string[] {
  const full = (line: string): boolean => line.trim() !== "";
  const start = lines.slice(0, SAMPLE_LINES).filter(full);
  const middle = Math.floor(lines.length / 2);
  return lines.length <= SAMPLE_LINES ? start : [...start, ...lines.slice(middle, middle + SAMPLE_LINES).filter(full)];
}

function scoreOf(sample: readonly string[], delimiter: Delimiter): number {
  const rows = sample.map((line) => splitLine(line, delimiter));
  const counts = new Map<number, number>();
  for (const row of rows) counts.set(row.length, (counts.get(row.length) ?? 0) + 1);
  let common = 0;
  let times = 0;
  for (const [count, met] of counts) {
    if (count < 2 || met < times || (met === times && count < common)) continue;
    common = count;
    times = met;
  }
  if (times === 0) return 0;
  let cells = 0;
  let whole = 0;
  for (const row of rows.filter((candidate) => candidate.length === common)) {
    for (const cell of row) {
      cells += 1;
      if (isWhole(tidyCell(cell).trim())) whole += 1;
    }
  }
  return (times / rows.length) * (0.1 + whole / cells);
}

const NUMBER = /^[+-]?(?:\d[\d.,' ]*|[.,]\d+)(?:[eE][+-]?\d+)?$/;
const STAMP = /^\d{1,4}[-/.:]\d{1,2}(?:[-/.:]\d{1,4})?(?:[T ]+\d{1,2}:?\d{2}.*)?$|^\d{4}(?:\d{4})? ?(?:UTC|Z|T\d+Z?)$/;

function isWhole(cell: string): boolean {
  if (isMissingWord(cell)) return true;
  if (NUMBER.test(cell)) return !/ \d{1,2}(?:[.,]|$)/.test(cell);
  return STAMP.test(cell) || /^(?:[NSEWO]{1,3}|VRB|T)$/.test(cell);
}

/** Splits one line, minding double quotes; for judging, not for reading. */
export function splitLine(line: string, delimiter: Delimiter): string[] {
  if (delimiter === " ") return line.trim().split(/[ \t]+/);
  if (!line.includes('"')) return line.split(delimiter);
  const cells: string[] = [];
  let cell = "";
  let quoted = false;
  for (const character of line) {
    if (character === '"') quoted = !quoted;
    else if (character === delimiter && !quoted) {
      cells.push(cell);
      cell = "";
    } else cell += character;
  }
  return [...cells, cell];
}
