import { nameParts } from "./column-names";
import { zoneByName, type Zone } from "./local-time";
import type { ProblemList } from "./problem-list";
import type { ReadingAnswers, ReadingQuestion, Understood } from "./reading";

/** Abbreviations are no zones: `EST` may be written all summer, `IST` is three countries. They only make a suggestion. */
const ABBREVIATIONS: Readonly<Record<string, string>> = {
  EST: "-05:00",
  EDT: "-04:00",
  CST: "-06:00",
  CDT: "-05:00",
  MST: "-07:00",
  MDT: "-06:00",
  PST: "-08:00",
  PDT: "-07:00",
  AKST: "-09:00",
  HST: "-10:00",
  AST: "-04:00",
  NST: "-03:30",
  BRT: "-03:00",
  ART: "-03:00",
  CLT: "-04:00",
  WET: "+00:00",
  BST: "+01:00",
  CET: "+01:00",
  CEST: "+02:00",
  EET: "+02:00",
  MSK: "+03:00",
  SAST: "+02:00",
  PKT: "+05:00",
  IST: "+05:30",
  ICT: "+07:00",
  WIB: "+07:00",
  HKT: "+08:00",
  SGT: "+08:00",
  AWST: "+08:00",
  JST: "+09:00",
  KST: "+09:00",
  ACST: "+09:30",
  AEST: "+10:00",
  AEDT: "+11:00",
  NZST: "+12:00",
  NZDT: "+13:00",
};

const UTC_STATED = /\b(?:UTC|GMT|zulu)\b\s*(?:\(?\s*([+\-\u2212]\s*\d{1,2}(?::?\d{2})?))?/i;
const IANA_STATED =
  /\b(?:Africa|America|Antarctica|Asia|Atlantic|Australia|Europe|Indian|Pacific|Etc)\/[A-Za-z_]+(?:\/[A-Za-z_]+|[+-]\d{1,2})?/;
const TIME_TALK = /time|hora|hour|heure|zeit|fuso|huso|date|stamp|\btz\b/i;

interface StatedZone {
  zone: string | null;
  suggestion: string | null;
  where: string;
}

/** What the header of the stamp's columns or the lines above the table say about the zone. */
function statedZone(columnNames: string[], preamble: string[]): StatedZone {
  const places = [
    ...columnNames.map((name) => ({ text: name.replace(/_/g, " "), where: `header “${nameParts(name).bare}”` })),
    ...preamble.filter((line) => TIME_TALK.test(line)).map((text) => ({ text, where: "the lines above the table" })),
  ];
  for (const { text, where } of places) {
    const iana = IANA_STATED.exec(text);
    if (iana) return { zone: iana[0], suggestion: null, where };
    const utc = UTC_STATED.exec(text);
    if (utc) return { zone: utc[1] === undefined ? "UTC" : utc[1].replace(/\s/g, ""), suggestion: null, where };
  }
  for (const { text, where } of places) {
    const word = text.match(/\b[A-Z]{3,4}\b/g)?.find((candidate) => candidate in ABBREVIATIONS);
    if (word !== undefined)
      return { zone: null, suggestion: ABBREVIATIONS[word] ?? null, where: `“${word}” in ${where}` };
  }
  return { zone: null, suggestion: null, where: "" };
}

export interface ZoneChoice {
  zone: Zone;
  understood: Understood;
  question: ReadingQuestion | null;
}

/**
 * Settles the zone of stamps that state no offset of their own: the answer, else the format's definition, else what the
 * file says, else UTC with a question that must be answered.
 */
export function chooseZone(input: {
  answers: ReadingAnswers;
  byFormat: string | null;
  /** Whether every stamp states its offset. */
  offsetsStated: boolean;
  columnNames: string[];
  preamble: string[];
  problems: ProblemList;
}): ZoneChoice {
  const { answers, problems } = input;
  const utc = zoneByName("UTC") as Zone;
  if (input.offsetsStated) {
    return {
      zone: utc,
      understood: {
        what: "Time zone",
        taken: "each stamp states its offset from UTC",
        confidence: "stated in the file",
      },
      question: null,
    };
  }
  if (input.byFormat !== null && answers.zone === undefined) {
    const zone = zoneByName(input.byFormat) ?? utc;
    return { zone, understood: { what: "Time zone", taken: zone.name, confidence: "by the format" }, question: null };
  }
  const stated = statedZone(input.columnNames, input.preamble);
  const question: ReadingQuestion = {
    key: "zone",
    needed: true,
    message:
      stated.suggestion === null
        ? "The file does not say which time zone its stamps are in. Give an IANA zone (America/Recife), UTC, or a fixed offset (+05:30) where the clock ran on standard time all year."
        : `${stated.where} is an abbreviation, which many write all year without changing the clock. Give a fixed offset (${stated.suggestion}) for a clock on standard time all year, or an IANA zone for one that followed summer time.`,
    suggestion: stated.suggestion ?? "UTC",
  };
  if (answers.zone !== undefined) {
    const zone = zoneByName(answers.zone);
    if (zone !== null) {
      return {
        zone,
        understood: { what: "Time zone", taken: zoneLabel(zone), confidence: "answered" },
        question: { ...question, needed: false, answer: answers.zone },
      };
    }
    problems.add(
      "error",
      "unknownZone",
      `“${answers.zone}” is no time zone`,
      "Give an IANA name such as Europe/Lisbon, UTC, or an offset such as +05:30.",
    );
    return { zone: utc, understood: { what: "Time zone", taken: "UTC", confidence: "assumed" }, question };
  }
  const fromFile = stated.zone === null ? null : zoneByName(stated.zone);
  if (fromFile !== null) {
    return {
      zone: fromFile,
      understood: {
        what: "Time zone",
        taken: `${zoneLabel(fromFile)}, from ${stated.where}`,
        confidence: "stated in the file",
      },
      question: null,
    };
  }
  const assumed = zoneByName(question.suggestion ?? "UTC") ?? utc;
  return {
    zone: assumed,
    understood: { what: "Time zone", taken: zoneLabel(assumed), confidence: "assumed" },
    question,
  };
}

/** The sign of `Etc/GMT+5` is the reverse of what it looks like, so it is spelled out. */
function zoneLabel(zone: Zone): string {
  const etc = /^Etc\/GMT([+-])(\d{1,2})$/.exec(zone.name);
  if (!etc) return zone.name;
  return `${zone.name} (${etc[2]} h ${etc[1] === "+" ? "behind" : "ahead of"} UTC)`;
}
