export type DateOrder = "ymd" | "dmy" | "mdy";

/** A stamp as written. */
export interface WrittenStamp {
  /** Seconds since 1970-01-01T00:00:00 on the clock of the file, as if it were UTC. */
  clock: number;
  /** Offset from UTC in seconds where the stamp states one, else null. */
  offset: number | null;
}

/** Longer text is no stamp, and patterns need not be tried on it. */
const LONGEST_STAMP = 64;

const TIME =
  /^(\d{1,2})(?:[:hH.]|\s?h\s?)(\d{2})(?:m(?:in)?)?(?:[:.](\d{2})(?:[.,](\d+))?)?\s*([aApP])?\.?(?:[mM]\.?)?\s*(Z|z|UTC|utc|GMT|(?:UTC|GMT)?\s*[+-]\d{1,2}(?::?\d{2})?)?$/;
const TIME_DIGITS = /^(\d{1,2})(\d{2})(\d{2})?\s*(Z|z|UTC|utc|GMT|H|h)?$/;
const DATE_YEAR_FIRST = /^(\d{4})([-/. ])(\d{1,2})\2(\d{1,2})$/;
const DATE_YEAR_LAST = /^(\d{1,2})([-/. ])(\d{1,2})\2(\d{4}|\d{2})\.?$/;
const DATE_DAY_MONTH_NAME = /^(\d{1,2})\.?[-/ .]*([\p{L}]{3,})\.?[-/ .]*(\d{4}|\d{2})$/u;
const DATE_MONTH_NAME_DAY = /^([\p{L}]{3,})\.? (\d{1,2}),? (\d{4})$/u;
const COMPACT = /^(\d{4})(\d{2})(\d{2})(?:[T ]?(\d{2}):?(\d{2})(?::?(\d{2}))?)?(Z)?$/;
const COMPACT_HOUR = /^(\d{4})(\d{2})(\d{2})[T ]?(\d{2})(Z)?$/;
const DAY_OF_YEAR = /^(\d{4})-(\d{3})$/;

/** First letters of month names in English, Portuguese, Spanish, French and German, without accents. */
const MONTHS: readonly (readonly string[])[] = [
  ["jan", "ene"],
  ["feb", "fev", "fevr"],
  ["mar", "mrz", "marz"],
  ["apr", "abr", "avr"],
  ["may", "mai"],
  ["jun", "juin"],
  ["jul", "juil"],
  ["aug", "ago", "aou"],
  ["sep", "set"],
  ["oct", "out", "okt"],
  ["nov"],
  ["dec", "dez", "dic"],
];

function monthByName(name: string): number | null {
  const plain = name
    .normalize("NFKD")
    .replace(/[\u0300-\u036f]/g, "")
    .toLowerCase();
  if (plain.startsWith("juil")) return 7;
  if (plain.startsWith("juin")) return 6;
  const index = MONTHS.findIndex((starts) => starts.some((start) => plain.startsWith(start)));
  return index < 0 ? null : index + 1;
}

/** Two-digit years: 70–99 are 1970–1999, 00–69 are 2000–2069 (the POSIX `%y` rule, with its turn at 69 moved by one). */
export function fullYear(year: number, digits: number): number {
  if (digits > 2) return year;
  return year >= 70 ? 1900 + year : 2000 + year;
}

const DAYS_BEFORE = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334];

