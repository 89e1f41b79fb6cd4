import { describe, expect, it } from "vitest";
import { meanArrows } from "./arrow-strip";

describe("meanArrows", () => {
  it("means directions as vectors, so that 350° and 10° meet in the north", () => {
    const [arrow] = meanArrows([0, 1], { towards: [350, 10], speed: [5, 5] }, [0, 1], 1);
    expect(arrow?.towards).toBeCloseTo(0, 9);
  });
  it("weighs by speed and leaves out gaps", () => {
    const [arrow] = meanArrows([0, 1, 2], { towards: [0, 90, Number.NaN], speed: [1, 1e9, 5] }, [0, 2], 1);
    expect(arrow?.towards).toBeCloseTo(90, 6);
  });
  it("draws none for calm, for gaps and where directions cancel out", () => {
    expect(meanArrows([0, 1], { towards: [0, 180], speed: [5, 5] }, [0, 1], 1)).toEqual([]);
    expect(meanArrows([0, 1], { towards: [0, 0], speed: [0, 0] }, [0, 1], 1)).toEqual([]);
    expect(meanArrows([0], { towards: [Number.NaN], speed: [3] }, [-1, 1], 1)).toEqual([]);
  });
});
