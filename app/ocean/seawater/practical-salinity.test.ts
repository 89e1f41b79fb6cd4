import { describe, expect, it } from "vitest";
import { salinityFromConductivity, salinityFromRatio } from "./practical-salinity";

describe("practical salinity", () => {
  // Check values of Fofonoff & Millard (1983), UNESCO 44, section 1 (from memory).
  it.each([
    [1, 15, 0, 35],
    [1.2, 20, 2000, 37.245628],
    [0.65, 5, 1500, 27.995347],
  ])("of a ratio %d at %d °C and %d dbar is %d", (R, t68, p, S) => {
    expect(salinityFromRatio(R, t68, p)).toBeCloseTo(S, 6);
  });

  it("is 35 for standard seawater in the temperatures of today", () => {
    expect(salinityFromConductivity(4.2914, 15 / 1.00024, 0)).toBeCloseTo(35, 6);
  });

  it("refuses what is no conductivity", () => {
    expect(() => salinityFromConductivity(0, 10, 0)).toThrow(/exceed 0 S\/m/);
    expect(() => salinityFromConductivity(NaN, 10, 0)).toThrow();
  });
});
