import { describe, expect, it } from "vitest";
import {
  buildScenario,
  castWater,
  isoTime,
  scenarioStorm,
  twoLayerWater,
  type BoxInput,
  type EstimateInput,
  type WaterInput,
} from "./build-scenario";
import { changedParts, inputParts, type InputPart } from "./input-parts";
import { inputHash } from "~/ocean/input-hash";
import { validateScenario } from "~/ocean/validate-scenario";

const box: BoxInput = {
  polygon: [
    [-8.26, 54.4],
    [-8.2, 54.4],
    [-8.2, 54.43],
    [-8.26, 54.4],
  ],
  waterDepth: null,
  shoreNormal: 90,
  distanceToShore: null,
  triggerLevels: [],
};
const water: WaterInput = {
  temperature: 12,
  salinity: 33,
  salinityScale: "practical",
  layerDepth: 14,
  belowTemperature: 10,
  belowSalinity: 34,
};
const storm = scenarioStorm({ time: [0, 3600], windSpeed: [1, 2], windFrom: [3, 4], windHeight: 4, rain: [0, 1] });
const input: EstimateInput = {
  box,
  water: twoLayerWater(water),
  storm,
  method: { model: "slab" },
  ensemble: null,
};

describe("buildScenario", () => {
  it("says what the engine is asked, without what was not given", () => {
    const scenario = buildScenario(input);
    expect(scenario).toEqual({
      box: { polygon: box.polygon, shoreNormal: 90 },
      water: {
        temperature: 12,
        practicalSalinity: 33,
        layerDepth: 14,
        below: { temperature: 10, practicalSalinity: 34 },
      },
      storm: {
        time: ["1970-01-01T00:00:00Z", "1970-01-01T01:00:00Z"],
        windSpeed: [1, 2],
        windFrom: [3, 4],
        windHeight: 4,
        rain: [0, 1],
      },
      method: { model: "slab" },
    });
    expect(validateScenario(scenario)).toEqual([]);
  });

  it("asks for the ensemble of its sheet", () => {
    const scenario = buildScenario({ ...input, ensemble: { members: 200, seed: 3 } });
    expect(scenario.ensemble).toEqual({ members: 200, seed: 3 });
    expect(validateScenario(scenario)).toEqual([]);
  });

  it("leaves the water below out unless both numbers are known", () => {
    expect(twoLayerWater({ ...water, belowSalinity: null })).not.toHaveProperty("below");
  });

  it("asks for a cast level by level, on its own scale, with the depth of its layer only where it was set", () => {
    const levels = {
      depth: Float64Array.of(0, 10),
      temperature: Float64Array.of(20, 18),
      salinity: Float64Array.of(35, 35.5),
      salinityScale: "practical" as const,
    };
    const cast = [
      { depth: 0, temperature: 20, practicalSalinity: 35 },
      { depth: 10, temperature: 18, practicalSalinity: 35.5 },
    ];
    expect(castWater(levels, null)).toEqual({ cast });
    expect(validateScenario(buildScenario({ ...input, water: castWater(levels, 8) }))).toEqual([]);
    expect(castWater({ ...levels, salinityScale: "absolute" }, 8)).toMatchObject({
      layerDepth: 8,
      cast: [{ salinity: 35 }, { salinity: 35.5 }],
    });
  });

  it("writes milliseconds only where there are any", () => {
    expect([0, 0.5].map(isoTime)).toEqual(["1970-01-01T00:00:00Z", "1970-01-01T00:00:00.500Z"]);
  });
});

describe("the parts of a scenario", () => {
  const before = inputParts(buildScenario(input));

  it.each([
    ["box", { ...input, box: { ...box, waterDepth: 20 } }],
    ["water", { ...input, water: twoLayerWater({ ...water, temperature: 12.1 }) }],
    ["method", { ...input, method: { model: "budget" } }],
    ["storm", { ...input, storm: { ...storm, rain: [0, 2] } }],
    [
      "triggerLevels",
      { ...input, box: { ...box, triggerLevels: [{ quantity: "salinity", side: "below", value: 30, hours: 6 }] } },
    ],
  ] as [InputPart, EstimateInput][])("tell when the %s changed, and only that", (part, changed) => {
    const now = inputParts(buildScenario(changed));
    expect(changedParts(before, now)).toEqual([part]);
    expect(inputHash(buildScenario(changed))).not.toBe(inputHash(buildScenario(input)));
  });

  it("agree for equal inputs", () => {
    expect(changedParts(before, inputParts(buildScenario(structuredClone(input))))).toEqual([]);
  });
});
