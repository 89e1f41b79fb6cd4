import { describe, expect, it } from "vitest";
import { METHOD_KEYS, parameterText, scientific, tidyNumber } from "./method-parameters";
import { formValues, methodSheetSchema } from "./method-sheet-schema";
import { methodSchema } from "~/ocean/validation/scenario-schema";
import type { MethodChoices } from "~/ocean/scenario";

describe("methodSheetSchema", () => {
  it("takes what was filled in and leaves the rest to the defaults", () => {
    const form = {
      name: " Slab ",
      model: "slab",
      dampingRate: "2.9e-6",
      highWindCap: "30,5",
      rainHeat: "false",
      gravity: "",
    };
    expect(methodSheetSchema.parse(form)).toEqual({
      name: "Slab",
      choices: { model: "slab", dampingRate: 2.9e-6, highWindCap: 30.5, rainHeat: false },
      ensemble: null,
    });
  });

  it("says at the field what is wrong", () => {
    const read = methodSheetSchema.safeParse({ name: "x", model: "spiral", timeStep: "-1", gravity: "heavy" });
    const issues = read.error?.issues.map(({ path, message }) => [path.join("."), message]) ?? [];
    expect(issues.map(([path]) => path).sort()).toEqual(["gravity", "model", "timeStep"]);
    expect(Object.fromEntries(issues).timeStep).toContain("from 1 to 21600 s; it is -1");
    expect(Object.fromEntries(issues).gravity).toContain('it is the text "heavy"');
  });

  it("comes back from what it shows", () => {
    const choices: MethodChoices = { model: "column", gradientMixing: false, cellSize: 0.5, waterType: "II" };
    const ensemble = { members: 64, seed: 5 };
    expect(methodSheetSchema.parse(formValues("Column", choices, ensemble))).toEqual({
      name: "Column",
      choices,
      ensemble,
    });
    expect(methodSheetSchema.parse(formValues("Column", choices, null))).toEqual({
      name: "Column",
      choices,
      ensemble: null,
    });
  });

  it("asks for whole members within the engine's limits, and takes seed 1 where none is given", () => {
    expect(methodSheetSchema.parse({ name: "x", members: "200" }).ensemble).toEqual({ members: 200, seed: 1 });
    const wrong = methodSheetSchema.safeParse({ name: "x", members: "6000", seed: "0.5" });
    expect(wrong.error?.issues.map(({ path }) => path.join("."))).toEqual(["members", "seed"]);
  });

  it("offers every choice that the engine knows, and none that it does not", () => {
    expect([...METHOD_KEYS].sort()).toEqual(Object.keys(methodSchema.shape).sort());
  });
});

describe("numbers of a method", () => {
  it.each([
    [3991.86795711963, "3991.868"],
    [0.0388056, "0.0388"],
    [-1649.86, "−1649.86"],
    [2.8935e-6, "2.89 × 10⁻⁶"],
    [-5.04e7, "−5.04 × 10⁷"],
    [0, "0"],
  ])("%d is %s", (value, text) => {
    expect(tidyNumber(value)).toBe(text);
  });

  it("keep their unit, and options their words", () => {
    expect(parameterText("airDensity", 1.22, "kg/m³")).toBe("1.22\u00a0kg/m³");
    expect(parameterText("dragCoefficient", 0.0015, "1")).toBe("0.0015");
    expect(parameterText("rainHeat", true, "")).toBe("yes");
    expect(scientific(1e-13, 2)).toBe("1.0 × 10⁻¹³");
  });
});
