import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatBearing, formatNumber, formatQuantity, formatRange, fromDisplay, toDisplay } from "./format-quantity";
import { QUANTITIES, type QuantityId } from "./quantities";
import { DEFAULT_UNITS, type UnitChoices } from "./unit-choices";

const metric = DEFAULT_UNITS;
const sea: UnitChoices = {
  speed: "kn",
  rain: "in/h",
  length: "ft",
  distance: "nm",
  salinity: "PSS-78",
  temperature: "°C",
};

describe("conversions (BIPM SI Brochure, NIST SP 811: exact by definition; from memory)", () => {
  it.each([
    ["windSpeed10", 1852 / 3600, 1],
    ["windSpeed10", 1, 3600 / 1852],
    ["windSpeed10", 20, 38.876889848812095],
    ["rainRate", 25.4, 1],
    ["rainTotal", 254, 10],
    ["layerDepth", 0.3048, 1],
    ["layerDepth", 1, 3.280839895013123],
    ["displacement", 1852, 1],
    ["displacement", 92_600, 50],
    ["area", 1852 * 1852, 1],
  ] as [QuantityId, number, number][])("%s: %d in SI is %d at sea", (id, si, shown) => {
    expect(toDisplay(si, id, sea)).toBeCloseTo(shown, 12);
  });

  it("turns Absolute Salinity to Practical Salinity by 35 ÷ 35.16504 (Millero et al. 2008)", () => {
    expect(toDisplay(35.16504, "salinity", sea)).toBe(35);
    expect(fromDisplay(35, "salinity", sea)).toBe(35.16504);
  });

  it("comes back from every unit of every quantity", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...(Object.keys(QUANTITIES) as QuantityId[])),
        fc.double({ min: -1e6, max: 1e6, noNaN: true }),
        fc.constantFrom(metric, sea),
        (id, value, choices) => {
          const back = fromDisplay(toDisplay(value, id, choices), id, choices);
          expect(Math.abs(back - value)).toBeLessThanOrEqual(1e-12 * Math.max(1, Math.abs(value)));
        },
      ),
    );
  });
});

describe("formatQuantity", () => {
  it("gives number, unit and both", () => {
    expect(formatQuantity(31.94, "salinity", metric)).toEqual({ number: "31.9", unit: "g/kg", text: "31.9\u00a0g/kg" });
    expect(formatQuantity(84_230, "displacement", metric).text).toBe("84.2\u00a0km");
    expect(formatQuantity(84_230, "displacement", sea).text).toBe("45.5\u00a0nm");
    expect(formatQuantity(1.624, "stress", metric).text).toBe("1.62\u00a0N/m²");
    expect(formatQuantity(310_000, "transportTotal", metric).text).toBe("310\u00a0million m³/km");
    expect(formatQuantity(0.334, "share", metric).text).toBe("33\u00a0%");
    expect(formatQuantity(19 * 3600, "duration", metric, { decimals: 0 }).text).toBe("19\u00a0h");
  });

  it("writes a proper minus sign, a plus sign where asked, and never a negative zero", () => {
    expect(formatQuantity(-0.91, "temperatureChange", metric).number).toBe("−0.9");
    expect(formatQuantity(0.91, "temperatureChange", metric, { sign: true }).number).toBe("+0.9");
    expect(formatQuantity(-0.01, "temperatureChange", metric, { sign: true }).number).toBe("0.0");
  });

  it.each([null, undefined, Number.NaN, Number.POSITIVE_INFINITY])("says so when there is no value: %s", (value) => {
    expect(formatQuantity(value, "salinity", metric).text).toBe("no value");
  });

  it("always ends in a unit", () => {
    for (const id of Object.keys(QUANTITIES) as QuantityId[]) {
      for (const choices of [metric, sea]) {
        const shown = formatQuantity(1, id, choices);
        expect(shown.unit).not.toBe("");
        expect(shown.text.endsWith(shown.unit)).toBe(true);
      }
    }
  });

  it("groups from five digits on", () => {
    expect(formatNumber(9999, 0)).toBe("9999");
    expect(formatNumber(-1234567.891, 1)).toBe("−1\u00a0234\u00a0567.9");
  });
});

describe("formatRange", () => {
  it("names the unit once", () => {
    expect(formatRange(31.6, 32.2, "salinity", metric)).toBe("31.6 to 32.2\u00a0g/kg");
    expect(formatRange(8, 350, "direction", metric)).toBe("008° to 350°");
    expect(formatRange(1, null, "salinity", metric)).toBe("no value");
  });
});

describe("formatBearing", () => {
  it.each([
    [128.4, "128°"],
    [359.6, "000°"],
    [-90, "270°"],
    [8, "008°"],
    [null, "no direction"],
  ])("%s is %s", (degrees, text) => {
    expect(formatBearing(degrees)).toBe(text);
  });
});
