import { CHANNEL_QUANTITIES, FILE_UNITS } from "~/readers/file-units";
import {
  CHANNEL_NAMES,
  type ColumnReading,
  type ReadingAnswers,
  type ReadingQuestion,
  type SeriesReading,
} from "~/readers/reading";
import { parseCoordinates } from "~/area/parse-coordinates";
import { zoneClock } from "~/units/format-time";
import { CHANNELS } from "./channels";

/**
 * The answers of a reading sheet as form fields. An empty field means "as read": only what a person changed is kept as an
 * answer, so that the provenance still tells what the file itself said.
 */
export const ROLES: readonly { value: ColumnReading["role"]; label: string }[] = [
  { value: "time", label: "time" },
  ...CHANNEL_NAMES.map((channel) => ({ value: channel, label: CHANNELS[channel].label })),
  { value: "windTowards", label: "wind direction, towards" },
  { value: "windU", label: "wind towards the east (u)" },
  { value: "windV", label: "wind towards the north (v)" },
  { value: "leftOut", label: "left out" },
];

export function roleLabel(role: ColumnReading["role"]): string {
  return ROLES.find(({ value }) => value === role)?.label ?? role;
}

/** The units that a column of this role can be written in. */
export function unitsFor(role: ColumnReading["role"]): { value: string; label: string }[] {
  if (role === "time" || role === "leftOut") return [];
  const quantities = CHANNEL_QUANTITIES[role];
  return FILE_UNITS.filter(({ quantity }) => quantities.includes(quantity)).map(({ id, label }) => ({
    value: id,
    label,
  }));
}

export const NO_CODES = "none";

export interface AnswersRead {
  answers: ReadingAnswers;
  /** What is wrong, by field name; empty where nothing is. */
  errors: Record<string, string>;
}

/** Reads the posted fields against the sheet they were shown on. */
export function readAnswers(form: FormData, shown: Pick<SeriesReading, "columns" | "questions">): AnswersRead {
  const errors: Record<string, string> = {};
  const text = (name: string) => {
    const value = form.get(name);
    return typeof value === "string" ? value.trim() : "";
  };
  const answers: ReadingAnswers = {};

  const sheet = text("sheet");
  if (isOffered("sheet", sheet, shown.questions)) answers.sheet = sheet;
  const zone = text("zone");
  if (zone !== "" && isZone(zone)) answers.zone = zone;
  else if (zone !== "")
    errors.zone = `"${zone}" is no time zone: write UTC, a name such as Europe/Dublin, or an offset such as +05:30.`;

  const dateOrder = text("dateOrder");
  if (isOneOf(dateOrder, ["ymd", "dmy", "mdy"])) answers.dateOrder = dateOrder;
  const epoch = text("serialEpoch");
  if (isOneOf(epoch, ["1900", "1904"])) answers.serialEpoch = epoch;
  const sense = text("directionSense");
  if (isOneOf(sense, ["from", "towards"]) && !isAsRead("directionSense", sense, shown.questions))
    answers.directionSense = sense;

  const height = readNumber(text("windHeight"), 0.5, 500);
  if (height === "wrong") errors.windHeight = "Write a height from 0.5 to 500 m above the sea.";
  else if (height !== null) answers.windHeight = height;
  const averaging = readNumber(text("averagingMinutes"), 0.01, 1440);
  if (averaging === "wrong") errors.averagingMinutes = "Write minutes from 0.01 to 1440.";
  else if (averaging !== null) answers.averagingMinutes = averaging;

  const place = readPlace(text("place"), shown.questions);
  if (place === "wrong") errors.place = "Write a latitude and a longitude, such as 44.5, -63.4.";
  else if (place !== null) answers.place = place;
  const gridMethod = text("gridMethod");
  if (isOneOf(gridMethod, ["nearestSea", "bilinear"])) answers.gridMethod = gridMethod;
  const accumulation = text("accumulation");
  if (isOneOf(accumulation, ["step", "day", "start"])) answers.accumulation = accumulation;
  const flagged = text("flagged");
  if (isOneOf(flagged, ["leaveOut", "keep"])) answers.flagged = flagged;
  const timeAxis = text("timeAxis");
  if (isOffered("timeAxis", timeAxis, shown.questions)) answers.timeAxis = timeAxis;

  for (const column of shown.columns) {
    const role = ROLES.find(({ value }) => value === text(`role-${column.index}`))?.value;
    const unit = text(`unit-${column.index}`);
    const effective = role ?? column.role;
    const known = unit !== "" && unitsFor(effective).some(({ value }) => value === unit);
    if (unit !== "" && !known && role === undefined) {
      errors[`unit-${column.index}`] = `${roleLabel(effective)} is not measured in ${unit}.`;
    }
    // A unit that does not fit a newly chosen role belongs to the former one, and is dropped with it.
    if (role !== undefined || known) {
      answers.columns = { ...answers.columns, [column.index]: known ? { role: effective, unit } : { role: effective } };
    }
    const codes = text(`missing-${column.index}`);
    if (codes !== "") {
      const list = codes === NO_CODES ? [] : codes.split(/[\s;]+/).filter((code) => code !== "");
      answers.missingCodes = { ...answers.missingCodes, [column.index]: list };
    }
  }
  if (text("leaveOutBadRows") === "on") answers.leaveOutBadRows = true;
  return { answers, errors };
}

/** A radio button cannot be left empty: one that stands where the reader put it is no answer. */
function isAsRead(key: ReadingQuestion["key"], value: string, questions: readonly ReadingQuestion[]): boolean {
  const question = questions.find((candidate) => candidate.key === key);
  return question !== undefined && !question.needed && question.answer === undefined && question.suggestion === value;
}

function isOffered(key: ReadingQuestion["key"], value: string, questions: readonly ReadingQuestion[]): boolean {
  return questions.some(
    (question) => question.key === key && question.options?.some((option) => option.value === value),
  );
}

/** A place of the list as it stands there, or a position however it is written, as `LAT,LON`. */
function readPlace(text: string, questions: readonly ReadingQuestion[]): string | null | "wrong" {
  if (text === "" || !questions.some(({ key }) => key === "place")) return null;
  if (isOffered("place", text, questions)) return text;
  const { corners, problems } = parseCoordinates(text);
  const [corner] = corners;
  if (corner === undefined || corners.length > 1 || problems.length > 0) return "wrong";
  return `${corner[1]},${corner[0]}`;
}

function isOneOf<const T extends string>(value: string, options: readonly T[]): value is T {
  return (options as readonly string[]).includes(value);
}

function isZone(zone: string): boolean {
  try {
    zoneClock(zone);
    return true;
  } catch (error) {
    if (error instanceof RangeError) return false;
    throw error;
  }
}

function readNumber(text: string, min: number, max: number): number | null | "wrong" {
  if (text === "") return null;
  const number = Number(text.replace(",", "."));
  return number >= min && number <= max ? number : "wrong";
}

/** Whether two sets of answers ask for the same reading. */
export function sameAnswers(a: ReadingAnswers, b: ReadingAnswers): boolean {
  return JSON.stringify(inOrder(a)) === JSON.stringify(inOrder(b));
}

function inOrder(value: unknown): unknown {
  if (Array.isArray(value) || typeof value !== "object" || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .filter(([, inner]) => inner !== undefined)
      .sort(([a], [b]) => a.localeCompare(b))
      .map(([key, inner]) => [key, inOrder(inner)]),
  );
}
