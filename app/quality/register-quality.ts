/** The quality of a storm's series as an estimate keeps it with its inputs and a memo prints it. */
import type { ChannelName } from "~/readers/reading";
import type { StormWindow } from "~/storms/storm-window";
import type { JudgedChannel } from "./judge-storm";
import type { MissingAccepted } from "./missing-rule";
import { summariseQuality, type QualitySummary } from "./summarise-quality";
import { describeThresholds } from "./describe-thresholds";
import type { Thresholds } from "./thresholds";

export interface RegisteredChannel extends Omit<QualitySummary, "raised"> {
  recordId: string;
  /** The thresholds of its tests, in words. */
  thresholds: string;
}

export interface RegisteredQuality {
  /** 0: the defaults. */
  thresholdsVersion: number;
  leaveOutSuspect: boolean;
  missingAccepted: MissingAccepted | null;
  /** Inside the storm's window; none while it has no window. */
  channels: RegisteredChannel[];
}

interface RegisterOptions {
  thresholds: Thresholds;
  thresholdsVersion: number;
  leaveOutSuspect: boolean;
  missingAccepted: MissingAccepted | null;
}

export function registerQuality(
  judged: readonly JudgedChannel[],
  window: StormWindow | null,
  { thresholds, thresholdsVersion, leaveOutSuspect, missingAccepted }: RegisterOptions,
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
  };
}
