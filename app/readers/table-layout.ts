import { isStampName, nameParts, ruleForName, squashedName } from "./column-names";
import { STAMP_NAMES } from "./column-vocabulary";
import { unitFromText } from "./file-units";
import { isMissingWord } from "./missing-codes";
import { numberFromText, tidyCell } from "./number-text";
import type { Rows } from "./rows";
import type { SplitRows } from "./split-table";
import { stampFromText, timeFromText } from "./stamp-text";

/** Where the parts of a table stand among its rows. */
export interface TableLayout {
  names: string[];
  unitTexts: (string | null)[];
  named: boolean;
  firstData: number;
  /** Row after the last record; what follows are notes. */
  endData: number;
}

/** Rows looked at for the start of the records: no preamble is longer. */
const SEARCHED = 500;
const HEADER_ROWS = 4;
const LONGEST_NAME = 120;

/** Finds names, units, records and notes at the foot; null where no row looks like a record. */
export function findLayout(split: SplitRows): TableLayout | null {
  const { rows } = split;
  const kinds = Array.from({ length: Math.min(SEARCHED, rows.length) }, (_, index) => kindOf(rows.row(index)));
  const width = commonWidth(rows);
  const digital = kinds.filter((kind) => kind.numbers + kind.stamps > 0);
  const stamped = digital.filter((kind) => kind.stamps > 0).length > 0.3 * digital.length;
  const isRecord = (index: number): boolean => {
    const kind = index < kinds.length ? kinds[index] : kindOf(rows.row(index));
    if (kind === undefined || kind.filled === 0) return false;
    const enough = Math.abs(rows.width(index) - width) <= 1 || kind.filled >= 0.7 * width;
    return (
      enough &&
      kind.numbers + kind.stamps > 0 &&
      kind.numbers + kind.stamps >= 0.5 * kind.filled &&
      (!stamped || kind.stamps > 0)
    );
  };
  const firstData = kinds.findIndex((_, index) => isRecord(index));
  if (firstData < 0) return null;
  let endData = rows.length;
  while (endData > firstData + 1 && !isRecord(endData - 1) && isNote(rows.row(endData - 1), width)) endData -= 1;
  return { ...findHeader(rows, firstData, width), firstData, endData };
}

interface RowKind {
  filled: number;
  numbers: number;
  stamps: number;
}

function kindOf(cells: readonly string[]): RowKind {
  const kind: RowKind = { filled: 0, numbers: 0, stamps: 0 };
  for (const cell of cells) {
    const text = tidyCell(cell).trim();
    if (text === "") continue;
    kind.filled += 1;
    if (numberFromText(text, ".") !== null || numberFromText(text, ",") !== null) kind.numbers += 1;
    else if (
      /\d/.test(text) &&
      (stampFromText(text, "dmy") ?? stampFromText(text, "mdy") ?? timeFromText(text)) !== null
    )
      kind.stamps += 1;
    else if (isMissingWord(text)) kind.numbers += 1;
  }
  return kind;
}

function commonWidth(rows: Rows): number {
  const counts = new Map<number, number>();
  for (let row = 0; row < rows.length; row += 1) {
    const length = rows.width(row);
    if (length > 1) counts.set(length, (counts.get(length) ?? 0) + 1);
  }
  let width = 1;
  let times = 0;
  for (const [length, count] of counts) if (count > times) [width, times] = [length, count];
  return width;
}

const SUMMARY =
  /^(?:mean|average|avg|media|moyenne|mittel\w*|total|sum|suma|soma|somme|summe|max\w*|min\w*|std\w*|count|n|end|eof|source|note\w*)\b/i;

/**
 * A row at the foot that is no record: blank, a remark, or a mean or total under a word. A full row of numbers under any
 * other word is a record with an unreadable time.
 */
function isNote(cells: readonly string[], width: number): boolean {
  const kind = kindOf(cells);
  const first = tidyCell(cells.find((cell) => cell.trim() !== "") ?? "").trim();
  if (kind.filled === 0 || /^[*#;"']/.test(first) || (kind.stamps === 0 && SUMMARY.test(first))) return true;
  return kind.stamps === 0 && kind.numbers < 0.5 * width;
}

function findHeader(rows: Rows, firstData: number, width: number): Pick<TableLayout, "names" | "unitTexts" | "named"> {
  const block: string[][] = [];
  for (let index = firstData - 1; index >= 0 && block.length < HEADER_ROWS; index -= 1) {
    const cells = rows.row(index);
    const kind = kindOf(cells);
    if (kind.filled === 0 && block.length === 0) continue;
    if (kind.filled < Math.max(1, 0.4 * width) || kind.numbers > 0.5 * kind.filled) break;
    block.unshift(cells.map((cell) => tidyCell(cell).trim()));
  }
  const scores = block.map((cells) => ({
    names: countIf(cells, isKnownName),
    units: countIf(cells, (cell) => unitFromText(cell) !== null),
  }));
  let nameRow = -1;
  for (const [index, score] of scores.entries()) {
    if (score.units > score.names) continue;
    if (nameRow < 0 || score.names >= (scores[nameRow]?.names ?? 0)) nameRow = index;
  }
  const dataWidth = widthWithoutTrailing(rows, firstData, width);
  if (nameRow < 0) {
    return {
      names: Array.from({ length: dataWidth }, (_, index) => `column ${index + 1}`),
      unitTexts: new Array<null>(dataWidth).fill(null),
      named: false,
    };
  }
  let names = block[nameRow] ?? [];
  const merged = mergedNames(block[nameRow - 1], names);
  if (merged !== null && countIf(merged, isKnownName) > countIf(names, isKnownName)) names = merged;
  while (names.length > 1 && names.length > dataWidth - 1 && names.at(-1) === "") names = names.slice(0, -1);
  const unitRow = scores.findIndex(
    (score, index) => index !== nameRow && score.units > 0 && score.units >= score.names,
  );
  const units = unitRow < 0 ? [] : (block[unitRow] ?? []);
  return {
    names: names.map((name) => name.replace(/^[#%;]+\s*/, "").slice(0, LONGEST_NAME)),
    unitTexts: names.map((_, index) =>
      units[index] === undefined || units[index] === "" ? null : (units[index] ?? null),
    ),
    named: true,
  };
}

/** A trailing delimiter makes an empty last field in every row. */
function widthWithoutTrailing(rows: Rows, firstData: number, width: number): number {
  const count = Math.min(50, rows.length - firstData);
  const first = Array.from({ length: count }, (_, index) => rows.row(firstData + index));
  const sample = first.filter((row) => row.length === width);
  const trailing = sample.length > 0 && sample.every((row) => (row.at(-1) ?? "").trim() === "");
  return trailing ? width - 1 : width;
}

/** Group names above, spread to the right over their columns, before the names below: `Wind` + `Speed`. */
function mergedNames(above: string[] | undefined, names: string[]): string[] | null {
  if (above === undefined || !above.includes("")) return null;
  let group = "";
  return names.map((name, index) => {
    if ((above[index] ?? "") !== "") group = above[index] ?? "";
    return `${group} ${name}`.trim();
  });
}

const PARTS: readonly string[] = Object.values(STAMP_NAMES).flat();

function isKnownName(cell: string): boolean {
  if (cell === "") return false;
  return ruleForName(cell) !== null || isStampName(cell) || PARTS.includes(squashedName(nameParts(cell).bare));
}

function countIf(cells: readonly string[], test: (cell: string) => boolean): number {
  return cells.reduce((count, cell) => (test(cell) ? count + 1 : count), 0);
}
