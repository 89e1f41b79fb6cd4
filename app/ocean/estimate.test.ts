import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { plainScenario, scenarioArbitrary } from "../../tests/factories/scenario-arbitrary";
import { estimate } from "./estimate";
import type { Response } from "./response";
import type { ModelId, Scenario } from "./scenario";
import { ScenarioInvalid } from "./scenario-invalid";
import { validateScenario } from "./validate-scenario";

const LAYER_MODELS: readonly ModelId[] = ["budget", "slab", "coastal"];

function everyNumber(value: unknown, path = ""): [string, number][] {
  if (typeof value === "number") return [[path, value]];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, item]) => everyNumber(item, `${path}.${key}`));
}

function withWind(scenario: Scenario, windSpeed: (k: number) => number, windFrom: (k: number) => number): Scenario {
  const { time } = scenario.storm;
  return {
    ...scenario,
    storm: {
      ...scenario.storm,
      windSpeed: time.map((_, k) => windSpeed(k)),
      windFrom: time.map((_, k) => windFrom(k)),
    },
  };
}

const gusty = (k: number) => 10 + 6 * Math.sin(k / 5);
const veering = (k: number) => (200 + 4 * k) % 360;

describe("estimate: any valid scenario", () => {
  for (const model of LAYER_MODELS) {
    it(`gives finite numbers and closed budgets (${model})`, () => {
      fc.assert(
        fc.property(scenarioArbitrary([model]), (scenario) => {
          const response = computed(scenario);
          if (!response) return;
          expect(everyNumber(response).filter(([, value]) => !Number.isFinite(value))).toEqual([]);
          const { heat, salt, momentum } = response.budgets;
          expect(Math.abs(heat.residual)).toBeLessThan(1 + 1e-9 * Math.abs(heat.input));
          expect(Math.abs(salt.residual)).toBeLessThan(1e-6);
          expect(momentum.residual).toBeLessThan(1e-6 * (1 + momentum.change + momentum.input));
        }),
        { numRuns: 60 },
      );
    });
  }

  it("gives finite numbers and closed budgets (column)", () => {
    fc.assert(
      fc.property(scenarioArbitrary(["column"]), (scenario) => {
        const response = computed(scenario);
        if (!response) return;
        expect(everyNumber(response).filter(([, value]) => !Number.isFinite(value))).toEqual([]);
        const { heat, salt, momentum } = response.budgets;
        expect(Math.abs(heat.residual)).toBeLessThan(10 + 1e-9 * Math.abs(heat.input));
        expect(Math.abs(salt.residual)).toBeLessThan(1e-6);
        expect(momentum.residual).toBeLessThan(1e-6 * (1 + momentum.change));
      }),
      { numRuns: 15 },
    );
  }, 120_000);

  /** A thin layer may not bear its rain or heat: then the refusal is typed and says what to do. */
  function computed(scenario: Scenario): Response | null {
    try {
      return estimate(scenario);
    } catch (error) {
      expect(error).toBeInstanceOf(ScenarioInvalid);
      const [problem] = (error as ScenarioInvalid).problems;
      expect(["INVALID_INPUT", "NONPOSITIVE_DEPTH", "NOT_CONVERGED"]).toContain(problem.code);
      expect(validateScenario(scenario)).toEqual([]);
      return null;
    }
  }
});

