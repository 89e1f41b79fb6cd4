import type { CastColumn } from "./cast-columns";
import type { CastAnswers, CastChannel, CastQuestion } from "./cast-reading";
import type { CastTable } from "./cast-table";
import { CHANNEL_RULES } from "./cast-vocabulary";

/** A channel without which a cast cannot be used, that no column was found for. */
export type LackingChannel = "depth" | "temperature" | "salinity";

const MOST_OPTIONS = 60;

/** Which of several casts; null where the file holds one. */
export function castQuestion(
  tables: readonly CastTable[],
  taken: CastTable,
  answers: CastAnswers,
): CastQuestion | null {
  if (tables.length < 2) return null;
  return {
    key: "cast",
    needed: !tables.some(({ label }) => label === answers.cast),
    message: `The file holds ${tables.length} casts. Which one is it? Each makes a water column of its own.`,
    options: tables
      .slice(0, MOST_OPTIONS)
      .map(({ label, rows }) => ({ value: label, label: `${label}, ${rows.length} records` })),
    suggestion: taken.label,
    ...(answers.cast !== undefined && { answer: answers.cast }),
  };
}

/** Which column is a channel, where the name leaves it open, and the unit where the file does not state it. */
export function columnQuestions(
  columns: readonly CastColumn[],
  table: CastTable,
  answers: CastAnswers,
): CastQuestion[] {
  return columns.flatMap((column) => {
    const questions: CastQuestion[] = [];
    const unsure = column.confidence === "by content";
    if (unsure || column.confidence === "answered" || column.others.length > 1) {
      const message = unsure
        ? `No column is named as ${column.channel}; by its values it could be “${column.name}”.`
        : `“${column.name}” is taken for the ${column.channel}.`;
      questions.push(columnQuestion(column.channel, message, unsure, column.index, table, answers));
    }
    const { units } = CHANNEL_RULES[column.channel];
    if (column.unitConfidence !== "stated in the file" && units.length > 1) {
      const answer = answers.units?.[column.channel];
      questions.push({
        key: `unit-${column.channel}`,
        // Salinity from a conductivity in the wrong unit is another water.
        needed: column.unitConfidence === "by content" && column.channel === "conductivity",
        message: `The file states no unit of “${column.name}”.`,
        options: units.map(({ id }) => ({ value: id, label: id })),
        suggestion: column.unit.id,
        ...(answer !== undefined && { answer }),
      });
    }
    return questions;
  });
}

/** Asks for the column of a channel that none was found for. */
export function lackingQuestion(channel: LackingChannel, table: CastTable, answers: CastAnswers): CastQuestion {
  return columnQuestion(channel, `No column was found for the ${channel}.`, true, null, table, answers);
}

function columnQuestion(
  channel: CastChannel,
  message: string,
  needed: boolean,
  index: number | null,
  table: CastTable,
  answers: CastAnswers,
): CastQuestion {
  const answer = answers.columns?.[channel];
  const sample = (at: number) => table.rows.find((cells) => (cells[at] ?? "").trim() !== "")?.[at]?.trim();
  return {
    key: `column-${channel}`,
    needed,
    message,
    options: table.names.slice(0, MOST_OPTIONS).map((name, at) => ({
      value: String(at),
      label: `${name}${sample(at) === undefined ? "" : `, as ${sample(at)}`}`,
    })),
    ...(index !== null && { suggestion: String(index) }),
    ...(typeof answer === "number" && { answer: String(answer) }),
  };
}
