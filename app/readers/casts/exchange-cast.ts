import type { SourceFile } from "../source-file";
import { PLAIN_TABLE, type CastTable } from "./cast-table";

const FIRST_LINE = /^\uFEFF?CTD,\d{8}/;

/** Whether the first line is that of an exchange file: `CTD,` and a date stamp. */
export function isExchangeCast(source: SourceFile): boolean {
  return FIRST_LINE.test(source.lines[0] ?? "");
}

/**
 * Takes an exchange file apart: remarks, a header of keys, names, units, values with quality flags, END_DATA; then, where
 * files were joined, the next cast.
 * Source: WHP-Exchange format description, "CTD profiles": flags 2 good, 3 questionable, 4 bad, 5 not reported, 9 not
 * sampled, −999 missing (from memory).
 */
export function exchangeTables(source: SourceFile): CastTable[] {
  const starts = source.lines.flatMap((line, index) => (FIRST_LINE.test(line) ? [index] : []));
  return starts.map((start, k) => exchangeTable(source.lines.slice(start, starts[k + 1]), start));
}

function exchangeTable(all: readonly string[], start: number): CastTable {
  const keys = new Map<string, string>();
  let line = 1;
  for (; line < all.length; line += 1) {
    const text = all[line] ?? "";
    if (text.startsWith("#")) continue;
    const pair = /^\s*([A-Z_]+)\s*=\s*(.*?)\s*$/.exec(text);
    if (!pair) break;
    keys.set(pair[1], pair[2]);
  }
  const cells = (text: string) => text.split(",").map((cell) => cell.trim());
  const names = cells(all[line] ?? "");
  // A trailing comma makes a last column without a name.
  while (names.at(-1) === "") names.pop();
  const units = cells(all[line + 1] ?? "");
  const rows: string[][] = [];
  const lines: number[] = [];
  for (let at = line + 2; at < all.length; at += 1) {
    const text = all[at] ?? "";
    if (text.startsWith("END_DATA")) break;
    if (text.trim() === "" || text.startsWith("#")) continue;
    rows.push(cells(text));
    lines.push(start + at + 1);
  }
  const flags = names.map((name) => names.indexOf(`${name}_FLAG_W`));
  const cast = keys.get("CASTNO");
  return {
    ...PLAIN_TABLE,
    label: `station ${keys.get("STNNBR") ?? "not told"}${cast === undefined ? "" : `, cast ${cast}`}`,
    names,
    units: names.map((_, index) => units[index] || null),
    rows,
    lines,
    missing: [-999],
    flagOf: new Map(flags.flatMap((flag, index) => (flag < 0 ? [] : [[index, flag]]))),
    badFlags: ["4", "5", "9"],
    doubtfulFlags: ["3"],
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
