/** The one rule for pauses in a storm's series: the storm's page tells by it what a run will refuse. */
import { LONGEST_GAP } from "~/ocean/constants";
import type { ChannelName } from "~/readers/reading";
import { firstNotBefore, medianStep } from "~/storms/channel-series";
import { pairWind } from "./pair-wind";
import type { SampledChannels } from "./samples";

/** A pause of more usual steps than this is a gap: one sample or more is missing. */
export const GAP_STEPS = 1.5;

export const HEAT_PARTS = ["shortwave", "longwave", "sensible", "latent"] as const;
const FORCING = ["windSpeed", "rain", "evaporation", "netHeat", ...HEAT_PARTS] as const;
export type ForcingChannel = (typeof FORCING)[number];
/** What an estimate takes from a storm. */
export const FORCING_CHANNELS: readonly ChannelName[] = ["windFrom", ...FORCING];

export interface Pause {
  channel: ForcingChannel;
  /** Seconds since 1970-01-01T00:00:00Z. */
  from: number;
  to: number;
}

/**
 * The longest pause that an estimate bridges, in seconds. Wind is held to the engine's limit; rain or heat of longer regular
 * steps (a daily gauge) may pause for as long as it always does.
 */
export function longestBridged(channel: ChannelName, time: ArrayLike<number>): number {
  if (channel === "windSpeed") return LONGEST_GAP;
  return Math.max(LONGEST_GAP, GAP_STEPS * (medianStep(time) ?? 0));
}

/** The channels that an estimate takes from a storm: where net heat is given its parts are left aside. */
export function forcingOf(channels: SampledChannels): ForcingChannel[] {
  return FORCING.filter(
    (name) => channels[name] && !(channels.netHeat && (HEAT_PARTS as readonly string[]).includes(name)),
  );
}

/** Times at which the channel says something: the wind's where it has speed and direction. */
function timesOf(name: ForcingChannel, channels: SampledChannels): ArrayLike<number> {
  const { windSpeed, windFrom } = channels;
  if (name === "windSpeed" && windSpeed && windFrom) return pairWind(windSpeed, windFrom).time;
  return channels[name]?.time ?? [];
}

/** Pauses longer than `longest`, cut to [from, to]; a missing start or end counts as one. */
function longPauses(
  time: ArrayLike<number>,
  from: number,
  to: number,
  longest: number,
): { from: number; to: number }[] {
  if (!(to > from)) return [];
  const first = firstNotBefore(time, from);
  const knots = [time[first] === from || first === 0 ? from : time[first - 1]];
  let at = first;
  for (; at < time.length && time[at] < to; at++) if (time[at] > from) knots.push(time[at]);
  knots.push(at < time.length ? time[at] : to);
  return knots.slice(1).flatMap((next, index) => {
    const previous = knots[index];
    return next - previous > longest ? [{ from: Math.max(previous, from), to: Math.min(next, to) }] : [];
  });
}

/**
 * The pauses of a storm's window that no estimate bridges. The wind has to cover the window; the other channels are asked for
 * where there is wind, since that is what an estimate covers.
 */
export function unbridgedPauses(channels: SampledChannels, startsAt: number, endsAt: number): Pause[] {
  const wind = channels.windSpeed ? timesOf("windSpeed", channels) : [];
  const covered =
    wind.length > 0
      ? { from: Math.max(startsAt, wind[0]), to: Math.min(endsAt, wind[wind.length - 1]) }
      : { from: startsAt, to: endsAt };
  const edges =
    wind.length > 0
      ? [
          { from: startsAt, to: Math.min(covered.from, endsAt) },
          { from: Math.max(covered.to, startsAt), to: endsAt },
        ].filter(({ from, to }) => to - from > LONGEST_GAP)
      : [];
  return [
    ...edges.map((edge): Pause => ({ channel: "windSpeed", ...edge })),
    ...forcingOf(channels).flatMap((channel) => {
      const time = timesOf(channel, channels);
      return longPauses(time, covered.from, covered.to, longestBridged(channel, time)).map((pause) => ({
        channel,
        ...pause,
      }));
    }),
  ];
}
