import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { extremes } from "./extremes";
import { keepExtremes, openPauses } from "./thin-line";

describe("keepExtremes", () => {
  it("keeps everything where there is little", () => {
    expect(keepExtremes([3, 1, 2])).toEqual([0, 1, 2]);
    expect(keepExtremes([])).toEqual([]);
  });

  it("keeps the ends, the extremes and the gaps, in order, within the limit", () => {
    const sample = fc.oneof({ weight: 9, arbitrary: fc.integer({ min: -99, max: 99 }) }, fc.constant(Number.NaN));
    fc.assert(
      fc.property(fc.array(sample, { minLength: 61, maxLength: 2000 }), (values) => {
        const kept = keepExtremes(values, 60);
        expect(kept.length).toBeLessThanOrEqual(60);
        expect(kept).toEqual([...new Set(kept)].sort((a, b) => a - b));
        expect([kept[0], kept.at(-1)]).toEqual([0, values.length - 1]);
        const drawn = kept.map((index) => values[index] ?? Number.NaN);
        expect(extremes(drawn)?.min).toBe(extremes(values)?.min);
        expect(extremes(drawn)?.max).toBe(extremes(values)?.max);
        if (values.some(Number.isNaN)) expect(drawn.some(Number.isNaN)).toBe(true);
      }),
    );
  });

  it("keeps a single spike among ten thousand samples", () => {
    const values = new Float64Array(10_000);
    values[4321] = 50;
    expect(keepExtremes(values)).toContain(4321);
  });
});

describe("openPauses", () => {
  it("opens a line across a pause of more than three median steps, and only there", () => {
    expect(openPauses([0, 10, 20, 90, 100], [1, 2, 3, 4, 5])).toEqual({
      time: [0, 10, 20, 30, 90, 100],
      values: [1, 2, 3, Number.NaN, 4, 5],
    });
    expect(openPauses([0, 10, 40], [1, 2, 3]).values).toEqual([1, 2, 3]);
    expect(openPauses([5], [1])).toEqual({ time: [5], values: [1] });
  });
});
