import { describe, expect, it } from "vitest";
import { CHANNEL_QUANTITIES, conversionLabel, FILE_UNITS, unitById, unitFromText, unitsFor } from "./file-units";

describe("FILE_UNITS", () => {
  it("has unique ids, and no writing that means two units", () => {
    const ids = FILE_UNITS.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    const writings = FILE_UNITS.flatMap(({ written }) => written);
    expect(writings.filter((writing, index) => writings.indexOf(writing) !== index)).toEqual([]);
  });

  it.each([
    // Source: BIPM SI Brochure table 8 (nautical mile 1852 m) and NIST SP 811 appendix B.8.
    ["kn", 10, 5.144444444],
    ["mph", 10, 4.4704],
    ["ft/s", 10, 3.048],
    ["°F", 212, 100],
    ["K", 273.15, 0],
    ["inHg", 29.92, 1013.2076],
    ["in", 1, 25.4],
    ["kg/m²/s", 1.1666667e-3, 4.2],
    ["MJ/m²/day", 8.64, 100],
    ["Ly", 1, 41840],
  ])("turns %s right", (id, value, expected) => {
    const unit = unitById(id);
    expect(unit).not.toBeNull();
    expect((value - (unit?.zero ?? NaN)) * (unit?.factor ?? NaN)).toBeCloseTo(expected, 3);
  });

  it.each([
    ["M/S", "m/s"],
    ["m s**-1", "m/s"],
    ["m s⁻¹", "m/s"],
    ["Kts", "kn"],
    ["KJ/m²", "kJ/m²"],
    ["W m^-2", "W/m²"],
    ["° (gr)", "deg"],
    ["mB", "hPa"],
    ["ºC", "°C"],
    ["kg m-2 s-1", "kg/m²/s"],
  ])("knows %s", (written, id) => {
    expect(unitFromText(written)?.id).toBe(id);
  });

  it("takes m/s of rain for a depth of water", () => {
    expect(unitFromText("m s-1", "rain")?.id).toBe("m/s of water");
    expect(unitFromText("furlong")).toBeNull();
  });

  it("offers at least one unit for every role, and labels only what changes", () => {
    for (const role of Object.keys(CHANNEL_QUANTITIES) as (keyof typeof CHANNEL_QUANTITIES)[]) {
      expect(unitsFor(role).length).toBeGreaterThan(0);
    }
    const label = (id: string): string =>
      conversionLabel(unitById(id) ?? (FILE_UNITS[0] as (typeof FILE_UNITS)[number]), "m/s");
    expect(label("kn")).toBe("knots to m/s (× 0.514444)");
    expect(label("m/s")).toBe("");
  });
});
