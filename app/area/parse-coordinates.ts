import type { Position } from "~/ocean/scenario";

export interface CoordinateProblem {
  /** Line of the text, counted from 1. */
  line: number;
  code: "unreadable" | "range" | "swapped" | "hemisphere" | "minutes" | "geojson";
  message: string;
}

export interface ParsedCoordinates {
  /** [longitude, latitude] in degrees, one a readable line. */
  corners: Position[];
  problems: CoordinateProblem[];
}

const EXAMPLE = 'Write one corner a line, such as "54.412 -8.231", "54° 24.7′ N 8° 13.9′ W" or "54°24′43″N 8°13′52″W".';

/**
 * Reads corners as people write them, one a line; blank lines are passed over. Decimal degrees, degrees and minutes, or
 * degrees, minutes and seconds; N/S/E/W before or after; separated by comma, semicolon, tab or space; decimal point or
 * decimal comma. Latitude comes first unless hemisphere letters say otherwise. Never guesses silently: what can be read
 * in two ways is a problem with its line number.
 */
export function parseCoordinates(text: string): ParsedCoordinates {
  const corners: Position[] = [];
  const problems: CoordinateProblem[] = [];
  text.split(/\r\n|\r|\n/).forEach((line, i) => {
    if (line.trim() === "") return;
    try {
      corners.push(parseLine(line));
    } catch (error) {
      if (!(error instanceof Unreadable)) throw error;
      problems.push({ line: i + 1, code: error.code, message: `Line ${i + 1}: ${error.message}` });
    }
  });
  return { corners, problems };
}

class Unreadable extends Error {
  readonly code: CoordinateProblem["code"];

  constructor(code: CoordinateProblem["code"], message: string) {
    super(message);
    this.code = code;
  }
}

type Letter = "N" | "S" | "E" | "W";

interface Angle {
  degrees: number;
  letter: Letter | null;
}

function parseLine(line: string): Position {
  if (/[[\]{}]/.test(line)) {
    const message =
      "brackets mean GeoJSON, where longitude comes first. Import it as a file, or take the brackets away.";
    throw new Unreadable("geojson", message);
  }
  const plain = toPlainSigns(line);
  const [first, second] = splitInTwo(plain);
  return toPosition(parseAngle(first), parseAngle(second));
}

