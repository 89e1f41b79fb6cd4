import type { SettledColumn } from "./settle-columns";
import type { ReadingAnswers, ReadingQuestion, Understood } from "./reading";
import { directionSenseOf } from "./column-names";
import type { FormatKnowledge } from "./text-table";

export interface WindFacts {
  height: number | null;
  averagingMinutes: number | null;
  understood: Understood[];
  questions: ReadingQuestion[];
}

/** Height, averaging period and sense of direction: stated in the header, answered, or asked. */
export function windQuestions(
  settled: readonly SettledColumn[],
  knowledge: FormatKnowledge,
  answers: ReadingAnswers,
): WindFacts {
  const facts: WindFacts = { height: null, averagingMinutes: null, understood: [], questions: [] };
  const wind = settled.find(({ role }) => role === "windSpeed") ?? settled.find(({ role }) => role === "windU");
  if (wind === undefined) return facts;
  settleHeight(facts, wind, knowledge, answers);
  settleAveraging(facts, wind, knowledge, answers);
  settleSense(facts, settled, answers);
  return facts;
}

function settleHeight(
  facts: WindFacts,
  wind: SettledColumn,
  knowledge: FormatKnowledge,
  answers: ReadingAnswers,
): void {
  const stated = wind.column.height;
  facts.height = answers.windHeight ?? stated;
  if (facts.height !== null) {
    const confidence = answers.windHeight !== undefined ? "answered" : "stated in the file";
    facts.understood.push({ what: "Wind height", taken: `${facts.height} m`, confidence });
  }
  const hint = knowledge.windHeightHint;
  const question: ReadingQuestion = {
    key: "windHeight",
    needed: facts.height === null,
    message: hint.message,
    suggestion: stated === null ? hint.suggestion : `${stated}`,
  };
  facts.questions.push(answers.windHeight === undefined ? question : { ...question, answer: `${answers.windHeight}` });
}

function settleAveraging(
  facts: WindFacts,
  wind: SettledColumn,
  knowledge: FormatKnowledge,
  answers: ReadingAnswers,
): void {
  const stated = wind.column.averagingMinutes;
  facts.averagingMinutes = answers.averagingMinutes ?? stated;
  if (facts.averagingMinutes !== null) {
    const confidence = answers.averagingMinutes !== undefined ? "answered" : "stated in the file";
    facts.understood.push({ what: "Wind averaging", taken: `${facts.averagingMinutes} min`, confidence });
  }
  const hint = knowledge.averagingHint;
  const message = hint?.message ?? "Over how many minutes is each wind value averaged? A gust is not a mean.";
  const question: ReadingQuestion = { key: "averagingMinutes", needed: false, message };
  const suggestion = stated === null ? hint?.suggestion : `${stated}`;
  if (suggestion !== undefined) question.suggestion = suggestion;
  facts.questions.push(
    answers.averagingMinutes === undefined ? question : { ...question, answer: `${answers.averagingMinutes}` },
  );
}

function settleSense(facts: WindFacts, settled: readonly SettledColumn[], answers: ReadingAnswers): void {
  const direction = settled.find(({ role }) => role === "windFrom" || role === "windTowards");
  if (direction === undefined) return;
  const { senseKnown, name } = direction.column;
  const ofRole = direction.role === "windTowards" ? "towards" : "from";
  const stated = senseKnown ? ofRole : directionSenseOf(name);
  const taken = answers.directionSense ?? ofRole;
  const confidence =
    answers.directionSense !== undefined
      ? "answered"
      : stated === null
        ? "assumed"
        : senseKnown
          ? direction.column.confidence
          : "stated in the file";
  facts.understood.push({
    what: "Wind direction",
    taken: taken === "from" ? "where the wind comes from" : "where the wind blows towards",
    confidence,
  });
  const question: ReadingQuestion = {
    key: "directionSense",
    needed: false,
    message: "Is the direction where the wind comes from, or where it blows towards?",
    options: [
      { value: "from", label: "Comes from" },
      { value: "towards", label: "Blows towards" },
    ],
    suggestion: taken,
  };
  if (answers.directionSense !== undefined) facts.questions.push({ ...question, answer: answers.directionSense });
  else if (stated === null) facts.questions.push(question);
}
