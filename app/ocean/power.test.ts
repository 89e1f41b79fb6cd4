import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { power } from "./power";

describe("power", () => {
  it("is what the operator gives, to rounding", () => {
    const base = fc.double({ min: 1e-6, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(base, fc.double({ min: -8, max: 8, noNaN: true }), (x, y) => {
        expect(Math.abs(power(x, y) / x ** y - 1)).toBeLessThan(1e-13);
      }),
    );
  });

  it("multiplies whole exponents out, for numbers of any sign", () => {
    expect(power(-1.5, 3)).toBe(-1.5 * -1.5 * -1.5);
    expect(power(0.1, 4)).toBe(0.1 * 0.1 * 0.1 * 0.1);
    expect(power(7, 1)).toBe(7);
  });

  it("keeps to the operator at nothing and without end", () => {
    expect([power(0, 0), power(0, 0.3), power(0, 5), power(0, -0.5)]).toEqual([1, 0, 0, Number.POSITIVE_INFINITY]);
    expect(power(1e200, 2.5)).toBe(Number.POSITIVE_INFINITY);
    expect(power(-2, 0.5)).toBeNaN();
  });
});
