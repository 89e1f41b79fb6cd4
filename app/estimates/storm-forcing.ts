/**
 * One time axis for all that drives a storm. Each channel comes with its own times, missing values taken out;
 * wind is brought to the common axis as a vector, rain and evaporation as rates that hold until their next time,
 * heat on the straight line between its times, or held where the method says so.
 */
import { heldAt, linearAt, lastAtOrBefore, unionAxis } from "./resample";
import { LONGEST_GAP } from "~/ocean/constants";
import type { HeatSeries, ScenarioProblem } from "~/ocean/scenario";
import { forcingOf, HEAT_PARTS, unbridgedPauses, type ForcingChannel, type Pause } from "~/quality/gap-rule";
import { pairWind, type PairedWind } from "~/quality/pair-wind";
import type { SampledChannels, Samples } from "~/quality/samples";
import { medianStep } from "~/storms/channel-series";
import { formatTime } from "~/units/format-time";

export interface StormInput {
  channels: SampledChannels;
  /** m above the sea; null where the record does not say. */
  windHeight: number | null;
  /** Seconds since 1970-01-01T00:00:00Z. */
  startsAt: number | null;
  endsAt: number | null;
  heatInterpolation: "linear" | "hold";
}

export interface StormForcing {
  /** Seconds since 1970-01-01T00:00:00Z, strictly ascending. */
  time: number[];
  /** m/s at `windHeight` */
  windSpeed: number[];
  /** degrees true, where the wind comes from */
  windFrom: number[];
  windHeight: number;
  /** mm/h */
  rain?: number[];
  /** mm/h */
  evaporation?: number[];
  heat?: HeatSeries;
}

export interface ReadForcing {
  /** Null where a problem leaves nothing to compute with. */
  forcing: StormForcing | null;
  problems: ScenarioProblem[];
  /** What was taken for granted, a sentence each. */
  assumptions: string[];
}

const LABELS: Record<ForcingChannel, string> = {
  windSpeed: "wind",
  rain: "rain",
  evaporation: "evaporation",
  netHeat: "net heat",
  shortwave: "shortwave radiation",
  longwave: "longwave radiation",
  sensible: "sensible heat",
  latent: "latent heat",
};

const RADIANS = Math.PI / 180;

/** As measured where a sample stands; between samples the vector on the straight line, turned back to speed and direction. */
function windAt(wind: PairedWind, moment: number): [speed: number, from: number] {
  const at = lastAtOrBefore(wind.time, moment);
  if (at >= 0 && wind.time[at] === moment) return [wind.speed[at], wind.from[at]];
  const east = linearAt({ time: wind.time, values: wind.east }, moment);
  const north = linearAt({ time: wind.time, values: wind.north }, moment);
  const speed = Math.hypot(east, north);
  return [speed, speed === 0 ? 0 : (Math.atan2(-east, -north) / RADIANS + 360) % 360];
}

/** Where a scenario holds what the channel brings. */
function pathOf(channel: ForcingChannel): string {
  if (channel === "windSpeed" || channel === "rain" || channel === "evaporation") return `storm.${channel}`;
  return `storm.heat.${channel === "netHeat" ? "net" : channel}`;
}

function pauseProblem(pause: Pause, zone: string): ScenarioProblem {
  const hours = ((pause.to - pause.from) / 3600).toFixed(1);
  return {
    path: pathOf(pause.channel),
    code: "GAP",
    message:
      `The ${LABELS[pause.channel]} has no value for ${hours} h, from ${formatTime(pause.from, zone)} to ` +
      `${formatTime(pause.to, zone)}. A pause this long is not bridged: bring a record that covers it, or narrow the storm's window.`,
  };
}

/** Held rates: the last one stands for one step of its own record, then nothing. */
function heldRate(samples: Samples, axis: number[]): number[] {
  const last = samples.time[samples.time.length - 1];
  const step = medianStep(samples.time);
  const end = step === null ? Number.POSITIVE_INFINITY : last + step;
  return axis.map((moment) => {
    const value = moment >= end ? 0 : heldAt(samples, moment);
    return Number.isNaN(value) ? 0 : value;
  });
}

