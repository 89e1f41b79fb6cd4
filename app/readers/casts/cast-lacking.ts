import type { ProblemList } from "../problem-list";
import type { Understood } from "../reading";
import type { CastColumn } from "./cast-columns";
import { lackingQuestion, type LackingChannel } from "./cast-questions";
import type { CastAnswers, CastChannel, CastQuestion, TableReading } from "./cast-reading";
import { castStatistics } from "./cast-statistics";
import type { CastTable } from "./cast-table";

/** The channels that a cast cannot do without and no column was found for. */
export function lackingOf(columns: readonly CastColumn[]): LackingChannel[] {
  const has = (channel: CastChannel) => columns.some((column) => column.channel === channel);
  const lacking: LackingChannel[] = [];
  if (!has("depth") && !has("pressure")) lacking.push("depth");
  if (!has("temperature")) lacking.push("temperature");
  if (!has("salinity") && !has("conductivity")) lacking.push("salinity");
  return lacking;
}

interface Unusable {
  answers: CastAnswers;
  problems: ProblemList;
  understood: Understood[];
  questions: CastQuestion[];
  values: Map<CastChannel, Float64Array>;
}

const LACKING: Record<LackingChannel, string> = {
  depth: "neither depth nor pressure",
  temperature: "no temperature",
  salinity: "neither salinity nor conductivity",
};

/** A table that lacks a channel: asks which column it is, and shows what was read. */
export function unusable(
  lacking: readonly LackingChannel[],
  table: CastTable,
  { answers, problems, understood, questions, values }: Unusable,
): TableReading {
  for (const channel of lacking) {
    questions.push(lackingQuestion(channel, table, answers));
    const code = `no${channel.charAt(0).toUpperCase()}${channel.slice(1)}`;
    problems.add(
      "error",
      code,
      `the cast has ${LACKING[channel]}`,
      "Say which column it is, or give a file that has it.",
    );
  }
  const channels = Object.fromEntries(
    [...values].map(([channel, list]) => [channel, castStatistics(channel, list, channel)]),
  );
  return { channels, salinityScale: "practical", samples: [], half: "down", understood, questions };
}
