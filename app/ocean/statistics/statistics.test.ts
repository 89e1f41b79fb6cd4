import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { latinHypercube } from "./latin-hypercube";
import { morrisEffects } from "./morris";
import { mulberry32 } from "./mulberry32";
import { quantile, quantiles } from "./quantile";
import { sobolIndices } from "./sobol";

describe("statistics", () => {
  it("hits every stratum of every dimension exactly once", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 60 }),
        fc.integer({ min: 1, max: 6 }),
        fc.integer({ min: 0, max: 1e6 }),
        (n, d, seed) => {
          const sample = latinHypercube(n, d, seed);
          for (let dimension = 0; dimension < d; dimension++) {
            const strata = new Set(sample.map((row) => Math.floor(row[dimension] * n)));
            expect(strata.size).toBe(n);
          }
          expect(latinHypercube(n, d, seed)).toEqual(sample);
        },
      ),
    );
  });

  it("orders quantiles and stays within the values", () => {
    const values = fc.array(fc.double({ min: -1e6, max: 1e6, noNaN: true }), { minLength: 1, maxLength: 40 });
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(values, share, share, (list, a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        expect(quantile(list, low)).toBeLessThanOrEqual(quantile(list, high) + 1e-9);
        expect(quantile(list, 0)).toBe(Math.min(...list) + 0);
        expect(quantile(list, 1)).toBe(Math.max(...list) + 0);
      }),
    );
    for (const wrong of [Number.NaN, Infinity, -Infinity]) {
      expect(() => quantile([1, wrong, 2, 3], 0.1)).toThrow(/finite/);
    }
    expect(quantiles([3, 1, 2], [0, 0.25, 1])).toEqual([1, 1.5, 3]);
    expect(() => quantile([1], 1.5)).toThrow();
  });

  it("draws numbers that are evenly spread and refuses seeds that are none", () => {
    const random = mulberry32(3);
    const draws = Array.from({ length: 20_000 }, () => random());
    expect(draws.reduce((sum, u) => sum + u, 0) / draws.length).toBeCloseTo(0.5, 2);
    expect(Math.max(...draws)).toBeLessThan(1);
    for (const seed of [-1, 0.5, Number.NaN, 2 ** 32]) expect(() => mulberry32(seed)).toThrow(/seed/);
  });

  it("says nothing about the sensitivity of what does not vary", () => {
    expect(sobolIndices(() => 3, 2, 16, 1)).toEqual({ first: [null, null], total: [null, null] });
  });

  it("sees curvature as spread of the elementary effects", () => {
    const { muStar, sigma } = morrisEffects(([x, y]) => x * x + 2 * y, 2, { levels: 4, trajectories: 30, seed: 2 });
    expect(muStar[1]).toBeCloseTo(2, 12);
    expect(sigma[1]).toBeCloseTo(0, 12);
    expect(sigma[0]).toBeGreaterThan(0.1);
  });
});
