import fc from "fast-check";
import {
  DRAG_LAWS,
  TRIGGER_QUANTITIES,
  type CastLevel,
  type ModelId,
  type Position,
  type Scenario,
} from "~/ocean/scenario";
import { LIKELY, type ScenarioRanges } from "./scenario-ranges";
import { uniformOrTiny as number } from "./uniform";

/** Any valid scenario of these models: a short record within these ranges, at any latitude, every optional part there or not. */
export function scenarioArbitrary(models: readonly ModelId[], ranges: ScenarioRanges = LIKELY): fc.Arbitrary<Scenario> {
  const within = (name: keyof ScenarioRanges) => number(...ranges[name]);
  const salinity = fc.oneof(
    fc.record({ salinity: within("salinity") }),
    fc.record({ practicalSalinity: within("salinity") }),
  );
  const water = fc.tuple(within("temperature"), salinity).map(([temperature, salt]) => ({ temperature, ...salt }));
  const cast = fc.array(fc.tuple(within("levelStep"), water), { minLength: 2, maxLength: 8 }).map((levels) => {
    let depth = 0;
    return levels.map(([step, level]): CastLevel => ({ depth: (depth += step), ...level }));
  });
  const twoLayers = fc
    .tuple(water, within("layerDepth"), water)
    .map(([layer, layerDepth, below]) => ({ ...layer, layerDepth, below }));
  return fc.integer({ min: 2, max: 8 }).chain((samples) =>
    fc.record({
      box: boxes(models, ranges),
      water: fc.oneof(twoLayers, fc.record({ cast, layerDepth: within("layerDepth") }, { requiredKeys: ["cast"] })),
      storm: storms(samples, ranges),
      method: fc.record(
        {
          model: fc.constantFrom(...models),
          dragLaw: fc.constantFrom(...DRAG_LAWS),
          dragCoefficient: within("dragCoefficient"),
          timeStep: within("timeStep"),
          dampingRate: within("dampingRate"),
          // The deep Ekman balance is refused near the equator, where any other model holds.
          ekman: fc.constantFrom("deep" as const, "finiteDepth" as const),
          eddyViscosity: within("eddyViscosity"),
          penetratingShortwave: fc.boolean(),
          waterType: fc.constantFrom("I" as const, "IA" as const, "IB" as const, "II" as const, "III" as const),
          heatInterpolation: fc.constantFrom("linear" as const, "hold" as const),
          rainHeat: fc.boolean(),
          cellSize: within("cellSize"),
          maxDepth: within("maxDepth"),
          bottomDrag: within("bottomDrag"),
          gradientMixing: fc.boolean(),
        },
        { requiredKeys: ["model", "dragLaw", "timeStep", "cellSize", "maxDepth"] },
      ),
      triggerLevels: fc.array(
        fc.record({
          quantity: fc.constantFrom(...TRIGGER_QUANTITIES),
          side: fc.constantFrom("below" as const, "above" as const),
          value: number(-5, 1100),
          hours: number(0, 24),
        }),
        { maxLength: 3 },
      ),
    }),
  );
}

function boxes(models: readonly ModelId[], ranges: ScenarioRanges): fc.Arbitrary<Scenario["box"]> {
  const latitude = models.includes("budget") ? fc.oneof(number(2.001, 90), number(-90, -2.001)) : number(-90, 90);
  const point = fc.record({ latitude, longitude: number(-180, 180) });
  const polygon = fc
    .tuple(number(5, 80), fc.boolean(), number(-180, 180), number(0.01, 2))
    .map(([from, south, west, size]) => {
      const edge = south ? -from : from;
      const ring: Position[] = [
        [west, edge],
        [west + size, edge],
        [west + size / 2, edge + size],
      ];
      return { polygon: ring };
    });
  const shore = fc.record({
    waterDepth: number(...ranges.waterDepth),
    shoreNormal: number(0, 360),
    distanceToShore: number(0, 1e6),
  });
  return fc.tuple(fc.oneof(point, polygon), shore).map(([place, coast]) => ({ ...place, ...coast }));
}

function storms(samples: number, ranges: ScenarioRanges): fc.Arbitrary<Scenario["storm"]> {
  const series = (min: number, max: number) => fc.array(number(min, max), { minLength: samples, maxLength: samples });
  const flux = series(...ranges.flux);
  const sun = series(0, ranges.flux[1]);
  const heat = fc.oneof(
    fc.record({ net: flux }),
    fc.record({ shortwave: sun, longwave: flux, sensible: flux, latent: flux }, { requiredKeys: ["shortwave"] }),
  );
  const cyclone = fc.record({ radiusOfMaximumWind: number(1000, 1e6), translationSpeed: number(0, 50) });
  return fc
    .record(
      {
        intervals: fc.array(number(...ranges.interval), { minLength: samples - 1, maxLength: samples - 1 }),
        windSpeed: series(...ranges.windSpeed),
        windFrom: series(0, 360),
        windHeight: number(...ranges.windHeight),
        rain: series(...ranges.rain),
        evaporation: series(...ranges.evaporation),
        cyclone,
        heat,
      },
      { requiredKeys: ["intervals", "windSpeed", "windFrom"] },
    )
    .map(({ intervals, ...storm }) => {
      let seconds = 0;
      return { time: [0, ...intervals.map((interval) => (seconds += interval))], ...storm };
    });
}

/** A steady storm over a two-layer sea: the plain case that single properties start from. */
export function plainScenario(change: { latitude?: number; hours?: number } & Partial<Scenario> = {}): Scenario {
  const { latitude = 45, hours = 48, ...parts } = change;
  const time = Array.from({ length: hours + 1 }, (_, k) => k * 3600);
  return {
    box: { latitude, longitude: -40 },
    water: { temperature: 18, salinity: 35, layerDepth: 20 },
    storm: { time, windSpeed: time.map(() => 12), windFrom: time.map(() => 270) },
    method: { model: "slab" },
    ...parts,
  };
}
