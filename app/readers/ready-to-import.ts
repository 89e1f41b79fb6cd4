import type { SeriesReading } from "./reading";

/** Whether a reading can be confirmed: no error stands and every needed question is answered. */
export function isReadyToImport(reading: Pick<SeriesReading, "problems" | "questions">): boolean {
  return (
    !reading.problems.some(({ severity }) => severity === "error") && !reading.questions.some(({ needed }) => needed)
  );
}
