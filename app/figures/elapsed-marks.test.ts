import { describe, expect, it } from "vitest";
import { elapsedMarks } from "./elapsed-marks";

const hours = (...values: number[]) => values.map((value) => 1000 + value * 3600);

describe("elapsedMarks", () => {
  it("takes samples that fall on the marks as they are", () => {
    expect(elapsedMarks(hours(0, 12, 24), [0, 1, 4], [0, -1, -2], 12)).toEqual([
      { hours: 0, x: 0, y: 0 },
      { hours: 12, x: 1, y: -1 },
      { hours: 24, x: 4, y: -2 },
    ]);
  });

  it("is linear between unequal samples", () => {
    expect(elapsedMarks(hours(0, 6, 36), [0, 0, 30], [0, 6, 6], 12)).toEqual([
      { hours: 0, x: 0, y: 0 },
      { hours: 12, x: 6, y: 6 },
      { hours: 24, x: 18, y: 6 },
      { hours: 36, x: 30, y: 6 },
    ]);
  });

  it("leaves out marks within a gap, and copes with one sample or none", () => {
    const gap = elapsedMarks(hours(0, 10, 20, 24), [0, Number.NaN, 2, 3], [0, 0, 0, 0], 12);
    expect(gap.map((mark) => mark.hours)).toEqual([0, 24]);
    expect(elapsedMarks(hours(0), [1], [2], 12)).toEqual([{ hours: 0, x: 1, y: 2 }]);
    expect(elapsedMarks([], [], [], 12)).toEqual([]);
  });
});
