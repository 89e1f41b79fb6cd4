import type { ProblemList } from "./problem-list";
import type { ReadingAnswers, SeriesReading } from "./reading";
import { rowsOf } from "./rows";
import { seriesFromTable } from "./series-from-table";
import type { SourceFile } from "./source-file";
import type { FormatKnowledge, KnownColumn, TextTable } from "./text-table";

const MISSING = ["-9999"];
const leftOut = (note: string): KnownColumn => ({ role: "leftOut", unit: null, missingCodes: MISSING, note });

/**
 * The twelve fields of the integrated surface hourly data in their light form: every number a whole one, most of them
 * ten times the value. Source: NCEI, "ISD-Lite format document" (2006).
 */
const FIELDS: readonly { name: string; column: KnownColumn | null }[] = [
  { name: "year", column: null },
  { name: "month", column: null },
  { name: "day", column: null },
  { name: "hour", column: null },
  { name: "air temperature", column: { role: "airTemperature", unit: "0.1 °C", missingCodes: MISSING } },
  { name: "dew point", column: { role: "dewPoint", unit: "0.1 °C", missingCodes: MISSING } },
  { name: "sea level pressure", column: { role: "airPressure", unit: "0.1 hPa", missingCodes: MISSING } },
  { name: "wind direction", column: { role: "windFrom", unit: "deg", missingCodes: MISSING } },
  { name: "wind speed", column: { role: "windSpeed", unit: "0.1 m/s", missingCodes: MISSING } },
  { name: "sky condition", column: leftOut("cloud cover code") },
  {
    name: "precipitation, 1 h",
    column: { role: "rain", unit: "0.1 mm", missingCodes: MISSING, traceCodes: ["-1"] },
  },
  { name: "precipitation, 6 h", column: leftOut("sum over six hours, which overlaps the hourly one") },
];

const RECORD = /^\d{4} \d{2} \d{2} \d{2}(?:\s+-?\d{1,5}){8}\s*$/;
const LINES_LOOKED_AT = 20;

/** Whether the first lines, but for one in five that may be torn, are records of year, month, day, hour and eight numbers. */
export function isHourlyText(source: SourceFile): boolean {
  const lines = source.lines.filter((line) => line.trim() !== "").slice(0, LINES_LOOKED_AT);
  return lines.length > 0 && lines.filter((line) => RECORD.test(line)).length >= 0.8 * lines.length;
}

/** Reads fixed-width hourly surface records: tenths, −9999 for missing, −1 for a trace of rain, direction 0 for a calm. */
export function readHourlyText(source: SourceFile, answers: ReadingAnswers, problems: ProblemList): SeriesReading {
  const rows: string[][] = [];
  const lines: number[] = [];
  for (const [index, line] of source.lines.entries()) {
    if (line.trim() === "") continue;
    rows.push(line.trim().split(/\s+/));
    lines.push(index + 1);
  }
  const table: TextTable = {
    names: FIELDS.map(({ name }) => name),
    unitTexts: FIELDS.map(() => null),
    rows: rowsOf(rows),
    lines,
    decimal: ".",
    preamble: [],
    named: true,
  };
  return seriesFromTable(table, KNOWLEDGE, source.fileName, answers, problems);
}

const KNOWLEDGE: FormatKnowledge = {
  id: "hourlyText",
  label: "fixed-width hourly surface records",
  zone: "UTC",
  columnByName: (name) => FIELDS.find((field) => field.name === name)?.column ?? null,
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
    { what: "Stamps", taken: "rounded to the whole hour by the archive", confidence: "by the format" },
    { what: "Numbers", taken: "tenths; −9999 is missing, −1 a trace of rain", confidence: "by the format" },
    { what: "Place", taken: "a station on land: winds over the sea are mostly stronger", confidence: "assumed" },
  ],
};
