import { describe, expect, it } from "vitest";
import { plainScenario } from "../../../tests/factories/scenario-arbitrary";
import { estimate } from "../estimate";
import { BAND_NAMES, EFFECT_FIGURES, HEADLINE_FIGURES, type Response, type Uncertainty } from "../response";
import type { Scenario } from "../scenario";
import { quantiles } from "../statistics/quantile";
import { heated } from "./change-scenario";
import { FEWEST_FOR_INDICES } from "./effects";

const hours = Array.from({ length: 25 }, (_, k) => k);
/** Everything that can be uncertain. */
const whole: Scenario = {
  ...plainScenario({ hours: 24 }),
  water: { temperature: 18, salinity: 35, layerDepth: 20, below: { temperature: 14, salinity: 35.3 } },
  storm: {
    time: hours.map((k) => k * 3600),
    windSpeed: hours.map((k) => 8 + 6 * Math.sin(k / 4)),
    windFrom: hours.map((k) => (350 + k) % 360),
    rain: hours.map((k) => (k > 8 && k < 14 ? 8 : 0)),
    heat: {
      shortwave: hours.map((k) => Math.max(0, 600 * Math.sin((k * Math.PI) / 12))),
      latent: hours.map(() => -120),
    },
  },
  method: { model: "slab", penetratingShortwave: true },
  ensemble: { members: 200, seed: 7 },
};

function spreadOf(scenario: Scenario): Response & { uncertainty: Uncertainty } {
  const response = estimate(scenario);
  const { uncertainty } = response;
  if (!uncertainty) throw new Error("No ensemble was run.");
  return { ...response, uncertainty };
}