/** One way of writing each sign: `-`, `d`, `m`, `s`; separators `|`; upper-case hemisphere letters. */
function toPlainSigns(line: string): string {
  return line
    .replace(/[\u2212\u2013\u2012]/g, "-")
    .replace(/[\u00a0\u2007\u2009\u202f]/g, " ")
    .replace(/\b(latitude|longitude|lat|lon|lng|long)\b\s*[:=.]?/gi, " ")
    .replace(/''|[\u2033\u201d\u201c"]/g, "s")
    .replace(/[\u2032\u2019\u2018'\u00b4`]/g, "m")
    .replace(/[\u00b0\u00ba\u02da]|deg(rees)?\b/gi, "d")
    .replace(/[nsew](?![a-z])/gi, (letter, at: number, whole: string) => asLetter(letter, whole, at))
    .replace(/(?<=\d):(?=\d)/g, " ")
    .replace(/[;\t]/g, "|")
    .trim();
}

/** `s` may stand for seconds or for south: after a number whose minutes were marked it means seconds. */
function asLetter(letter: string, whole: string, at: number): string {
  const seconds = letter === "s" && /m\s*[\d.,]+\s*$/.test(whole.slice(0, at));
  return seconds ? "s" : letter.toUpperCase();
}

/** The two angles of a line, by its separator, its letters, its degree signs, or else half the numbers each. */
function splitInTwo(line: string): [string, string] {
  const readings = [decimalCommas(line), line.replace(/,/g, "|")];
  for (const reading of readings) {
    const parts = splitReading(reading);
    if (parts) return parts;
  }
  throw new Unreadable("unreadable", `this is not a latitude and a longitude. ${EXAMPLE}`);
}

/** Commas between digits become decimal points unless the line has points already; other commas separate. */
function decimalCommas(line: string): string {
  const between = line.includes(".") ? "|" : ".";
  return line.replace(/(?<=\d),(?=\d)/g, between).replace(/,/g, "|");
}

function splitReading(reading: string): [string, string] | null {
  if (!/^[\d.\s|dmsNSEW+-]*$/.test(reading)) return null;
  const parts = reading
    .split("|")
    .map((part) => part.trim())
    .filter((part) => part !== "");
  const pair = parts.length === 1 ? splitUnseparated(parts[0]) : parts.length === 2 ? [parts[0], parts[1]] : null;
  if (!pair) return null;
  const [first, second] = pair;
  const counts = [numbersIn(first), numbersIn(second)];
  const marked = /[dms]/.test(reading);
  if (counts.some((count) => count < 1 || count > 3) || (!marked && counts[0] !== counts[1])) return null;
  return [first, second];
}

function numbersIn(part: string): number {
  const numbers = part.match(/[\d.]+/g) ?? [];
  return numbers.every((number) => /^(\d+\.?\d*|\.\d+)$/.test(number)) ? numbers.length : 0;
}

function splitUnseparated(line: string): [string, string] | null {
  const letters = [...line.matchAll(/[NSEW]/g)].map((match) => match.index);
  if (letters.length === 2) {
    const at = /^[NSEW]/.test(line) ? letters[1] : letters[0] + 1;
    return [line.slice(0, at), line.slice(at)];
  }
  const numbers = [...line.matchAll(/[+-]?\s*[\d.]+/g)];
  const degreeSigns = [...line.matchAll(/d/g)].map((match) => match.index);
  const second =
    degreeSigns.length === 2
      ? numbers.filter((number) => number.index < degreeSigns[1]).at(-1)
      : numbers.length % 2 === 0
        ? numbers[numbers.length / 2]
        : undefined;
  if (!second || second.index === 0 || letters.length === 1) return null;
  return [line.slice(0, second.index), line.slice(second.index)];
}

const ANGLE =
  /^([NSEW])?\s*([+-])?\s*(\d+\.?\d*|\.\d+)\s*d?\s*(?:[\s:]*(\d+\.?\d*|\.\d+)\s*m?\s*(?:[\s:]*(\d+\.?\d*|\.\d+)\s*s?)?)?\s*([NSEW])?$/;

function parseAngle(text: string): Angle {
  const match = ANGLE.exec(text.trim());
  if (!match) throw new Unreadable("unreadable", `"${readable(text)}" is not an angle. ${EXAMPLE}`);
  const [, before, sign, ...rest] = match;
  const after = rest.pop();
  const parts = rest.filter((part) => part !== undefined);
  if (before && after) throw new Unreadable("hemisphere", `"${readable(text)}" has two hemisphere letters. Keep one.`);
  const letter = (before ?? after ?? null) as Letter | null;
  if (letter && sign) {
    throw new Unreadable("hemisphere", `"${readable(text)}" has both a sign and the letter ${letter}. Keep one.`);
  }
  const size = sexagesimal(parts, text);
  const negative = sign === "-" || letter === "S" || letter === "W";
  return { degrees: negative ? -size : size, letter };
}

function sexagesimal(parts: string[], text: string): number {
  const values = parts.map(Number);
  const fractional = parts.findIndex((part) => /\.\d*[1-9]/.test(part));
  if (fractional >= 0 && fractional < parts.length - 1) {
    throw new Unreadable("minutes", `in "${readable(text)}" only the last part can have decimals.`);
  }
  if (values.slice(1).some((value) => value >= 60)) {
    throw new Unreadable("minutes", `in "${readable(text)}" minutes and seconds must be below 60.`);
  }
  const [degrees, minutes = 0, seconds = 0] = values;
  return degrees + minutes / 60 + seconds / 3600;
}

function readable(text: string): string {
  return text.trim().replace(/d/g, "°").replace(/m/g, "′").replace(/s/g, "″");
}

function toPosition(first: Angle, second: Angle): Position {
  const firstIsLongitude = isLongitude(first.letter) || isLatitude(second.letter);
  const firstIsLatitude = isLatitude(first.letter) || isLongitude(second.letter);
  if (firstIsLatitude && firstIsLongitude) {
    throw new Unreadable("hemisphere", "both angles are along the same axis. One needs N or S, the other E or W.");
  }
  const lettered = firstIsLatitude || firstIsLongitude;
  const [latitude, longitude] = firstIsLongitude ? [second.degrees, first.degrees] : [first.degrees, second.degrees];
  if (Math.abs(latitude) > 90) {
    if (!lettered && Math.abs(longitude) <= 90 && Math.abs(latitude) <= 360) {
      const message = `latitude comes first, and ${latitude}° is beyond 90°: the two seem to be swapped. Turn them round, or add N/S and E/W.`;
      throw new Unreadable("swapped", message);
    }
    throw new Unreadable("range", `latitude ${latitude}° is beyond 90°.`);
  }
  if (Math.abs(longitude) > 360) {
    throw new Unreadable("range", `longitude ${longitude}° is not within -180° to 180° (or 0° to 360°).`);
  }
  return [longitude, latitude];
}

function isLatitude(letter: Letter | null): boolean {
  return letter === "N" || letter === "S";
}

function isLongitude(letter: Letter | null): boolean {
  return letter === "E" || letter === "W";
}
