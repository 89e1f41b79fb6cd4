/** What the quality page says of one channel: counts, what is missing, what each test did. Inside the storm's window. */
import type { ChannelName } from "~/readers/reading";
import { medianStep } from "~/storms/channel-series";
import { CHANNELS } from "~/storms/channels";
import type { StormWindow } from "~/storms/storm-window";
import { formatPeriod } from "~/units/format-time";
import { relationWords, thresholdWords } from "./describe-thresholds";
import { FAIL, FLAG_WORDS, FLAGS, MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flag, type Flags } from "./flags";
import { FORCING_CHANNELS, longestBridged } from "./gap-rule";
import type { JudgedChannel } from "./judge-storm";
import { missingVerdict } from "./missing-rule";
import type { QualitySummary } from "./summarise-quality";
import type { Thresholds } from "./thresholds";
import { usedSamples } from "./used-values";

export interface TestLine {
  test: string;
  /** Its thresholds in words. */
  rule: string;
  good: number;
  suspect: number;
  bad: number;
  notEvaluated: number;
}

export interface GapLine {
  period: string;
  hours: number;
  missing: number;
  effect: string;
}

export interface ChannelQuality {
  channel: ChannelName;
  label: string;
  counts: { flag: Flag; words: string; count: number }[];
  overridden: number;
  /** 0 to 1 */
  shareMissing: number;
  verdict: ReturnType<typeof missingVerdict> | "notUsed";
  tests: TestLine[];
  gaps: GapLine[];
  /** What is done with a gap. */
  gapRule: string;
}

interface PresentOptions {
  window: StormWindow;
  thresholds: Thresholds;
  leaveOutSuspect: boolean;
  zone: string;
}

const HOUR = 3600;

const countOf = (flags: Flags, wanted: Flag) => flags.reduce((count, flag) => count + (flag === wanted ? 1 : 0), 0);

/** @param inside the channel cut to the window, `whole` as it is on record */
export function presentChannel(
  inside: JudgedChannel,
  whole: JudgedChannel,
  summary: QualitySummary,
  { window, thresholds, leaveOutSuspect, zone }: PresentOptions,
): ChannelQuality {
  const { channel, tests, gaps } = inside;
  const words = [...thresholdWords(channel, thresholds.channels[channel]), ...relationWords(thresholds.relations)];
  const usedTime = usedSamples([whole], leaveOutSuspect)[channel]?.time ?? [];
  const used = FORCING_CHANNELS.includes(channel);
  // Speed and direction are bridged together.
  const longest = longestBridged(channel === "windFrom" ? "windSpeed" : channel, usedTime);
  return {
    channel,
    label: CHANNELS[channel].label,
    counts: FLAGS.map((flag) => ({ flag, words: FLAG_WORDS[flag], count: summary.counts[flag] })),
    overridden: summary.overridden,
    shareMissing: summary.shareMissing,
    verdict: used ? missingVerdict(summary.shareMissing) : "notUsed",
    tests: tests.map(({ test, flags }) => ({
      test,
      rule: words.find((each) => each.test === test)?.words ?? "",
      good: countOf(flags, PASS),
      suspect: countOf(flags, SUSPECT),
      bad: countOf(flags, FAIL),
      notEvaluated: countOf(flags, NOT_EVALUATED) + countOf(flags, MISSING),
    })),
    gaps: gaps.map(({ from, to, missing }) => ({
      period: formatPeriod(Math.max(from, window.startsAt), Math.min(to, window.endsAt), zone),
      hours: (to - from) / HOUR,
      missing,
      effect: used ? effectOf(channel, to - from, longest) : "not used by estimates",
    })),
    gapRule: used ? ruleOf(channel, longest, medianStep(usedTime)) : "Estimates do not use this channel.",
  };
}

const HOW = {
  hold: "the last value is held",
  linear: "bridged on a straight line",
  turn: "bridged with the wind speed, as a vector",
};

function howBridged(channel: ChannelName): string {
  return channel === "windSpeed" ? "bridged with the direction, as a vector" : HOW[CHANNELS[channel].between];
}

function effectOf(channel: ChannelName, pause: number, longest: number): string {
  return pause <= longest ? howBridged(channel) : "too long: no estimate is made across it";
}

function ruleOf(channel: ChannelName, longest: number, step: number | null): string {
  const usual = step === null ? "" : ` The usual step is ${Number((step / 60).toFixed(2))} min.`;
  return `A pause of more than 1.5 usual steps is a gap.${usual} Up to ${Number((longest / HOUR).toFixed(1))} h, ${howBridged(channel)}; a longer one stops the estimate.`;
}