describe("an ensemble", () => {
  it("gives the same bytes for the same seed, and others for another", () => {
    expect(JSON.stringify(estimate(whole))).toBe(JSON.stringify(estimate(whole)));
    const other = estimate({ ...whole, ensemble: { members: 200, seed: 8 } });
    expect(other.headline.peakDrift.p50).not.toBe(estimate(whole).headline.peakDrift.p50);
  });

  it("leaves every value as it is without members, and puts ordered percentiles beside it", () => {
    const [single, spread] = [estimate({ ...whole, ensemble: undefined }), estimate(whole)];
    expect(single.uncertainty).toBeUndefined();
    expect(single.headline.peakStress.p50).toBeUndefined();
    for (const figure of HEADLINE_FIGURES) {
      const { value, p10 = NaN, p50 = NaN, p90 = NaN } = spread.headline[figure];
      expect(value).toBe(single.headline[figure].value);
      expect(p10, figure).toBeLessThan(p50);
      expect(p50, figure).toBeLessThan(p90);
    }
    expect(spread.series).toEqual(single.series);
  });

  it("keeps the members' figures that its percentiles are of", () => {
    const { headline, memberFigures } = spreadOf(whole);
    for (const figure of HEADLINE_FIGURES) {
      const { p10 = NaN, p50 = NaN, p90 = NaN } = headline[figure];
      expect(quantiles(memberFigures?.[figure] ?? [], [0.1, 0.5, 0.9])).toEqual([p10, p50, p90]);
    }
    expect(estimate({ ...whole, ensemble: undefined }).memberFigures).toBeUndefined();
  });

  it("bands every series at its times, the value at the start by the start's own uncertainty", () => {
    const { bands, series } = spreadOf(whole);
    expect(bands?.time).toEqual(series.time);
    for (const name of BAND_NAMES) {
      const { p10, p50, p90 } = bands?.series[name] ?? { p10: [], p50: [], p90: [] };
      expect(p10).toHaveLength(series.time.length);
      expect(
        p10.every((low, k) => low <= p50[k] && p50[k] <= p90[k]),
        name,
      ).toBe(true);
    }
    const start = bands?.series.temperature;
    // Uniform over ±0.5 °C: its 10th and 90th percentile lie 0.4 °C away.
    expect((start?.p90[0] ?? NaN) - (start?.p10[0] ?? NaN)).toBeCloseTo(0.8, 1);
    expect(bands?.series.displacementEast.p90[0]).toBe(0);
  });

  it("spreads stress as the square of an evenly drawn wind, all of it the wind's share (closed form)", () => {
    const constant: Scenario = { ...whole, method: { model: "budget", dragLaw: "constant" } };
    const { headline, uncertainty } = spreadOf(constant);
    const { value, p10 = NaN, p50 = NaN, p90 = NaN } = headline.peakStress;
    // Each percentile of the sample lies within one of the 200 strata of ±10 %: 0.1 % of the wind, 0.2 % of the stress.
    [
      [p10, 0.92],
      [p50, 1],
      [p90, 1.08],
    ].forEach(([found, wind]) => expect(Math.abs(found / value / wind ** 2 - 1)).toBeLessThan(0.002));
    const [first, ...others] = uncertainty.effects.find(({ figure }) => figure === "peakStress")?.firstOrder ?? [];
    expect(first.factor).toBe("wind speed");
    expect(first.index).toBeGreaterThan(0.95);
    for (const { index } of others) expect(index).toBeLessThan(0.12);
  });

  it("bands a change by itself: the start's uncertainty moves both its ends alike", () => {
    const { surfaceTemperature } = estimate(whole).headline;
    const width = ({ p10 = NaN, p90 = NaN }) => p90 - p10;
    expect(width(surfaceTemperature.changeBand ?? {})).toBeLessThan(0.7 * width(surfaceTemperature));
    expect(surfaceTemperature.changeBand?.p10).toBeLessThan(surfaceTemperature.change);
  });

  it("keeps at most 500 samples of a long storm's bands, its end among them", () => {
    const long = plainScenario({ hours: 1200 });
    const { bands, series } = spreadOf({ ...long, ensemble: { members: 4, seed: 1 } });
    expect(bands?.time.length).toBeLessThanOrEqual(501);
    expect(bands?.time.at(-1)).toBe(series.time.at(-1));
  });

  it("varies what is uncertain in the scenario, and nothing that was chosen or is not there", () => {
    const names = (scenario: Scenario) => spreadOf(scenario).uncertainty.factors.map(({ name }) => name);
    expect(names(whole)).toEqual([
      "drag law",
      "wind speed",
      "wind direction",
      "layer depth",
      "step below the layer",
      "start temperature",
      "start salinity",
      "rain",
      "heat flux",
      "water clarity",
      "damping",
    ]);
    const { time, windSpeed, windFrom } = whole.storm;
    const dry = { time, windSpeed, windFrom };
    const settled = { ...whole, storm: dry, method: { model: "slab", dragLaw: "smith1980", dampingRate: 0 } } as const;
    expect(names(settled)).toEqual([
      "wind speed",
      "wind direction",
      "layer depth",
      "step below the layer",
      "start temperature",
      "start salinity",
    ]);
    const cyclone = { radiusOfMaximumWind: 40_000, translationSpeed: 5 };
    const under = (parametricWind: boolean) => ({
      ...whole,
      storm: { ...whole.storm, cyclone: { ...cyclone, parametricWind } },
    });
    expect(names(under(true))).toContain("averaging of the wind");
    // Measured under a cyclone: its averaging period is known.
    expect(names(under(false))).not.toContain("averaging of the wind");
    const coastal: Scenario = {
      ...whole,
      box: { ...whole.box, waterDepth: 30, shoreNormal: 90 },
      method: { model: "coastal" },
    };
    expect(names(coastal)).toContain("eddy viscosity");
    expect(names({ ...coastal, method: { model: "coastal", eddyViscosity: 0.01 } })).not.toContain("eddy viscosity");
  });

  it("adds heat that neither evaporates water nor shines into it", () => {
    const components = heated(whole, 50).storm.heat;
    expect(components?.sensible).toEqual(hours.map(() => 50));
    expect(components?.latent).toBe(whole.storm.heat?.latent);
    expect(components?.shortwave).toBe(whole.storm.heat?.shortwave);
    const net = { ...whole, storm: { ...whole.storm, heat: { net: hours.map(() => -200) } } };
    expect(heated(net, 50).storm.heat).toEqual({ net: hours.map(() => -150) });
  });

  it("tells how far each factor alone moves a figure, the widest first, on both sides of the value where it is monotone", () => {
    const { effects } = spreadOf(whole).uncertainty;
    expect(effects.map(({ figure }) => figure)).toEqual([...EFFECT_FIGURES]);
    for (const { figure, value, bars } of effects) {
      const swings = bars.map(({ low, high }) => high.value - low.value);
      expect(
        [...swings].sort((a, b) => b - a),
        figure,
      ).toEqual(swings);
      expect(swings.every((swing) => swing >= 0)).toBe(true);
      expect(bars).toHaveLength(11);
      for (const { low, high } of bars) {
        expect(low.value).toBeLessThanOrEqual(value);
        expect(high.value).toBeGreaterThanOrEqual(value);
        // An end that is the estimate itself says so.
        for (const end of [low, high]) if (end.setting === "as given") expect(end.value).toBe(value);
      }
    }
    const drift = effects.find(({ figure }) => figure === "peakDrift");
    const depth = drift?.bars.find(({ factor }) => factor === "layer depth");
    expect([depth?.low.setting, depth?.high.setting]).toEqual(["+20 %", "−20 %"]);
    const stress = effects.find(({ figure }) => figure === "peakStress");
    const wind = stress?.bars.find(({ factor }) => factor === "wind speed");
    expect([wind?.low.setting, wind?.high.setting]).toEqual(["−10 %", "+10 %"]);
    const direction = stress?.bars.find(({ factor }) => factor === "wind direction");
    expect((direction?.high.value ?? NaN) - (direction?.low.value ?? NaN)).toBeLessThan(1e-12);
  });

  it("shares out the spread: start temperature drives the temperature, rain and layer depth the freshening, wind and law the stress", () => {
    const { effects } = spreadOf(whole).uncertainty;
    const leading = (name: string) => effects.find(({ figure }) => figure === name)?.firstOrder[0];
    expect(leading("surfaceTemperature")?.factor).toBe("start temperature");
    expect(leading("surfaceTemperature")?.index).toBeGreaterThan(0.5);
    expect(["drag law", "wind speed"]).toContain(leading("peakStress")?.factor);
    for (const { firstOrder } of effects) {
      const sum = firstOrder.reduce((total, { index }) => total + (index ?? 0), 0);
      expect(sum).toBeLessThan(1.5);
    }
  });

  it(`says nothing of shares under ${FEWEST_FOR_INDICES} members`, () => {
    const { effects } = spreadOf({ ...whole, ensemble: { members: FEWEST_FOR_INDICES - 1, seed: 1 } }).uncertainty;
    expect(effects.every(({ firstOrder }) => firstOrder.length === 0)).toBe(true);
  });

  it("counts members that fell over an edge, and goes on without them", () => {
    const thin: Scenario = {
      ...plainScenario({ hours: 48 }),
      water: { temperature: 30, salinity: 35, layerDepth: 1 },
      storm: { ...plainScenario({ hours: 48 }).storm, evaporation: new Array<number>(49).fill(8) },
      ensemble: { members: 60, seed: 2 },
    };
    const { computed, members, failures, factors } = spreadOf(thin).uncertainty;
    expect(members).toBe(60);
    expect(computed).toBeGreaterThan(0);
    expect(computed).toBeLessThan(60);
    expect(failures?.reduce((sum, failure) => sum + failure.members, 0)).toBe(60 - computed);
    expect(failures?.[0].message).toMatch(/layer/);
    // By itself the thinner layer evaporates away as well; the thicker one does not.
    expect(factors.find(({ name }) => name === "layer depth")?.failed).toEqual(["−20 %"]);
    expect(factors.find(({ name }) => name === "wind speed")?.failed).toBeUndefined();
  });

  it("counts the members that meet a trigger level, and bands the hours beyond it", () => {
    const { triggers } = spreadOf({
      ...whole,
      triggerLevels: [
        { quantity: "stress", side: "above", value: 0, hours: 1 },
        { quantity: "stress", side: "above", value: 100, hours: 1 },
        { quantity: "temperature", side: "below", value: 18.1, hours: 12 },
      ],
    }).headline;
    expect(triggers.map(({ metInMembers }) => metInMembers)).toEqual([200, 0, expect.any(Number)]);
    expect(triggers[2].metInMembers).toBeGreaterThan(20);
    expect(triggers[2].metInMembers).toBeLessThan(180);
    expect(triggers[2].p10).toBeLessThan(triggers[2].p90 ?? 0);
  });
});