function heatOf(input: StormInput, axis: number[], assumptions: string[]): HeatSeries | undefined {
  const { channels, heatInterpolation } = input;
  const at = (samples: Samples) =>
    axis.map((moment) => {
      const held = heatInterpolation === "hold" ? heldAt(samples, moment) : linearAt(samples, moment);
      return Number.isNaN(held) ? samples.values[0] : held;
    });
  const parts = HEAT_PARTS.filter((part) => channels[part]);
  if (channels.netHeat) {
    if (parts.length > 0) {
      assumptions.push(
        `Net heat is given; its parts (${parts.map((part) => LABELS[part]).join(", ")}) are not added to it.`,
      );
    }
    return { net: at(channels.netHeat) };
  }
  if (parts.length === 0) {
    assumptions.push("No heat flux is given: taken as 0 W/m².");
    return undefined;
  }
  const missing = HEAT_PARTS.filter((part) => !channels[part]);
  if (missing.length > 0) {
    assumptions.push(`No ${missing.map((part) => LABELS[part]).join(", no ")} is given: taken as 0 W/m².`);
  }
  return Object.fromEntries(parts.map((part) => [part, at(channels[part] as Samples)]));
}

/**
 * Brings a storm's channels to one time axis: the union of the times of all channels within the window, and its ends.
 * @param zone names times in messages
 * @returns what drives the water, or the problems that leave nothing to compute with; never throws for what a file can hold
 */
export function readForcing(input: StormInput, zone: string): ReadForcing {
  const { channels, startsAt, endsAt } = input;
  const problems: ScenarioProblem[] = [];
  const assumptions: string[] = [];
  const fail = (path: string, code: string, message: string): ReadForcing => ({
    forcing: null,
    problems: [...problems, { path, code, message }],
    assumptions,
  });
  if (startsAt === null || endsAt === null) {
    return fail(
      "storm.time",
      "INVALID_INPUT",
      "The storm has no confirmed record yet: confirm one on its reading sheet.",
    );
  }
  if (!channels.windSpeed || !channels.windFrom) {
    const what = !channels.windSpeed ? "wind speed" : "wind direction";
    return fail("storm.windSpeed", "INVALID_INPUT", `The storm has no ${what}: add a record that holds it.`);
  }
  const wind = pairWind(channels.windSpeed, channels.windFrom);
  if (wind.time.length < 2) {
    return fail(
      "storm.windFrom",
      "INVALID_INPUT",
      "Fewer than two samples have both a wind speed and a direction: bring a record in which they share their times.",
    );
  }
  const from = Math.max(startsAt, wind.time[0]);
  const to = Math.min(endsAt, wind.time[wind.time.length - 1]);
  const pauses = unbridgedPauses(channels, startsAt, endsAt);
  problems.push(...pauses.map((pause) => pauseProblem(pause, zone)));
  for (const [start, end] of [
    [startsAt, Math.min(from, endsAt)],
    [Math.max(to, startsAt), endsAt],
  ]) {
    if (end > start && end - start <= LONGEST_GAP) {
      assumptions.push(
        `The wind record lacks ${formatTime(start, zone)} to ${formatTime(end, zone)}: the estimate covers what it holds.`,
      );
    }
  }
  if (!(to > from)) {
    return fail(
      "storm.time",
      "INVALID_INPUT",
      "The wind record and the storm's window do not overlap: change the window.",
    );
  }

  const used = forcingOf(channels);
  const timesOf = (name: ForcingChannel) => (name === "windSpeed" ? wind.time : (channels[name]?.time ?? []));
  // Nothing is invented inside a pause: the axis itself has it, and the engine refuses it as well.
  const axis = unionAxis([...used.map(timesOf), ...heldEnds(channels)], from, to).filter((moment) =>
    pauses.every((pause) => moment <= pause.from || moment >= pause.to),
  );

  if (input.windHeight === null) assumptions.push("The record does not state the wind's height: taken as 10 m.");
  if (!channels.rain) assumptions.push("No rain is given: taken as 0 mm/h.");
  if (!channels.evaporation) {
    assumptions.push(
      channels.latent && !channels.netHeat
        ? "No evaporation is given: derived from the latent heat."
        : "No evaporation is given: taken as 0 mm/h.",
    );
  }
  const speeds = axis.map((moment) => windAt(wind, moment));
  const heat = heatOf(input, axis, assumptions);
  return {
    forcing: {
      time: axis,
      windSpeed: speeds.map(([speed]) => speed),
      windFrom: speeds.map(([, bearing]) => bearing),
      windHeight: input.windHeight ?? 10,
      ...(channels.rain && { rain: heldRate(channels.rain, axis) }),
      ...(channels.evaporation && { evaporation: heldRate(channels.evaporation, axis) }),
      ...(heat && { heat }),
    },
    problems,
    assumptions,
  };
}

/** Moments at which a held rate ends, so that the axis has them. */
function heldEnds(channels: SampledChannels): number[][] {
  return [channels.rain, channels.evaporation].flatMap((samples) => {
    if (!samples || samples.time.length < 2) return [];
    return [[samples.time[samples.time.length - 1] + (medianStep(samples.time) ?? 0)]];
  });
}
