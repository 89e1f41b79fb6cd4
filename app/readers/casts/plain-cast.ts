import { findDelimiter } from "../delimiter";
import type { ProblemList } from "../problem-list";
import type { SourceFile } from "../source-file";
import { splitRows } from "../split-table";
import { castColumns } from "./cast-columns";
import type { CastTable } from "./cast-table";

const LINES_OF_HEADER = 200;

/** Whether a line of names near the top has depth or pressure, temperature, and salt, but neither wind nor a time. */
export function isPlainCast(source: SourceFile): boolean {
  return source.lines.slice(0, LINES_OF_HEADER).some((line) => {
    if (/^\s*[%#*]/.test(line) || /\b(?:time|date|wind)/i.test(line)) return false;
    const cells = line.split(/[,;\t]/);
    const channels = castColumns(cells.map(bareName), cells.map(unitOf)).map(({ channel }) => channel);
    const salt = channels.includes("salinity") || channels.includes("conductivity");
    return salt && channels.includes("temperature") && (channels.includes("pressure") || channels.includes("depth"));
  });
}

/**
 * Takes delimited text apart: remarks with keys above (`% Start latitude,-36.2`), one line of names with units in
 * brackets or in a line beneath, then numbers. Handheld instruments and spreadsheets write casts so.
 * @returns null where no line of names has a depth or pressure beside a temperature
 */
export function plainTable(source: SourceFile, problems: ProblemList): CastTable | null {
  const keys = new Map<string, string>();
  const remark = /^\s*[%#*]/;
  const body = source.lines.map((line) => {
    if (!remark.test(line)) return line;
    const pair = /^\s*[%#*]+\s*([^,:=]+?)\s*[,:=]\s*(.*?)\s*$/.exec(line);
    if (pair) keys.set(pair[1].toLowerCase(), pair[2]);
    return "";
  });
  const delimiter = findDelimiter(body);
  if (delimiter === null) return null;
  const split = splitRows(
    { ...source, lines: body, decoded: { ...source.decoded, text: body.join("\n") } },
    delimiter,
    problems,
  );
  const header = split.rows.slice(0, LINES_OF_HEADER).findIndex((cells) => {
    const channels = castColumns(cells.map(bareName), cells.map(unitOf)).map(({ channel }) => channel);
    return channels.includes("temperature") && (channels.includes("pressure") || channels.includes("depth"));
  });
  if (header < 0) return null;
  const names = split.rows[header] ?? [];
  const beneath = split.rows[header + 1] ?? [];
  const hasUnits = beneath.some((cell) => cell.trim() !== "") && beneath.every((cell) => !/^\s*-?\d/.test(cell));
  const rows: string[][] = [];
  const lines: number[] = [];
  for (let at = header + (hasUnits ? 2 : 1); at < split.rows.length; at += 1) {
    const cells = split.rows[at] ?? [];
    if (cells.every((cell) => cell.trim() === "")) continue;
    rows.push(cells);
    lines.push(split.lines[at] ?? 0);
  }
  return {
    names: names.map(bareName),
    units: names.map((name, index) => unitOf(name) ?? (hasUnits ? (beneath[index] ?? null) : null)),
    rows,
    lines,
    missing: [-999, -9999, -99],
    flagOf: new Map(),
    badFlags: [],
    time: timeOf(keys.get("cast time (utc)")),
    latitude: numberOf(keys.get("start latitude") ?? keys.get("latitude")),
    longitude: numberOf(keys.get("start longitude") ?? keys.get("longitude")),
  };
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
