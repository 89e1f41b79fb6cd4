/**
 * What a reader makes of a file. A reading is a pure function of (bytes, file name, answers):
 * the same three give the same reading, so a person's answers can be kept beside the original file
 * and the reading made again at any time.
 */

/** Channels that a series file can carry, with the unit each has after reading. */
export const CHANNEL_UNITS = {
  windSpeed: "m/s",
  windGust: "m/s",
  windFrom: "deg",
  rain: "mm/h",
  airTemperature: "°C",
  dewPoint: "°C",
  seaTemperature: "°C",
  airPressure: "hPa",
  relativeHumidity: "%",
  shortwave: "W/m²",
  longwave: "W/m²",
  sensible: "W/m²",
  latent: "W/m²",
  netHeat: "W/m²",
  evaporation: "mm/h",
} as const;
export type ChannelName = keyof typeof CHANNEL_UNITS;
export const CHANNEL_NAMES = Object.keys(CHANNEL_UNITS) as ChannelName[];

export type Severity = "error" | "warning" | "note";

/**
 * `row` is the line of the file, counted from 1, header lines included, or its record where it has no lines; `column` is
 * its name, or its number from 1.
 */
export interface ReadingProblem {
  severity: Severity;
  code: string;
  row?: number;
  column?: string;
  /** What, where and what to do, in a sentence or two. */
  message: string;
  /** How many times, where the same problem was met more than once; the row is the first. */
  count?: number;
}

/** Something that the reader cannot know; the import is not confirmed while a `needed` one is unanswered. */
export interface ReadingQuestion {
  /** The key of `ReadingAnswers` that settles it. */
  key:
    | "sheet"
    | "zone"
    | "dateOrder"
    | "serialEpoch"
    | "directionSense"
    | "windHeight"
    | "averagingMinutes"
    | "columns"
    | "missingCodes"
    | "leaveOutBadRows"
    | "place"
    | "gridMethod"
    | "timeAxis"
    | "accumulation"
    | "flagged";
  /** False once answered: an answered question stays in the list so that the answer can be changed. */
  needed: boolean;
  message: string;
  /** For `columns` and `missingCodes`: index of the column in question. Options of `columns` are unit ids. */
  column?: number;
  options?: { value: string; label: string }[];
  /** What the reader would take, if it has an opinion. */
  suggestion?: string;
  /** What was answered, as text. */
  answer?: string;
}

/** A line of the reading sheet: what was understood, and how sure the reader is. */
export interface Understood {
  what: string;
  taken: string;
  confidence: "stated in the file" | "by the format" | "by name" | "by content" | "answered" | "assumed";
}

/** What one column of the file was taken for. */
export interface ColumnReading {
  /** From 0. */
  index: number;
  name: string;
  /** Unit as written in the file, or null. */
  statedUnit: string | null;
  role: "time" | ChannelName | "windU" | "windV" | "windTowards" | "leftOut";
  /** Unit that the values were read in, as an id of `FILE_UNITS`. */
  unit: string | null;
  /** Codes that count as missing in this column. */
  missingCodes: string[];
  /** Records without a value in this column. */
  missing: number;
  confidence: Understood["confidence"];
  /** Why it was left out, or what makes the reader think so. */
  note?: string;
}

/** A conversion the values went through, in order. */
export interface ReadingStep {
  id: string;
  /** As `knots to m/s (× 0.514444)`. */
  label: string;
  channel: ChannelName | "time";
  /** Values touched. */
  count: number;
}

/**
 * One channel. Counts and statistics are those of the file's records, duplicates included, as other programs would
 * count them; `values` is what is used. The direction of a calm is counted as recorded but is NaN in `values`.
 * For `windFrom`, `mean` is the direction of the vector mean; `min`, `max` are null (a circle has no largest value).
 */
export interface ChannelReading {
  unit: string;
  /** One a stamp, NaN where missing; same length as `time`. */
  values: Float64Array;
  count: number;
  missing: number;
  mean: number | null;
  max: number | null;
  maxAt: string | null;
  min: number | null;
  /** mm, for rain and evaporation. */
  total?: number;
  fromColumns: string[];
}

/** Answers a person gave on the reading sheet. All optional; JSON. */
export interface ReadingAnswers {
  /** Name of a workbook's sheet. */
  sheet?: string;
  /** IANA zone, or `UTC`, or a fixed offset as `+05:30`. */
  zone?: string;
  dateOrder?: "ymd" | "dmy" | "mdy";
  /** First year of spreadsheet day numbers. */
  serialEpoch?: "1900" | "1904";
  directionSense?: "from" | "towards";
  /** m above the sea */
  windHeight?: number;
  averagingMinutes?: number;
  /** Column index → role and unit. */
  columns?: Record<string, { role: ColumnReading["role"]; unit?: string | null }>;
  /** Column index → codes. */
  missingCodes?: Record<string, string[]>;
  /** Rows with an error (an unreadable number, negative rain, wind beyond any measured) are left out instead of stopping the import. */
  leaveOutBadRows?: boolean;
  /** Where in a file of several places or of a grid: `LAT,LON` in decimal degrees, or a place's name in the file. */
  place?: string;
  gridMethod?: "nearestSea" | "bilinear";
  /** Name of the variable of time, where a file has several. */
  timeAxis?: string;
  /** Over which time the amounts of a file add up: its step, the day since 00 UTC, or all since the start. */
  accumulation?: "step" | "day" | "start";
  /** What becomes of values that the file's own flags call bad. */
  flagged?: "leaveOut" | "keep";
}

export interface PreviewRow {
  /** Line in the file, from 1. */
  line: number;
  /** Cells as written. */
  cells: string[];
  /** ISO UTC as read, or null. */
  time: string | null;
  /** Channels as read. */
  values: Partial<Record<ChannelName, number | null>>;
}

export interface SeriesReading {
  kind: "series";
  /** Id of the reader that took it: `delimited`, `buoyText`, … */
  format: string;
  formatLabel: string;
  fileName: string;
  /** Records read. */
  rows: number;
  /** ISO UTC: earliest and latest stamp. */
  first: string | null;
  last: string | null;
  /** As found in the file. `time` and the channels are always ascending. */
  order: "ascending" | "descending" | "unsorted";
  duplicates: number;
  zone: string;
  windHeight: number | null;
  averagingMinutes: number | null;
  medianStepSeconds: number | null;
  columns: ColumnReading[];
  /** Seconds since 1970-01-01T00:00:00Z, ascending, unique. */
  time: Float64Array;
  channels: Partial<Record<ChannelName, ChannelReading>>;
  windVectorMean: { speed: number; from: number | null } | null;
  understood: Understood[];
  questions: ReadingQuestion[];
  steps: ReadingStep[];
  problems: ReadingProblem[];
  /** Three first and three last rows, in the order of the file. */
  firstRows: PreviewRow[];
  lastRows: PreviewRow[];
  /** Rows dropped and why. */
  dropped: { reason: string; count: number; firstRow: number }[];
}

/** Thrown where nothing at all can be read: `problems` says why. */
export class UnreadableFile extends Error {
  override name = "UnreadableFile";
  constructor(readonly problems: ReadingProblem[]) {
    super(problems[0]?.message ?? "The file could not be read.");
  }
}
