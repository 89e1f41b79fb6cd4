import type { ReadingProblem, Understood } from "../reading";

export const CAST_CHANNELS = {
  pressure: "dbar",
  depth: "m",
  temperature: "°C",
  salinity: "1",
  conductivity: "S/m",
} as const;
export type CastChannel = keyof typeof CAST_CHANNELS;
export const CAST_CHANNEL_NAMES = Object.keys(CAST_CHANNELS) as CastChannel[];

export type SalinityKind = "practical" | "absolute";
export type TemperatureScale = "ITS-90" | "IPTS-68";

/** One depth of a cast. */
export interface CastSample {
  /** m, positive down */
  depth: number;
  /** dbar */
  pressure: number;
  /** In situ, °C (ITS-90). */
  temperature: number;
  /** Practical Salinity, or Absolute Salinity in g/kg where the file has that: see `salinityScale`. */
  salinity: number;
}

export interface CastQuestion {
  /** What of `CastAnswers` settles it; of columns and units, which channel's. */
  key:
    | "cast"
    | "half"
    | "latitude"
    | "salinityScale"
    | "temperatureScale"
    | `column-${CastChannel}`
    | `unit-${CastChannel}`;
  /** False once answered, and where the reader is sure enough: the question stays so that the answer can be changed. */
  needed: boolean;
  message: string;
  options?: { value: string; label: string }[];
  /** What the reading goes by until it is answered. */
  suggestion?: string;
  answer?: string;
}

/** Answers a person gave. All optional; JSON. */
export interface CastAnswers {
  /** Which of several casts in the file, by its label. */
  cast?: string;
  half?: "down" | "up";
  /** Degrees north, for depth from pressure. */
  latitude?: number;
  salinityScale?: SalinityKind;
  temperatureScale?: TemperatureScale;
  /** Index of a channel's column, from 0; null for none. */
  columns?: Partial<Record<CastChannel, number | null>>;
  /** Ids of units, as in the question's options. */
  units?: Partial<Record<CastChannel, string>>;
}

/** A channel over all records of the file, in the unit of `CAST_CHANNELS`. */
export interface CastChannelReading {
  unit: string;
  /** One a record, NaN where missing or flagged bad. */
  values: Float64Array;
  count: number;
  missing: number;
  mean: number | null;
  min: number | null;
  max: number | null;
  /** Name in the file, or how it was derived. */
  from: string;
}

/** What a reader makes of a cast: a pure function of bytes, file name and answers. */
export interface CastReading {
  kind: "cast";
  format: string;
  formatLabel: string;
  fileName: string;
  /** Records of the cast. */
  rows: number;
  /** ISO UTC; null where the file does not say. */
  time: string | null;
  latitude: number | null;
  longitude: number | null;
  channels: Partial<Record<CastChannel, CastChannelReading>>;
  salinityScale: SalinityKind;
  /** The half that was chosen: from the surface down, depth ascending, each depth once. */
  samples: CastSample[];
  half: "down" | "up";
  understood: Understood[];
  questions: CastQuestion[];
  problems: ReadingProblem[];
  /** Names of columns that are not used. */
  leftOut: string[];
}

/** What one table of a file gives, before the file's own facts are added. */
export type TableReading = Pick<
  CastReading,
  "channels" | "salinityScale" | "samples" | "half" | "understood" | "questions"
>;
