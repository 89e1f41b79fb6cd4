import { isoFromSeconds } from "../stamp-text";
import { statisticsOf } from "../series-statistics";
import { TRACK_CHANNELS, type TrackChannel, type TrackReading } from "./track-reading";

/** What `galeprint read` prints for a track. */
export function summaryOfTrack(track: TrackReading) {
  const { fixes } = track;
  const time = Float64Array.from(fixes, (fix) => fix.time);
  const rows = fixes.map((_, row) => row);
  const channels = (Object.keys(TRACK_CHANNELS) as TrackChannel[]).map((channel) => {
    const values = Float64Array.from(fixes, (fix) => fix[channel] ?? NaN);
    return [channel, { unit: TRACK_CHANNELS[channel], ...statisticsOf(values, time, rows) }] as const;
  });
  const storm = `${track.storm.id} ${track.storm.name}`.trim();
  return {
    kind: track.kind,
    format: track.format,
    rows: track.rows,
    first: isoFromSeconds(time[0] ?? NaN),
    last: isoFromSeconds(time.at(-1) ?? NaN),
    order: track.order,
    duplicates: track.duplicates,
    storm,
    storms: track.storms,
    fixes: fixes.length,
    averagingMinutes: track.averagingMinutes,
    channels: Object.fromEntries(channels),
    understood: track.understood.map(({ what, taken, confidence }) => `${what}: ${taken} (${confidence})`),
    questions: track.questions,
    problems: track.problems,
  };
}
