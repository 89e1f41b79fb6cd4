import type { SourceFile } from "../source-file";
import type { CastTable } from "./cast-table";

/** Whether the first line is that of an exchange file: `CTD,` and a date stamp. */
export function isExchangeCast(source: SourceFile): boolean {
  return /^\uFEFF?CTD,\d{8}/.test(source.lines[0] ?? "");
}

/**
 * Takes an exchange file of one cast apart: remarks, a header of keys, names, units, values with quality flags, END_DATA.
 * Source: WHP-Exchange format description, "CTD profiles"; flags 3 questionable, 4 bad, 5 not reported, 9 not sampled.
 */
export function exchangeTable(source: SourceFile): CastTable {
  const keys = new Map<string, string>();
  let line = 1;
  for (; line < source.lines.length; line += 1) {
    const text = source.lines[line] ?? "";
    if (text.startsWith("#")) continue;
    const pair = /^\s*([A-Z_]+)\s*=\s*(.*?)\s*$/.exec(text);
    if (!pair) break;
    keys.set(pair[1], pair[2]);
  }
  const cells = (text: string) => text.split(",").map((cell) => cell.trim());
  const named = cells(source.lines[line] ?? "");
  // A trailing comma makes a last column without a name.
  while (named.at(-1) === "") named.pop();
  const units = cells(source.lines[line + 1] ?? "");
  const rows: string[][] = [];
  const lines: number[] = [];
  for (let at = line + 2; at < source.lines.length; at += 1) {
    const text = source.lines[at] ?? "";
    if (text.startsWith("END_DATA")) break;
    if (text.trim() === "" || text.startsWith("#")) continue;
    rows.push(cells(text));
    lines.push(at + 1);
  }
  const flagOf = new Map<number, number>();
  named.forEach((name, index) => {
    const flag = named.indexOf(`${name}_FLAG_W`);
    if (flag >= 0) flagOf.set(index, flag);
  });
  return {
    names: named,
    units: named.map((_, index) => units[index] ?? null),
    rows,
    lines,
    missing: [-999],
    flagOf,
    badFlags: ["4", "5", "9"],
    time: timeOf(keys.get("DATE"), keys.get("TIME")),
    latitude: numberOrNull(keys.get("LATITUDE")),
    longitude: numberOrNull(keys.get("LONGITUDE")),
  };
}

function timeOf(date: string | undefined, time: string | undefined): string | null {
  const day = /^(\d{4})(\d{2})(\d{2})$/.exec(date ?? "");
  if (!day) return null;
  const clock = /^(\d{2})(\d{2})$/.exec((time ?? "").padStart(4, "0"));
  const text = `${day[1]}-${day[2]}-${day[3]}T${clock?.[1] ?? "00"}:${clock?.[2] ?? "00"}:00Z`;
  return Number.isNaN(Date.parse(text)) ? null : text;
}

function numberOrNull(text: string | undefined): number | null {
  const value = Number(text ?? "");
  return text === undefined || text.trim() === "" || !Number.isFinite(value) ? null : value;
}
