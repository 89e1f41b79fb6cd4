/** What of a storm's series an estimate uses: by their flags, by how much is missing, and by what a person decided on both. */
import type { ScenarioProblem } from "~/ocean/scenario";
import { FAIL, SUSPECT } from "~/quality/flags";
import { forcingOf, longestBridged, type ForcingChannel } from "~/quality/gap-rule";
import type { JudgedChannel } from "~/quality/judge-storm";
import {
  bearableShare,
  MISSING_REFUSED,
  missingVerdict,
  shareMissing,
  type MissingAccepted,
} from "~/quality/missing-rule";
import type { SampledChannels } from "~/quality/samples";
import { usedSamples } from "~/quality/used-values";
import { medianStep } from "~/storms/channel-series";
import { CHANNELS } from "~/storms/channels";
import type { StormWindow } from "~/storms/storm-window";

export interface UseOfSeries {
  leaveOutSuspect: boolean;
  /** Set where a person took it on to estimate with more missing than the rule allows. */
  missingAccepted: MissingAccepted | null;
}

export interface UsedForcing {
  channels: SampledChannels;
  problems: ScenarioProblem[];
  /** What was left out or bridged, a sentence each. */
  assumptions: string[];
}

/** Pauses of more usual steps than this are told where they are bridged. Common practice, no source. */
const STEPS_TOLD = 3;
const HOUR = 3600;

const percent = (share: number) => `${Math.round(share * 100)}\u00a0%`;
const counted = (count: number, what: string) => `${count} ${what}${count === 1 ? "" : "s"}`;

/** @param window null while the storm has none: then nothing can be said of what is missing in it */
export function usedForcing(
  judged: readonly JudgedChannel[],
  window: StormWindow | null,
  use: UseOfSeries,
): UsedForcing {
  const channels = usedSamples(judged, use.leaveOutSuspect);
  const problems: ScenarioProblem[] = [];
  const assumptions: string[] = [];
  const asked = forcingOf(Object.fromEntries(judged.map((entry) => [entry.channel, entry])));
  for (const channel of [...asked, "windFrom"] as const) {
    if (channels[channel] || !judged.some((entry) => entry.channel === channel)) continue;
    problems.push({
      path: "storm",
      code: "NOTHING_LEFT",
      message:
        `Every value of the ${CHANNELS[channel].label} is left out as ${use.leaveOutSuspect ? "bad or suspect" : "bad"}: ` +
        "look through the storm's quality, or bring another record.",
    });
  }
  const from = judged.find(({ channel }) => channel === "windFrom");
  for (const name of forcingOf(channels)) {
    const entry = judged.find(({ channel }) => channel === name);
    if (!entry || !window) continue;
    const share = shareMissing(entry, from, window, use.leaveOutSuspect);
    const verdict = missingVerdict(share);
    if (share > bearableShare(use.missingAccepted)) problems.push(missingProblem(name, share));
    const left = leftOut(entry, window, use.leaveOutSuspect);
    if (left) assumptions.push(left);
    if (verdict !== "fits") {
      assumptions.push(`Of the ${CHANNELS[name].label}, ${percent(share)} of the window is missing or left out.`);
    }
    const bridged = bridgedPauses(name, channels[name]?.time ?? [], window);
    if (bridged) assumptions.push(bridged);
  }
  return { channels, problems, assumptions };
}

function missingProblem(channel: ForcingChannel, share: number): ScenarioProblem {
  return {
    path: "storm",
    code: "MISSING",
    message:
      `Of the ${CHANNELS[channel].label}, ${percent(share)} of the storm's window is missing or left out; above ${percent(MISSING_REFUSED)} no ` +
      "estimate is made. Bring a fuller record, narrow the window, or take it on with a reason on the storm's quality page.",
  };
}

function leftOut(entry: JudgedChannel, { startsAt, endsAt }: StormWindow, leaveOutSuspect: boolean): string | null {
  const count = (flag: number) =>
    entry.inForce.filter((own, k) => own === flag && entry.time[k] >= startsAt && entry.time[k] <= endsAt).length;
  const parts = [
    ...(count(FAIL) > 0 ? [counted(count(FAIL), "bad value")] : []),
    ...(leaveOutSuspect && count(SUSPECT) > 0 ? [counted(count(SUSPECT), "suspect value")] : []),
  ];
  return parts.length === 0 ? null : `Of the ${CHANNELS[entry.channel].label}, ${parts.join(" and ")} left out.`;
}

/** Pauses of more than three usual steps that are short enough to be bridged. */
function bridgedPauses(
  channel: ForcingChannel,
  time: ArrayLike<number>,
  { startsAt, endsAt }: StormWindow,
): string | null {
  const step = medianStep(time);
  if (step === null) return null;
  const longest = longestBridged(channel, time);
  const pauses = Array.from({ length: time.length - 1 }, (_, k) => ({ from: time[k], to: time[k + 1] }))
    .filter(({ from, to }) => from < endsAt && to > startsAt)
    .map(({ from, to }) => to - from)
    .filter((pause) => pause > STEPS_TOLD * step && pause <= longest);
  if (pauses.length === 0) return null;
  const how = CHANNELS[channel].between === "hold" ? "held over" : "bridged on a straight line";
  const hours = (Math.max(...pauses) / HOUR).toFixed(1);
  return `Of the ${CHANNELS[channel].label}, ${counted(pauses.length, "pause")} of more than three usual steps ${how}, up to ${hours}\u00a0h.`;
}
