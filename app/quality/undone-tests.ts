/** Tests of the open set that were not made, each with its reason: an undone test is told, not passed over. */
import type { CHANNEL_NAMES } from "~/readers/reading";
import { CHANNELS } from "~/storms/channels";
import type { JudgedChannel } from "./judge-storm";
import { TEST_NAMES, type TestName, type Thresholds } from "./thresholds";

export interface UndoneTest {
  test: string;
  reason: string;
}

const ALWAYS: UndoneTest[] = [
  { test: "location", reason: "a record holds one place at most, and none for each sample" },
  { test: "neighbour and forecast", reason: "a storm has each channel from one record" },
  {
    test: "rain and its counter",
    reason: "counters are turned to rates on the reading sheet, and their resets told there",
  },
];

/** The tests that look at one channel by itself. */
const OF_EVERY_CHANNEL: readonly TestName[] = [
  "gross range",
  "climatology",
  "spike",
  "rate of change",
  "flat line",
  "attenuated signal",
];

export function undoneTests(
  judged: readonly JudgedChannel[],
  { relations }: Thresholds,
  place: readonly [number, number] | null,
): UndoneTest[] {
  const made = (test: TestName) => judged.filter(({ tests }) => tests.some((result) => result.test === test));
  const has = (channel: (typeof CHANNEL_NAMES)[number]) => judged.some((entry) => entry.channel === channel);
  const undone = [...ALWAYS];
  for (const test of TEST_NAMES.filter((name) => OF_EVERY_CHANNEL.includes(name))) {
    const without = judged.filter((entry) => !made(test).includes(entry)).map(({ channel }) => CHANNELS[channel].label);
    if (without.length === 0) continue;
    const reason =
      test === "flat line"
        ? "no thresholds, a constant, or reported too coarsely for the tolerance"
        : "no thresholds, or a constant";
    undone.push({ test: `${test} of ${without.join(", ")}`, reason });
  }
  if (has("windSpeed") && made("wind and pressure").length === 0) {
    const reason = relations.jumpDeviations === null ? "no threshold is set" : "no record of air pressure";
    undone.push({ test: "wind and pressure", reason });
  }
  if (has("shortwave") && place === null) {
    undone.push({ test: "light at night", reason: "no study box yet that says where the sun stands" });
  }
  return undone;
}
