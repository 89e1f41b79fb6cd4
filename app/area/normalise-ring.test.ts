import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniformOrTiny } from "../../tests/factories/uniform";
import { normaliseRing } from "./normalise-ring";
import { unwrapRing } from "./ring";
import type { Position } from "~/ocean/scenario";

const clockwise: Position[] = [
  [0, 50],
  [0, 51],
  [1, 51],
  [1, 50],
];

describe("normaliseRing", () => {
  it("turns a clockwise ring and keeps its first corner (RFC 7946, 3.1.6)", () => {
    expect(normaliseRing(clockwise)).toEqual([
      [0, 50],
      [1, 50],
      [1, 51],
      [0, 51],
      [0, 50],
    ]);
  });

  it("drops repeated corners and brings longitudes to ±180", () => {
    const ring: Position[] = [
      [359, 10],
      [359, 10],
      [361, 10],
      [360, 11],
      [-1, 10],
    ];
    expect(normaliseRing(ring)).toEqual([
      [-1, 10],
      [1, 10],
      [0, 11],
      [-1, 10],
    ]);
  });

  it("gives nothing for nothing", () => {
    expect(normaliseRing([])).toEqual([]);
  });

  it("is counter-clockwise, closed and the same when done twice, wherever the ring lies", () => {
    const rings = fc.tuple(uniformOrTiny(-400, 400), uniformOrTiny(-80, 79), fc.boolean()).map(([x, y, turned]) => {
      const ring: Position[] = [
        [x, y],
        [x + 2, y],
        [x + 1, y + 1],
      ];
      return turned ? ring.reverse() : ring;
    });
    fc.assert(
      fc.property(rings, (ring) => {
        const normal = normaliseRing(ring);
        expect(normal).toHaveLength(4);
        expect(normal[3]).toEqual(normal[0]);
        expect(normal.every(([x]) => Math.abs(x) <= 180)).toBe(true);
        const [[ax, ay], [bx, by], [cx, cy]] = unwrapRing(normal);
        expect((bx - ax) * (cy - ay) - (cx - ax) * (by - ay)).toBeGreaterThan(1.98);
        expect(normaliseRing(normal)).toEqual(normal);
      }),
    );
  });
});
