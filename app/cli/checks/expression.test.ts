import { describe, expect, it } from "vitest";
import { complex } from "~/ocean/complex";
import { OceanError } from "~/ocean/errors";
import { parseFormula } from "./expression";

const at = (text: string, variables: Record<string, number> = {}) =>
  parseFormula(text)(Object.fromEntries(Object.entries(variables).map(([name, value]) => [name, complex(value)])));

describe("formulas in words", () => {
  it("knows the order of the signs and a blank for multiplication", () => {
    expect(at("-250+100 sin(i/10)", { i: 5 }).re).toBeCloseTo(-250 + 100 * Math.sin(0.5), 12);
    expect(at("2+3*4^2/8-1").re).toBe(7);
    expect(at("-2^2").re).toBe(-4);
    expect(at("20-N2 z/(g alpha)", { N2: 2e-4, z: 10, g: 9.81, alpha: 2e-4 }).re).toBeCloseTo(
      20 - 2e-3 / (9.81 * 2e-4),
      12,
    );
  });

  it("works with complex numbers", () => {
    const formula = parseFormula("0.8 exp(i*idx/60)(1+sin(idx/30))/2");
    const value = formula({ i: complex(0, 1), idx: complex(90) });
    const size = (0.8 * (1 + Math.sin(3))) / 2;
    expect(value.re).toBeCloseTo(size * Math.cos(1.5), 12);
    expect(value.im).toBeCloseTo(size * Math.sin(1.5), 12);
  });

  it("takes the larger and the smaller", () => {
    expect(at("300 max(0,sin(i/20))", { i: 70 }).re).toBe(0);
    expect(at("min(3, 2, 5)").re).toBe(2);
  });

  it.each(["", "1+", "sin 3", "(1", "1)", "#", "unknown(2)", "1..2", "2 3"])("refuses %j", (text) => {
    expect(() => parseFormula(text)({})).toThrow(OceanError);
  });
});
