import { describe, expect, it } from "vitest";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import { waterSchema } from "./water-schema";

const good = {
  name: "Outer bay",
  source: "CTD cast of 2026-10-30",
  salinityScale: "absolute",
  temperature: 14.2,
  salinity: 33.6,
  layerDepth: 12.5,
  belowTemperature: 11.8,
  belowSalinity: 34.4,
};

/** Messages by field. */
function errorsOf(changes: Record<string, unknown>, units = DEFAULT_UNITS): Record<string, string> {
  const parsed = waterSchema(units).safeParse({ ...good, ...changes });
  return Object.fromEntries((parsed.error?.issues ?? []).map(({ path, message }) => [path.join("."), message]));
}

describe("the form of a water column", () => {
  it("takes a column that is whole", () => {
    expect(errorsOf({})).toEqual({});
  });

  it("takes a column without water below", () => {
    expect(errorsOf({ belowTemperature: undefined, belowSalinity: undefined })).toEqual({});
  });

  it("wants both numbers of the water below or neither", () => {
    expect(Object.keys(errorsOf({ belowSalinity: undefined }))).toEqual(["belowSalinity"]);
    expect(Object.keys(errorsOf({ belowTemperature: undefined }))).toEqual(["belowTemperature"]);
  });

  it("refuses a column that would turn over, with both densities", () => {
    const message = errorsOf({ belowTemperature: 18, belowSalinity: 30 }).belowTemperature;
    expect(message).toMatch(/σ0 21\.35 kg\/m³.*lighter.*σ0 24\.95 kg\/m³/);
  });

  it.each([
    ["temperature", 58, "°F"],
    ["temperature", -2.4, "freezes"],
    ["salinity", -1, "negative"],
    ["salinity", 43, "42"],
    ["layerDepth", 0, "0.1 m"],
    ["layerDepth", 2000, "1000 m"],
    ["name", "  ", "name"],
    ["source", "", "come from"],
  ])("refuses %s %j", (field, value, message) => {
    expect(errorsOf({ [field]: value })[field]).toContain(message);
  });

  it("stores metres where feet are typed, without the noise of the conversion", () => {
    const feet = { ...DEFAULT_UNITS, length: "ft" as const };
    // 41.01049869 ft is 12.5 m (1 ft is 0.3048 m, exact by definition).
    expect(waterSchema(feet).parse({ ...good, layerDepth: 41.01049869 }).layerDepth).toBe(12.5);
    expect(errorsOf({ layerDepth: 4000 }, feet).layerDepth).toContain("ft");
  });
});
