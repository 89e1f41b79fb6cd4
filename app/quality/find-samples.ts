import type { StormWindow } from "~/storms/storm-window";
import type { FlagFilter } from "./flag-filter";
import { FAIL, SUSPECT } from "./flags";
import type { JudgedChannel } from "./judge-storm";
import { sampleKey } from "./overrides";

/** A sample of a judged channel, by its place. */
export interface SamplePlace {
  judged: JudgedChannel;
  k: number;
}

/**
 * The samples that a filter finds, channel by channel in the order of time. Where a test is chosen, the flag is the one that
 * this test gave; else it is the flag in force.
 * @param isSet whether a person's flag stands on a sample
 */
export function findSamples(
  judged: readonly JudgedChannel[],
  filter: FlagFilter,
  window: StormWindow,
  isSet: (place: SamplePlace) => boolean,
): SamplePlace[] {
  const from = filter.from ?? (filter.to === null ? window.startsAt : Number.NEGATIVE_INFINITY);
  const to = filter.to ?? (filter.from === null ? window.endsAt : Number.POSITIVE_INFINITY);
  const found: SamplePlace[] = [];
  for (const entry of judged) {
    if (filter.channel !== null && entry.channel !== filter.channel) continue;
    const flags = filter.test === null ? entry.inForce : entry.tests.find(({ test }) => test === filter.test)?.flags;
    if (!flags) continue;
    entry.time.forEach((seconds, k) => {
      if (seconds < from || seconds > to) return;
      const place = { judged: entry, k };
      if (fits(filter, flags[k], () => isSet(place))) found.push(place);
    });
  }
  return found;
}

function fits({ flag: choice, test }: FlagFilter, flag: number, isSet: () => boolean): boolean {
  switch (choice) {
    case "all":
      return true;
    case "set":
      return isSet();
    case "look":
      return flag === SUSPECT || flag === FAIL || (test === null && isSet());
    default:
      return String(flag) === choice;
  }
}

/** A missing sample has no value that a person could judge. */
export function isPresent({ judged, k }: SamplePlace): boolean {
  return !Number.isNaN(judged.values[k]);
}

/** The samples that `channel@seconds` names; what is not there is passed over. */
export function namedSamples(judged: readonly JudgedChannel[], names: readonly string[]): SamplePlace[] {
  const wanted = new Set(names);
  return judged.flatMap((entry) =>
    Array.from(entry.time.keys())
      .filter((k) => wanted.has(sampleKey(entry.channel, entry.time[k])))
      .map((k) => ({ judged: entry, k })),
  );
}
