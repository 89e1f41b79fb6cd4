import { describe, expect, it } from "vitest";
import { parameterName, parameterValue, printedNumbers } from "./method-words";

describe("parameterValue", () => {
  it.each([
    [1.22, "1.22"],
    [0.000002, "2 × 10⁻⁶"],
    [-0.0000123, "−1.23 × 10⁻⁵"],
    [12_000_000, "1.2 × 10⁷"],
    [0, "0"],
    [3991.86795711963, "3991.86795711963"],
    [0.25 / 86_400, "2.89352 × 10⁻⁶"],
    [0.036199556126421804, "0.0361996"],
    [0.001, "0.001"],
    [-7, "−7"],
    [true, "yes"],
    [false, "no"],
    ["largePond1981", "Large and Pond (1981)"],
    ["linear", "linear"],
  ])("tells %j as %j", (value, text) => {
    expect(parameterValue(value)).toBe(text);
  });
});

describe("parameterName", () => {
  it("names what it knows and keeps the key of what it does not", () => {
    expect(parameterName("dragLaw")).toBe("Drag law");
    expect(parameterName("somethingNew")).toBe("somethingNew");
  });
});

describe("printedNumbers", () => {
  it("sets minus signs and powers of ten, and leaves ranges and words alone", () => {
    expect(printedNumbers("SA 0…42 g/kg, -2…40 °C; 7.29e-5 1/s; pages 29-43; wind-driven")).toBe(
      "SA 0…42 g/kg, −2…40 °C; 7.29 × 10⁻⁵ 1/s; pages 29-43; wind-driven",
    );
  });
});
