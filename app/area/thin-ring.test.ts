import { describe, expect, it } from "vitest";
import { BOX_LIMITS } from "./check-box";
import { measureBox } from "./measure-box";
import { thinRing } from "./thin-ring";
import type { Position } from "~/ocean/scenario";

function oval(corners: number, middle = -8.4): Position[] {
  return Array.from({ length: corners }, (_, k): Position => {
    const angle = (2 * Math.PI * k) / corners;
    return [middle + 0.05 * Math.cos(angle), 54.4 + 0.03 * Math.sin(angle)];
  });
}

describe("an outline of too many corners", () => {
  it("is thinned to what a study box may have, and its area stays", () => {
    const many = oval(20_000);
    const thinned = thinRing(many);
    expect(thinned?.ring.length).toBeLessThanOrEqual(BOX_LIMITS.corners + 1);
    expect(thinned?.deviation).toBeLessThan(20);
    const [before, after] = [many, thinned?.ring ?? []].map((ring) => measureBox(ring).areaKm2);
    expect(Math.abs(after / before - 1)).toBeLessThan(0.002);
  });

  it("is thinned across the antimeridian as anywhere", () => {
    const wrapped = oval(5000, 180).map(([x, y]): Position => [x > 180 ? x - 360 : x, y]);
    expect(measureBox(thinRing(wrapped)?.ring ?? []).areaKm2).toBeCloseTo(measureBox(oval(5000)).areaKm2, 0);
  });

  it("is given up where no outline of so few corners is a study box", () => {
    expect(thinRing(oval(1000).map(([x, y]): Position => [-8.4 + 80 * (x + 8.4), y]))).toBeNull();
  });
});
