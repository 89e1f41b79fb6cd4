import type { ChannelName, ReadingProblem, ReadingQuestion, SeriesReading } from "./reading";

export interface ChannelSummary {
  unit: string;
  count: number;
  missing: number;
  mean: number | null;
  max: number | null;
  maxAt: string | null;
  /** mm */
  total?: number;
}

/** What `galeprint read` prints for a series. */
export interface ReadSummary {
  kind: "series";
  format: string;
  rows: number;
  first: string | null;
  last: string | null;
  order: SeriesReading["order"];
  duplicates: number;
  channels: Partial<Record<ChannelName, ChannelSummary>>;
  windVectorMean: SeriesReading["windVectorMean"];
  understood: string[];
  questions: ReadingQuestion[];
  problems: ReadingProblem[];
}

/** A reading as plain JSON, without its values. */
export function summaryOfReading(reading: SeriesReading): ReadSummary {
  const channels: Partial<Record<ChannelName, ChannelSummary>> = {};
  for (const [name, channel] of Object.entries(reading.channels) as [
    ChannelName,
    NonNullable<SeriesReading["channels"][ChannelName]>,
  ][]) {
    const { unit, count, missing, mean, max, maxAt, total } = channel;
    channels[name] = { unit, count, missing, mean, max, maxAt, ...(total === undefined ? {} : { total }) };
  }
  const leftOut = reading.columns
    .filter(({ role }) => role === "leftOut")
    .map(({ name, note }) => `Left out: “${name}”${note === undefined ? "" : ` (${note})`}`);
  return {
    kind: "series",
    format: reading.format,
    rows: reading.rows,
    first: reading.first,
    last: reading.last,
    order: reading.order,
    duplicates: reading.duplicates,
    channels,
    windVectorMean: reading.windVectorMean,
    understood: [
      ...reading.understood.map(({ what, taken, confidence }) => `${what}: ${taken} (${confidence})`),
      ...leftOut,
    ],
    questions: reading.questions,
    problems: reading.problems,
  };
}
