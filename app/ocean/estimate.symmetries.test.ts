import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { plainScenario } from "../../tests/factories/scenario-arbitrary";
import { estimate } from "./estimate";
import type { Response } from "./response";
import type { ModelId, Scenario } from "./scenario";

const MODELS: readonly ModelId[] = ["budget", "slab", "column", "coastal"];
const BELOW = { temperature: 12, salinity: 35.4 };
const WATER = { temperature: 18, salinity: 35, layerDepth: 20, below: BELOW };
/** Shallow water under a shore, so that every model can be asked. */
const BOX = { longitude: -40, waterDepth: 80, shoreNormal: 200, distanceToShore: 20_000 };

interface Storm {
  speed: (k: number) => number;
  from: (k: number) => number;
}

function scenarioOf(model: ModelId, latitude: number, { speed, from }: Storm, shoreNormal = BOX.shoreNormal): Scenario {
  const hours = Array.from({ length: 37 }, (_, k) => k);
  return {
    box: { ...BOX, latitude, shoreNormal },
    water: WATER,
    storm: {
      time: hours.map((k) => k * 3600),
      windSpeed: hours.map(speed),
      windFrom: hours.map((k) => (from(k) + 720) % 360),
      rain: hours.map((k) => (k > 10 && k < 16 ? 5 : 0)),
      heat: { net: hours.map(() => -150) },
    },
    method: { model, cellSize: 2, timeStep: 900 },
  };
}

const gusty = (k: number) => 11 + 6 * Math.sin(k / 5);
const veering = (k: number) => 200 + 4 * k;
const drift = ({ series }: Response, k: number): [number, number] => [series.driftEast[k], series.driftNorth[k]];

describe.each(MODELS)("symmetries (%s)", (model) => {
  it("turns everything with the wind, and with the shore where there is one", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 359 }), (turn) => {
        const a = estimate(scenarioOf(model, 35, { speed: gusty, from: veering }));
        const turned = { speed: gusty, from: (k: number) => veering(k) + turn };
        const b = estimate(scenarioOf(model, 35, turned, (BOX.shoreNormal + turn) % 360));
        const [cos, sin] = [Math.cos((turn * Math.PI) / 180), Math.sin((turn * Math.PI) / 180)];
        // The order of nearly equal exchanges in a column hangs on the last bit; its answer, on no more than this.
        const digits = model === "column" ? 3 : 9;
        a.series.time.forEach((_, k) => {
          const [east, north] = drift(a, k);
          expect(drift(b, k)[0]).toBeCloseTo(east * cos + north * sin, digits);
          expect(drift(b, k)[1]).toBeCloseTo(north * cos - east * sin, digits);
          expect(b.series.transportAcross[k]).toBeCloseTo(a.series.transportAcross[k], digits - 2);
          expect(b.series.temperature[k]).toBeCloseTo(a.series.temperature[k], digits);
        });
      }),
      { numRuns: 6 },
    );
  });

  it("mirrors across the equator", () => {
    const north = estimate(scenarioOf(model, 35, { speed: gusty, from: veering }, 200));
    const south = estimate(
      scenarioOf(model, -35, { speed: gusty, from: (k) => 180 - veering(k) }, (180 - 200 + 360) % 360),
    );
    north.series.time.forEach((_, k) => {
      const [east, up] = drift(north, k);
      expect(drift(south, k)[0]).toBeCloseTo(east, 10);
      expect(drift(south, k)[1]).toBeCloseTo(-up, 10);
      expect(south.series.temperature[k]).toBeCloseTo(north.series.temperature[k], 10);
      expect(south.series.transportAcross[k]).toBeCloseTo(north.series.transportAcross[k], 8);
    });
  });

  it("leaves the water as it is under a dry, windless, fluxless storm", () => {
    const storm = scenarioOf(model, 35, { speed: () => 0, from: () => 0 });
    const { series, headline, budgets, column } = estimate({
      ...storm,
      storm: { time: storm.storm.time, windSpeed: storm.storm.windSpeed, windFrom: storm.storm.windFrom },
    });
    for (const name of ["driftEast", "driftNorth", "displacementEast", "displacementNorth"] as const) {
      expect(
        series[name].every((value) => value === 0),
        name,
      ).toBe(true);
    }
    for (const name of ["temperature", "salinity", "density", "layerDepth"] as const) {
      expect(new Set(series[name]).size, name).toBe(1);
    }
    for (const name of ["temperature", "salinity", "driftEast", "driftNorth"] as const) {
      for (const profile of column?.[name] ?? []) expect(profile, name).toEqual(column?.[name][0]);
    }
    expect(series.temperature[0]).toBeCloseTo(WATER.temperature, 9);
    expect(headline.surfaceSalinity.change).toBe(0);
    expect(headline.peakStress.value).toBe(0);
    expect([budgets.heat.input, budgets.salt.input, budgets.momentum.input]).toEqual([0, 0, 0]);
  });
});

describe("what a response hangs on", () => {
  it("is the stress in proportion: twice the stress, twice the drift", () => {
    const withDrag = (dragCoefficient: number) =>
      estimate(plainScenario({ method: { model: "slab", dragLaw: "constant", dragCoefficient } })).headline;
    expect(withDrag(2e-3).netDisplacement.value / withDrag(1e-3).netDisplacement.value).toBeCloseTo(2, 12);
  });

  it("is not when the storm is: seconds, or ISO times, from any origin", () => {
    const base = scenarioOf("slab", 45, { speed: gusty, from: veering });
    const seconds = base.storm.time.map(Number);
    const at = (time: (string | number)[]) => estimate({ ...base, storm: { ...base.storm, time } });
    const plain = at(seconds);
    const dated = at(seconds.map((t) => new Date(t * 1000).toISOString()));
    expect(at(seconds.map((t) => t + 1e6)).series.driftEast).toEqual(plain.series.driftEast);
    expect(dated.series.driftEast).toEqual(plain.series.driftEast);
    const peak = plain.series.time.indexOf(plain.headline.peakStress.time);
    expect(dated.headline.peakStress.time).toBe(dated.series.time[peak]);
  });

  it("is not what was estimated before for another box", () => {
    const [a, b] = [plainScenario({ latitude: 20 }), plainScenario({ latitude: 50 })];
    const alone = JSON.stringify(estimate(b));
    estimate(a);
    expect(JSON.stringify(estimate(b))).toBe(alone);
  });
});
