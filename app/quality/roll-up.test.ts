import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { asFlag, FLAGS } from "./flags";
import { rollUp } from "./roll-up";

const flag = fc.constantFrom(...FLAGS);
const flags = (length: number) =>
  fc.array(flag, { minLength: length, maxLength: length }).map((list) => Uint8Array.from(list));

// Precedence: the open reference implementation of QARTOD (ioos_qc, qartod.py).
describe("the aggregate flag", () => {
  it("goes fail, suspect, pass, not evaluated, missing", () => {
    const [a, b] = [Uint8Array.of(4, 3, 1, 2, 9), Uint8Array.of(3, 1, 2, 9, 9)];
    expect([...rollUp([a, b], 5)]).toEqual([4, 3, 1, 2, 9]);
    expect([...rollUp([], 2)]).toEqual([2, 2]);
  });

  it("does not depend on the order of the tests, nor on one that is told twice", () => {
    fc.assert(
      fc.property(flags(8), flags(8), flags(8), (a, b, c) => {
        expect(rollUp([a, b, c], 8)).toEqual(rollUp([c, a, b, a], 8));
        expect(rollUp([rollUp([a, b], 8), c], 8)).toEqual(rollUp([a, rollUp([b, c], 8)], 8));
        expect(rollUp([a, a], 8)).toEqual(a);
      }),
    );
  });

  it("refuses flags that do not belong together", () => {
    expect(() => rollUp([new Uint8Array(3)], 4)).toThrow("A test has 3 flags for 4 samples.");
    expect(() => asFlag(5)).toThrow("5 is no quality flag.");
  });
});
