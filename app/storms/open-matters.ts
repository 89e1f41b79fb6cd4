import { CHANNEL_NAMES, type ReadingProblem, type ReadingQuestion, type SeriesReading } from "~/readers/reading";

/** What stands between a reading and its confirmation. */
export interface OpenMatters {
  questions: ReadingQuestion[];
  /** Rows that are neither mended nor left out. */
  errors: ReadingProblem[];
  /** The file gave no channel that a storm can use. */
  empty: boolean;
}

export function openMatters(reading: SeriesReading): OpenMatters {
  const questions = reading.questions.filter((question) => question.needed);
  // Nothing is read of a file of several places before one of them is chosen.
  const waits = questions.some(({ key }) => key === "place");
  return {
    questions,
    errors: reading.problems.filter((problem) => problem.severity === "error"),
    empty: !waits && !CHANNEL_NAMES.some((channel) => (reading.channels[channel]?.count ?? 0) > 0),
  };
}

export function mayConfirm({ questions, errors, empty }: OpenMatters): boolean {
  return questions.length === 0 && errors.length === 0 && !empty;
}