describe("estimate: symmetries", () => {
  it("turns every current with the wind", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 359 }), fc.constantFrom(...LAYER_MODELS.slice(0, 2)), (turn, model) => {
        const base = withWind(plainScenario({ method: { model } }), gusty, veering);
        const turned = withWind(base, gusty, (k) => (veering(k) + turn) % 360);
        const [a, b] = [estimate(base), estimate(turned)];
        expect(b.headline.peakDrift.value).toBeCloseTo(a.headline.peakDrift.value, 10);
        expect(b.headline.netDisplacement.value).toBeCloseTo(a.headline.netDisplacement.value, 6);
        const difference =
          ((b.headline.netDisplacement.towards ?? 0) - (a.headline.netDisplacement.towards ?? 0) - turn + 720) % 360;
        expect(Math.min(difference, 360 - difference)).toBeLessThan(1e-6);
      }),
      { numRuns: 30 },
    );
  });

  it.each(["budget", "slab"] as const)("mirrors across the equator (%s)", (model) => {
    const north = withWind(plainScenario({ method: { model }, latitude: 35 }), gusty, veering);
    const mirrored = withWind(
      plainScenario({ method: { model }, latitude: -35 }),
      gusty,
      (k) => (540 - veering(k)) % 360,
    );
    const [a, b] = [estimate(north), estimate(mirrored)];
    a.series.driftEast.forEach((east, k) => expect(b.series.driftEast[k]).toBeCloseTo(east, 10));
    a.series.driftNorth.forEach((drift, k) => expect(b.series.driftNorth[k]).toBeCloseTo(-drift, 10));
  });

  it("drifts in proportion to the stress", () => {
    const half = estimate(plainScenario({ method: { model: "slab", dragLaw: "constant", dragCoefficient: 1e-3 } }));
    const whole = estimate(plainScenario({ method: { model: "slab", dragLaw: "constant", dragCoefficient: 2e-3 } }));
    expect(whole.headline.netDisplacement.value / half.headline.netDisplacement.value).toBeCloseTo(2, 12);
  });

  it("does not hang on when the storm is: seconds, or ISO times, from any origin", () => {
    const base = withWind(plainScenario(), gusty, veering);
    const shifted = { ...base, storm: { ...base.storm, time: (base.storm.time as number[]).map((t) => t + 1e6) } };
    const dated = {
      ...base,
      storm: { ...base.storm, time: (base.storm.time as number[]).map((t) => new Date(t * 1000).toISOString()) },
    };
    const plain = estimate(base);
    expect(estimate(shifted).series.driftEast).toEqual(plain.series.driftEast);
    expect(estimate(dated).series.driftEast).toEqual(plain.series.driftEast);
    expect(estimate(dated).headline.peakStress.time).toBe(
      dated.storm.time[estimate(dated).series.time.indexOf(estimate(dated).headline.peakStress.time)],
    );
  });

  it("computes a storm in two windows to the same end (budget: heat, salt and displacement add up)", () => {
    const whole = estimate(withRainAndHeat(plainScenario({ hours: 48, method: { model: "budget" } })));
    const first = estimate(withRainAndHeat(plainScenario({ hours: 24, method: { model: "budget" } })));
    const freshWater = 24 * 5e-3;
    const second = estimate(
      withRainAndHeat({
        ...plainScenario({ hours: 24, method: { model: "budget" } }),
        water: {
          temperature: first.headline.surfaceTemperature.value,
          salinity: first.series.salinity[24],
          layerDepth: 20,
        },
      }),
    );
    expect(first.headline.netDisplacement.value + second.headline.netDisplacement.value).toBeCloseTo(
      whole.headline.netDisplacement.value,
      6,
    );
    expect(second.headline.surfaceTemperature.value).toBeCloseTo(whole.headline.surfaceTemperature.value, 3);
    // Each window starts from a layer of 20 m, so the second is diluted by its own rain alone: exact in closed form.
    expect(second.series.salinity[24]).toBeCloseTo((35 * 20 * 20) / (20 + freshWater) ** 2, 9);
    expect(whole.series.salinity[48]).toBeCloseTo((35 * 20) / (20 + 2 * freshWater), 9);
  });

  function withRainAndHeat(scenario: Scenario): Scenario {
    const { time } = scenario.storm;
    return { ...scenario, storm: { ...scenario.storm, rain: time.map(() => 5), heat: { net: time.map(() => 150) } } };
  }
});

