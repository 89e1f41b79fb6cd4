import type { ProblemList } from "./problem-list";
import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "./reading";
import { rowsOf } from "./rows";
import { seriesFromTable } from "./series-from-table";
import type { SourceFile } from "./source-file";
import type { FormatKnowledge, KnownColumn, TextTable } from "./text-table";

/**
 * Columns of standard meteorological buoy text, with the unit and the missing code of each by the format's definition:
 * 99 is missing for a speed and a measurement for a direction. Old headers (`WD`, `BAR`) and new ones stand side by side.
 * Source: NDBC, "Measurement descriptions and units" and "Historical data: missing data" (ndbc.noaa.gov/measdes.shtml).
 */
const COLUMNS: Readonly<Record<string, KnownColumn>> = {
  WDIR: { role: "windFrom", unit: "deg", missingCodes: ["999"] },
  WD: { role: "windFrom", unit: "deg", missingCodes: ["999"] },
  WSPD: { role: "windSpeed", unit: "m/s", missingCodes: ["99"] },
  GST: { role: "windGust", unit: "m/s", missingCodes: ["99"] },
  PRES: { role: "airPressure", unit: "hPa", missingCodes: ["9999"] },
  BAR: { role: "airPressure", unit: "hPa", missingCodes: ["9999"] },
  ATMP: { role: "airTemperature", unit: "°C", missingCodes: ["999"] },
  WTMP: { role: "seaTemperature", unit: "°C", missingCodes: ["999"] },
  DEWP: { role: "dewPoint", unit: "°C", missingCodes: ["999"] },
  WVHT: { role: "leftOut", unit: null, missingCodes: ["99"], note: "wave height" },
  DPD: { role: "leftOut", unit: null, missingCodes: ["99"], note: "wave period" },
  APD: { role: "leftOut", unit: null, missingCodes: ["99"], note: "wave period" },
  MWD: { role: "leftOut", unit: null, missingCodes: ["999"], note: "wave direction" },
  VIS: { role: "leftOut", unit: null, missingCodes: ["99"], note: "visibility" },
  PTDY: { role: "leftOut", unit: null, missingCodes: ["99"], note: "pressure tendency" },
  TIDE: { role: "leftOut", unit: null, missingCodes: ["99"], note: "water level" },
  GDR: { role: "leftOut", unit: null, missingCodes: ["999"], note: "direction of the gust" },
  GTIME: { role: "leftOut", unit: null, missingCodes: ["99", "9999"], note: "time of the gust" },
};

const HEADER = /^\s*#?\s*(?:YY|YYYY)\s+MM\s+DD\s+hh\b/;

/** Whether the text starts with a buoy header: year, month, day, hour, then at least one known column. */
export function isBuoyText(source: SourceFile): boolean {
  const header = source.lines.find((line) => line.trim() !== "");
  if (header === undefined || !HEADER.test(header)) return false;
  return split(header).some((name) => name in COLUMNS);
}

/** Reads buoy text, real-time (`MM`, newest first) and archive (nines), with or without minutes and four-digit years. */
export function readBuoyText(source: SourceFile, answers: ReadingAnswers, problems: ProblemList): SeriesReading {
  const headerIndex = source.lines.findIndex((line) => line.trim() !== "");
  const header = source.lines[headerIndex] ?? "";
  const names = split(header);
  const rows: string[][] = [];
  const lines: number[] = [];
  let units: string[] = [];
  let realtime = false;
  for (let index = headerIndex + 1; index < source.lines.length; index += 1) {
    const line = source.lines[index] ?? "";
    if (line.trim() === "") continue;
    const cells = split(line);
    if (line.trimStart().startsWith("#")) {
      if (rows.length === 0 && cells.length === names.length) units = cells;
      continue;
    }
    if (HEADER.test(line)) {
      problems.add("note", "repeatedHeader", "the header is repeated within the file", "The line was passed over.", {
        row: index + 1,
      });
      continue;
    }
    realtime ||= cells.includes("MM");
    rows.push(cells);
    lines.push(index + 1);
  }
  if (rows.length === 0) {
    problems.add("error", "onlyHeader", "the file has a header but no records", "Give a file with records.", {
      row: headerIndex + 1,
    });
    throw new UnreadableFile(problems.toArray());
  }
  const table: TextTable = {
    names,
    unitTexts: names.map((_, index) => units[index] ?? null),
    rows: rowsOf(rows),
    lines,
    decimal: ".",
    preamble: [],
    named: true,
  };
  return seriesFromTable(table, knowledgeOf(realtime), source.fileName, answers, problems);
}

function split(line: string): string[] {
  return line.replace(/^\s*#/, " ").trim().split(/\s+/);
}

function knowledgeOf(realtime: boolean): FormatKnowledge {
  return {
    id: "buoyText",
    label: realtime ? "agency buoy text, real-time form" : "agency buoy text, archive form",
    zone: "UTC",
    columnByName: (name) => COLUMNS[name] ?? null,
    windHeightHint: {
      suggestion: "4",
      message:
        "At which height above the sea was the wind measured? The file does not say; the station's page does. On moored buoys it is often 3 to 5 m.",
    },
    averagingHint: {
      suggestion: "8",
      message:
        "Over how many minutes is each wind value averaged? By the agency's description 8 min on buoys, 2 min at stations on land and at the coast.",
    },
    understood: [{ what: "Missing values", taken: realtime ? "MM" : "nines, by column", confidence: "by the format" }],
  };
}
