import type { Run } from "./document";

/** `_index`, `^power`, either with one pair of brackets, or the power of ten of a number as `8.84e-6`. */
const MARKED = /([_^])(?:\(([^()]+)\)|([\p{L}\d]+(?:\.\d+)?))|(?<![\d.])1e(-?\d+)|(?<=\d)e(-?\d+)/gu;

/**
 * An equation written as plain text, set as one: `V_abk` lowers, `s^2` raises, `8.84e-6` becomes a power of ten, and
 * a hyphen that means minus becomes one.
 */
export function equationRuns(text: string): Run[] {
  const runs: Run[] = [];
  const push = (part: string, rise?: Run["rise"]) => {
    if (part !== "") runs.push(rise ? { text: minus(part), rise } : { text: minus(part) });
  };
  let from = 0;
  for (const match of text.matchAll(MARKED)) {
    const [whole, sign, bracketed, bare, loneTen, power] = match;
    push(text.slice(from, match.index));
    const exponent = loneTen ?? power;
    if (exponent !== undefined) {
      push(loneTen === undefined ? " × 10" : "10");
      push(exponent, "super");
    } else push(bracketed ?? bare ?? "", sign === "_" ? "sub" : "super");
    from = match.index + whole.length;
  }
  push(text.slice(from));
  return runs;
}

/** A hyphen between two letters joins words; any other is a minus sign. */
function minus(text: string): string {
  return text.replace(/(?<!\p{L})-|-(?!\p{L})/gu, "−");
}
