import fc from "fast-check";

const PARTS = 1_000_000;

/**
 * A number that is as likely here as there within the range, its ends somewhat more so. `fc.double` draws every exponent
 * alike: of its winds from 0 to 70 m/s hardly one in a hundred would move any water.
 */
export function uniform(min: number, max: number): fc.Arbitrary<number> {
  return fc.integer({ min: 0, max: PARTS }).map((part) => min + ((max - min) * part) / PARTS);
}

/** The same, and at times any number within the range down to the smallest there is. */
export function uniformOrTiny(min: number, max: number): fc.Arbitrary<number> {
  return fc.oneof(
    { arbitrary: uniform(min, max), weight: 3 },
    { arbitrary: fc.double({ min, max, noNaN: true }), weight: 1 },
  );
}
