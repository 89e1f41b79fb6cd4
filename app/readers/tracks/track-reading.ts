import type { ReadingProblem, SeriesReading, Understood } from "../reading";

export const TRACK_CHANNELS = {
  latitude: "deg",
  longitude: "deg",
  maxWind: "m/s",
  centralPressure: "hPa",
} as const;
export type TrackChannel = keyof typeof TRACK_CHANNELS;

/** Radius of a wind by quadrant, north-east, south-east, south-west, north-west, m; null where not told. */
export interface WindRadii {
  /** m/s */
  wind: number;
  quadrants: [number | null, number | null, number | null, number | null];
}

/** A cyclone at one moment, as its agency analysed it. */
export interface TrackFix {
  /** Seconds since 1970-01-01T00:00:00Z. */
  time: number;
  /** Degrees north. */
  latitude: number;
  /** Degrees east, -180…180. */
  longitude: number;
  /** The strongest wind anywhere in the storm, m/s. */
  maxWind: number | null;
  /** hPa */
  centralPressure: number | null;
  /** m */
  radiusOfMaximumWind: number | null;
  /** Pressure of the last closed isobar, hPa. */
  ambientPressure: number | null;
  radii: WindRadii[];
}

/** A storm that a file of several holds. */
export interface TrackStorm {
  id: string;
  name: string;
  fixes: number;
  /** ISO UTC */
  first: string | null;
  last: string | null;
}

export interface TrackQuestion {
  /** The key of `TrackAnswers` that settles it. */
  key: "storm" | "agency";
  needed: boolean;
  message: string;
  options: { value: string; label: string }[];
  suggestion: string;
  answer?: string;
}

/** Answers a person gave. All optional; JSON. */
export interface TrackAnswers {
  /** Id of a storm of the file. */
  storm?: string;
  /** Whose analysis of several. */
  agency?: string;
}

/** What a reader makes of a best track: a pure function of bytes, file name and answers. */
export interface TrackReading {
  kind: "track";
  format: string;
  formatLabel: string;
  fileName: string;
  /** Records of the file, of all its storms. */
  rows: number;
  storms: TrackStorm[];
  storm: TrackStorm;
  order: SeriesReading["order"];
  /** Records that tell more of a time that an earlier one has told of, as wind radii do. */
  duplicates: number;
  /** Ascending, one a time. */
  fixes: TrackFix[];
  /** Averaging of the maximum wind, minutes; null where the file leaves it open. */
  averagingMinutes: number | null;
  understood: Understood[];
  questions: TrackQuestion[];
  problems: ReadingProblem[];
}
