/**
 * Flags of quality by the primary scheme of IODE that QARTOD uses. A flag never deletes or changes a value.
 * Source: IOOS, Manual for Real-Time Quality Control of Wind Data (QARTOD), flags.
 */
export const PASS = 1;
export const NOT_EVALUATED = 2;
/** Suspect or of high interest: in a storm mostly the latter. */
export const SUSPECT = 3;
export const FAIL = 4;
export const MISSING = 9;

export const FLAGS = [PASS, NOT_EVALUATED, SUSPECT, FAIL, MISSING] as const;
export type Flag = (typeof FLAGS)[number];

export const FLAG_WORDS: Record<Flag, string> = {
  [PASS]: "good",
  [NOT_EVALUATED]: "not evaluated",
  [SUSPECT]: "suspect or of high interest",
  [FAIL]: "bad",
  [MISSING]: "missing",
};

/** Where there is no room for the whole. */
export const SHORT_FLAG_WORDS: Record<Flag, string> = { ...FLAG_WORDS, [SUSPECT]: "suspect" };

/** One flag a sample; every element is a `Flag`. */
export type Flags = Uint8Array;

/** @throws RangeError for a number that is no flag */
export function asFlag(value: number): Flag {
  const flag = FLAGS.find((known) => known === value);
  if (flag === undefined) throw new RangeError(`${value} is no quality flag.`);
  return flag;
}
