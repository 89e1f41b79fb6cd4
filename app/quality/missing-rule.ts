/** How much of a channel may be missing in a storm's window. */
import type { StormWindow } from "~/storms/storm-window";
import { valuesAt } from "./filled-channels";
import { GAP_STEPS } from "./gap-rule";
import type { JudgedChannel } from "./judge-storm";
import { isUsed } from "./used-values";

/** Above this share an estimate says so. Common practice, no source; so is the next. */
export const MISSING_CAUTION = 0.1;
/** Above this share none is made, unless a person takes it on with a reason. */
export const MISSING_REFUSED = 0.25;

/** Who took it on to estimate with more missing than the rule allows, and why. */
export interface MissingAccepted {
  by: string;
  /** ISO UTC */
  at: string;
  reason: string;
  /** The greatest share of a channel that was missing then: where more is missing now, it has to be taken on anew. */
  upTo: number;
}

/** A step whose end is a rounding away from a whole one is whole. */
const ROUNDING = 1e-6;

/** Samples of the usual step that would fit into an edge of the window which the record does not reach. */
function missingAtEdge(pause: number, step: number): number {
  return pause > GAP_STEPS * step ? Math.floor(pause / step + ROUNDING) : 0;
}

/**
 * The share of a channel's samples in the window that an estimate does without: missing, bad, and suspect where those are left
 * out. A wind without its direction is missing, a calm needs none.
 * @returns 0 to 1; 1 where the record has nothing in the window
 */
export function shareMissing(
  judged: JudgedChannel,
  from: JudgedChannel | undefined,
  { startsAt, endsAt }: StormWindow,
  leaveOutSuspect: boolean,
): number {
  const bearings = judged.channel === "windSpeed" && from ? usedBearings(judged, from, leaveOutSuspect) : null;
  let [expected, missing] = [0, 0];
  let [first, last] = [Number.NaN, Number.NaN];
  judged.time.forEach((seconds, k) => {
    if (seconds < startsAt || seconds > endsAt) return;
    if (Number.isNaN(first)) first = seconds;
    last = seconds;
    expected += 1;
    const directed = !bearings || judged.values[k] === 0 || !Number.isNaN(bearings[k]);
    if (!isUsed(judged.inForce[k], leaveOutSuspect) || !directed) missing += 1;
  });
  if (expected === 0) return 1;
  if (judged.step !== null) {
    const edges = missingAtEdge(first - startsAt, judged.step) + missingAtEdge(endsAt - last, judged.step);
    return (missing + edges) / (expected + edges);
  }
  return missing / expected;
}

function usedBearings(speed: JudgedChannel, from: JudgedChannel, leaveOutSuspect: boolean): Float64Array {
  const values = from.values.map((value, k) => (isUsed(from.inForce[k], leaveOutSuspect) ? value : Number.NaN));
  return valuesAt(speed.time, { ...from, values });
}

/** The share up to which an estimate is made. */
export function bearableShare(accepted: MissingAccepted | null): number {
  return Math.max(MISSING_REFUSED, accepted?.upTo ?? 0);
}

/** Which of the rule's steps a share reaches. */
export function missingVerdict(share: number): "fits" | "caution" | "refused" {
  if (share > MISSING_REFUSED) return "refused";
  return share > MISSING_CAUTION ? "caution" : "fits";
}
