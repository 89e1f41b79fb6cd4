import type { Position } from "~/ocean/scenario";
import { distanceKm, positionFromText } from "~/readers/netcdf/position";
import type { ReadingAnswers, ReadingQuestion, SeriesReading } from "~/readers/reading";

/**
 * Tells for the place of a file of several what a study box says of it: its middle for a grid, else which place is
 * nearest and how far, which may be too far to take.
 * @param centre [longitude, latitude] in degrees, or null where the project has no box yet
 */
export function suggestPlace(questions: readonly ReadingQuestion[], centre: Position | null): ReadingQuestion[] {
  if (centre === null) return [...questions];
  const [longitude, latitude] = centre;
  return questions.map((question) => {
    if (question.key !== "place") return question;
    const away = ({ value }: { value: string }) => {
      const position = positionFromText(value);
      return position === null ? Infinity : distanceKm(position, { latitude, longitude });
    };
    const nearest = [...(question.options ?? [])].sort((a, b) => away(a) - away(b))[0];
    if (nearest !== undefined) {
      const near = `Nearest to the first study box: ${nearest.label}, ${Math.round(away(nearest))} km from its middle.`;
      return away(nearest) === Infinity ? question : { ...question, message: `${question.message} ${near}` };
    }
    return { ...question, suggestion: `${latitude.toFixed(4)},${longitude.toFixed(4)}` };
  });
}

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
