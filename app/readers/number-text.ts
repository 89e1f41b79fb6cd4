export type DecimalSign = "." | ",";

const POINT = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;
const COMMA = /^[+-]?(?:\d+,?\d*|,\d+)(?:[eE][+-]?\d+)?$/;
const POINT_GROUPED = /^[+-]?\d{1,3}(?:([, '’])\d{3})(?:\1\d{3})*(?:\.\d+)?$/;
const COMMA_GROUPED = /^[+-]?\d{1,3}(?:([. '’])\d{3})(?:\1\d{3})*(?:,\d+)?$/;
/** No-break, narrow and figure spaces, and tabs: all count as a space. */
const SPACES = /[\u00a0\u2000-\u200a\u202f\u205f\u3000\t]/g;
const SIGNS = /[\u2212\u2012\u2013\uff0d]/g;
const PLAIN = /^[\x21-\x7e]*$/;

/**
 * Tidies a cell: no surrounding space or zero-width marks, every kind of space is a space, every kind of minus a hyphen.
 */
export function tidyCell(cell: string): string {
  if (PLAIN.test(cell)) return cell;
  return cell
    .replace(SPACES, " ")
    .replace(SIGNS, "-")
    .replace(/[\u200b\ufeff\u200e\u200f]/g, "")
    .trim();
}

/**
 * Reads a tidied cell as a number: sign, decimal sign (also leading, `,8`), thousands separators in strict groups of
 * three, exponent.
 * @returns the number, or null where the text is not one
 */
export function numberFromText(text: string, decimal: DecimalSign): number | null {
  if (decimal === ".") {
    if (POINT.test(text)) return finite(Number(text));
    return POINT_GROUPED.test(text) ? finite(Number(text.replace(/[, '’]/g, ""))) : null;
  }
  if (COMMA.test(text)) return finite(Number(text.replace(",", ".")));
  if (COMMA_GROUPED.test(text)) return finite(Number(text.replace(/[. '’]/g, "").replace(",", ".")));
  // A point that cannot be a thousands separator is a decimal point even in a file with decimal commas.
  return POINT.test(text) ? finite(Number(text)) : null;
}

function finite(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}

const SURELY_COMMA = /^[+-]?(?:\d*,\d+|\d{1,3}(?:[. ]\d{3})+,\d+)(?:[eE][+-]?\d+)?$/;
const PERHAPS_GROUPED = /^[+-]?[1-9]\d{0,2},\d{3}$/;
const SURELY_POINT = /^[+-]?(?:\d*\.\d+|\d{1,3}(?:,\d{3})+\.\d+)(?:[eE][+-]?\d+)?$/;

/**
 * Finds the decimal sign of a file from its cells.
 * @returns the sign, and whether the evidence could also mean thousands separators (`1,013` alone)
 */
export function decimalSignOf(cells: Iterable<string>): { sign: DecimalSign; ambiguous: boolean } {
  let perhaps = 0;
  let point = 0;
  let comma = 0;
  for (const raw of cells) {
    const cell = tidyCell(raw);
    if (PERHAPS_GROUPED.test(cell)) perhaps += 1;
    else if (SURELY_COMMA.test(cell)) comma += 1;
    else if (SURELY_POINT.test(cell)) point += 1;
  }
  if (comma > 0 && comma >= point) return { sign: ",", ambiguous: false };
  if (perhaps > 0 && point === 0) return { sign: ",", ambiguous: true };
  return { sign: ".", ambiguous: false };
}
