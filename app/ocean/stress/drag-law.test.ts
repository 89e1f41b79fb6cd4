import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniformOrTiny } from "../../../tests/factories/uniform";
import { DRAG_LAWS } from "../scenario";
import { dragCoefficient, dragLaw, dragRangeWarning, LAW_RANGES } from "./drag-law";
import { windStress } from "./wind-stress";

describe("drag laws", () => {
  it.each(DRAG_LAWS)("%s is finite and not negative at any wind", (id) => {
    const law = dragLaw(id);
    fc.assert(
      fc.property(uniformOrTiny(0, 150), (wind) => {
        expect(law(wind)).toBeGreaterThanOrEqual(0);
        expect(law(wind)).toBeLessThan(0.03);
      }),
    );
  });

  it.each(DRAG_LAWS)("%s is held above its cap", (id) => {
    const law = dragLaw(id, { highWindCap: 20 });
    expect(law(45)).toBe(law(20));
    expect(law(20)).toBe(dragLaw(id)(20));
  });

  it("gives no stress in a calm, whatever the law says there", () => {
    for (const id of DRAG_LAWS) expect(windStress(0, 0, dragLaw(id), 1.22)).toEqual({ x: 0, y: 0 });
  });

  it("points the stress with the wind", () => {
    fc.assert(
      fc.property(uniformOrTiny(-60, 60), uniformOrTiny(-60, 60), (u, v) => {
        const stress = windStress(u, v, dragLaw("largeYeager2009"), 1.22);
        expect(Math.abs(stress.x * v - stress.y * u)).toBeLessThan(
          1e-9 * (1 + Math.hypot(stress.x, stress.y) * Math.hypot(u, v)),
        );
        expect(stress.x * u + stress.y * v).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it("warns outside the range a law is stated for", () => {
    expect(dragRangeWarning("largePond1981", 30)).toMatchObject({
      code: "OUT_OF_RANGE",
      threshold: LAW_RANGES.largePond1981[1],
    });
    expect(dragRangeWarning("largePond1981", 3)).toMatchObject({ threshold: 4 });
    expect(dragRangeWarning("largePond1981", 10)).toBeNull();
  });

  it("refuses a law that does not exist, even one that every object has", () => {
    for (const id of ["mine", "toString", "constructor"]) {
      expect(() => dragCoefficient(id as "constant", 10)).toThrow(/Unknown drag law/);
    }
  });
});
