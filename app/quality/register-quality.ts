/** The quality of a storm's series as an estimate keeps it with its inputs and a memo prints it. */
import type { ChannelName } from "~/readers/reading";
import type { StormWindow } from "~/storms/storm-window";
import type { JudgedChannel, RecordOverride } from "./judge-storm";
import type { MissingAccepted } from "./missing-rule";
import { overrideFinder } from "./override-finder";
import type { SetFlag } from "./overrides";
import { summariseQuality, type QualitySummary } from "./summarise-quality";
import { describeThresholds } from "./describe-thresholds";
import type { Thresholds } from "./thresholds";

export interface RegisteredChannel extends Omit<QualitySummary, "raised"> {
  recordId: string;
  /** The thresholds of its tests, in words. */
  thresholds: string;
}

/** What a person set in one act on a channel of a record, as far as it stands. */
export interface RegisteredOverride {
  recordId: string;
  channel: ChannelName;
  flag: SetFlag;
  reason: string;
  /** Name of the person; absent in runs of before names were registered. */
  by?: string;
  /** ISO UTC; absent as `by` is. */
  setAt?: string;
  count: number;
  /** ISO UTC of the first and the last. */
  first: string;
  last: string;
}

export interface RegisteredQuality {
  /** 0: the defaults. */
  thresholdsVersion: number;
  leaveOutSuspect: boolean;
  missingAccepted: MissingAccepted | null;
  /** Inside the storm's window; none while it has no window. */
  channels: RegisteredChannel[];
  /** Absent in runs of before flags could be set. */
  overrides?: RegisteredOverride[];
}

interface RegisterOptions {
  thresholds: Thresholds;
  thresholdsVersion: number;
  leaveOutSuspect: boolean;
  missingAccepted: MissingAccepted | null;
  /** Oldest first. */
  overrides: readonly ReasonedOverride[];
  /** Names of persons by their id. */
  names: ReadonlyMap<string, string>;
}

type ReasonedOverride = RecordOverride & { reason: string; createdBy: string; createdAt: Date };

export function registerQuality(
  judged: readonly JudgedChannel[],
  window: StormWindow | null,
  { thresholds, thresholdsVersion, leaveOutSuspect, missingAccepted, overrides, names }: RegisterOptions,
): RegisteredQuality {
  const recordOf = new Map<ChannelName, string>(judged.map(({ channel, recordId }) => [channel, recordId]));
  const summaries = window ? summariseQuality(judged, { window, leaveOutSuspect }) : [];
  return {
    thresholdsVersion,
    leaveOutSuspect,
    missingAccepted,
    channels: summaries.map(({ channel, counts, overridden, longestPause, shareMissing }) => ({
      channel,
      counts,
      overridden,
      longestPause,
      shareMissing,
      recordId: recordOf.get(channel) ?? "",
      thresholds: describeThresholds(channel, thresholds.channels[channel]),
    })),
    overrides: window ? registerOverrides(judged, window, overrides, names) : [],
  };
}

/** Flags that persons set inside the window, those of one act together. */
function registerOverrides(
  judged: readonly JudgedChannel[],
  { startsAt, endsAt }: StormWindow,
  overrides: readonly ReasonedOverride[],
  names: RegisterOptions["names"],
): RegisteredOverride[] {
  const groups = new Map<string, RegisteredOverride>();
  const setAt = overrideFinder(overrides);
  for (const entry of judged) {
    const { recordId, channel } = entry;
    entry.time.forEach((seconds, k) => {
      const set = seconds < startsAt || seconds > endsAt ? null : setAt({ judged: entry, k });
      if (!set || set.flag === null) return;
      const { flag, reason, createdBy } = set;
      const setAtTime = set.createdAt.toISOString();
      const last = new Date(seconds * 1000).toISOString();
      const key = JSON.stringify([recordId, channel, flag, reason, createdBy, setAtTime]);
      const known = groups.get(key);
      if (known) Object.assign(known, { count: known.count + 1, last });
      else {
        const by = names.get(createdBy);
        groups.set(key, { recordId, channel, flag, reason, by, setAt: setAtTime, count: 1, first: last, last });
      }
    });
  }
  return [...groups.values()];
}
