import type { ChannelName, ReadingStep, Understood } from "~/readers/reading";
import type { StormScenario } from "./scenario";

/** A value that a person set to stand over the whole storm, in the channel's unit. */
export interface ConstantForcing {
  channel: ChannelName;
  value: number;
  /** As it was typed. */
  asWritten: { value: number; unit: string };
}

/** How a confirmed record was read: kept beside the original, printed in the memo's register of inputs. */
export interface RecordProvenance {
  formatLabel: string;
  rows: number;
  /** ISO UTC */
  first: string;
  last: string;
  zone: string;
  /** m; null where the file holds no wind. */
  windHeight: number | null;
  averagingMinutes: number | null;
  medianStepSeconds: number | null;
  understood: Understood[];
  steps: ReadingStep[];
  dropped: { reason: string; count: number; firstRow: number }[];
  channels: { channel: ChannelName; unit: string; count: number; missing: number; fromColumns: string[] }[];
  /** Only where no file stands behind the record. */
  constant?: ConstantForcing;
  /** Only where the record was taken over from another storm. */
  scenario?: StormScenario;
  /** Whose answers these are, and when (ISO UTC). */
  confirmedBy: string;
  confirmedAt: string;
}
