import { describe, expect, it } from "vitest";
import { CONSTANT_KINDS, constantLabel } from "./constant-kinds";
import { postedConstant } from "./posted-constant";

function form(fields: Record<string, string>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries(fields)) data.set(name, value);
  return data;
}

describe("constants over a storm", () => {
  it("turn inches an hour exactly into millimetres an hour", () => {
    const kind = CONSTANT_KINDS.find(({ id }) => id === "rain-in");
    expect(kind?.toSi).toBe(25.4);
  });

  it("are named as written", () => {
    const heat = CONSTANT_KINDS.find(({ id }) => id === "heat")!;
    expect(constantLabel(heat, -120.5)).toBe("constant net heat into the sea −120.5\u00a0W/m²");
  });

  it("are read with a decimal comma and a proper minus sign", () => {
    expect(postedConstant(form({ kind: "heat", value: "−120,5" }))).toMatchObject({ value: -120.5, replace: false });
  });

  it.each([
    ["rain-mm", "-1", "0 to 500 mm/h"],
    ["rain-mm", "", "0 to 500 mm/h"],
    ["heat", "NaN", "W/m²"],
    ["heat", "1e9", "W/m²"],
  ])("of kind %s refuse %j, with the limits", (kind, value, message) => {
    expect(() => postedConstant(form({ kind, value }))).toThrow(message);
  });

  it("refuse a kind that is not offered", () => {
    expect(() => postedConstant(form({ kind: "wind", value: "1" }))).toThrow("Choose what stays constant");
  });
});
