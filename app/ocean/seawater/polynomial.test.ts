import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { polynomial, polynomial2, polynomial3 } from "./polynomial";

const number = fc.double({ min: -2, max: 2, noNaN: true });

describe("polynomials", () => {
  it("sum their terms, whatever their order", () => {
    fc.assert(
      fc.property(number, number, number, (x, y, z) => {
        expect(
          polynomial2([
            [1, 2, 3],
            [0, 0, 5],
            [3, 0, -2],
          ])(x, y),
        ).toBeCloseTo(3 * x * y * y + 5 - 2 * x ** 3, 9);
        expect(
          polynomial3([
            [1, 0, 2, 4],
            [0, 3, 1, -1],
          ])(x, y, z),
        ).toBeCloseTo(4 * x * z * z - y ** 3 * z, 9);
        expect(polynomial([1, -2, 0.5], x)).toBeCloseTo(1 - 2 * x + 0.5 * x * x, 12);
      }),
    );
  });
});
