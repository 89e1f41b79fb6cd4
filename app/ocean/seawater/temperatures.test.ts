import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniformOrTiny as number } from "../../../tests/factories/uniform";
import { OceanError } from "../errors";
import { absoluteSalinity, practicalSalinity, practicalSalinityWarning, salinityRegion } from "./absolute-salinity";
import { conservativeFromPotential, potentialFromConservative } from "./conservative-temperature";
import { seawaterDensity } from "./density";
import {
  conservativeFromInSitu,
  inSituFromConservative,
  inSituFromPotential,
  potentialFromInSitu,
} from "./potential-temperature";

describe("temperatures and salinities there and back", () => {
  it("potential and Conservative Temperature", () => {
    fc.assert(
      fc.property(number(0, 42), number(-2, 40), (SA, pt) => {
        expect(Math.abs(potentialFromConservative(SA, conservativeFromPotential(SA, pt)) - pt)).toBeLessThan(1e-10);
      }),
    );
  });

  it("in-situ and Conservative Temperature at depth", () => {
    fc.assert(
      fc.property(number(0, 42), number(-2, 38), number(0, 6000), (SA, t, p) => {
        expect(Math.abs(inSituFromConservative(SA, conservativeFromInSitu(SA, t, p), p) - t)).toBeLessThan(1e-9);
        expect(Math.abs(inSituFromPotential(SA, potentialFromInSitu(SA, t, p), p) - t)).toBeLessThan(1e-9);
      }),
    );
  });

  it("Practical and Absolute Salinity, in the ocean and in the Baltic", () => {
    fc.assert(
      fc.property(number(2, 42), fc.constantFrom("ocean" as const, "baltic" as const), (SP, region) => {
        expect(practicalSalinity(absoluteSalinity(SP, region), region)).toBeCloseTo(SP, 11);
      }),
    );
    expect(practicalSalinityWarning(1)).toMatchObject({ code: "OUT_OF_RANGE", threshold: 2 });
    expect(practicalSalinityWarning(35)).toBeNull();
  });

  it.each([
    [58, 20, "baltic"],
    [65, 22, "baltic"],
    [58, 5, "ocean"],
    [55, 5, "ocean"],
    [45, 20, "ocean"],
    [70, 25, "ocean"],
  ] as const)("knows the Baltic from the ocean at %s° N %s° E", (latitude, longitude, region) => {
    expect(salinityRegion(latitude, longitude)).toBe(region);
  });
});

describe("seawater out of range", () => {
  it("warns beyond the fit and still answers", () => {
    const { rho, warnings } = seawaterDensity(50, 41, 0);
    expect(rho).toBeGreaterThan(1000);
    expect(warnings.map(({ threshold }) => threshold)).toEqual([42, 40]);
  });

  it.each([
    [-0.1, 10, 0],
    [61, 10, 0],
    [35, Number.NaN, 0],
    [35, 10, -1],
  ])("refuses SA %s, CT %s, p %s", (SA, CT, p) => {
    expect(() => seawaterDensity(SA, CT, p)).toThrow(OceanError);
  });
});
