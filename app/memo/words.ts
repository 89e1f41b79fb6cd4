/** The answer of a response in plain words, of at most 120: what happened, by how much, and what limits saying so. */
import type { Band, Response, TriggerOutcome, Uncertainty } from "~/ocean/response";
import { compassWord } from "~/units/compass";
import { formatBearing, formatQuantity, formatRange, SPACE, toDisplay } from "~/units/format-quantity";
import { formatTime } from "~/units/format-time";
import { quantity, type QuantityId } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import { type ColourToken, plain, type Run, textOf } from "./document";

export interface WordsContext {
  units: UnitChoices;
  /** IANA zone or `UTC`. */
  zone: string;
  boxName: string;
  /** Whether transport is told across a shore, or towards north and east. */
  shore: boolean;
}

export const MOST_WORDS = 120;

interface Sentence {
  runs: Run[];
  /** Left out first where the words do not all fit: the highest number. */
  rank: number;
}

/** Drafts the bottom line. Sentences that do not fit in 120 words are left out, the least telling first. */
export function draftAnswer(response: Response, context: WordsContext): Run[] {
  let sentences = [
    ...unfit(response),
    salinity(response, context),
    ...triggers(response, context),
    temperature(response, context),
    displacement(response, context),
    ...transport(response, context),
    ...limit(response),
    ...range(response),
  ];
  while (sentences.length > 1 && countWords(sentences) > MOST_WORDS) {
    const least = Math.max(...sentences.map((sentence) => sentence.rank));
    sentences = sentences.filter((sentence) => sentence.rank !== least);
  }
  return sentences.flatMap((sentence, index) => (index === 0 ? sentence.runs : [plain(" "), ...sentence.runs]));
}

function countWords(sentences: readonly Sentence[]): number {
  return wordsIn(sentences.map((sentence) => textOf(sentence.runs)).join(" "));
}

/** Words as a reader counts them: a number and its unit are two. */
export function wordsIn(text: string): number {
  return text.split(/[\s\u00a0]+/).filter((word) => word !== "").length;
}

/** Decimals that a distance supports: whole ones from ten up. */
export function distanceDecimals(metres: number, units: UnitChoices): number {
  return Math.abs(toDisplay(metres, "displacement", units)) >= 10 ? 0 : 1;
}

function strong(text: string, id: QuantityId): Run {
  const colour: ColourToken = quantity(id).colour;
  return colour === "ink" ? { text, bold: true } : { text, bold: true, colour };
}

function salinity({ headline }: Response, { units, zone, boxName }: WordsContext): Sentence {
  const { value, change, time, p10, p90 } = headline.surfaceSalinity;
  const start = formatQuantity(value - change, "salinity", units);
  const lowest = formatQuantity(value, "salinity", units);
  const where = boxName ? `At ${boxName} the` : "The";
  if (start.number === lowest.number)
    return {
      rank: 0,
      runs: [
        plain(`${where} surface salinity did not fall noticeably below its start of `),
        strong(start.text, "salinity"),
        plain("."),
      ],
    };
  return {
    rank: 0,
    runs: [
      plain(`${where} surface layer is estimated to have freshened from ${start.number} to `),
      strong(lowest.text, "salinity"),
      plain(`${band({ p10, p90 }, "salinity", units)}, lowest at ${formatTime(time, zone)}.`),
    ],
  };
}

const TRIGGER_SUBJECTS: Record<TriggerOutcome["quantity"], string> = {
  salinity: "Salinity",
  temperature: "Temperature",
  driftSpeed: "The drift",
  stress: "Wind stress",
  layerDepth: "The layer's depth",
  density: "Density",
};

/** A time in hours as text: whole from ten up. */
export function hoursText(hours: number): string {
  const shown = hours >= 10 ? hours.toFixed(0) : hours.toFixed(1).replace(/\.0$/, "");
  return `${shown}${SPACE}h`;
}

function triggers({ headline }: Response, { units, zone }: WordsContext): Sentence[] {
  const gravestFirst = [...headline.triggers].sort(
    (a, b) => Number(b.met) - Number(a.met) || b.hoursBeyond - a.hoursBeyond,
  );
  return gravestFirst.map((trigger, index): Sentence => {
    const level = formatQuantity(trigger.value, trigger.quantity, units).text;
    const subject = TRIGGER_SUBJECTS[trigger.quantity];
    const rank = index === 0 ? 1 : 5 + index;
    if (trigger.hoursBeyond <= 0)
      return { rank, runs: [plain(`${subject} was never ${trigger.side} the trigger level of ${level}.`)] };
    const beyond = hoursText(trigger.hoursBeyond);
    const spell = hoursText(trigger.longestSpell);
    const first = trigger.firstAt === null ? "" : `, first at ${formatTime(trigger.firstAt, zone)}`;
    const told = spell === beyond ? first : `${first}, at most ${spell} at a stretch`;
    const limit = hoursText(trigger.hours);
    const verdict = trigger.met ? `this meets the limit of ${limit}` : `this stays short of the limit of ${limit}`;
    return {
      rank,
      runs: [
        plain(`${subject} was ${trigger.side} the trigger level of ${level} for `),
        strong(beyond, trigger.quantity),
        plain(`${told}; ${verdict}.`),
      ],
    };
  });
}

