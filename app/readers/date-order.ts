import { tidyCell } from "./number-text";
import type { ReadingAnswers, ReadingQuestion, Understood } from "./reading";
import { dateFromText, dayMonthNumbers, type DateOrder } from "./stamp-text";

export interface DateOrderChoice {
  order: DateOrder;
  understood: Understood | null;
  question: ReadingQuestion | null;
}

const LABELS: Record<DateOrder, string> = {
  dmy: "day / month / year",
  mdy: "month / day / year",
  ymd: "year / month / day",
};

/**
 * Tells day from month. Certain where a number above 12 shows which is the day; where every date fits both orders, the
 * order under which the dates cover the shorter span is suggested and the person is asked.
 * @param cells date cells, all of them
 */
export function chooseDateOrder(cells: Iterable<string>, answers: ReadingAnswers): DateOrderChoice {
  let firstOver = 0;
  let secondOver = 0;
  let yearLast = 0;
  let sameNumbers = true;
  let dotted = true;
  let example = "";
  const distinct = new Set<string>();
  for (const cell of cells) {
    const text = tidyCell(cell);
    const numbers = dayMonthNumbers(text);
    if (numbers === null) continue;
    if (yearLast === 0) example = cell.trim();
    yearLast += 1;
    // Dates with dots are written day first wherever they are written (common practice, no source).
    if (!/^\d{1,2}\./.test(text)) dotted = false;
    if (numbers[0] > 12) firstOver += 1;
    if (numbers[1] > 12) secondOver += 1;
    if (numbers[0] !== numbers[1]) sameNumbers = false;
    if (firstOver === 0 && secondOver === 0) distinct.add(numbers.join("-"));
  }
  if (yearLast === 0) return { order: "ymd", understood: null, question: null };
  const say = (order: DateOrder, confidence: Understood["confidence"]): Understood => ({
    what: "Date order",
    taken: LABELS[order],
    confidence,
  });
  const ambiguous = firstOver === 0 && secondOver === 0 && !sameNumbers && !dotted;
  const suggestion = ambiguous ? shorterSpan([...distinct]) : firstOver >= secondOver ? "dmy" : "mdy";
  const question: ReadingQuestion = {
    key: "dateOrder",
    needed: ambiguous && answers.dateOrder === undefined,
    message: `Dates such as ${example} could be day/month or month/day. Say which.`,
    options: [
      { value: "dmy", label: LABELS.dmy },
      { value: "mdy", label: LABELS.mdy },
    ],
    suggestion,
  };
  if (answers.dateOrder !== undefined) {
    const order = answers.dateOrder;
    return { order, understood: say(order, "answered"), question: { ...question, answer: order } };
  }
  if (!ambiguous) return { order: suggestion, understood: say(suggestion, "by content"), question: null };
  return { order: suggestion, understood: say(suggestion, "assumed"), question };
}

/** A record is more likely a few days in a row than the same day of several months. */
function shorterSpan(dates: string[]): DateOrder {
  const span = (order: DateOrder): number => {
    let low = Infinity;
    let high = -Infinity;
    for (const date of dates) {
      const day = dateFromText(date, order);
      if (day === null) continue;
      low = Math.min(low, day);
      high = Math.max(high, day);
    }
    return high - low;
  };
  return span("mdy") < span("dmy") ? "mdy" : "dmy";
}
