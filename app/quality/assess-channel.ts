/** The tests that look at one channel by itself; the wind's direction by its components, which turn without a jump at north. */
import type { ChannelName } from "~/readers/reading";
import { exemptFrom } from "./exempt";
import type { FilledSeries } from "./fill-gaps";
import { onPresent, valuesAt, type FilledChannels } from "./filled-channels";
import { FAIL, type Flags } from "./flags";
import { flatTolerance, resolutionOf } from "./flat-tolerance";
import { rollUp } from "./roll-up";
import { attenuatedSignal } from "./tests/attenuated-signal";
import { climatology } from "./tests/climatology";
import { flatLine } from "./tests/flat-line";
import { grossRange } from "./tests/gross-range";
import { rateOfChange } from "./tests/rate-of-change";
import { spike } from "./tests/spike";
import { steepestChange } from "./tests/steepest-change";
import type { ChannelThresholds, TestName } from "./thresholds";
import { unwrapDegrees } from "./unwrap-degrees";

export interface TestResult {
  test: TestName;
  /** One a time of the channel, gaps included. */
  flags: Flags;
}

interface ChannelInput {
  channel: ChannelName;
  own: FilledSeries;
  filled: FilledChannels;
  limits: ChannelThresholds;
  /** Set by a person to one value: only its range is looked at. */
  constant: boolean;
}

/** What the tests that compare values look at. */
interface Compared {
  time: Float64Array;
  /** NaN where missing. */
  values: Float64Array;
  /** As `values`, NaN too where one fails the gross range: what no sensor can give judges no other. */
  sound: Float64Array;
  limits: ChannelThresholds;
}

const RADIANS = Math.PI / 180;

export function assessChannel({ channel, own, filled, limits, constant }: ChannelInput): TestResult[] {
  const { time, values } = own;
  const range = rangeFlags(values, limits);
  const seasons = limits.seasons.length > 0 ? climatology(time, values, limits.seasons) : null;
  const made = (results: [TestName, Flags | null][]): TestResult[] =>
    results.flatMap(([test, flags]) => (flags ? [{ test, flags: onPresent(flags, values) }] : []));
  const ofValue: [TestName, Flags | null][] = [
    ["gross range", range],
    ["climatology", seasons],
  ];
  if (constant) return made(ofValue);
  const sound = values.map((value, k) => (range?.[k] === FAIL ? Number.NaN : value));
  const direction = channel === "windFrom";
  const compared = { time, values, sound, limits };
  const parts = direction ? components(own, sound, filled, limits) : [compared];
  const turning = direction ? { ...compared, sound: unwrapDegrees(sound) } : compared;
  const exempt = exemptFrom(channel, own, filled);
  return made([
    ...ofValue,
    ["spike", together(parts.map(spikeFlags))],
    ["rate of change", together(parts.map(rateFlags))],
    ["flat line", flatFlags(turning, exempt)],
    ["attenuated signal", attenuationFlags(turning, exempt)],
  ]);
}

/** Towards the east and towards the north, m/s. */
function components(
  own: FilledSeries,
  from: Float64Array,
  filled: FilledChannels,
  limits: ChannelThresholds,
): Compared[] {
  const speed = valuesAt(own.time, filled.get("windSpeed"));
  return [Math.sin, Math.cos].map((part) => {
    const values = from.map((bearing, k) => -speed[k] * part(bearing * RADIANS));
    return { time: own.time, values, sound: values, limits };
  });
}

/** Null where the test has no thresholds. */
function together(results: (Flags | null)[]): Flags | null {
  const made = results.filter((flags) => flags !== null);
  return made.length > 0 ? rollUp(made, made[0].length) : null;
}

function rangeFlags(values: Float64Array, limits: ChannelThresholds): Flags | null {
  const { failLow, failHigh, suspectLow, suspectHigh } = limits;
  return [failLow, failHigh, suspectLow, suspectHigh].some((limit) => limit !== null)
    ? grossRange(values, limits)
    : null;
}

function spikeFlags({ values, sound, limits }: Compared): Flags | null {
  const { spikeLow, spikeHigh, spikeMethod: method } = limits;
  const high = spikeHigh ?? Number.POSITIVE_INFINITY;
  const low = spikeLow ?? high;
  return low === Number.POSITIVE_INFINITY ? null : spike(values, { low, high, method }, sound);
}

function rateFlags({ time, sound, limits }: Compared): Flags | null {
  const { rateDeviations: deviations, rateHours: hours, rateLeast, rateSteepest } = limits;
  return together([
    deviations !== null && hours !== null
      ? rateOfChange(time, sound, { deviations, hours, least: rateLeast ?? 0 })
      : null,
    rateSteepest === null ? null : steepestChange(time, sound, rateSteepest),
  ]);
}

function flatFlags({ time, values, sound, limits }: Compared, exempt: (k: number) => boolean): Flags | null {
  const { flatSuspectCount: suspectCount, flatFailCount: failCount, flatHours } = limits;
  const tolerance = flatTolerance(limits, resolutionOf(values));
  if (tolerance === null || (suspectCount === null && failCount === null)) return null;
  return flatLine(time, sound, { suspectCount, failCount, tolerance, leastHours: flatHours ?? 0 }, exempt);
}

function attenuationFlags({ time, sound, limits }: Compared, exempt: (k: number) => boolean): Flags | null {
  const { attenuatedHours: hours, attenuatedSuspect: suspect, attenuatedFail: fail } = limits;
  if (hours === null || (suspect === null && fail === null)) return null;
  return attenuatedSignal(time, sound, { hours, suspect, fail }, exempt);
}
