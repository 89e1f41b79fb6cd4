import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { niceAxis } from "./nice-ticks";

describe("niceAxis", () => {
  it.each([
    [0, 25.4, 4, { domain: [0, 30], ticks: [0, 10, 20, 30], decimals: 0 }],
    [32.03, 33.6, 4, { domain: [32, 34], ticks: [32, 32.5, 33, 33.5, 34], decimals: 1 }],
    [-0.25, 0.1, 4, { domain: [-0.3, 0.1], ticks: [-0.3, -0.2, -0.1, 0, 0.1], decimals: 1 }],
    [7, 7, 2, { domain: [6.5, 7.5], ticks: [6.5, 7, 7.5], decimals: 1 }],
  ])("from %d to %d in about %d steps", (low, high, count, expected) => {
    expect(niceAxis(low, high, count)).toEqual(expected);
  });

  it("holds the interval, in ascending ticks of equal steps", () => {
    const number = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(number, number, fc.integer({ min: 1, max: 12 }), (a, b, count) => {
        fc.pre(Math.abs(a - b) > 1e-6);
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        const { domain, ticks } = niceAxis(low, high, count);
        const slack = 1e-8 * (high - low);
        expect(domain[0]).toBeLessThanOrEqual(low + slack);
        expect(domain[1]).toBeGreaterThanOrEqual(high - slack);
        expect(ticks.length).toBeGreaterThanOrEqual(2);
        expect(ticks.length).toBeLessThanOrEqual(count + 3);
        expect([ticks[0], ticks.at(-1)]).toEqual(domain);
      }),
    );
  });
});
