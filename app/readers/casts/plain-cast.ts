import { findDelimiter } from "../delimiter";
import { decimalSignOf, numberFromText, tidyCell } from "../number-text";
import type { ProblemList } from "../problem-list";
import type { SourceFile } from "../source-file";
import { splitRows } from "../split-table";
import { channelsNamed } from "./cast-columns";
import { PLAIN_TABLE, type CastTable } from "./cast-table";

const LINES_OF_HEADER = 200;
const REMARK = /^\s*[%#*]/;

/** Whether a line of names near the top has depth or pressure, temperature, and salt, but neither wind nor a time. */
export function isPlainCast(source: SourceFile): boolean {
  return source.lines.slice(0, LINES_OF_HEADER).some((line) => {
    if (REMARK.test(line) || /\b(?:time|date|wind)/i.test(line)) return false;
    const channels = channelsNamed(line.split(/[,;\t]/).map(bareName));
    const salt = channels.includes("salinity") || channels.includes("conductivity");
    return salt && channels.includes("temperature") && (channels.includes("pressure") || channels.includes("depth"));
  });
}

/**
 * Takes delimited text apart: remarks with keys above (`% Start latitude,-36.2`), a line of names with units in brackets
 * or in a line beneath, then numbers. Handheld instruments and spreadsheets write casts so. A column of stations parts
 * the rows into casts.
 * @returns none where the text is no table of at least three columns of numbers
 */
export function plainTables(source: SourceFile, problems: ProblemList): CastTable[] {
  const keys = new Map<string, string>();
  const body = source.lines.map((line) => {
    if (!REMARK.test(line)) return line;
    const pair = /^\s*[%#*]+\s*([^,:=]+?)\s*[,:=]\s*(.*?)\s*$/.exec(line);
    if (pair) keys.set(pair[1].toLowerCase(), pair[2]);
    return "";
  });
  const delimiter = findDelimiter(body);
  if (delimiter === null) return [];
  const split = splitRows(
    { ...source, lines: body, decoded: { ...source.decoded, text: body.join("\n") } },
    delimiter,
    problems,
  );
  const all = Array.from({ length: split.rows.length }, (_, row) => split.rows.row(row));
  const header = headerOf(all);
  if (!header) return [];
  const { written, first } = header;
  const beneath = all[first] ?? [];
  const hasUnits = written.length > 0 && beneath.some((cell) => cell.trim() !== "") && !beneath.some(isNumber);
  const rows: string[][] = [];
  const lines: number[] = [];
  for (let at = first + (hasUnits ? 1 : 0); at < all.length; at += 1) {
    const cells = all[at] ?? [];
    if (cells.every((cell) => cell.trim() === "")) continue;
    rows.push(cells);
    lines.push(split.lines[at] ?? 0);
  }
  const names = Array.from({ length: Math.max(written.length, header.width) }, (_, index) => {
    const name = bareName(written[index] ?? "");
    return name === "" ? `column ${index + 1}` : name;
  });
  const table: CastTable = {
    ...PLAIN_TABLE,
    label: "the file's cast",
    names,
    named: written.length > 0,
    units: names.map(
      (_, index) => unitOf(written[index] ?? "") ?? (hasUnits ? (beneath[index]?.trim() ?? null) : null),
    ),
    rows,
    lines,
    decimal: delimiter === "," ? "." : decimalSignOf(rows.slice(0, LINES_OF_HEADER).flat()).sign,
    missing: [-999, -9999, -99, -999.9, -9.99e-29],
    time: timeOf(keys.get("cast time (utc)")),
    latitude: numberOf(keys.get("start latitude") ?? keys.get("latitude")),
    longitude: numberOf(keys.get("start longitude") ?? keys.get("longitude")),
  };
  return byStation(table);
}

interface Header {
  /** Names with their units; empty where there are none. */
  written: readonly string[];
  /** The row after the names. */
  first: number;
  width: number;
}

/** The row of names is one that speaks of a cast's channels, else the last above a table of numbers. */
function headerOf(rows: readonly string[][]): Header | null {
  const top = rows.slice(0, LINES_OF_HEADER);
  const spoken = top.findIndex((cells) => {
    const channels = channelsNamed(cells.map(bareName)).filter((channel) => channel !== null);
    return new Set(channels).size >= 2 && !cells.some(isNumber);
  });
  if (spoken >= 0) return { written: rows[spoken], first: spoken + 1, width: rows[spoken].length };
  const first = top.findIndex((cells) => cells.filter(isNumber).length >= 3 && cells.every(isNumberOrBlank));
  if (first < 0) return null;
  const above = rows[first - 1] ?? [];
  const width = rows[first].length;
  const named = above.length === width && above.every((cell) => cell.trim() !== "" && !isNumber(cell));
  return { written: named ? above : [], first, width };
}

const STATION = /^(?:station|stn|stat|cast|castno|cast[_ ](?:no|id|number)|profile|event|site)\.?$/i;
const MOST_CASTS = 200;

function byStation(table: CastTable): CastTable[] {
  const column = table.names.findIndex((name) => STATION.test(name));
  if (column < 0) return [table];
  const members = new Map<string, number[]>();
  table.rows.forEach((cells, k) => {
    const station = cells[column]?.trim() ?? "";
    members.set(station, [...(members.get(station) ?? []), k]);
  });
  if (members.size < 2 || members.size > MOST_CASTS) return [table];
  return [...members].map(([station, indices]) => ({
    ...table,
    label: `${table.names[column]} ${station === "" ? "not told" : station}`,
    rows: indices.map((k) => table.rows[k]),
    lines: indices.map((k) => table.lines[k]),
  }));
}

function isNumber(cell: string): boolean {
  const tidy = tidyCell(cell).trim();
  return numberFromText(tidy, ".") !== null || numberFromText(tidy, ",") !== null;
}

function isNumberOrBlank(cell: string): boolean {
  return cell.trim() === "" || isNumber(cell) || /^nan$/i.test(cell.trim());
}

function bareName(cell: string): string {
  return cell.replace(/[([{].*$/, "").trim();
}

function unitOf(cell: string): string | null {
  return /[([{]([^)\]}]+)[)\]}]/.exec(cell)?.[1]?.trim() ?? null;
}

function numberOf(text: string | undefined): number | null {
  const value = Number(text ?? "");
  return text === undefined || text === "" || !Number.isFinite(value) ? null : value;
}

function timeOf(text: string | undefined): string | null {
  const match = /^(\d{4}-\d{2}-\d{2})[ T](\d{2}:\d{2}:\d{2})$/.exec(text ?? "");
  return match ? `${match[1]}T${match[2]}Z` : null;
}
