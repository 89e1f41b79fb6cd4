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
    expect(note(at({ latitude: 1 }), "EQUATORIAL_MARGINAL")?.severity).toBe("caution");
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
    const polygon = (size: number): Scenario["box"] => ({
      polygon: [
        [0, 45],
        [size, 45],
        [size, 45 + size],
        [0, 45 + size],
      ],
    });
    expect(note(plainScenario({ box: polygon(0.01) }), "BOX_ROSSBY_NUMBER")?.severity).toBe("caution");
    expect(note(plainScenario({ box: polygon(10) }), "BOX_EXTENT")?.severity).toBe("caution");
  });

  it("recommend the budget in a long steady wind and the slab in one that turns", () => {
    expect(estimate(plainScenario({ hours: 72 })).recommendedModel).toBe("budget");
    const turning = plainScenario({ hours: 72 });
    const veered = {
      ...turning,
      storm: { ...turning.storm, windFrom: turning.storm.time.map((_, k) => (k * 15) % 360) },
    };
    const { recommendedModel, recommendation } = estimate(veered);
    expect(recommendedModel).toBe("slab");
    expect(recommendation).toContain("inertial");
  });
});
