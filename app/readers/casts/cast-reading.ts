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
  /** The key of `CastAnswers` that settles it. */
  key: "half" | "latitude" | "salinityScale" | "temperatureScale";
  needed: boolean;
  message: string;
  options?: { value: string; label: string }[];
  suggestion?: string;
  answer?: string;
}

/** Answers a person gave. All optional; JSON. */
export interface CastAnswers {
  half?: "down" | "up";
  /** Degrees north, for depth from pressure. */
  latitude?: number;
  salinityScale?: "practical" | "absolute";
  temperatureScale?: "ITS-90" | "IPTS-68";
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
  /** Records of the file. */
  rows: number;
  /** ISO UTC; null where the file does not say. */
  time: string | null;
  latitude: number | null;
  longitude: number | null;
  channels: Partial<Record<CastChannel, CastChannelReading>>;
  salinityScale: "practical" | "absolute";
  /** The half that was chosen: from the surface down, depth ascending, each depth once. */
  samples: CastSample[];
  half: "down" | "up";
  understood: Understood[];
  questions: CastQuestion[];
  problems: ReadingProblem[];
  /** Names of columns that are not used. */
  leftOut: string[];
}
