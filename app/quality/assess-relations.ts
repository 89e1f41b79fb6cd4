/** The tests that set channels against each other, or against the sun. */
import type { ChannelName } from "~/readers/reading";
import type { TestResult } from "./assess-channel";
import type { FilledSeries } from "./fill-gaps";
import { onPresent, valuesAt, type FilledChannels } from "./filled-channels";
import type { Flags } from "./flags";
import { directionMissing } from "./tests/direction-missing";
import { gustAndMean } from "./tests/gust-and-mean";
import { jumpWithoutPressure } from "./tests/jump-without-pressure";
import { lightAtNight } from "./tests/light-at-night";
import type { TestName, Thresholds } from "./thresholds";

interface RelationInput {
  channel: ChannelName;
  own: FilledSeries;
  filled: FilledChannels;
  thresholds: Thresholds;
  /** [longitude, latitude] in degrees; null where there is no study area yet. */
  place: readonly [number, number] | null;
}

const HOUR = 3600;

export function assessRelations(input: RelationInput): TestResult[] {
  const made = (test: TestName, flags: Flags | null): TestResult[] =>
    flags ? [{ test, flags: onPresent(flags, input.own.values) }] : [];
  switch (input.channel) {
    case "windSpeed":
      return [...made("direction missing", directionFlags(input)), ...made("wind and pressure", jumpFlags(input))];
    case "windGust":
      return made("gust and mean", gustFlags(input));
    case "shortwave":
      return made("light at night", nightFlags(input));
    default:
      return [];
  }
}

function directionFlags({ own, filled, thresholds }: RelationInput): Flags | null {
  const { directionAbove } = thresholds.relations;
  const from = filled.get("windFrom");
  return from && directionAbove !== null
    ? directionMissing(own.values, valuesAt(own.time, from), directionAbove)
    : null;
}

function gustFlags({ own, filled, thresholds }: RelationInput): Flags | null {
  const { gustRatio: ratio, gustAbove } = thresholds.relations;
  const mean = filled.get("windSpeed");
  return mean ? gustAndMean(own.values, valuesAt(own.time, mean), { ratio, above: gustAbove ?? 0 }) : null;
}

function jumpFlags({ own, filled, thresholds }: RelationInput): Flags | null {
  const { jumpDeviations: deviations, jumpHours: hours } = thresholds.relations;
  const pressure = filled.get("airPressure");
  if (!pressure || deviations === null || hours === null) return null;
  const limits = (channel: "windSpeed" | "airPressure") => ({
    deviations,
    hours,
    least: thresholds.channels[channel].rateLeast ?? 0,
  });
  return jumpWithoutPressure(own.time, own.values, valuesAt(own.time, pressure), {
    wind: limits("windSpeed"),
    pressure: limits("airPressure"),
  });
}

function nightFlags({ own, thresholds, place }: RelationInput): Flags | null {
  const { nightLight: light, nightElevation: elevation } = thresholds.relations;
  if (light === null || elevation === null) return null;
  return lightAtNight(own.time, own.values, { light, elevation, place, step: own.step ?? HOUR });
}
