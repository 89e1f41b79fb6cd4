import { numberFromText, tidyCell, type DecimalSign } from "./number-text";

const WORDS = new Set([
  "",
  "nan",
  "na",
  "n/a",
  "#n/a",
  "#na",
  "nil",
  "null",
  "none",
  "missing",
  "nodata",
  "no data",
  "-",
  "--",
  "---",
  "----",
  "/",
  "//",
  "///",
  "////",
  "/////",
  "m",
  "mm",
  ".",
  "..",
  "*",
  "**",
  "***",
  "?",
  "x",
  "inf",
  "-inf",
  "+inf",
  "infinity",
  "#div/0!",
  "#value!",
  "#ref!",
  "#name?",
  "#num!",
  "#null!",
]);

/** Whether a tidied cell is a word that means missing in any column: blank, `NaN`, `M`, `MM`, `//`, `#N/A`, … */
export function isMissingWord(text: string): boolean {
  return text.length <= 9 && WORDS.has(text.toLowerCase());
}

/**
 * Numbers that agencies and loggers write for "no value". They count as missing only where the column could not hold
 * them as a measurement: 99 is a legal direction, −9 a legal temperature. Source: common practice; NDBC, WHP-Exchange,
 * ISD-Lite and logger manuals name most of them.
 */
export const SENTINELS: ReadonlySet<number> = new Set([
  99, 99.9, 99.99, 999, 999.9, 999.99, 9999, 9999.9, 9999.99, 99999, 99999.9, 999999, -9, -99, -99.9, -99.99, -999,
  -999.9, -999.99, -9999, -9999.9, -9999.99, -99999, -999999, -6999, -7999, 7999, 6999, -32768, 32767, 1e20, 1e35,
  -1e34, 9.96921e36, -9.99e-29,
]);

/**
 * Makes a test for a column's own codes: numeric codes match by value (`99`, `99.0`, `99,00`), others by text.
 * @returns a function of (tidied cell, its number or null) that is true where the cell means missing
 */
export function codeTest(
  codes: readonly string[],
  decimal: DecimalSign,
): (text: string, value: number | null) => boolean {
  const numbers = new Set<number>();
  const words = new Set<string>();
  for (const code of codes) {
    const tidy = tidyCell(code);
    const value = numberFromText(tidy, decimal) ?? numberFromText(tidy, ".");
    if (value === null) words.add(tidy.toLowerCase());
    else numbers.add(value);
  }
  return (text, value) => (value !== null && numbers.has(value)) || (words.size > 0 && words.has(text.toLowerCase()));
}
