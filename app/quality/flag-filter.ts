/** What a flags table shows: chosen in the page's address, so that a view can be sent to a colleague. */
import { CHANNEL_NAMES, type ChannelName } from "~/readers/reading";
import { readWallClock } from "~/storms/storm-window";
import { FLAG_WORDS, FLAGS } from "./flags";
import { TEST_NAMES, type TestName } from "./thresholds";

export const FLAG_CHOICES = ["look", "set", "all", ...FLAGS.map(String)] as const;

export interface FlagFilter {
  channel: ChannelName | null;
  test: TestName | null;
  /** `look`: what a person should look at; `set`: by a person; else one flag by its number. */
  flag: string;
  /** Seconds since 1970-01-01T00:00:00Z; null: the storm's window. */
  from: number | null;
  to: number | null;
}

export interface ReadFilter {
  filter: FlagFilter;
  /** From 1. */
  page: number;
  problems: Partial<Record<"from" | "to", string[]>>;
}

export const FLAG_CHOICE_LABELS: Record<string, string> = {
  look: "suspect, bad, or set by a person",
  set: "set by a person",
  all: "all samples",
  ...Object.fromEntries(FLAGS.map((flag) => [String(flag), `${flag} · ${FLAG_WORDS[flag]}`])),
};

/** What cannot be read is left open, and told. @param zone of the times in the address */
export function readFilter(search: URLSearchParams, zone: string): ReadFilter {
  const problems: ReadFilter["problems"] = {};
  const time = (field: "from" | "to") => {
    const text = (search.get(field) ?? "").trim();
    if (text === "") return null;
    const clock = readWallClock(text, zone);
    if ("seconds" in clock) return clock.seconds;
    problems[field] = [clock.problem];
    return null;
  };
  const [from, to] = [time("from"), time("to")];
  if (from !== null && to !== null && from > to) problems.to = ["The end must come after the start."];
  const flag = search.get("flag") ?? "";
  return {
    filter: {
      channel: CHANNEL_NAMES.find((name) => name === search.get("channel")) ?? null,
      test: TEST_NAMES.find((name) => name === search.get("test")) ?? null,
      flag: FLAG_CHOICES.find((choice) => choice === flag) ?? "look",
      from,
      to,
    },
    page: Math.max(1, Math.min(1e6, Math.trunc(Number(search.get("page"))) || 1)),
    problems,
  };
}
