import { describe, expect, it } from "vitest";
import { cellText, columnDecimals } from "./table-text";

const table = (values: (number | null)[], decimals?: number) => ({
  columns: [{ name: "x", unit: "m", decimals }],
  rows: values.map((value) => [value]),
});

describe("columnDecimals", () => {
  it.each([
    [[33.61, 31.9], undefined, 3],
    [[1022.663], undefined, 2],
    [[123456.7], undefined, 0],
    [[1, 2, null], undefined, 0],
    [[null], undefined, 0],
    [[1.23456], 1, 1],
  ])("%j with %s of its own is read with %d", (values, own, expected) => {
    expect(columnDecimals(table(values, own), 0)).toBe(expected);
  });
});

describe("cellText", () => {
  it("rounds numbers, keeps text, and says where there is none", () => {
    expect(cellText(-1.256, 2)).toBe("−1.26");
    expect(cellText("2026-11-03T00:00:00Z", 2)).toBe("2026-11-03T00:00:00Z");
    expect(cellText(null, 2)).toBe("no value");
  });
});
