import type { ReadingAnswers, ReadingQuestion, SeriesReading } from "~/readers/reading";

/**
 * The questions that a sheet shows beside the open ones: those answered already, those the reader settled by itself, and
 * what the format says, which a person may know better.
 */
export function settledQuestions(reading: SeriesReading, answers: ReadingAnswers): ReadingQuestion[] {
  const settled = reading.questions.filter(({ needed }) => !needed);
  const asked = (key: ReadingQuestion["key"]) => reading.questions.some((question) => question.key === key);
  const byFormat = reading.understood.some(
    ({ what, confidence }) => what === "Time zone" && confidence === "by the format",
  );
  if (!asked("zone") && byFormat) {
    settled.unshift({
      key: "zone",
      needed: false,
      message: "The format settles it. Fill this in only where you know better.",
      suggestion: reading.zone,
      answer: answers.zone,
    });
  }
  if (!asked("directionSense") && reading.columns.some(({ role }) => role === "windFrom" || role === "windTowards")) {
    settled.push({
      key: "directionSense",
      needed: false,
      message: "The file or its format says which.",
      suggestion: reading.columns.some(({ role }) => role === "windTowards") ? "towards" : "from",
      answer: answers.directionSense,
    });
  }
  return settled;
}
