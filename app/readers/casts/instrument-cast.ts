import type { SourceFile } from "../source-file";
import { PLAIN_TABLE, type CastTable } from "./cast-table";

const USUAL_BAD = -9.99e-29;

/** Whether the text has the header of an instrument's own ASCII: lines of `*` and `#` with numbered names. */
export function isInstrumentCast(source: SourceFile): boolean {
  const head = source.lines.slice(0, 400);
  return /^\*/.test(head[0] ?? "") && head.some((line) => /^#\s*name\s+0\s*=/.test(line));
}

/**
 * Takes an instrument's ASCII apart: numbered names with units in brackets, a flag for bad values and, in a column
 * `flag`, for bad records, position and time.
 * Source: manual of the instrument's processing software, "data file formats" (from memory).
 */
export function instrumentTables(source: SourceFile): CastTable[] {
  const names: string[] = [];
  const units: (string | null)[] = [];
  let bad = USUAL_BAD;
  let end = source.lines.length;
  let latitude: number | null = null;
  let longitude: number | null = null;
  let [satelliteTime, clockTime]: (string | null)[] = [null, null];
  for (const [index, line] of source.lines.entries()) {
    if (/^\*END\*/.test(line)) {
      end = index + 1;
      break;
    }
    const name = /^#\s*name\s+(\d+)\s*=\s*([^:]+?)\s*:\s*(.*)$/.exec(line);
    if (name) {
      names[Number(name[1])] = name[2];
      units[Number(name[1])] = /\[([^\]]+)\]/.exec(name[3])?.[1] ?? null;
    }
    bad = Number(/^#\s*bad_flag\s*=\s*(\S+)/.exec(line)?.[1] ?? bad);
    latitude ??= degreesOf(/^\*.*\blatitude\s*=\s*(.*)$/i.exec(line)?.[1]);
    longitude ??= degreesOf(/^\*.*\blongitude\s*=\s*(.*)$/i.exec(line)?.[1]);
    satelliteTime ??= timeOf(/^\*.*\bUTC \(Time\)\s*=\s*(.*)$/.exec(line)?.[1]);
    clockTime ??= timeOf(/^#\s*start_time\s*=\s*([^[]*)/.exec(line)?.[1]);
  }
  const rows: string[][] = [];
  const lines: number[] = [];
  for (let at = end; at < source.lines.length; at += 1) {
    const text = (source.lines[at] ?? "").trim();
    if (text === "") continue;
    rows.push(text.split(/\s+/));
    lines.push(at + 1);
  }
  const filled = Array.from(names, (name, index) => name ?? `column ${index + 1}`);
  const flag = filled.indexOf("flag");
  return [
    {
      ...PLAIN_TABLE,
      label: "the file's cast",
      names: filled,
      units: filled.map((name, index) => units[index] ?? /^c[01](.*)$/.exec(name)?.[1] ?? null),
      rows,
      lines,
      missing: [bad, USUAL_BAD],
      isBadRow: (cells) => flag >= 0 && Number(cells[flag]) === bad,
      time: satelliteTime ?? clockTime,
      // The clock of the instrument or of the computer beside it.
      timeConfidence: satelliteTime === null ? "assumed" : "stated in the file",
      latitude,
      longitude,
    },
  ];
}

/** `02 00.07 S`, `02 00 04 S` or decimal degrees. */
function degreesOf(text: string | undefined): number | null {
  const match = /^\s*(-?\d+(?:\.\d+)?)(?:[°\s]+(\d+(?:\.\d+)?))?(?:['\s]+(\d+(?:\.\d+)?))?["'\s]*([NSEW])?\s*$/i.exec(
    text ?? "",
  );
  if (!match) return null;
  const degrees = Number(match[1]) + Number(match[2] ?? 0) / 60 + Number(match[3] ?? 0) / 3600;
  return /[SW]/i.test(match[4] ?? "") ? -degrees : degrees;
}

/** `Aug 24 2011  07:55:20`, as UTC. */
function timeOf(text: string | undefined): string | null {
  const match = /^\s*([A-Z][a-z]{2})\s+(\d{1,2})\s+(\d{4})\s+(\d{2}:\d{2}:\d{2})/.exec(text ?? "");
  if (!match) return null;
  const parsed = Date.parse(`${match[2]} ${match[1]} ${match[3]} ${match[4]} UTC`);
  return Number.isNaN(parsed) ? null : new Date(parsed).toISOString().replace(".000Z", "Z");
}
