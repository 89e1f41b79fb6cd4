import { readDelimitedAs } from "./delimited";
import type { ProblemList } from "./problem-list";
import type { ReadingAnswers, SeriesReading } from "./reading";
import type { SourceFile } from "./source-file";
import type { KnownColumn } from "./text-table";

const MISSING = ["M"];
const leftOut = (note: string): KnownColumn => ({ role: "leftOut", unit: null, missingCodes: MISSING, note });

/**
 * Columns of airport observations as archives export them, with the unit that each name stands for. The hour's rain
 * (`p01i`, `p01m`) counts from the hour's reset, and special reports between repeat it: never a sum of rows.
 * Source: column notes of airport report archives; trace and missing letters as in the reports themselves.
 */
const COLUMNS: Readonly<Record<string, KnownColumn>> = {
  drct: { role: "windFrom", unit: "deg", missingCodes: MISSING },
  sknt: { role: "windSpeed", unit: "kn", missingCodes: MISSING },
  gust: { role: "windGust", unit: "kn", missingCodes: MISSING, note: "only where it was strong enough to be reported" },
  gust_sknt: { role: "windGust", unit: "kn", missingCodes: MISSING },
  tmpf: { role: "airTemperature", unit: "°F", missingCodes: MISSING },
  tmpc: { role: "airTemperature", unit: "°C", missingCodes: MISSING },
  dwpf: { role: "dewPoint", unit: "°F", missingCodes: MISSING },
  dwpc: { role: "dewPoint", unit: "°C", missingCodes: MISSING },
  relh: { role: "relativeHumidity", unit: "%", missingCodes: MISSING },
  mslp: { role: "airPressure", unit: "hPa", missingCodes: MISSING },
  alti: { role: "airPressure", unit: "inHg", missingCodes: MISSING },
  p01i: { role: "rain", unit: "in since reset", missingCodes: MISSING },
  p01m: { role: "rain", unit: "mm since reset", missingCodes: MISSING },
  feel: leftOut("felt temperature"),
  vsby: leftOut("visibility"),
  metar: leftOut("the report as sent"),
  wxcodes: leftOut("weather codes"),
  peak_wind_gust: leftOut("strongest gust since the last report"),
  peak_wind_drct: leftOut("direction of the strongest gust"),
  peak_wind_time: leftOut("time of the strongest gust"),
};

const HEADER = /^\s*station\s*[,\t;]\s*valid\b/i;
const LINES_LOOKED_AT = 60;

/** Whether a header `station,valid,…` with at least one column of the exports stands near the top. */
export function isAirportText(source: SourceFile): boolean {
  const header = source.lines.slice(0, LINES_LOOKED_AT).find((line) => HEADER.test(line));
  return header !== undefined && header.split(/[,\t;]/).some((name) => columnOf(name) !== null);
}

/** Reads airport observations with `#` remarks, `M` for missing, `T` for a trace and `VRB` for no one direction. */
export function readAirportText(source: SourceFile, answers: ReadingAnswers, problems: ProblemList): SeriesReading {
  // Remarks above the header are no part of the table, whatever number of commas they have.
  const header = source.lines.findIndex((line) => HEADER.test(line));
  const bare = source.lines.map((line, index) => (index < header ? "" : line));
  const known: SourceFile = { ...source, lines: bare, decoded: { ...source.decoded, text: bare.join("\n") } };
  return readDelimitedAs(
    () => ({
      id: "airportText",
      label: "airport observations",
      zone: null,
      columnByName: columnOf,
      windHeightHint: {
        suggestion: "10",
        message:
          "At which height was the wind measured, in m above the ground? The file does not say; airports mostly measure at 10 m.",
      },
      averagingHint: {
        suggestion: "2",
        message:
          "Over how many minutes is each wind value averaged? The file does not say; airports mostly report 2 min in North America and 10 min elsewhere.",
      },
      understood: [
        {
          what: "Missing values",
          taken: "M; a blank gust was not reported, which does not mean that it was zero",
          confidence: "by the format",
        },
        { what: "Place", taken: "a station on land: winds over the sea are mostly stronger", confidence: "assumed" },
      ],
    }),
    known,
    answers,
    problems,
  );
}

function columnOf(name: string): KnownColumn | null {
  const key = name
    .replace(/\(.*\)/, "")
    .trim()
    .toLowerCase();
  return Object.hasOwn(COLUMNS, key) ? (COLUMNS[key] ?? null) : null;
}
