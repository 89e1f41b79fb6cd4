/** The thresholds of the tests: per channel, and for what relates channels to each other. All in the channels' own units. */
import type { ChannelName } from "~/readers/reading";
import type { Season } from "./tests/climatology";

/** How a number of the thresholds is told: in the channel's unit, as that per hour, or in a unit of its own. */
export type ThresholdUnit =
  "value" | "perHour" | "h" | "values" | "standard deviations" | "m/s" | "W/m²" | "°" | "" | "%";

export interface ThresholdField {
  label: string;
  unit: ThresholdUnit;
  /** The test that needs it. */
  test: TestName;
  min?: number;
  max?: number;
  whole?: true;
}

export const TEST_NAMES = [
  "gross range",
  "climatology",
  "spike",
  "rate of change",
  "flat line",
  "attenuated signal",
  "wind and pressure",
  "gust and mean",
  "direction missing",
  "light at night",
] as const;
export type TestName = (typeof TEST_NAMES)[number];

export const CHANNEL_FIELDS = {
  failLow: { label: "Bad below", unit: "value", test: "gross range" },
  failHigh: { label: "Bad above", unit: "value", test: "gross range" },
  suspectLow: { label: "Suspect below", unit: "value", test: "gross range" },
  suspectHigh: { label: "Suspect above", unit: "value", test: "gross range" },
  spikeLow: { label: "Spike suspect above", unit: "value", test: "spike", min: 0 },
  spikeHigh: { label: "Spike bad above", unit: "value", test: "spike", min: 0 },
  rateDeviations: { label: "Step suspect above", unit: "standard deviations", test: "rate of change", min: 0 },
  rateHours: { label: "Deviation of the steps of the last", unit: "h", test: "rate of change", min: 0.1, max: 720 },
  rateLeast: { label: "Least deviation", unit: "value", test: "rate of change", min: 0 },
  rateSteepest: { label: "Change suspect above", unit: "perHour", test: "rate of change", min: 0 },
  flatSuspectCount: {
    label: "Alike in a row, suspect from",
    unit: "values",
    test: "flat line",
    min: 2,
    max: 1000,
    whole: true,
  },
  flatFailCount: {
    label: "Alike in a row, bad from",
    unit: "values",
    test: "flat line",
    min: 2,
    max: 1000,
    whole: true,
  },
  flatHours: { label: "The row lasts at least", unit: "h", test: "flat line", min: 0, max: 720 },
  flatTolerance: { label: "Alike within", unit: "value", test: "flat line", min: 0 },
  flatFineTolerance: {
    label: "Alike within, where reported to 0.1 or finer",
    unit: "value",
    test: "flat line",
    min: 0,
  },
  attenuatedHours: { label: "Range over the last", unit: "h", test: "attenuated signal", min: 0.1, max: 720 },
  attenuatedSuspect: { label: "Range suspect below", unit: "value", test: "attenuated signal", min: 0 },
  attenuatedFail: { label: "Range bad below", unit: "value", test: "attenuated signal", min: 0 },
} satisfies Record<string, ThresholdField>;
export type ChannelField = keyof typeof CHANNEL_FIELDS;

export const RELATION_FIELDS = {
  gustRatio: { label: "Gust over mean suspect above", unit: "", test: "gust and mean", min: 1 },
  gustAbove: { label: "where the mean is above", unit: "m/s", test: "gust and mean", min: 0 },
  directionAbove: { label: "A direction is asked of wind above", unit: "m/s", test: "direction missing", min: 0 },
  nightLight: { label: "Shortwave at night bad above", unit: "W/m²", test: "light at night", min: 0 },
  nightElevation: { label: "Night is with the sun below", unit: "°", test: "light at night", min: -30, max: 0 },
  jumpDeviations: {
    label: "Jump of wind and of pressure above",
    unit: "standard deviations",
    test: "wind and pressure",
    min: 0,
  },
  jumpHours: { label: "Deviation of the steps of the last", unit: "h", test: "wind and pressure", min: 0.1, max: 720 },
} satisfies Record<string, ThresholdField>;
export type RelationField = keyof typeof RELATION_FIELDS;

/** Null: the test is not made. */
export interface ChannelThresholds extends Record<ChannelField, number | null> {
  spikeMethod: "differential" | "average";
  seasons: Season[];
}
export type RelationThresholds = Record<RelationField, number | null>;

export interface Thresholds {
  channels: Record<ChannelName, ChannelThresholds>;
  relations: RelationThresholds;
}

/** What a project has in place of the defaults, channel by channel. */
export interface ChosenThresholds {
  channels: Partial<Record<ChannelName, ChannelThresholds>>;
  relations?: RelationThresholds;
}
