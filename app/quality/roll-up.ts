import { FAIL, MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "./flags";

/** The one that comes first wins. Source: precedence of the open reference implementation (ioos_qc, qartod.py). */
const PRECEDENCE = [FAIL, SUSPECT, PASS, NOT_EVALUATED, MISSING];

const RANK = new Uint8Array(MISSING + 1);
PRECEDENCE.forEach((flag, index) => (RANK[flag] = PRECEDENCE.length - index));

/**
 * The aggregate flag of each sample: fail before suspect before pass before not evaluated before missing.
 * @param results flags of several tests, all of `length`
 * @returns not evaluated throughout where no test was made
 * @throws RangeError where the lengths differ
 */
export function rollUp(results: readonly Flags[], length: number): Flags {
  const rolled = new Uint8Array(length).fill(results.length === 0 ? NOT_EVALUATED : MISSING);
  for (const flags of results) {
    if (flags.length !== length) throw new RangeError(`A test has ${flags.length} flags for ${length} samples.`);
    for (let k = 0; k < length; k++) if (RANK[flags[k]] > RANK[rolled[k]]) rolled[k] = flags[k];
  }
  return rolled;
}
