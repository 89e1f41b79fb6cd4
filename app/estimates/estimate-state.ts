/**
 * What a cell of the ledger says of itself. It follows from the hash of the inputs as they are now and from the
 * responses that are stored, so that an edit taken back makes the estimate current again without a run.
 */
import { changedParts, PART_NAMES, type InputPart, type InputParts } from "./input-parts";
import type { ScenarioProblem } from "~/ocean/scenario";

export type EstimateState =
  | { kind: "notRun" }
  | { kind: "queued" }
  | { kind: "running" }
  | { kind: "current" }
  | { kind: "outOfDate"; changed: InputPart[]; newerEngine: boolean }
  | { kind: "failed"; problems: ScenarioProblem[]; changed: InputPart[] };

export const STATE_KINDS = ["notRun", "queued", "running", "current", "outOfDate", "failed"] as const;
export type StateKind = (typeof STATE_KINDS)[number];

export const STATE_NAMES: Record<StateKind, string> = {
  notRun: "not run",
  queued: "queued",
  running: "running",
  current: "current",
  outOfDate: "out of date",
  failed: "failed",
};

export interface LastRun {
  state: "queued" | "running" | "done" | "failed";
  problems: ScenarioProblem[] | null;
  /** Of the last run's inputs; null before the first has ended, or where they could not be gathered. */
  parts: InputParts | null;
  engineVersion: string | null;
}

export interface Now {
  /** Null where the inputs cannot be gathered as they are. */
  parts: InputParts | null;
  engineVersion: string;
  /** Whether a response is stored for the inputs as they are now and this engine. */
  responseStored: boolean;
}

export function estimateState(run: LastRun | null, now: Now): EstimateState {
  if (!run) return { kind: "notRun" };
  if (run.state === "queued" || run.state === "running") return { kind: run.state };
  if (now.responseStored) return { kind: "current" };
  const changed = changedSince(run.parts, now.parts);
  if (run.state === "failed") return { kind: "failed", problems: run.problems ?? [], changed };
  return {
    kind: "outOfDate",
    changed,
    newerEngine: run.engineVersion !== now.engineVersion,
  };
}

/** Only a storm's series can keep inputs from being gathered at all. */
function changedSince(before: InputParts | null, now: InputParts | null): InputPart[] {
  if (before && now) return changedParts(before, now);
  return before === now ? [] : ["storm"];
}

export function isUnderWay(state: EstimateState): boolean {
  return state.kind === "queued" || state.kind === "running";
}

/** Whether a run would tell something new: out of date, or failed with other inputs than those it failed with. */
export function needsRun(state: EstimateState): boolean {
  return state.kind === "outOfDate" || (state.kind === "failed" && state.changed.length > 0);
}

/** `out of date: water column and method sheet changed` */
export function stateSentence(state: EstimateState): string {
  switch (state.kind) {
    case "outOfDate": {
      const changed = state.changed.map((part) => PART_NAMES[part]);
      const reasons = [
        ...(changed.length > 0 ? [`${listed(changed)} changed`] : []),
        ...(state.newerEngine ? ["newer engine"] : []),
      ];
      return `out of date: ${reasons.length > 0 ? reasons.join(", ") : "its stored response is gone"}`;
    }
    case "failed":
      return state.changed.length > 0
        ? `failed; since then ${listed(state.changed.map((part) => PART_NAMES[part]))} changed`
        : "failed";
    default:
      return STATE_NAMES[state.kind];
  }
}

function listed(words: string[]): string {
  return words.length < 2 ? words.join("") : `${words.slice(0, -1).join(", ")} and ${words[words.length - 1]}`;
}
