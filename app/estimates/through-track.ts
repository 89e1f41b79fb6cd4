/** What a cyclone's track adds to a storm's channels at a box. */
import type { Storm } from "~/db/models/storm.server";
import type { Position, ScenarioCyclone } from "~/ocean/scenario";
import type { SampledChannels } from "~/quality/samples";
import { trackSentence } from "~/storms/storm-track";
import { cyclonePassing, trackSeries } from "~/storms/track-series";
import { windowOf } from "~/storms/storm-window";

export interface ThroughTrack {
  channels: SampledChannels;
  /** Whether the wind is the track's. */
  parametric: boolean;
  /** Null without a track. */
  cyclone: ScenarioCyclone | null;
  assumptions: string[];
}

/**
 * Fills from the track what no record brings: wind as a whole, and rain.
 * @param place [longitude, latitude] of the box's middle; null where there is none to compute at
 */
export function throughTrack(
  recorded: SampledChannels,
  storm: Pick<Storm, "track" | "startsAt" | "endsAt">,
  place: Position | null,
): ThroughTrack {
  const { track } = storm;
  const window = windowOf(storm);
  if (!track || !place || !window) {
    return { channels: recorded, parametric: false, cyclone: null, assumptions: [] };
  }
  const series = trackSeries(track, place);
  const computed = (name: "windSpeed" | "windFrom" | "rain") => series.find(({ channel }) => channel === name);
  const parametric = !recorded.windSpeed && !recorded.windFrom;
  const rain = recorded.rain ?? computed("rain");
  return {
    channels: {
      ...recorded,
      ...(parametric && { windSpeed: computed("windSpeed"), windFrom: computed("windFrom") }),
      ...(rain && { rain }),
    },
    parametric,
    cyclone: { ...cyclonePassing(track, place, window), ...(parametric && { parametricWind: true }) },
    assumptions: parametric
      ? [trackSentence(track)]
      : [`Wind is as recorded; the track gives ${recorded.rain ? "the cyclone's size and speed" : "the rain"} only.`],
  };
}
