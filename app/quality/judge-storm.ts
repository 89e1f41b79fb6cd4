/** The flags in force of a storm: what the tests say, and what persons set in their place. */
import type { StormSeries } from "~/storms/load-series.server";
import { assessStorm, type AssessedChannel, type StormInput } from "./assess-storm";
import type { Flags } from "./flags";
import { standing, withOverrides, type Override } from "./overrides";

/** An override as it is kept, with the record that it belongs to. */
export interface RecordOverride extends Override {
  recordId: string;
}

export interface JudgedChannel extends AssessedChannel {
  recordId: string;
  /** Flags of the tests, and those of persons in their place. */
  inForce: Flags;
}

type Judged = Omit<StormInput, "series"> & {
  series: readonly StormSeries[];
  /** Oldest first. */
  overrides: readonly RecordOverride[];
};

export function judgeStorm({ series, overrides, ...input }: Judged): JudgedChannel[] {
  return assessStorm({ ...input, series }).map((assessed, index) => {
    const { recordId } = series[index];
    const own = standing(overrides.filter((override) => override.recordId === recordId));
    return { ...assessed, recordId, inForce: withOverrides(assessed, own) };
  });
}
