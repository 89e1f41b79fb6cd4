import { describe, expect, it } from "vitest";
import { chanceRatio, correlationRatio } from "./correlation-ratio";
import { latinHypercube } from "./latin-hypercube";
import { ishigami, sobolIndices } from "./sobol";

const MEMBERS = 4000;
const GROUPS = 40;
const column = (rows: number[][], k: number) => rows.map((row) => row[k]);

describe("correlation ratio", () => {
  it("finds the first-order indices of the Ishigami function, 0.3139, 0.4424 and 0 for a = 7, b = 0.1 (closed form)", () => {
    const rows = latinHypercube(MEMBERS, 3, 5);
    const y = rows.map((row) => ishigami(row, 7, 0.1));
    const found = [0, 1, 2].map((k) => correlationRatio(column(rows, k), y, GROUPS) ?? NaN);
    [0.3139, 0.4424, 0].forEach((index, k) => expect(Math.abs(found[k] - index)).toBeLessThan(0.03));
  });

  it("finds those of a linear function, known from its coefficients", () => {
    const rows = latinHypercube(MEMBERS, 4, 6);
    const weights = [4, 2, 1, 0];
    const y = rows.map((row) => row.reduce((sum, u, k) => sum + weights[k] * u, 1000));
    const whole = weights.reduce((sum, weight) => sum + weight * weight, 0);
    weights.forEach((weight, k) =>
      expect(Math.abs((correlationRatio(column(rows, k), y, GROUPS) ?? NaN) - (weight * weight) / whole)).toBeLessThan(
        0.01,
      ),
    );
  });

  it("agrees with the estimate from runs made for it", () => {
    const model = ([a, b, c]: readonly number[]) => Math.exp(a) * (1 + b) + 0.3 * c * c;
    const rows = latinHypercube(MEMBERS, 3, 9);
    const y = rows.map(model);
    const { first } = sobolIndices(model, 3, MEMBERS, 11);
    first.forEach((index, k) =>
      expect(Math.abs((correlationRatio(column(rows, k), y, GROUPS) ?? NaN) - (index ?? NaN))).toBeLessThan(0.05),
    );
  });

  it.each([
    [64, 4],
    [200, 8],
    [1000, 25],
  ])("of %d members in %d groups passes the ratio of chance once in 25 times where there is no effect", (n, groups) => {
    const rows = latinHypercube(n, 401, 3);
    const y = column(rows, 0);
    const found = Array.from({ length: 400 }, (_, k) => correlationRatio(column(rows, k + 1), y, groups) ?? NaN);
    const passed = found.filter((ratio) => ratio > chanceRatio(n, groups)).length;
    // 16 expected; within three standard deviations of the count, rounded up.
    expect(Math.abs(passed - 16)).toBeLessThanOrEqual(12);
    expect(found.filter((ratio) => ratio === 0).length).toBeGreaterThan(100);
  });

  it("has no answer where nothing varies, and refuses what it cannot group", () => {
    expect(correlationRatio([0.1, 0.3, 0.6, 0.9], [5, 5, 5, 5], 2)).toBeNull();
    expect(correlationRatio([0.1, 0.3, 0.6, 0.9], [0, 0, 0, 0], 2)).toBeNull();
    expect(() => correlationRatio([0.1, 0.3], [1, 2, 3, 4], 2)).toThrow(/cannot be parted/);
    expect(() => correlationRatio([0.1, 0.3, 0.5, 0.7], [1, 2, 3, 4], 3)).toThrow(/cannot be parted/);
  });
});
