import { describe, expect, it } from "vitest";
import { correlationRatio } from "./correlation-ratio";
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

  it("is near zero for what has no effect, even in few groups of few members", () => {
    const rows = latinHypercube(100, 2, 3);
    expect(correlationRatio(column(rows, 1), column(rows, 0), 4)).toBeLessThan(0.15);
  });

  it("has no answer where nothing varies, and refuses what it cannot group", () => {
    expect(correlationRatio([0.1, 0.3, 0.6, 0.9], [5, 5, 5, 5], 2)).toBeNull();
    expect(correlationRatio([0.1, 0.3, 0.6, 0.9], [0, 0, 0, 0], 2)).toBeNull();
    expect(() => correlationRatio([0.1, 0.3], [1, 2, 3, 4], 2)).toThrow(/cannot be parted/);
    expect(() => correlationRatio([0.1, 0.3, 0.5, 0.7], [1, 2, 3, 4], 3)).toThrow(/cannot be parted/);
  });
});
