import { CAST_CHANNEL_NAMES, type CastAnswers, type CastChannel } from "./cast-reading";
import type { CastTable } from "./cast-table";
import { CHANNEL_RULES, type CastUnit } from "./cast-vocabulary";
import type { Understood } from "../reading";

export interface CastColumn {
  channel: CastChannel;
  index: number;
  name: string;
  unit: CastUnit;
  /** How sure it is that the column is this channel. */
  confidence: Understood["confidence"];
  unitConfidence: Understood["confidence"];
  /** Columns that could be it as well. */
  others: number[];
}

/** The channels that column names speak of, one a name; null for what is none, or a measure derived from a channel. */
export function channelsNamed(names: readonly string[]): (CastChannel | null)[] {
  return names.map((name) => {
    const key = name.trim().toLowerCase();
    if (/spec(?:ific)?\b|potential|theta|sigma|std|stdev|\bflag|_flag_w$|qc$/.test(key)) return null;
    return CAST_CHANNEL_NAMES.find((channel) => CHANNEL_RULES[channel].names.test(key)) ?? null;
  });
}

/**
 * Finds the column of each channel: by the person's answer, by its name, and where no name tells by its values.
 * @param numbers the cells of a column as numbers, NaN where there is none
 */
export function castColumns(
  table: CastTable,
  numbers: (index: number) => Float64Array,
  answers: CastAnswers,
): CastColumn[] {
  const named = channelsNamed(table.names);
  const claimed = new Set(Object.values(answers.columns ?? {}));
  const found = new Map<CastChannel, { index: number; confidence: Understood["confidence"]; others: number[] }>();
  for (const channel of CAST_CHANNEL_NAMES) {
    const answer = answers.columns?.[channel];
    const others = named.flatMap((one, index) => (one === channel ? [index] : []));
    if (answer === null) continue;
    if (answer !== undefined && answer < table.names.length) {
      found.set(channel, { index: answer, confidence: "answered", others });
      continue;
    }
    const free = others.filter((index) => !claimed.has(index));
    if (free.length > 0) found.set(channel, { index: free[0], confidence: "by name", others });
  }
  const canGuess = found.size > 0 || !table.named;
  for (const channel of canGuess ? lackingChannels(found, answers) : []) {
    const used = new Set([...found.values()].map(({ index }) => index));
    const index = table.names.findIndex(
      (_, at) => named[at] === null && !used.has(at) && !claimed.has(at) && looksLike(channel, numbers(at)),
    );
    if (index >= 0) found.set(channel, { index, confidence: "by content", others: [] });
  }
  return [...found].map(([channel, { index, confidence, others }]) => ({
    channel,
    index,
    name: table.names[index],
    confidence,
    others,
    ...unitOf(channel, table.units[index], numbers(index), answers),
  }));
}

/** What a cast cannot do without and no name tells. */
function lackingChannels(found: ReadonlyMap<CastChannel, unknown>, { columns = {} }: CastAnswers): CastChannel[] {
  const lacking: CastChannel[] = [];
  if (!found.has("depth") && !found.has("pressure") && columns.depth !== null) lacking.push("depth");
  if (!found.has("temperature") && columns.temperature !== null) lacking.push("temperature");
  if (!found.has("salinity") && !found.has("conductivity") && columns.salinity !== null) lacking.push("salinity");
  return lacking;
}

const FEWEST = 4;

/** Depth goes one way nearly always; the others lie within the sea's limits. */
function looksLike(channel: CastChannel, numbers: Float64Array): boolean {
  const present = numbers.filter((value) => !Number.isNaN(value));
  if (present.length < FEWEST || present.length < 0.5 * numbers.length) return false;
  if (channel !== "depth") {
    const { min, max } = CHANNEL_RULES[channel].limits;
    return present.every((value) => value >= min && value <= max);
  }
  let down = 0;
  for (let k = 1; k < present.length; k += 1) down += Math.sign(present[k] - present[k - 1]);
  return Math.abs(down) >= 0.9 * (present.length - 1);
}

function unitOf(
  channel: CastChannel,
  written: string | null,
  numbers: Float64Array,
  answers: CastAnswers,
): Pick<CastColumn, "unit" | "unitConfidence"> {
  const { units, unitByContent } = CHANNEL_RULES[channel];
  const answered = units.find(({ id }) => id === answers.units?.[channel]);
  if (answered) return { unit: answered, unitConfidence: "answered" };
  const key = written?.trim().toLowerCase() ?? "";
  const stated = units.find((unit) => unit.written.test(key));
  if (stated) return { unit: stated, unitConfidence: "stated in the file" };
  const likely = unitByContent?.(medianOf(numbers));
  const byContent = units.find(({ id }) => id === likely);
  return byContent ? { unit: byContent, unitConfidence: "by content" } : { unit: units[0], unitConfidence: "assumed" };
}

function medianOf(values: Float64Array): number {
  const sorted = values.filter((value) => !Number.isNaN(value)).sort();
  return sorted.length === 0 ? NaN : sorted[sorted.length >> 1];
}
