import { describe, expect, it } from "vitest";
import { plainScenario } from "../../../tests/factories/scenario-arbitrary";
import { estimate } from "../estimate";
import type { FitNote } from "../response";
import type { Scenario } from "../scenario";

function note(scenario: Scenario, code: string): FitNote | undefined {
  return estimate(scenario).fitNotes.find((entry) => entry.code === code);
}

const at = (box: Partial<Scenario["box"]>, change: Parameters<typeof plainScenario>[0] = {}) =>
  plainScenario({ ...change, box: { latitude: 45, longitude: 0, ...box } });

const blowing = (scenario: Scenario, windSpeed: number, windFrom = 270): Scenario => ({
  ...scenario,
  storm: {
    ...scenario.storm,
    windSpeed: scenario.storm.time.map(() => windSpeed),
    windFrom: scenario.storm.time.map(() => windFrom),
  },
});

describe("fit notes", () => {
  it("say what, by how much, against which threshold and from where, gravest first", () => {
    const notes = estimate(at({ waterDepth: 15, distanceToShore: 1000 })).fitNotes;
    const order = ["doNotUse", "caution", "ok"];
    const grades = notes.map(({ severity }) => order.indexOf(severity));
    expect(grades).toEqual([...grades].sort((a, b) => a - b));
    for (const { message, source, value, threshold } of notes) {
      expect(message).toMatch(/\.$/);
      expect(message).not.toMatch(/NaN|Infinity|undefined/);
      expect(source).not.toBe("");
      expect(Number.isFinite(value) && Number.isFinite(threshold)).toBe(true);
    }
  });

  it("judge latitude", () => {
    expect(note(at({ latitude: 45 }), "LATITUDE")?.severity).toBe("ok");
    expect(note(at({ latitude: 3 }, { method: { model: "budget" } }), "EQUATORIAL_MARGINAL")?.severity).toBe("caution");
    expect(note(at({ latitude: 1 }), "EQUATORIAL")?.severity).toBe("caution");
  });

  it("judge the distance to the shore by the internal Rossby radius, unless the model reckons with the shore", () => {
    expect(note(at({ distanceToShore: 1000 }), "COAST_DISTANCE")?.severity).toBe("doNotUse");
    expect(note(at({ distanceToShore: 15_000 }), "COAST_DISTANCE")?.severity).toBe("caution");
    expect(note(at({ distanceToShore: 500_000 }), "COAST_DISTANCE")?.severity).toBe("ok");
    const coastal = at({ distanceToShore: 1000, waterDepth: 20, shoreNormal: 270 }, { method: { model: "coastal" } });
    expect(note(coastal, "COAST_DISTANCE")?.severity).toBe("caution");
    expect(estimate(coastal).recommendedModel).toBe("coastal");
  });

  it("judge water depth against the Ekman depth", () => {
    const method = { model: "budget", eddyViscosity: 0.05 } as const;
    expect(note(at({ waterDepth: 300 }, { method }), "WATER_DEPTH")?.severity).toBe("ok");
    expect(note(at({ waterDepth: 70 }, { method }), "WATER_DEPTH")?.severity).toBe("caution");
    expect(note(at({ waterDepth: 25 }, { method }), "WATER_DEPTH")?.severity).toBe("doNotUse");
    expect(note(at({ waterDepth: 25 }, { method: { ...method, ekman: "finiteDepth" } }), "WATER_DEPTH")?.severity).toBe(
      "ok",
    );
    // The balance of finite depth is the budget's own: chosen beside the slab it changes nothing.
    const slab = { model: "slab", eddyViscosity: 0.05, ekman: "finiteDepth" } as const;
    expect(note(at({ waterDepth: 25 }, { method: slab }), "WATER_DEPTH")?.severity).toBe("doNotUse");
  });

  it("judge the storm's length against the inertial period", () => {
    const budget = { model: "budget" } as const;
    expect(note(at({}, { hours: 48, method: budget }), "DURATION")?.severity).toBe("ok");
    expect(note(at({}, { hours: 10, method: budget }), "DURATION")?.severity).toBe("caution");
    expect(note(at({}, { hours: 3, method: budget }), "DURATION")?.severity).toBe("doNotUse");
    expect(note(at({}, { hours: 10 }), "DURATION")?.severity).toBe("ok");
  });

  it("judge the wind against the law's range, and a large constant coefficient", () => {
    const law = (dragLaw: "largePond1981" | "largeYeager2009") => at({}, { method: { dragLaw } });
    expect(note(blowing(law("largePond1981"), 30), "OUT_OF_RANGE")?.value).toBeCloseTo(30, 9);
    expect(note(blowing(law("largeYeager2009"), 30), "WIND_RANGE")?.severity).toBe("ok");
    expect(note(at({}, { method: { dragLaw: "constant", dragCoefficient: 3e-3 } }), "DRAG_COEFFICIENT")?.severity).toBe(
      "caution",
    );
  });

  it("judge the fetch of a wind off the land, and leave one from the sea alone", () => {
    const shore = at({ distanceToShore: 2000, shoreNormal: 90 });
    expect(note(blowing(shore, 15, 270), "FETCH")).toMatchObject({ severity: "caution", threshold: 8 });
    expect(note(blowing(shore, 15, 90), "FETCH")).toBeUndefined();
    expect(note(blowing(shore, 0), "FETCH")).toBeUndefined();
    expect(note(at({ distanceToShore: 2000 }), "FETCH")).toMatchObject({ severity: "caution", value: 2 });
  });

  it("warn of a column mixed down to its bed, and say what the shore would allow", () => {
    const water = { temperature: 12, salinity: 35, layerDepth: 15, below: { temperature: 11.8, salinity: 35 } };
    const shallow = (waterDepth: number, shoreNormal?: number) =>
      blowing(at({ waterDepth, shoreNormal }, { hours: 30, water, method: { model: "column" } }), 20);
    const mixed = note(shallow(20, 90), "COLUMN_MIXED_TO_BED");
    expect(mixed).toMatchObject({ severity: "caution", threshold: 0 });
    expect(mixed?.value).toBeGreaterThan(0);
    expect(mixed?.value).toBeLessThan(30);
    expect(mixed?.message).toMatch(/steady balance with the shore gives 0\.\d\d m\/s at most/);
    expect(note(shallow(20), "COLUMN_MIXED_TO_BED")?.message).not.toContain("steady balance");
    const stratified = { ...shallow(60), water: { ...water, below: { temperature: 6, salinity: 35 } } };
    expect(note(stratified, "COLUMN_MIXED_TO_BED")).toBeUndefined();
  });

  it("judge the water that was given: unstable, or beyond the Practical Salinity Scale", () => {
    const over = (temperature: number) =>
      at({}, { water: { temperature: 15, salinity: 35, layerDepth: 20, below: { temperature, salinity: 35 } } });
    expect(note(over(16), "LAYER_UNSTABLE")?.severity).toBe("doNotUse");
    expect(note(over(14), "LAYER_UNSTABLE")).toBeUndefined();
    expect(estimate(over(16)).recommendedModel).toBe("column");
    const practical = (top: number, below: number) => {
      const deep = { temperature: 8, practicalSalinity: below };
      return at({}, { water: { temperature: 15, practicalSalinity: top, layerDepth: 20, below: deep } });
    };
    expect(note(practical(1, 44), "OUT_OF_RANGE")).toMatchObject({ severity: "caution", value: 44, threshold: 42 });
    expect(note(practical(1, 35), "OUT_OF_RANGE")).toMatchObject({ value: 1, threshold: 2 });
    expect(note(practical(2, 42), "OUT_OF_RANGE")).toBeUndefined();
  });

  it("look at a cyclone only where one is told of, and let it change no number", () => {
    const codes = ["STORM_SPEED_NUMBER", "UPWELLING", "BOX_STORM_SIZE"];
    const box = {
      polygon: [
        [0, 20],
        [0.2, 20],
        [0.2, 20.2],
      ],
    } satisfies Scenario["box"];
    const without = plainScenario({ box });
    const cyclone = { radiusOfMaximumWind: 50_000, translationSpeed: 5 };
    const told = { ...without, storm: { ...without.storm, cyclone } };
    for (const code of codes) {
      expect(note(without, code)).toBeUndefined();
      expect(note(told, code)?.severity).toBe("ok");
    }
    expect(note(told, "STORM_SPEED_NUMBER")?.message).toContain("to the right of the track");
    expect(estimate(told).headline).toEqual(estimate(without).headline);
    const south = { latitude: -20, longitude: 0 };
    expect(note({ ...told, box: south }, "STORM_SPEED_NUMBER")?.message).toContain("to the left of the track");
    expect(note({ ...told, box: { latitude: 1, longitude: 0 } }, "STORM_SPEED_NUMBER")).toBeUndefined();
  });

  it("judge whether the layer would entrain, and recommend the column then", () => {
    const thin = at(
      {},
      { water: { temperature: 18, salinity: 35, layerDepth: 5, below: { temperature: 17.8, salinity: 35 } } },
    );
    const stormy = blowing(thin, 25);
    expect(note(stormy, "LAYER_RICHARDSON")?.severity).toBe("doNotUse");
    expect(estimate(stormy).recommendedModel).toBe("column");
  });

  it("judge samples far apart, light through the layer, and small or huge boxes", () => {
    const sparse = plainScenario();
    const time = [0, 4, 8, 12].map((hour) => hour * 3600);
    const series = time.map(() => 10);
    const sunny = {
      ...sparse,
      storm: { time, windSpeed: series, windFrom: series, heat: { shortwave: time.map(() => 500) } },
    };
    expect(note(sunny, "SAMPLING")).toMatchObject({ severity: "caution", value: 4 });
    expect(note(sunny, "SHORTWAVE_AT_BASE")?.value).toBeGreaterThan(0.05);
    const shallow = { ...sunny, box: { ...sunny.box, waterDepth: 12 } };
    expect(note(shallow, "SHORTWAVE_AT_BED")?.message).toContain("reaches the bed at 12 m");
    const polygon = (size: number): Scenario["box"] => ({
      polygon: [
        [0, 45],
        [size, 45],
        [size, 45 + size],
        [0, 45 + size],
      ],
    });
    expect(note(plainScenario({ box: polygon(0.01) }), "BOX_ROSSBY_NUMBER")?.severity).toBe("caution");
    expect(note(plainScenario({ box: polygon(10) }), "BOX_EXTENT")?.message).toMatch(
      /periods of 16\.\d h in the south and 14\.\d h in the north/,
    );
    const equator: Scenario["box"] = {
      polygon: [
        [0, -8],
        [10, -8],
        [10, 8],
        [0, 8],
      ],
    };
    expect(note(plainScenario({ box: equator }), "BOX_EXTENT")?.message).toContain("opposite ways");
  });
});
