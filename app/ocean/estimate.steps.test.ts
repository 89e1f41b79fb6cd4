import { describe, expect, it } from "vitest";
import { estimate } from "./estimate";
import type { MethodChoices, ModelId, Scenario, ScenarioStorm, ScenarioWater } from "./scenario";

const HOURS = Array.from({ length: 37 }, (_, k) => k);
const END = HOURS.length - 1;

const TWO_LAYERS: ScenarioWater = {
  ...{ temperature: 22, salinity: 35, layerDepth: 20 },
  below: { temperature: 14, salinity: 35.4 },
};
const SMOOTH: ScenarioWater = {
  cast: [
    { depth: 0, temperature: 26, salinity: 35 },
    { depth: 20, temperature: 26, salinity: 35 },
    { depth: 60, temperature: 19, salinity: 35.3 },
    { depth: 120, temperature: 15, salinity: 35.4 },
  ],
};

function after(
  method: MethodChoices,
  { water = TWO_LAYERS, ...storm }: Partial<ScenarioStorm> & { water?: ScenarioWater } = {},
) {
  const scenario: Scenario = {
    box: { latitude: 35, longitude: -40, waterDepth: 120, shoreNormal: 200 },
    water,
    storm: {
      time: HOURS.map((k) => k * 3600),
      windSpeed: HOURS.map((k) => 14 + 8 * Math.sin(k / 5)),
      windFrom: HOURS.map((k) => (200 + 6 * k) % 360),
      heat: { net: HOURS.map((k) => -200 + 100 * Math.sin(k / 4)) },
      ...storm,
    },
    method: { dragLaw: "constant", cellSize: 2, ...method },
  };
  const { series } = estimate(scenario);
  const last = series.time.length - 1;
  return {
    drift: [series.driftEast[last], series.driftNorth[last]],
    displacement: [series.displacementEast[last], series.displacementNorth[last]],
    temperature: series.temperature[last],
    cooling: series.temperature[0] - series.temperature[last],
  };
}

type End = ReturnType<typeof after>;

/** Errors of an end under steps of an hour, a half, a quarter, an eighth, against a very short one; then their ratios. */
function ratios(work: (timeStep: number) => End, error: (end: End, exact: End) => number): number[] {
  const exact = work(3600 / 128);
  const errors = [3600, 1800, 900, 450].map((timeStep) => error(work(timeStep), exact));
  return errors.slice(1).map((next, k) => errors[k] / next);
}

const away = (name: "drift" | "displacement") => (end: End, exact: End) =>
  Math.hypot(end[name][0] - exact[name][0], end[name][1] - exact[name][1]);

describe("halving the step", () => {
  it.each<ModelId>(["budget", "slab", "coastal"])(
    "quarters what a layer's way misses: the stress between steps is taken as linear, all else is exact (%s)",
    (model) => {
      for (const ratio of ratios((timeStep) => after({ model, timeStep }), away("displacement"))) {
        expect(ratio).toBeGreaterThan(3.9);
        expect(ratio).toBeLessThan(4.2);
      }
    },
  );

  it.each<ModelId>(["budget", "slab", "coastal"])("changes nothing where the stress is linear (%s)", (model) => {
    const steady = { windSpeed: HOURS.map(() => 17), windFrom: HOURS.map(() => 230) };
    const [coarse, fine] = [3600, 225].map((timeStep) => after({ model, timeStep }, steady));
    for (const k of [0, 1]) {
      expect(coarse.drift[k]).toBeCloseTo(fine.drift[k], 12);
      expect(coarse.displacement[k] / fine.displacement[k]).toBeCloseTo(1, 11);
    }
  });

  it.each([
    ["shines", { shortwave: HOURS.map((k) => 400 * Math.max(0, Math.sin(k / 4))) }],
    ["cools", { net: HOURS.map(() => -300) }],
  ])("changes nothing in a calm column while it %s: heat is added up exactly", (_, heat) => {
    const calm = { windSpeed: HOURS.map(() => 0), heat };
    const ends = [3600, 900, 225].map((timeStep) => after({ model: "column", timeStep }, calm).temperature);
    expect(ends[1]).toBeCloseTo(ends[0], 10);
    expect(ends[2]).toBeCloseTo(ends[0], 10);
  });

  it("quarters the error of a column's current while its layer mixes as a whole", () => {
    const light = { windSpeed: HOURS.map((k) => 4 + Math.sin(k / 5)) };
    const bulk = (timeStep: number) => after({ model: "column", gradientMixing: false, timeStep }, light);
    for (const ratio of ratios(bulk, away("drift"))) {
      expect(ratio).toBeGreaterThan(3.5);
      expect(ratio).toBeLessThan(4.5);
    }
  });

  it("brings a column's cooling nearer by a third or more where shear mixes a smooth cast", () => {
    const gale = { water: SMOOTH, windSpeed: HOURS.map((k) => 10 + 14 * Math.sin((Math.PI * k) / END)) };
    const mixed = (timeStep: number) => after({ model: "column", timeStep }, gale);
    const misses = ratios(mixed, (end, exact) => Math.abs(end.cooling - exact.cooling));
    // Measured 1.4, 1.6, 1.6: mixing that starts at a threshold is between half and first order.
    for (const ratio of misses) expect(ratio).toBeGreaterThan(1.2);
    expect(mixed(450).cooling / mixed(3600 / 128).cooling).toBeCloseTo(1, 1);
  });

  it("moves a column's cooling by no more than a seventh at a sharp interface, where it has no order", () => {
    const coolings = [1800, 900, 600, 450, 300, 225, 112.5].map(
      (timeStep) => after({ model: "column", timeStep }).cooling,
    );
    const mean = coolings.reduce((sum, cooling) => sum + cooling) / coolings.length;
    for (const cooling of coolings) expect(Math.abs(cooling / mean - 1)).toBeLessThan(1 / 7);
  });
});

describe("a storm in two windows", () => {
  it.each<ModelId>(["budget", "coastal"])(
    "goes as far as in one, where the drift follows the stress at once (%s)",
    (model) => {
      const series = (from: number, to: number) => {
        const hours = HOURS.slice(from, to + 1);
        return {
          time: hours.map((k) => k * 3600),
          windSpeed: hours.map((k) => 14 + 8 * Math.sin(k / 5)),
          windFrom: hours.map((k) => (200 + 6 * k) % 360),
          heat: { net: hours.map(() => 0) },
        };
      };
      const [whole, first, second] = [series(0, END), series(0, 13), series(13, END)].map(
        (storm) => after({ model, eddyViscosity: 0.03 }, storm).displacement,
      );
      for (const k of [0, 1]) expect(first[k] + second[k]).toBeCloseTo(whole[k], 7);
    },
  );
});
