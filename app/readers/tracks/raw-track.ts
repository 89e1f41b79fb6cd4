import type { Understood } from "../reading";
import type { TrackFix, TrackQuestion } from "./track-reading";

/** One record of a file, before records of one time are joined. */
export interface RawFix {
  stormId: string;
  stormName: string;
  fix: TrackFix;
  /** Line of the file, from 1. */
  row: number;
}

/** What one of the forms yields. */
export interface RawTracks {
  fixes: RawFix[];
  averagingMinutes: number | null;
  understood: Understood[];
  questions: TrackQuestion[];
}
