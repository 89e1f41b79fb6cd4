import type { TrackParameters } from "~/ocean/cyclone/track-parameters";
import type { TrackFix } from "~/readers/tracks/track-reading";

/** The cyclone's track that a storm stands on, and how its wind is made of it: its series are computed at each study box. */
export interface StormTrack {
  /** Name or number of the cyclone; may be empty where it was typed. */
  cyclone: string;
  /** At least two, ascending. */
  fixes: TrackFix[];
  /** Averaging of the maximum wind, minutes; null where it is not known. */
  averagingMinutes: number | null;
  parameters: TrackParameters;
  /** The file behind it; null where the fixes were typed. */
  source: { formatLabel: string; fileName: string; sha256: string } | null;
  /** Whether fixes were changed by hand after the file was read. */
  edited: boolean;
  savedBy: string;
  /** ISO UTC */
  savedAt: string;
}

/** A longer track is no storm: its series would weigh more than a month of them. */
export const LONGEST_TRACK_DAYS = 40;
export const MOST_FIXES = 500;

/** One sentence that stands wherever the storm's wind does. */
export function trackSentence({ cyclone, parameters }: StormTrack): string {
  const of = cyclone === "" ? "a typed track" : `the track of ${cyclone}`;
  const rain = parameters.rain ? "; rain is climatological" : "";
  return `Wind is parametric, computed from ${of} at the study box's middle${rain}.`;
}

/** Ends a figure's first sentence. */
export function parametricAt(box: string): string {
  return `parametric, computed from the track at the middle of ${box}`;
}
