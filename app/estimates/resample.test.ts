import { describe, expect, it } from "vitest";
import { heldAt, lastAtOrBefore, linearAt, unionAxis } from "./resample";

const samples = { time: [0, 10, 30], values: [1, 3, -1] };

describe("resampling", () => {
  it.each([
    [-5, 1],
    [0, 1],
    [5, 2],
    [10, 3],
    [20, 1],
    [30, -1],
    [99, -1],
  ])("is linear between samples and flat beyond: at %d s %d", (moment, value) => {
    expect(linearAt(samples, moment)).toBe(value);
  });

  it.each([
    [-5, Number.NaN],
    [0, 1],
    [9.9, 1],
    [10, 3],
    [29, 3],
    [99, -1],
  ])("holds a value until the next: at %d s %d", (moment, value) => {
    expect(heldAt(samples, moment)).toBe(value);
  });

  it("finds the sample at or before a moment", () => {
    expect([-1, 0, 9, 10, 31].map((moment) => lastAtOrBefore(samples.time, moment))).toEqual([-1, 0, 0, 1, 2]);
    expect(lastAtOrBefore([], 5)).toBe(-1);
  });

  it("takes every time once, the ends too, and none outside them", () => {
    expect(unionAxis([[0, 10, 20], [5, 10], [99]], 3, 18)).toEqual([3, 5, 10, 18]);
  });
});
