/** What a spreadsheet would take for a formula. */
const FORMULA_START = /^[=+\-@\t\r]/;

/** A text as a cell after RFC 4180; one that a spreadsheet would run as a formula gets an apostrophe before it. */
export function csvCell(text: string): string {
  const safe = FORMULA_START.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
