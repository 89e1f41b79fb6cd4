/** What the tests make of a storm's series, channel by channel, inside its window. */
import type { ChannelName } from "~/readers/reading";
import { withinWindow, type StormWindow } from "~/storms/storm-window";
import { FAIL, FLAGS, SUSPECT, type Flag } from "./flags";
import { forcingOf } from "./gap-rule";
import type { JudgedChannel } from "./judge-storm";
import { shareMissing } from "./missing-rule";
import type { TestName } from "./thresholds";
import { usedSamples } from "./used-values";

export interface QualitySummary {
  channel: ChannelName;
  /** Samples of each flag in force. */
  counts: Record<Flag, number>;
  /** Samples whose flag a person set. */
  overridden: number;
  /** Samples that each test raised. */
  raised: { test: TestName; suspect: number; bad: number }[];
  /** s, between samples that an estimate uses, or from the edge of the window. */
  longestPause: number;
  /** 0 to 1, of what an estimate would use. */
  shareMissing: number;
}

interface SummaryOptions {
  window: StormWindow;
  leaveOutSuspect: boolean;
}

export function summariseQuality(judged: readonly JudgedChannel[], options: SummaryOptions): QualitySummary[] {
  const from = judged.find(({ channel }) => channel === "windFrom");
  return judged.map((channel) => summariseChannel(channel, from, options));
}

/** The greatest share that is missing of a channel that an estimate takes. */
export function greatestMissing(judged: readonly JudgedChannel[], options: SummaryOptions): number {
  const asked: readonly ChannelName[] = forcingOf(Object.fromEntries(judged.map((entry) => [entry.channel, entry])));
  return summariseQuality(judged, options)
    .filter(({ channel }) => asked.includes(channel))
    .reduce((most, { shareMissing: share }) => Math.max(most, share), 0);
}

function summariseChannel(
  judged: JudgedChannel,
  from: JudgedChannel | undefined,
  { window, leaveOutSuspect }: SummaryOptions,
): QualitySummary {
  const { channel, time, tests, flags, inForce } = judged;
  const counts: Record<Flag, number> = { 1: 0, 2: 0, 3: 0, 4: 0, 9: 0 };
  let overridden = 0;
  const inside: number[] = [];
  time.forEach((seconds, k) => {
    if (seconds < window.startsAt || seconds > window.endsAt) return;
    inside.push(k);
    if (inForce[k] !== flags[k]) overridden += 1;
  });
  for (const flag of FLAGS) counts[flag] = inside.filter((k) => inForce[k] === flag).length;
  const raised = tests
    .map(({ test, flags: own }) => ({
      test,
      suspect: inside.filter((k) => own[k] === SUSPECT).length,
      bad: inside.filter((k) => own[k] === FAIL).length,
    }))
    .filter(({ suspect, bad }) => suspect + bad > 0);
  const used = usedSamples([judged], leaveOutSuspect)[channel];
  return {
    channel,
    counts,
    overridden,
    raised,
    longestPause: longestPause(used?.time ?? [], window),
    shareMissing: shareMissing(judged, from, window, leaveOutSuspect),
  };
}

function longestPause(time: ArrayLike<number>, window: StormWindow): number {
  const { startsAt, endsAt } = window;
  const within = withinWindow({ time: Float64Array.from(time), values: Float64Array.from(time) }, window).time;
  const edges = [startsAt, ...within, endsAt];
  return edges.slice(1).reduce((longest, to, index) => Math.max(longest, to - edges[index]), 0);
}
