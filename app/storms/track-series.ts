import { fromCentre, trackReader } from "~/ocean/cyclone/track-state";
import { trackWind } from "~/ocean/cyclone/track-wind";
import type { Position, ScenarioCyclone } from "~/ocean/scenario";
import { CHANNEL_UNITS, type ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { groupOf } from "./channels";
import type { StormTrack } from "./storm-track";
import type { StormWindow } from "./storm-window";

/** m above the sea: where a track's wind is computed. */
export const TRACK_WIND_HEIGHT = 10;

/** s: a track's wind is asked as often as this. */
const STEP = 600;

/** Every ten minutes from the first fix to the last, and the last. */
function momentsOf({ fixes }: StormTrack): Float64Array {
  const [first, last] = [fixes[0].time, fixes[fixes.length - 1].time];
  const steps = Math.ceil((last - first) / STEP);
  return Float64Array.from({ length: steps + 1 }, (_, k) => Math.min(first + k * STEP, last));
}

/** Wind at 10 m, air pressure and rain at a place, as a record there would tell them. Deterministic. */
export function trackSeries(track: StormTrack, [longitude, latitude]: Position): ChannelSeries[] {
  const { time, u, v, pressure, rain } = trackWind(
    track.fixes,
    track.parameters,
    { latitude, longitude },
    momentsOf(track),
  );
  const series = (channel: ChannelName, values: Float64Array): ChannelSeries => ({
    channel,
    unit: CHANNEL_UNITS[channel],
    time,
    values,
  });
  const from = (k: number) => (u[k] === 0 && v[k] === 0 ? 0 : ((Math.atan2(-u[k], -v[k]) * 180) / Math.PI + 360) % 360);
  return [
    series(
      "windSpeed",
      u.map((east, k) => Math.hypot(east, v[k])),
    ),
    series(
      "windFrom",
      u.map((_, k) => from(k)),
    ),
    ...(rain ? [series("rain", rain)] : []),
    series("airPressure", pressure),
  ];
}

/** A storm's series at a place: what records bring, and from the track what none of them does. */
export function withTrack<S extends ChannelSeries>(
  recorded: readonly S[],
  track: StormTrack | null,
  place: Position | null,
): (S | ChannelSeries)[] {
  if (!track || !place) return [...recorded];
  const brought = new Set(recorded.map(({ channel }) => groupOf(channel)));
  return [...recorded, ...trackSeries(track, place).filter(({ channel }) => !brought.has(groupOf(channel)))];
}

/** Stands in for the wind where only its reach in time matters: the track's own strongest wind at its fixes. */
export function trackReach(track: StormTrack | null | undefined): ChannelSeries[] {
  if (!track) return [];
  const time = Float64Array.from(track.fixes, (fix) => fix.time);
  const values = Float64Array.from(track.fixes, ({ maxWind }) => maxWind ?? 0);
  return [{ channel: "windSpeed", unit: CHANNEL_UNITS.windSpeed, time, values }];
}

/** The cyclone as it passes a place, where within the window it comes nearest. */
export function cyclonePassing(
  track: StormTrack,
  [longitude, latitude]: Position,
  window: StormWindow,
): Omit<ScenarioCyclone, "parametricWind"> {
  const read = trackReader(track.fixes);
  let nearest = { distance: Number.POSITIVE_INFINITY, state: read(window.startsAt) };
  for (const moment of momentsOf(track)) {
    if (moment < window.startsAt || moment > window.endsAt) continue;
    const state = read(moment);
    const { dx, dy } = fromCentre(state, { latitude, longitude });
    const distance = Math.hypot(dx, dy);
    if (distance < nearest.distance) nearest = { distance, state };
  }
  const { radiusOfMaximumWind, translationSpeed } = nearest.state;
  return { radiusOfMaximumWind: radiusOfMaximumWind ?? track.parameters.radiusOfMaximumWind, translationSpeed };
}
