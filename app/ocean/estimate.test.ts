import { describe, expect, it } from "vitest";
import { plainScenario } from "../../tests/factories/scenario-arbitrary";
import { estimate } from "./estimate";
import type { Scenario } from "./scenario";

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
