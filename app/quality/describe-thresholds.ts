/** Thresholds in words, for a memo: test by test, what is suspect and what is bad. */
import { CHANNEL_UNITS, type ChannelName } from "~/readers/reading";
import { formatSeasons } from "./season-text";
import type { ChannelThresholds, RelationThresholds, TestName } from "./thresholds";

function between(low: number | null, high: number | null): string {
  if (low !== null && high !== null) return `outside ${low} to ${high}`;
  return low !== null ? `below ${low}` : `above ${high}`;
}

/** `suspect above 20, bad above 40 m/s`; empty without either. */
function degrees(suspect: string | null, bad: string | null, unit: string): string {
  const parts = [suspect && `suspect ${suspect}`, bad && `bad ${bad}`].filter(Boolean);
  return parts.length === 0 ? "" : `${parts.join(", ")}${unit === "" ? "" : ` ${unit}`}`;
}

const given = (value: number | null, words: (value: number) => string) => (value === null ? null : words(value));

export function describeThresholds(channel: ChannelName, limits: ChannelThresholds): string {
  return thresholdWords(channel, limits)
    .map(({ test, words }) => `${test === "spike" ? `spike, ${limits.spikeMethod}` : test}: ${words}`)
    .join("; ");
}

interface TestWords {
  test: TestName;
  words: string;
}

/** Test by test, those that have thresholds. */
export function thresholdWords(channel: ChannelName, limits: ChannelThresholds): TestWords[] {
  const unit = CHANNEL_UNITS[channel];
  const range = (low: number | null, high: number | null) =>
    low === null && high === null ? null : between(low, high);
  const spikeUnit = channel === "windFrom" ? "m/s" : unit;
  const counts = degrees(
    given(limits.flatSuspectCount, (count) => `${count} alike in a row`),
    given(limits.flatFailCount, (count) => `${count} alike in a row`),
    "",
  );
  const lasting = limits.flatHours ? `, for at least ${limits.flatHours} h` : "";
  const fine = limits.flatFineTolerance === null ? "" : ` (${limits.flatFineTolerance} where reported to 0.1 or finer)`;
  const parts: [TestName, string][] = [
    [
      "gross range",
      degrees(range(limits.suspectLow, limits.suspectHigh), range(limits.failLow, limits.failHigh), unit),
    ],
    ["climatology", limits.seasons.length > 0 ? `suspect outside ${formatSeasons(limits.seasons, "; ")} ${unit}` : ""],
    [
      "spike",
      degrees(
        given(limits.spikeLow, (value) => `above ${value}`),
        given(limits.spikeHigh, (value) => `above ${value}`),
        spikeUnit,
      ),
    ],
    [
      "rate of change",
      [
        limits.rateDeviations === null
          ? ""
          : `suspect above ${limits.rateDeviations} standard deviations of the steps of ${limits.rateHours} h, at least ${limits.rateLeast ?? 0} ${spikeUnit}`,
        limits.rateSteepest === null ? "" : `suspect above ${limits.rateSteepest} ${spikeUnit} per hour`,
      ]
        .filter((text) => text !== "")
        .join(" and "),
    ],
    ["flat line", counts === "" ? "" : `${counts}, within ${limits.flatTolerance ?? "none"} ${unit}${fine}${lasting}`],
    [
      "attenuated signal",
      degrees(
        given(limits.attenuatedSuspect, (value) => `below a range of ${value}`),
        given(limits.attenuatedFail, (value) => `below a range of ${value}`),
        limits.attenuatedHours === null ? unit : `${unit} over ${limits.attenuatedHours} h`,
      ),
    ],
  ];
  return parts.flatMap(([test, words]) => (words === "" ? [] : [{ test, words }]));
}

/** Of the tests that set channels against each other; those that have thresholds. */
export function relationWords(limits: RelationThresholds): TestWords[] {
  const { gustRatio, gustAbove, directionAbove, nightLight, nightElevation, jumpDeviations, jumpHours } = limits;
  const ratio = gustRatio === null ? "" : `, or above ${gustRatio} times a mean of more than ${gustAbove ?? 0} m/s`;
  const words: [TestName, string | null][] = [
    ["gust and mean", `suspect below the mean${ratio}`],
    ["direction missing", given(directionAbove, (value) => `suspect where wind above ${value} m/s has no direction`)],
    [
      "light at night",
      given(nightLight, (value) => `bad above ${value} W/m² with the sun below ${nightElevation ?? 0}°`),
    ],
    [
      "wind and pressure",
      given(
        jumpDeviations,
        (value) =>
          `suspect where the wind jumps by more than ${value} standard deviations of ${jumpHours ?? 0} h and the pressure does not`,
      ),
    ],
  ];
  return words.flatMap(([test, text]) => (text === null ? [] : [{ test, words: text }]));
}