function temperature({ headline }: Response, { units }: WordsContext): Sentence {
  const { value, change } = headline.surfaceTemperature;
  const by = formatQuantity(Math.abs(change), "temperatureChange", units);
  const end = formatQuantity(value, "temperature", units).text;
  if (Number(by.number) === 0)
    return {
      rank: 4,
      runs: [plain("The layer ended at "), strong(end, "temperature"), plain(", as warm as it began.")],
    };
  return {
    rank: 4,
    runs: [
      plain(`The layer ${change < 0 ? "cooled" : "warmed"} by `),
      strong(by.text, "temperature"),
      plain(` to ${end}.`),
    ],
  };
}

function displacement({ headline }: Response, { units }: WordsContext): Sentence {
  const { value, towards, p10, p90 } = headline.netDisplacement;
  const decimals = distanceDecimals(value, units);
  const { number, text } = formatQuantity(value, "displacement", units, { decimals });
  if (towards === null || Number(number) === 0) return { rank: 2, runs: [plain("The layer ended where it began.")] };
  return {
    rank: 2,
    runs: [
      plain("It moved about "),
      strong(text, "displacement"),
      plain(band({ p10, p90 }, "displacement", units, decimals)),
      plain(` towards the ${compassWord(towards)} (${formatBearing(towards)}).`),
    ],
  };
}

function transport({ headline }: Response, { units, shore }: WordsContext): Sentence[] {
  const { value } = headline.transportAcross;
  const amount = formatQuantity(Math.abs(value), "transportTotal", units, {
    decimals: transportDecimals(value, units),
  });
  if (!shore || Number(amount.number) === 0) return [];
  const way = value > 0 ? "away from the shore, which favours upwelling" : "towards the shore, which favours sinking";
  return [
    {
      rank: 4.5,
      runs: [plain("Ekman transport summed to "), strong(amount.text, "transportTotal"), plain(` ${way}.`)],
    },
  ];
}

/** Decimals that a storm's transport supports. */
export function transportDecimals(value: number, units: UnitChoices): number {
  return Math.abs(toDisplay(value, "transportTotal", units)) >= 10 ? 0 : 1;
}

/** A method that does not hold here is said before any number that it gave. */
function unfit({ fitNotes }: Response): Sentence[] {
  const worst = fitNotes.find((note) => note.severity === "doNotUse");
  return worst ? [{ rank: 0.5, runs: [plain(`The method should not be used here: ${asClause(worst.message)}`)] }] : [];
}

function limit({ fitNotes }: Response): Sentence[] {
  const worst = fitNotes.find((note) => note.severity === "caution");
  return worst ? [{ rank: 3, runs: [plain(`What limits this: ${asClause(worst.message)}`)] }] : [];
}

const LONGEST_CLAUSE = 40;

/** A note's first sentence, to follow a colon; "et al. (1990)" ends none. */
function asClause(message: string): string {
  const first = /^.*?[.!?](?=\s+\p{Lu}|$)/su.exec(message.trim())?.[0] ?? `${message.trim()}.`;
  if (wordsIn(first) > LONGEST_CLAUSE) return "see the fit notes.";
  const [head = "", second = ""] = first;
  const lowered = second === second.toLowerCase() && /\p{L}|\s/u.test(second);
  return lowered ? head.toLowerCase() + first.slice(1) : first;
}

function range({ uncertainty }: Response): Sentence[] {
  if (uncertainty) {
    const ranges = `Ranges are the 10th to 90th percentile of ${uncertainty.computed} members`;
    const driver = leadingInput(uncertainty);
    return [{ rank: 9, runs: [plain(driver === null ? `${ranges}.` : `${ranges}; ${driver}.`)] }];
  }
  return [{ rank: 3.5, runs: [plain("No ensemble was run, so these values carry no range.")] }];
}

/** `the salinity depends most on rain`; null where nothing moves it. */
function leadingInput({ effects }: Uncertainty): string | null {
  const effect = effects.find(({ figure }) => figure === "surfaceSalinity");
  const [widest] = effect?.bars ?? [];
  if (!widest || widest.high.value === widest.low.value) return null;
  return `the salinity depends most on ${widest.factor}`;
}

function band({ p10, p90 }: Band, id: QuantityId, units: UnitChoices, decimals?: number): string {
  if (p10 === undefined || p90 === undefined) return "";
  return ` (${formatRange(p10, p90, id, units, decimals === undefined ? {} : { decimals })})`;
}