describe("estimate: by hand (common practice)", () => {
  const day = [0, 6, 12, 18, 24].map((hour) => hour * 3600);
  const calm = { time: day, windSpeed: day.map(() => 0), windFrom: day.map(() => 0) };

  it.each(["budget", "slab"] as const)("warms 100 m by 0.2 °C when 1000 W/m² shine for a day (%s)", (model) => {
    const scenario = {
      ...plainScenario({ method: { model } }),
      water: { temperature: 20, salinity: 35, layerDepth: 100 },
      storm: { ...calm, heat: { net: day.map(() => 1000) } },
    };
    expect(estimate(scenario).headline.surfaceTemperature.change).toBeCloseTo(0.21, 2);
    expect(Math.round(estimate(scenario).headline.surfaceTemperature.change * 10) / 10).toBe(0.2);
  });

  it("freshens 100 m from 35 to 34.65 with 1 m of rain, and halves salinity with as much rain as water", () => {
    const rained = (layerDepth: number, salinity: number, metres: number) =>
      estimate({
        ...plainScenario(),
        water: { temperature: 20, salinity, layerDepth },
        storm: { ...calm, rain: day.map(() => (metres * 1000) / 24) },
      }).headline.surfaceSalinity.value;
    expect(rained(100, 35, 1)).toBeCloseTo(34.65, 2);
    expect(rained(25, 34, 25)).toBeCloseTo(17, 10);
  });

  it.each([
    [45, 180],
    [-45, 0],
  ])("drives the layer at %s° towards %s° under a wind from the west", (latitude, towards) => {
    const { peakDrift, netDisplacement } = estimate(plainScenario({ latitude, method: { model: "budget" } })).headline;
    expect(peakDrift.towards).toBeCloseTo(towards, 9);
    expect(netDisplacement.towards).toBeCloseTo(towards, 9);
  });

  it.each([...LAYER_MODELS, "column"] as const)(
    "leaves the water alone when nothing blows, rains or shines (%s)",
    (model) => {
      const { headline, series } = estimate({
        ...plainScenario({ method: { model } }),
        box: { latitude: 45, longitude: -40, waterDepth: 60, shoreNormal: 90 },
        water: { temperature: 18, salinity: 35, layerDepth: 20, below: { temperature: 12, salinity: 35.1 } },
        storm: calm,
      });
      expect(headline.peakStress.value).toBe(0);
      expect(headline.peakDrift).toMatchObject({ value: 0, towards: null });
      expect(headline.netDisplacement).toEqual({ value: 0, towards: null });
      expect(headline.surfaceTemperature.change).toBe(0);
      expect(headline.surfaceSalinity.change).toBe(0);
      expect(series.temperature[0]).toBeCloseTo(18, 10);
      expect(series.salinity[0]).toBe(35);
    },
  );

  it("keeps an equatorial slab going straight downwind", () => {
    const { peakDrift } = estimate(plainScenario({ latitude: 0 })).headline;
    expect(peakDrift.towards).toBeCloseTo(90, 9);
    expect(Number.isFinite(peakDrift.value)).toBe(true);
  });

  it("sends the offshore transport of a wind along the shore away from it: upwelling", () => {
    // Wind from the north along a west coast of the northern hemisphere: the open sea lies to the west.
    const scenario = withWind(
      plainScenario({ method: { model: "budget" }, box: { latitude: 40, longitude: -124, shoreNormal: 270 } }),
      () => 10,
      () => 0,
    );
    const { transportAcross, transportAlong } = estimate(scenario).headline;
    expect(transportAcross.value).toBeGreaterThan(0);
    expect(Math.abs(transportAlong.value)).toBeLessThan(1e-9 * transportAcross.value);
  });

  it("lets nothing through the shore in model coastal", () => {
    const box = { latitude: 40, longitude: -124, shoreNormal: 250, waterDepth: 30, distanceToShore: 2000 };
    const { headline } = estimate(withWind(plainScenario({ box, method: { model: "coastal" } }), gusty, veering));
    expect(Math.abs(headline.transportAcross.value)).toBeLessThan(1e-8);
    expect(Math.abs(headline.transportAlong.value)).toBeGreaterThan(1000);
  });

  it("holds a freezing layer at its freezing point and says how much heat was not taken", () => {
    const response = estimate({
      ...plainScenario(),
      water: { temperature: -1.8, salinity: 34, layerDepth: 10 },
      storm: { ...calm, heat: { net: day.map(() => -500) } },
    });
    const note = response.fitNotes.find(({ code }) => code === "FREEZING");
    expect(response.headline.surfaceTemperature.value).toBeGreaterThan(-1.9);
    expect(note?.value).toBeGreaterThan(0);
    expect(500 * 86400 - (note?.value ?? 0)).toBeCloseTo(-response.budgets.heat.input, 3);
  });
});

