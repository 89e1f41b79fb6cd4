import { describe, expect, it } from "vitest";
import { bearingOf, compassLetters, compassWord } from "./compass";

describe("compass", () => {
  it.each([
    [0, "north", "N"],
    [128, "south-east", "SE"],
    [112.5, "south-east", "ESE"],
    [359, "north", "N"],
    [-45, "north-west", "NW"],
    [202, "south", "SSW"],
  ])("%d° is %s, %s", (degrees, word, letters) => {
    expect(compassWord(degrees)).toBe(word);
    expect(compassLetters(degrees)).toBe(letters);
  });
});

describe("bearingOf", () => {
  it.each([
    [0, 1, 0],
    [1, 0, 90],
    [0, -2, 180],
    [-3, 0, 270],
    [1, 1, 45],
  ])("(%d, %d) points to %d°", (east, north, bearing) => {
    expect(bearingOf(east, north)).toBeCloseTo(bearing, 12);
  });
  it("has none without length or with a gap", () => {
    expect(bearingOf(0, 0)).toBeNull();
    expect(bearingOf(Number.NaN, 1)).toBeNull();
  });
});