function isLeap(year: number): boolean {
  return (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
}

/**
 * Days from 1970-01-01 to a date of the Gregorian calendar.
 * @returns null where no such date exists (30 February)
 */
export function daysFromDate(year: number, month: number, day: number): number | null {
  if (month < 1 || month > 12 || day < 1 || year < 1 || year > 9999) return null;
  const inMonth = [31, isLeap(year) ? 29 : 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31][month - 1] ?? 0;
  if (day > inMonth) return null;
  const before = year - 1;
  const leapDays = Math.floor(before / 4) - Math.floor(before / 100) + Math.floor(before / 400);
  const dayOfYear = (DAYS_BEFORE[month - 1] ?? 0) + (month > 2 && isLeap(year) ? 1 : 0) + day - 1;
  return before * 365 + leapDays + dayOfYear - 719162;
}

/** Seconds of the day; 24:00:00 is the end of the day; null where the parts are no time of day. */
export function secondsOfDay(hour: number, minute: number, second: number): number | null {
  if (hour === 24 && minute === 0 && second === 0) return 86400;
  if (hour < 0 || hour > 23 || minute < 0 || minute > 59 || second < 0 || second >= 61) return null;
  return hour * 3600 + minute * 60 + second;
}

/** Reads a date; the order matters only where the year is not first and the month no word. Days since 1970-01-01. */
export function dateFromText(text: string, order: DateOrder): number | null {
  if (text.length > LONGEST_STAMP) return null;
  let match = DATE_YEAR_FIRST.exec(text);
  if (match) return daysFromDate(Number(match[1]), Number(match[3]), Number(match[4]));
  match = DATE_YEAR_LAST.exec(text);
  if (match) {
    const [first, second, last] = [Number(match[1]), Number(match[3]), Number(match[4])];
    const lastDigits = match[4]?.length ?? 4;
    if (order === "ymd" && lastDigits === 2) return daysFromDate(fullYear(first, 2), second, last);
    const year = fullYear(last, lastDigits);
    return order === "mdy" ? daysFromDate(year, first, second) : daysFromDate(year, second, first);
  }
  match = COMPACT.exec(text);
  if (match && match[4] === undefined) return daysFromDate(Number(match[1]), Number(match[2]), Number(match[3]));
  match = DATE_DAY_MONTH_NAME.exec(text);
  if (match) {
    const month = monthByName(match[2] ?? "");
    return month === null
      ? null
      : daysFromDate(fullYear(Number(match[3]), match[3]?.length ?? 4), month, Number(match[1]));
  }
  match = DATE_MONTH_NAME_DAY.exec(text);
  if (match) {
    const month = monthByName(match[1] ?? "");
    return month === null ? null : daysFromDate(Number(match[3]), month, Number(match[2]));
  }
  match = DAY_OF_YEAR.exec(text);
  if (match) {
    const start = daysFromDate(Number(match[1]), 1, 1);
    const day = Number(match[2]);
    return start === null || day < 1 || day > 366 ? null : start + day - 1;
  }
  return null;
}

/** Reads a time of day: `15:30`, `15h30`, `0330 UTC`, `3:30:00 pm`, `24:00`, with an offset where it states one. */
export function timeFromText(text: string): { seconds: number; offset: number | null } | null {
  if (text.length > LONGEST_STAMP) return null;
  let match = TIME.exec(text);
  if (match) {
    let hour = Number(match[1]);
    const half = match[5]?.toLowerCase();
    if (half !== undefined) {
      if (hour < 1 || hour > 12) return null;
      hour = (hour % 12) + (half === "p" ? 12 : 0);
    }
    const second = Number(match[3] ?? 0) + (match[4] === undefined ? 0 : Number(`0.${match[4]}`));
    const seconds = secondsOfDay(hour, Number(match[2]), second);
    return seconds === null ? null : { seconds, offset: offsetFromText(match[6]) };
  }
  match = TIME_DIGITS.exec(text);
  if (match) {
    const seconds = secondsOfDay(Number(match[1]), Number(match[2]), Number(match[3] ?? 0));
    const utc = match[4] !== undefined && !/h/i.test(match[4]);
    return seconds === null ? null : { seconds, offset: utc ? 0 : null };
  }
  return null;
}

/** `Z`, `UTC`, `+02`, `+0530`, `-03:00` → seconds east of Greenwich; null where nothing is stated. */
export function offsetFromText(text: string | undefined): number | null {
  if (text === undefined || text === "") return null;
  const match = /([+-])(\d{1,2}):?(\d{2})?$/.exec(text);
  if (!match) return 0;
  const seconds = Number(match[2]) * 3600 + Number(match[3] ?? 0) * 60;
  return match[1] === "-" ? -seconds : seconds;
}

const SPLIT = /^(\d{1,2} \p{L}+\.? \d{4}|\p{L}+\.? \d{1,2},? \d{4}|\S+)[T, _]+(\S.*)$/u;
const ISO_T = /^(\d{4}-\d{2}-\d{2}|\d{8})[Tt](\d.*)$/;

/**
 * Reads a date with an optional time in one text.
 * @returns null where the text is no stamp
 */
export function stampFromText(text: string, order: DateOrder): WrittenStamp | null {
  if (text.length > LONGEST_STAMP) return null;
  const iso = ISO_T.exec(text);
  const parts = iso ?? SPLIT.exec(text);
  if (parts) {
    const day = dateFromText((parts[1] ?? "").replace(/,$/, ""), order);
    const time = timeFromText((parts[2] ?? "").trim());
    if (day !== null && time !== null) return { clock: day * 86400 + time.seconds, offset: time.offset };
  }
  const day = dateFromText(text, order);
  if (day !== null) return { clock: day * 86400, offset: null };
  const compact = COMPACT.exec(text);
  if (compact) return compactStamp(compact[1], compact[2], compact[3], compact[4], compact[5], compact[6], compact[7]);
  const hourly = COMPACT_HOUR.exec(text);
  return hourly ? compactStamp(hourly[1], hourly[2], hourly[3], hourly[4], "0", "0", hourly[5]) : null;
}

function compactStamp(...parts: (string | undefined)[]): WrittenStamp | null {
  const [year, month, date, hour, minute, second] = parts.slice(0, 6).map((part) => Number(part ?? 0));
  const day = daysFromDate(year ?? 0, month ?? 0, date ?? 0);
  const seconds = secondsOfDay(hour ?? 0, minute ?? 0, second ?? 0);
  if (day === null || seconds === null) return null;
  return { clock: day * 86400 + seconds, offset: parts[6] === undefined ? null : 0 };
}

/** First two numbers of a date whose year is last, for telling day from month; null for other dates. */
export function dayMonthNumbers(text: string): [number, number, number] | null {
  const match = /^(\d{1,2})([-/. ])(\d{1,2})\2(\d{4}|\d{2})(?![\d])/.exec(text);
  return match ? [Number(match[1]), Number(match[3]), Number(match[4])] : null;
}

/** ISO text of a time in UTC, to the second: `2019-01-01T00:00:00Z`. Null where it lies outside the years 1 to 9999. */
export function isoFromSeconds(seconds: number): string | null {
  const date = new Date(Math.round(seconds * 1000));
  const year = date.getUTCFullYear();
  if (!Number.isFinite(year) || year < 1 || year > 9999) return null;
  return date.toISOString().replace(/\.000Z$/, "Z");
}
