/** I and O are left out, as on drawings: they are read as 1 and 0 (common practice, no source). */
const LETTERS = "ABCDEFGHJKLMNPQRSTUVWXYZ";

/** A, B, C … Z, AA, AB … for revisions counted from 1. */
export function revisionLabel(sequence: number): string {
  let rest = sequence;
  let label = "";
  while (rest > 0) {
    const digit = (rest - 1) % LETTERS.length;
    label = LETTERS[digit] + label;
    rest = (rest - 1 - digit) / LETTERS.length;
  }
  return label;
}
