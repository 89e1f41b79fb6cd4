import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { z } from "zod";
import { CHECK_METHODS } from "../../app/cli/check-methods";
import { checkCaseSchema, runCase } from "../../app/cli/checks/run-case";

/** Published values, reference libraries and independent computations, each with its source beside it. */
const CASES = z
  .array(checkCaseSchema)
  .parse(JSON.parse(readFileSync(new URL("./engine-checks.json", import.meta.url), "utf8")));

/** As explained in README.md. */
const KINDS = ["published", "reference-library", "independent-computation", "common-practice", "memory"];

describe("the engine against outside values", () => {
  it("has a source and a known kind of source for every case, and a method that the engine has", () => {
    expect(CASES.filter(({ source, sourceKind }) => !source || !KINDS.includes(sourceKind ?? ""))).toEqual([]);
    expect(CASES.filter(({ method }) => !Object.hasOwn(CHECK_METHODS, method))).toEqual([]);
    expect(new Set(CASES.map(({ id }) => id)).size).toBe(CASES.length);
  });

  for (const one of CASES) {
    it(`${one.id} (${one.sourceKind})`, () => {
      expect(runCase(one), one.source).toEqual({ outcome: "passed" });
    });
  }
});

describe("the check runner itself", () => {
  const density = { id: "x", method: "seawater.density", inputs: { SA: 35, CT: 10, p: 0 }, tolerance: { abs: 0.01 } };

  it("fails a wrong value and says what came out", () => {
    const result = runCase({ ...density, expected: { rho: 1000 } });
    expect(result).toMatchObject({ outcome: "failed", expected: '{"rho":1000}' });
  });

  it("fails where an error was expected and a number came, and the other way round", () => {
    expect(runCase({ ...density, expected: { error: "INVALID_INPUT" } }).outcome).toBe("failed");
    expect(runCase({ ...density, inputs: { SA: -1, CT: 10, p: 0 }, expected: { rho: 1027 } }).outcome).toBe("failed");
  });

  it("takes a missing, null or misspelt input as invalid", () => {
    for (const SA of [undefined, null, "much", "NaN"]) {
      expect(runCase({ ...density, inputs: { SA, CT: 10, p: 0 }, expected: { error: "INVALID_INPUT" } }).outcome).toBe(
        "passed",
      );
    }
  });

  it("skips a method that the engine lacks", () => {
    expect(runCase({ ...density, method: "seawater.soundSpeed", expected: 1500 }).outcome).toBe("skipped");
  });

  it("compares a bare number with the method's first figure, and infinity with its word", () => {
    expect(
      runCase({
        id: "x",
        method: "ekman.coriolis",
        inputs: { lat: 90 },
        expected: 1.458423e-4,
        tolerance: { rel: 1e-9 },
      }).outcome,
    ).toBe("passed");
    const still = { dRho: 0.5, h: 30, dU: 0 };
    expect(
      runCase({ id: "x", method: "regime.bulkRichardson", inputs: still, expected: { Ri: "Infinity" } }).outcome,
    ).toBe("passed");
    expect(
      runCase({ id: "x", method: "regime.bulkRichardson", inputs: { ...still, dU: 1 }, expected: { Ri: "Infinity" } })
        .outcome,
    ).toBe("failed");
  });
});
