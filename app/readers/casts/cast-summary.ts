import { CAST_CHANNEL_NAMES, type CastReading } from "./cast-reading";

/** What `galeprint read` prints for a cast. */
export function summaryOfCast(cast: CastReading) {
  const channels = CAST_CHANNEL_NAMES.flatMap((name) => {
    const channel = cast.channels[name];
    if (!channel) return [];
    const { unit, count, missing, mean, min, max } = channel;
    return [[name, { unit, count, missing, mean, min, max, maxAt: null }] as const];
  });
  return {
    kind: cast.kind,
    format: cast.format,
    rows: cast.rows,
    first: cast.time,
    last: cast.time,
    order: cast.half === "down" ? "ascending" : "descending",
    duplicates: 0,
    latitude: cast.latitude,
    longitude: cast.longitude,
    samples: cast.samples.length,
    salinityScale: cast.salinityScale,
    channels: Object.fromEntries(channels),
    understood: [
      ...cast.understood.map(({ what, taken, confidence }) => `${what}: ${taken} (${confidence})`),
      ...cast.leftOut.map((name) => `Left out: “${name}”`),
    ],
    questions: cast.questions,
    problems: cast.problems,
  };
}
