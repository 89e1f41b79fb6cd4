import { describe, expect, it } from "vitest";
import { clipRing } from "./land-marks";
import { planeFrame } from "./plane-frame";

const frame = {
  ...planeFrame([0], [0], 300, 1),
  xDomain: [0, 10] as [number, number],
  yDomain: [0, 10] as [number, number],
};
const area = (ring: { x: number; y: number }[]) =>
  Math.abs(ring.reduce((sum, { x, y }, i) => sum + x * (ring.at(i - 1)?.y ?? 0) - y * (ring.at(i - 1)?.x ?? 0), 0)) / 2;
const square = (from: number, to: number) => [
  { x: from, y: from },
  { x: to, y: from },
  { x: to, y: to },
  { x: from, y: to },
];

describe("clipRing", () => {
  it("leaves what lies inside, drops what lies outside, cuts what crosses", () => {
    expect(clipRing(square(2, 4), frame)).toEqual(square(2, 4));
    expect(clipRing(square(20, 40), frame)).toEqual([]);
    expect(area(clipRing(square(5, 15), frame))).toBeCloseTo(25, 12);
    expect(area(clipRing(square(-5, 15), frame))).toBeCloseTo(100, 12);
  });
});

describe("planeFrame", () => {
  it("has one scale both ways and holds every point", () => {
    for (const [x, y] of [
      [
        [0, 80],
        [0, -45],
      ],
      [
        [0, 1],
        [0, 500],
      ],
      [
        [3, 3],
        [4, 4],
      ],
    ] as [number[], number[]][]) {
      const made = planeFrame(x, y, 640, 0.5);
      const [across, up] = [made.xDomain[1] - made.xDomain[0], made.yDomain[1] - made.yDomain[0]];
      const pxAcross = made.width - made.marginLeft - made.marginRight;
      const pxUp = made.height - made.marginTop - made.marginBottom;
      expect(across / pxAcross / (up / pxUp)).toBeCloseTo(1, 2);
      for (const value of x) expect(value >= made.xDomain[0] && value <= made.xDomain[1]).toBe(true);
      for (const value of y) expect(value >= made.yDomain[0] && value <= made.yDomain[1]).toBe(true);
    }
  });
});
