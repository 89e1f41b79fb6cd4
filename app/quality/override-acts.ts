/** Overrides as they were made: one act of a person may set many samples. */
import type { ChannelName } from "~/readers/reading";
import { firstNotBefore } from "~/storms/channel-series";
import type { StormSeries } from "~/storms/load-series.server";
import type { RecordOverride } from "./judge-storm";
import { standing, type SetFlag } from "./overrides";

/** An override with who set it, when and why. */
export interface KeptOverride extends RecordOverride {
  id: string;
  reason: string;
  createdBy: string;
  createdAt: Date;
}

export interface OverrideAct {
  /** Names the act: it is the same for all of its overrides. */
  key: string;
  by: string;
  at: Date;
  reason: string;
  /** Null: it took others back. */
  flag: SetFlag | null;
  channels: ChannelName[];
  /** Seconds since 1970-01-01T00:00:00Z, of the first and last sample. */
  from: number;
  to: number;
  overrides: KeptOverride[];
  /** How many of them are the last word on their sample, and have a value that still stands there. */
  standing: number;
}

function keyOf({ createdAt, createdBy, flag, reason }: KeptOverride): string {
  return JSON.stringify([createdAt.getTime(), createdBy, flag, reason]);
}

/**
 * @param overrides oldest first
 * @param valueNow of a sample of a record; undefined where there is none
 * @returns newest first
 */
export function overrideActs(
  overrides: readonly KeptOverride[],
  valueNow: (override: KeptOverride) => number | undefined,
): OverrideAct[] {
  const last = new Set(lastWords(overrides).map(({ id }) => id));
  return [...grouped(overrides, keyOf)]
    .map(([key, own]): OverrideAct => {
      const [{ createdBy, createdAt, reason, flag }] = own;
      return {
        key,
        by: createdBy,
        at: createdAt,
        reason,
        flag,
        channels: [...new Set(own.map(({ channel }) => channel))],
        from: own.reduce((least, { at }) => Math.min(least, at), Number.POSITIVE_INFINITY),
        to: own.reduce((most, { at }) => Math.max(most, at), Number.NEGATIVE_INFINITY),
        overrides: own,
        standing: own.filter((each) => each.flag !== null && last.has(each.id) && valueNow(each) === each.value).length,
      };
    })
    .reverse();
}

/** The overrides of an act that are still the last word on their sample. @param all oldest first */
export function stillStanding(all: readonly KeptOverride[], key: string): KeptOverride[] {
  return lastWords(all).filter((override) => override.flag !== null && keyOf(override) === key);
}

/** The last override of each sample. */
function lastWords(all: readonly KeptOverride[]): KeptOverride[] {
  return [...grouped(all, ({ recordId }) => recordId).values()].flatMap((own) => [...standing(own).values()]);
}

function grouped<T>(entries: readonly T[], keyOf: (entry: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const entry of entries) {
    const group = groups.get(keyOf(entry));
    if (group) group.push(entry);
    else groups.set(keyOf(entry), [entry]);
  }
  return groups;
}

/** The value of an override's sample as it is now; undefined where the sample has gone. */
export function valueNowIn(series: readonly StormSeries[]) {
  return ({ recordId, channel, at }: RecordOverride): number | undefined => {
    const own = series.find((entry) => entry.recordId === recordId && entry.channel === channel);
    const k = own ? firstNotBefore(own.time, at) : -1;
    return own?.time[k] === at ? own.values[k] : undefined;
  };
}
