import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { plainScenario, scenarioArbitrary } from "../../tests/factories/scenario-arbitrary";
import { estimate } from "./estimate";
import { OCEAN_ERROR_CODES } from "./errors";
import type { Scenario } from "./scenario";
import { ScenarioInvalid } from "./scenario-invalid";
import { validateScenario } from "./validate-scenario";

const plain = plainScenario({ hours: 6 });
const paths = (scenario: unknown) => validateScenario(scenario).map(({ path, code }) => `${path} ${code}`);
const withStorm = (change: Record<string, unknown>) => ({ ...plain, storm: { ...plain.storm, ...change } });

describe("validateScenario", () => {
  it("finds nothing wrong with what the engine computes", () => {
    fc.assert(
      fc.property(scenarioArbitrary(["slab", "column", "coastal"]), (scenario) => {
        expect(validateScenario(scenario)).toEqual([]);
      }),
      { numRuns: 100 },
    );
  });

  it("never throws, whatever it is handed, and every problem has a known code and a sentence", () => {
    const part = fc.anything({ maxDepth: 3 });
    const junk = fc.oneof(
      part,
      fc.record(
        { box: part, water: part, storm: part, method: part, triggerLevels: part, ensemble: part },
        { requiredKeys: [] },
      ),
    );
    fc.assert(
      fc.property(junk, (scenario) => {
        const problems = validateScenario(scenario);
        expect(problems.length).toBeGreaterThan(0);
        for (const { code, message } of problems) {
          expect(OCEAN_ERROR_CODES).toContain(code);
          expect(message).toMatch(/\S.*\.$/);
        }
        expect(() => estimate(scenario as Scenario)).toThrow(ScenarioInvalid);
      }),
      { numRuns: 300 },
    );
  });

  it.each<[string, unknown, string]>([
    ["a missing part", { box: plain.box, water: plain.water }, "storm INVALID_INPUT"],
    ["a negative wind", withStorm({ windSpeed: [1, 2, 3, -4, 5, 6, 7] }), "storm.windSpeed[3] INVALID_INPUT"],
    ["a gap in the series", withStorm({ windSpeed: [1, 2, 3, null, 5, 6, 7] }), "storm.windSpeed[3] INVALID_INPUT"],
    ["not a number", withStorm({ rain: [0, 0, Number.NaN, 0, 0, 0, 0] }), "storm.rain[2] INVALID_INPUT"],
    [
      "infinite heat",
      withStorm({ heat: { net: [0, Number.POSITIVE_INFINITY, 0, 0, 0, 0, 0] } }),
      "storm.heat.net[1] INVALID_INPUT",
    ],
    ["a series too short", withStorm({ windFrom: [270] }), "storm.windFrom INVALID_INPUT"],
    [
      "a direction past the circle",
      withStorm({ windFrom: [0, 0, 0, 0, 0, 0, 361] }),
      "storm.windFrom[6] INVALID_INPUT",
    ],
    [
      "times out of order",
      withStorm({ time: [0, 3600, 3600, 7200, 10800, 14400, 18000] }),
      "storm.time[2] INVALID_INPUT",
    ],
    [
      "a time without its zone",
      withStorm({
        time: ["2026-11-04T00:00:00", ...Array.from({ length: 6 }, (_, k) => `2026-11-04T0${k + 1}:00:00Z`)],
      }),
      "storm.time[0] INVALID_INPUT",
    ],
    [
      "times of two kinds",
      withStorm({ time: [0, "2026-11-04T00:00:00Z", 2, 3, 4, 5, 6] }),
      "storm.time[1] INVALID_INPUT",
    ],
    [
      "a gap too long to bridge",
      withStorm({ time: [0, 3600, 7200, 10800, 14400, 18000, 18000 + 21601] }),
      "storm.time[6] GAP",
    ],
    [
      "net heat and its parts",
      withStorm({ heat: { net: [0, 0, 0, 0, 0, 0, 0], latent: [0, 0, 0, 0, 0, 0, 0] } }),
      "storm.heat INVALID_INPUT",
    ],
    [
      "a cyclone without its speed",
      withStorm({ cyclone: { radiusOfMaximumWind: 40_000 } }),
      "storm.cyclone.translationSpeed INVALID_INPUT",
    ],
    [
      "a cyclone measured in kilometres",
      withStorm({ cyclone: { radiusOfMaximumWind: 40, translationSpeed: 5 } }),
      "storm.cyclone.radiusOfMaximumWind INVALID_INPUT",
    ],
    [
      "a misspelt cyclone",
      withStorm({ cyclone: { radiusOfMaximumWind: 40_000, translationSpeed: 5, speed: 5 } }),
      "storm.cyclone.speed INVALID_INPUT",
    ],
    ["a misspelt heat", withStorm({ heat: { shortwav: [0] } }), "storm.heat.shortwav INVALID_INPUT"],
    ["no layer depth", { ...plain, water: { temperature: 18, salinity: 35 } }, "water.layerDepth INVALID_INPUT"],
    [
      "a layer of no depth",
      { ...plain, water: { temperature: 18, salinity: 35, layerDepth: 0 } },
      "water.layerDepth NONPOSITIVE_DEPTH",
    ],
    [
      "water of no depth",
      { ...plain, box: { latitude: 1, longitude: 1, waterDepth: -3 } },
      "box.waterDepth NONPOSITIVE_DEPTH",
    ],
    ["no salinity", { ...plain, water: { temperature: 18, layerDepth: 10 } }, "water.salinity INVALID_INPUT"],
    [
      "two salinities",
      { ...plain, water: { temperature: 18, salinity: 35, practicalSalinity: 35, layerDepth: 10 } },
      "water.salinity INVALID_INPUT",
    ],
    [
      "a negative salinity",
      { ...plain, water: { temperature: 18, salinity: -1, layerDepth: 10 } },
      "water.salinity INVALID_INPUT",
    ],
    [
      "a cast out of order",
      {
        ...plain,
        water: {
          cast: [
            { depth: 5, temperature: 1, salinity: 1 },
            { depth: 5, temperature: 1, salinity: 1 },
          ],
        },
      },
      "water.cast[1].depth INVALID_INPUT",
    ],
    [
      "a cast of one level",
      { ...plain, water: { cast: [{ depth: 5, temperature: 1, salinity: 1 }] } },
      "water.cast INVALID_INPUT",
    ],
    ["an unknown law", { ...plain, method: { dragLaw: "mine" } }, "method.dragLaw INVALID_INPUT"],
    ["a misspelt choice", { ...plain, method: { dragLow: "constant" } }, "method.dragLow INVALID_INPUT"],
    ["a misspelt key of the box", { ...plain, box: { ...plain.box, waterDept: 20 } }, "box.waterDept INVALID_INPUT"],
    ["a misspelt part", { ...plain, triggers: [] }, "triggers INVALID_INPUT"],
    ["no place", { ...plain, box: { name: "nowhere" } }, "box.latitude INVALID_INPUT"],
    [
      "a line for a polygon",
      {
        ...plain,
        box: {
          polygon: [
            [0, 0],
            [1, 1],
            [2, 2],
          ],
        },
      },
      "box.polygon INVALID_INPUT",
    ],
    ["a place off the globe", { ...plain, box: { latitude: 91, longitude: 0 } }, "box.latitude INVALID_INPUT"],
    [
      "steady Ekman at the equator",
      { ...plain, box: { latitude: 1, longitude: 0 }, method: { model: "budget" } },
      "box.latitude EQUATORIAL",
    ],
    ["a coast without its depth", { ...plain, method: { model: "coastal" } }, "box.waterDepth INVALID_INPUT"],
    ["a column without water below", { ...plain, method: { model: "column" } }, "water.below INVALID_INPUT"],
    [
      "an ensemble of one and a half",
      { ...plain, ensemble: { members: 2.5, seed: 1 } },
      "ensemble.members INVALID_INPUT",
    ],
    [
      "an unknown trigger",
      { ...plain, triggerLevels: [{ quantity: "colour", side: "above", value: 1, hours: 1 }] },
      "triggerLevels[0].quantity INVALID_INPUT",
    ],
    [
      "steps without end",
      {
        ...plain,
        method: { model: "column", timeStep: 1, cellSize: 0.05, maxDepth: 12000 },
        water: { ...plain.water, below: { temperature: 9, salinity: 35 } },
      },
      "method.timeStep INVALID_INPUT",
    ],
  ])("names %s", (_, scenario, expected) => {
    expect(paths(scenario)).toContain(expected);
  });

  it("gives every problem of many, and says how many more there are", () => {
    const n = 200;
    const series = Array.from({ length: n }, () => -1);
    const problems = validateScenario({
      ...plain,
      storm: { time: series.map((_, k) => k), windSpeed: series, windFrom: series.map(() => 0) },
    });
    expect(problems).toHaveLength(51);
    expect(problems[50].message).toContain("150 more");
  });

  it("refuses a layer thinner than a millimetre and more salt than water holds, whichever scale it is on", () => {
    const of = (water: Record<string, unknown>) => paths({ ...plain, water: { temperature: 18, ...water } });
    expect(of({ salinity: 35, layerDepth: 1e-300 })).toEqual(["water.layerDepth INVALID_INPUT"]);
    expect(of({ salinity: 60, layerDepth: 10 })).toEqual([]);
    expect(of({ practicalSalinity: 59.7, layerDepth: 10 })).toEqual([]);
    expect(of({ practicalSalinity: 60, layerDepth: 10 })).toEqual(["water.practicalSalinity INVALID_INPUT"]);
  });
});
