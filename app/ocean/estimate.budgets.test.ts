import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { everyNumber } from "../../tests/factories/every-number";
import { scenarioArbitrary } from "../../tests/factories/scenario-arbitrary";
import { LIKELY, LIMITS } from "../../tests/factories/scenario-ranges";
import { uniform } from "../../tests/factories/uniform";
import { estimate } from "./estimate";
import type { Response } from "./response";
import type { ModelId, Scenario } from "./scenario";
import { ScenarioInvalid } from "./scenario-invalid";
import { conservativeFromPotential } from "./seawater/conservative-temperature";
import { conservativeFromInSitu } from "./seawater/potential-temperature";
import { pressureFromDepth } from "./seawater/pressure-from-depth";

const MODELS: readonly ModelId[] = ["budget", "slab", "column", "coastal"];

/** What is valid may still be water that cannot bear its storm: then the refusal is typed and names the water. */
function computed(scenario: Scenario): Response | null {
  try {
    return estimate(scenario);
  } catch (error) {
    if (!(error instanceof ScenarioInvalid)) throw error;
    expect(error.problems).toHaveLength(1);
    expect(["water.layerDepth", "water.cast", "method.cellSize"]).toContain(error.problems[0].path);
    return null;
  }
}

describe.each(MODELS)("any valid scenario (%s)", (model) => {
  it("has budgets that close to rounding, whichever of rain, evaporation, sun, damping and bed there is", () => {
    let closed = 0;
    fc.assert(
      fc.property(scenarioArbitrary([model], LIKELY), (scenario) => {
        const response = computed(scenario);
        if (!response) return;
        closed++;
        // The worst of some thousands: 2e-14 in a column of a hundred cells, 1e-14 elsewhere.
        expect(missing(response).filter(([, share]) => !(share < 1e-12))).toEqual([]);
      }),
      { numRuns: model === "column" ? 40 : 150 },
    );
    expect(closed).toBeGreaterThan(20);
  });

  it("gives finite numbers up to the limits of what is valid, or refuses by name", () => {
    fc.assert(
      fc.property(scenarioArbitrary([model], LIMITS), (scenario) => {
        expect(everyNumber(computed(scenario)).filter(([, value]) => !Number.isFinite(value))).toEqual([]);
      }),
      { numRuns: model === "column" ? 60 : 300 },
    );
  });
});

/** Forces so small that doubles keep no digits of them. N s/m² */
const NO_IMPULSE = 1e-290;

/** What each budget misses, as a share of what its sums are made of: rounding adds up to a multiple of 1e-16 of that. */
function missing({ budgets, column, series, method, headline }: Response): [string, number][] {
  const water = Math.max(column ? 2 * column.depth[0] * column.depth.length : 0, series.layerDepth[0]);
  const density = Number(method.waterDensity?.value);
  const heatContent = density * Number(method.heatCapacity?.value) * water * 30;
  const saltContent = (density / 1000) * water * 40;
  const impulse = headline.peakStress.value * 86_400 + density * water * headline.peakDrift.value;
  return [
    ["heat", Math.abs(budgets.heat.residual) / (heatContent + Math.abs(budgets.heat.input))],
    ["salt", Math.abs(budgets.salt.residual) / (saltContent + Math.abs(budgets.salt.input))],
    ["momentum", impulse < NO_IMPULSE ? 0 : budgets.momentum.residual / impulse],
  ];
}

/** A day of everything, over warm water; sampled hourly, and computed in steps of an hour so that every step is in the series. */
const stormy = fc.record({
  wind: uniform(5, 30),
  veer: uniform(-20, 20),
  rain: uniform(0, 30),
  evaporation: uniform(0, 1),
  sun: uniform(0, 800),
  loss: uniform(-400, 0),
  latitude: uniform(-70, 70),
  dampingRate: uniform(0, 1e-5),
  hold: fc.boolean(),
});
const HOURS = Array.from({ length: 25 }, (_, k) => k);
const RHO = 1025;
const CP = 3991.86795711963;

type Storminess = typeof stormy extends fc.Arbitrary<infer T> ? T : never;

function stormyScenario(model: ModelId, storminess: Storminess): Scenario {
  const { wind, veer, rain, evaporation, sun, loss, latitude, dampingRate, hold } = storminess;
  return {
    box: { latitude, longitude: -40, waterDepth: 60, shoreNormal: 90 },
    water: { temperature: 24, salinity: 34, layerDepth: 25, below: { temperature: 18, salinity: 35.5 } },
    storm: {
      time: HOURS.map((k) => k * 3600),
      windSpeed: HOURS.map((k) => wind * (1 + 0.5 * Math.sin(k))),
      windFrom: HOURS.map((k) => (200 + veer * k + 3600) % 360),
      rain: HOURS.map((k) => (k % 3 === 0 ? rain : 0)),
      evaporation: HOURS.map(() => evaporation),
      heat: {
        shortwave: HOURS.map((k) => sun * Math.max(0, Math.sin((Math.PI * k) / 12))),
        latent: HOURS.map((k) => loss * (1 + 0.3 * Math.cos(k))),
      },
    },
    method: {
      model,
      timeStep: 3600,
      cellSize: 1,
      dampingRate,
      ekman: "finiteDepth",
      penetratingShortwave: model === "column",
      heatInterpolation: hold ? "hold" : "linear",
    },
  };
}

