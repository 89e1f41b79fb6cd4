import type { ScenarioStorm } from "./scenario";

/** Ends in Z or an offset, so that the instant does not hang on where it is read. */
const WITH_ZONE = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d+)?)?(Z|[+-]\d{2}:?\d{2})$/;

/** Seconds of a time stamp (since 1970 for text, as given for a number); null if it is not one. */
export function secondsOf(stamp: string | number): number | null {
  if (typeof stamp === "number") return Number.isFinite(stamp) ? stamp : null;
  if (!WITH_ZONE.test(stamp)) return null;
  const milliseconds = Date.parse(stamp);
  return Number.isNaN(milliseconds) ? null : milliseconds / 1000;
}

/** Writes an instant the way the storm writes its times: ISO 8601 UTC, or seconds. */
export function stampLike(storm: Pick<ScenarioStorm, "time">, seconds: number): string | number {
  if (typeof storm.time[0] === "number") return seconds;
  return new Date(Math.round(seconds * 1000)).toISOString().replace(".000Z", "Z");
}
