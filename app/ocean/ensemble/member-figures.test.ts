import { describe, expect, it } from "vitest";
import { sampleResponse } from "../../../tests/factories/response";
import type { Headline } from "../response";
import { quantile } from "../statistics/quantile";
import { memberFigures } from "./member-figures";

const { headline } = sampleResponse();
const member = (drift: number, step: number | null): Headline => ({
  ...headline,
  peakDrift: { ...headline.peakDrift, value: drift },
  densityStep: { value: step },
});

describe("the headline figures of members", () => {
  it("are sorted, and leave out what is not known", () => {
    const figures = memberFigures([member(0.5, null), member(0.2, 1.5), member(0.3, null)]);
    expect(figures.peakDrift).toEqual([0.2, 0.3, 0.5]);
    expect(figures.densityStep).toEqual([1.5]);
    expect(memberFigures([member(0.1, null)]).densityStep).toBeUndefined();
  });

  it("are at most 400, with their ends and percentiles, of however many members", () => {
    // Squares: not evenly spread, so that a thinning that leans to one side shows in its percentiles.
    const values = Array.from({ length: 5000 }, (_, k) => (k / 4999) ** 2);
    const kept = memberFigures(values.map((value) => member(value, null))).peakDrift ?? [];
    expect(kept).toHaveLength(400);
    expect([kept.at(0), kept.at(-1)]).toEqual([0, 1]);
    for (const p of [0.1, 0.5, 0.9]) expect(quantile(kept, p)).toBeCloseTo(quantile(values, p), 3);
  });
});