/** Heat, J/m², and fresh water, m, that the storm's own series bring in a day. */
function brought({ storm, method }: Scenario): { heat: number; freshWater: number } {
  const { shortwave = [], latent = [] } = storm.heat ?? {};
  const total = { heat: 0, freshWater: 0 };
  for (const k of HOURS.slice(0, -1)) {
    const at = (j: number) => shortwave[j] + latent[j];
    total.heat += 3600 * (method?.heatInterpolation === "hold" ? at(k) : (at(k) + at(k + 1)) / 2);
    total.freshWater += ((storm.rain?.[k] ?? 0) - (storm.evaporation?.[k] ?? 0)) / 1000;
  }
  return total;
}

describe("budgets added up from what is in the response", () => {
  it.each(["budget", "slab", "coastal"] as const)("find a layer's heat and salt again (%s)", (model) => {
    fc.assert(
      fc.property(stormy, (storminess) => {
        const scenario = stormyScenario(model, storminess);
        const { series } = estimate(scenario);
        const { heat, freshWater } = brought(scenario);
        const CT = (k: number) => conservativeFromPotential(series.salinity[k], series.temperature[k]);
        expect(RHO * CP * 25 * (CT(24) - CT(0))).toBeCloseTo(heat, 0);
        expect(series.salinity[24] * (25 + freshWater)).toBeCloseTo(series.salinity[0] * 25, 9);
      }),
      { numRuns: 20 },
    );
  });

  it("find a column's heat and salt again, light at the bed and all", () => {
    fc.assert(
      fc.property(stormy, (storminess) => {
        const scenario = stormyScenario("column", storminess);
        const { column } = estimate(scenario);
        const { heat, freshWater } = brought(scenario);
        if (!column) throw new Error("no column");
        const total = (at: number) => {
          const salinity = column.salinity[at];
          const CT = column.temperature[at].map((t, k) =>
            conservativeFromInSitu(salinity[k], t, pressureFromDepth(column.depth[k], storminess.latitude)),
          );
          const sum = (values: number[]) => values.reduce((all, value) => all + value, 0);
          return { heat: RHO * CP * sum(CT), salt: sum(salinity) };
        };
        const [before, after] = [total(0), total(column.time.length - 1)];
        expect(Math.abs(after.heat - before.heat - heat)).toBeLessThan(1e-9 * before.heat);
        expect(after.salt - before.salt).toBeCloseTo(-34 * freshWater, 8);
      }),
      { numRuns: 5 },
    );
  });

  it("find a slab's momentum again: what the stress gave less what turning and damping took", () => {
    fc.assert(
      fc.property(stormy, (storminess) => {
        const { series } = estimate(stormyScenario("slab", storminess));
        const f = 2 * 7.292115e-5 * Math.sin((storminess.latitude * Math.PI) / 180);
        const impulse = (stress: number[]) =>
          HOURS.slice(0, -1).reduce((sum, k) => sum + 1800 * (stress[k] + stress[k + 1]), 0);
        const [x, y] = [series.displacementEast[24], series.displacementNorth[24]];
        const mass = RHO * 25;
        const r = storminess.dampingRate;
        expect(mass * (series.driftEast[24] + r * x - f * y) - impulse(series.stressX)).toBeCloseTo(0, 6);
        expect(mass * (series.driftNorth[24] + r * y + f * x) - impulse(series.stressY)).toBeCloseTo(0, 6);
      }),
      { numRuns: 20 },
    );
  });

  it("find a column's momentum again where nothing turns or takes it: the equator, a steady wind, no bed", () => {
    const scenario = stormyScenario("column", {
      ...{ wind: 15, veer: 0, rain: 5, evaporation: 0.2, sun: 300, loss: -100, hold: false },
      ...{ latitude: 0, dampingRate: 0 },
    });
    const { storm, method } = scenario;
    const { series, column } = estimate({
      ...scenario,
      storm: { ...storm, windSpeed: HOURS.map(() => 15), windFrom: HOURS.map(() => 240) },
      method: { ...method, bottomDrag: 0 },
    });
    const sum = (values: number[] = []) => values.reduce((all, value) => all + value, 0);
    const duration = 86_400;
    expect(RHO * sum(column?.driftEast.at(-1))).toBeCloseTo(series.stressX[0] * duration, 6);
    expect(RHO * sum(column?.driftNorth.at(-1))).toBeCloseTo(series.stressY[0] * duration, 6);
  });

  it("find a steady layer's momentum again: the stress turns all of the transport where no bed is near", () => {
    fc.assert(
      fc.property(stormy, uniform(5, 80), (storminess, latitude) => {
        const scenario = stormyScenario("budget", { ...storminess, latitude });
        const open = { box: { latitude, longitude: -40 }, method: { ...scenario.method, ekman: "deep" as const } };
        const { series } = estimate({ ...scenario, ...open });
        const f = 2 * 7.292115e-5 * Math.sin((latitude * Math.PI) / 180);
        // Without a shore, across is east and along is north.
        for (const k of HOURS) {
          expect(RHO * f * series.transportAcross[k]).toBeCloseTo(series.stressY[k], 12);
          expect(RHO * f * series.transportAlong[k]).toBeCloseTo(-series.stressX[k], 12);
        }
      }),
      { numRuns: 10 },
    );
  });
});
