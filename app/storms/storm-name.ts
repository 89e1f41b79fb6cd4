import type { SeriesReading } from "~/readers/reading";
import { zoneClock } from "~/units/format-time";
import { StormRefusal } from "./refusal";

export const STORM_NAME_LENGTH = 120;

/** Proposed where nobody gave a name: the day of the strongest wind, else the file's name without its ending. */
export function proposeStormName(reading: SeriesReading, zone: string): string {
  const peakAt = reading.channels.windSpeed?.maxAt;
  if (peakAt) return `Storm of ${zoneClock(zone).date(Date.parse(peakAt) / 1000)}`;
  const base = reading.fileName.replace(/\.[^.]*$/, "").trim();
  return (base || "Storm").slice(0, STORM_NAME_LENGTH);
}

/** The name itself, or with the first number from 2 up that nobody has yet. */
export function freeName(wanted: string, taken: ReadonlySet<string>): string {
  if (!taken.has(wanted)) return wanted;
  for (let number = 2; ; number++) {
    const numbered = `${wanted.slice(0, STORM_NAME_LENGTH - 7)} (${number})`;
    if (!taken.has(numbered)) return numbered;
  }
}

/**
 * The name in a form; empty where none was given.
 * @throws StormRefusal for one that is too long
 */
export function postedName(form: FormData, field = "name"): string {
  const text = form.get(field);
  const name = typeof text === "string" ? text.trim() : "";
  if (name.length > STORM_NAME_LENGTH) throw new StormRefusal(`Use at most ${STORM_NAME_LENGTH} characters.`, field);
  return name;
}
