/** The marks that a figure puts on a channel's samples: what a good sample has not. */
import type { FlagMark } from "~/figures/time-panel";
import type { StormWindow } from "~/storms/storm-window";
import { FAIL, MISSING, SUSPECT } from "./flags";
import type { JudgedChannel } from "./judge-storm";

const KINDS = { [SUSPECT]: "suspect", [FAIL]: "bad", [MISSING]: "missing" } as const;

export function flagMarksOf(judged: Pick<JudgedChannel, "time" | "values" | "flags" | "inForce">): FlagMark[] {
  const { time, values, flags, inForce } = judged;
  const marks: FlagMark[] = [];
  time.forEach((seconds, k) => {
    const value = Number.isNaN(values[k]) ? 0 : values[k];
    const flag = inForce[k];
    if (flag === SUSPECT || flag === FAIL || flag === MISSING) marks.push({ kind: KINDS[flag], seconds, value });
    if (flag !== flags[k]) marks.push({ kind: "set", seconds, value });
  });
  return marks;
}

/** A judged channel cut to a window, ends included. */
export function insideWindow(judged: JudgedChannel, { startsAt, endsAt }: StormWindow): JudgedChannel {
  const kept = (_: number, k: number) => judged.time[k] >= startsAt && judged.time[k] <= endsAt;
  return {
    ...judged,
    time: judged.time.filter(kept),
    values: judged.values.filter(kept),
    flags: judged.flags.filter(kept),
    inForce: judged.inForce.filter(kept),
    tests: judged.tests.map(({ test, flags }) => ({ test, flags: flags.filter(kept) })),
    gaps: judged.gaps.filter(({ from, to }) => to > startsAt && from < endsAt),
  };
}