describe("estimate: what stands in a response", () => {
  it("states every choice with its value, source and whether it was made", () => {
    const { method } = estimate(plainScenario({ method: { model: "slab", dragLaw: "smith1980" } }));
    expect(method.dragLaw).toMatchObject({ value: "smith1980", origin: "chosen" });
    expect(method.dampingRate).toMatchObject({ origin: "default", unit: "1/s" });
    expect(method.dampingRate?.value).toBeCloseTo(1 / (4 * 86400), 12);
    expect(Object.keys(method)).toHaveLength(23);
    for (const entry of Object.values(method)) expect(entry.source).not.toBe("");
  });

  it("hashes equal scenarios equally, however their keys are ordered, and others differently", () => {
    const scenario = plainScenario();
    const reordered = Object.fromEntries(Object.entries(scenario).reverse()) as unknown as Scenario;
    expect(estimate(reordered).inputs).toBe(estimate(scenario).inputs);
    expect(estimate(plainScenario({ latitude: 46 })).inputs).not.toBe(estimate(scenario).inputs);
    expect(estimate(scenario).inputs).toMatch(/^[0-9a-f]{64}$/);
  });

  it("says that a layer deeper than the water was cut, and reckons with the water's depth", () => {
    const response = estimate(plainScenario({ box: { latitude: 45, longitude: 0, waterDepth: 12 } }));
    expect(response.headline.layerDepth.value).toBe(12);
    expect(response.fitNotes.find(({ code }) => code === "LAYER_DEEPER_THAN_WATER")).toMatchObject({
      value: 20,
      threshold: 12,
    });
  });

  it("finds the layer of a cast by its density step and the step below it", () => {
    const cast = [
      { depth: 1, temperature: 20, salinity: 35 },
      { depth: 20, temperature: 20, salinity: 35 },
      { depth: 30, temperature: 14, salinity: 35.2 },
      { depth: 60, temperature: 12, salinity: 35.3 },
    ];
    const { headline } = estimate(plainScenario({ water: { cast } }));
    expect(headline.layerDepth.value).toBeGreaterThan(20);
    expect(headline.layerDepth.value).toBeLessThan(21);
    expect(headline.densityStep.value).toBeGreaterThan(1);
  });

  it("gives the column through time and depth, with the layer deepening under a gale", () => {
    const scenario = plainScenario({
      hours: 24,
      water: { temperature: 20, salinity: 35, layerDepth: 10, below: { temperature: 15, salinity: 35.2 } },
      method: { model: "column" },
    });
    const { column, series } = estimate(
      withWind(
        scenario,
        () => 20,
        () => 270,
      ),
    );
    expect(column?.temperature).toHaveLength(25);
    expect(column?.temperature[0]).toHaveLength(column?.depth.length ?? 0);
    expect(series.layerDepth[24]).toBeGreaterThan(series.layerDepth[0] + 3);
    expect(series.temperature[24]).toBeLessThan(20);
  });
});
