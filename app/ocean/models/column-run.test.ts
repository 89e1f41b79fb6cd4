import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniform } from "../../../tests/factories/uniform";
import { estimate } from "../estimate";
import { assumedRainHeatLoss } from "../heat/assumed-rain-heat";
import type { Scenario } from "../scenario";
import { seawaterDensity } from "../seawater/density";
import { conservativeFromInSitu } from "../seawater/potential-temperature";
import { pressureFromDepth } from "../seawater/pressure-from-depth";

const STEP = 900;

/** Any water, upside down too, from rivers to brine; and a storm whose every sample is one step of the column. */
const upheavals = fc.record({
  cast: fc.array(fc.tuple(uniform(-2, 32), uniform(0, 41)), { minLength: 2, maxLength: 12 }),
  steps: fc.array(fc.tuple(uniform(0, 60), uniform(0, 360), uniform(0, 60), uniform(-800, 0), uniform(0, 900)), {
    minLength: 2,
    maxLength: 20,
  }),
  latitude: uniform(-80, 80),
  gradientMixing: fc.boolean(),
});

function stepByStep({ cast, steps, latitude, gradientMixing }: Upheaval): Scenario {
  return {
    box: { latitude, longitude: -40, waterDepth: 60 },
    water: {
      cast: cast.map(([temperature, salinity], k) => ({ depth: 5 * k, temperature, salinity })),
      layerDepth: 10,
    },
    storm: {
      time: steps.map((_, k) => k * STEP),
      windSpeed: steps.map(([speed]) => speed),
      windFrom: steps.map(([, from]) => from),
      rain: steps.map(([, , rain]) => rain),
      heat: { net: steps.map(([, , , loss, sun]) => loss + sun) },
    },
    method: { model: "column", timeStep: STEP, cellSize: 2, gradientMixing, rainHeat: true },
  };
}

type Upheaval = typeof upheavals extends fc.Arbitrary<infer T> ? T : never;

describe("a column run", () => {
  it("is statically stable after every step, whatever water it starts from, by densities computed anew", () => {
    fc.assert(
      fc.property(upheavals, (upheaval) => {
        const { column } = estimate(stepByStep(upheaval));
        if (!column) throw new Error("no column");
        for (let at = 1; at < column.time.length; at++) {
          const sigma0 = column.depth.map((depth, k) => {
            const [SA, pressure] = [column.salinity[at][k], pressureFromDepth(depth, upheaval.latitude)];
            return seawaterDensity(SA, conservativeFromInSitu(SA, column.temperature[at][k], pressure), 0).sigma0;
          });
          // Temperatures come out in situ, to 1e-11 °C; back from there densities are good to some 1e-9 kg/m³.
          for (let k = 1; k < sigma0.length; k++) expect(sigma0[k]).toBeGreaterThan(sigma0[k - 1] - 1e-8);
        }
      }),
      { numRuns: 60 },
    );
  });

  it("does not leave brackish water that was held at freezing on top of lighter water", () => {
    // Cooled faster than it mixes, water of 8 g/kg grows light; held at its freezing point it is the denser again.
    const { column, headline } = estimate({
      box: { latitude: 58, longitude: -40, waterDepth: 4 },
      water: { temperature: 8, salinity: 8, layerDepth: 1, below: { temperature: 8, salinity: 8 } },
      storm: { time: [0, STEP, 2 * STEP], windSpeed: [0, 0, 0], windFrom: [0, 0, 0], heat: { net: [0, -5000, -5000] } },
      method: { model: "column", timeStep: STEP, cellSize: 0.05 },
    });
    expect(headline.surfaceTemperature.value).toBeLessThan(8);
    for (const density of column?.density ?? []) {
      for (let k = 1; k < density.length; k++) expect(density[k]).toBeGreaterThan(density[k - 1] - 1e-9);
    }
  });

  it("takes the rain's heat from the surface as warm as it is: fresh water's Conservative Temperature is not that", () => {
    const { budgets } = estimate({
      box: { latitude: 10, longitude: -40 },
      water: { temperature: 28, salinity: 2, layerDepth: 10, below: { temperature: 26, salinity: 34 } },
      storm: { time: [0, 60], windSpeed: [0, 0], windFrom: [0, 0], rain: [20, 20] },
      method: { model: "column", timeStep: 60, rainHeat: true },
    });
    expect(budgets.heat.input).toBeCloseTo(-60 * assumedRainHeatLoss(20 / 3.6e6, 28), 6);
  });
});
