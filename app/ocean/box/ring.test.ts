import { describe, expect, it } from "vitest";
import type { Position } from "../scenario";
import { placeOf } from "./place";
import { ringArea, ringCentre } from "./ring";

const square: Position[] = [
  [10, 50],
  [11, 50],
  [11, 51],
  [10, 51],
];

describe("a box's ring", () => {
  it("has its centre in the middle, open or closed, either way round", () => {
    for (const ring of [square, [...square, square[0]], [...square].reverse()]) {
      expect(ringCentre(ring)[0]).toBeCloseTo(10.5, 9);
      expect(ringCentre(ring)[1]).toBeCloseTo(50.5, 9);
    }
  });

  it("has an area of a degree squared, to 1 %", () => {
    const degree = 111_195;
    const expected = degree * degree * Math.cos((50.5 * Math.PI) / 180);
    expect(Math.abs(ringArea(square) / expected - 1)).toBeLessThan(0.01);
  });

  it("stays in one piece across the antimeridian", () => {
    const fiji: Position[] = [
      [179.5, -17],
      [-179.5, -17],
      [-179.5, -16],
      [179.5, -16],
    ];
    expect(ringArea(fiji)).toBeLessThan(1.3e10);
    expect(ringCentre(fiji)[0]).toBeCloseTo(180, 9);
    expect(placeOf({ polygon: fiji }).f).toBeLessThan(0);
  });
});
