/** Seasons as they are typed: a line each, `6-9: 0 to 45`, months first. */
import type { Season } from "./tests/climatology";

const NUMBER = String.raw`[+\-\u2212]?\d+(?:[.,]\d+)?`;
const LINE = new RegExp(String.raw`^(\d{1,2})\s*[-\u2013]\s*(\d{1,2})\s*:\s*(${NUMBER})\s+to\s+(${NUMBER})$`, "i");

const numberOf = (text: string) => Number(text.replace(",", ".").replace("\u2212", "-"));

export function formatSeasons(seasons: readonly Season[], between = "\n"): string {
  return seasons.map(({ fromMonth, toMonth, low, high }) => `${fromMonth}-${toMonth}: ${low} to ${high}`).join(between);
}

/** @returns the seasons, or what is wrong with the first line that cannot be read */
export function readSeasons(text: string): Season[] | { problem: string } {
  const seasons: Season[] = [];
  for (const line of text.split(/\r?\n/).map((each) => each.trim())) {
    if (line === "") continue;
    const [, from, to, low, high] = LINE.exec(line) ?? [];
    const season = {
      fromMonth: Number(from),
      toMonth: Number(to),
      low: numberOf(low ?? ""),
      high: numberOf(high ?? ""),
    };
    const months = [season.fromMonth, season.toMonth].every((month) => month >= 1 && month <= 12);
    if (from === undefined || !months || !(season.low < season.high)) {
      return { problem: `"${line}" is no season: write months from 1 to 12 and a range, such as 6-9: 0 to 45.` };
    }
    seasons.push(season);
  }
  return seasons;
}
