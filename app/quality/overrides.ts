/** Flags that persons set: kept in order, each with its reason; the last one on a sample stands. */
import type { ChannelName } from "~/readers/reading";
import { FAIL, PASS, SUSPECT, type Flags } from "./flags";

/** What a person may set. */
export const SET_FLAGS = [PASS, SUSPECT, FAIL] as const;
export type SetFlag = (typeof SET_FLAGS)[number];

export interface Override {
  channel: ChannelName;
  /** Seconds since 1970-01-01T00:00:00Z. */
  at: number;
  /** The sample's value when the flag was set. */
  value: number;
  /** Null: the tests' own flag stands again. */
  flag: SetFlag | null;
}

/** A sample by name: its channel and time. */
export function sampleKey(channel: ChannelName, at: number): string {
  return `${channel}@${at}`;
}

/** The override that stands on each sample, by `sampleKey`. @param overrides oldest first */
export function standing<O extends Override>(overrides: readonly O[]): ReadonlyMap<string, O> {
  return new Map(overrides.map((override) => [sampleKey(override.channel, override.at), override]));
}

/**
 * The flags in force: those of the tests, and in their place what a person set. An override holds for the value that the
 * person saw: where a record was read anew and the sample has another value, the tests speak again.
 */
export function withOverrides(
  { channel, time, values, flags }: { channel: ChannelName; time: Float64Array; values: Float64Array; flags: Flags },
  overrides: ReadonlyMap<string, Override>,
): Flags {
  if (overrides.size === 0) return flags;
  return flags.map((flag, k) => {
    const set = overrides.get(sampleKey(channel, time[k]));
    return set && set.flag !== null && set.value === values[k] ? set.flag : flag;
  });
}
