import fc from "fast-check";
import { DRAG_LAWS, TRIGGER_QUANTITIES, type ModelId, type Scenario } from "~/ocean/scenario";

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Any scenario that the engine must compute, at any latitude, with a short record and every optional part there or not. */
export function scenarioArbitrary(models: readonly ModelId[]): fc.Arbitrary<Scenario> {
  return fc.integer({ min: 2, max: 12 }).chain((n) => {
    const series = (min: number, max: number) => fc.array(number(min, max), { minLength: n, maxLength: n });
    const layerDepth = number(1, 150);
    return fc.record({
      box: fc.record({
        // The steady Ekman balance of model budget is refused near the equator.
        latitude: models.includes("budget") ? fc.oneof(number(2.001, 90), number(-90, -2.001)) : number(-90, 90),
        longitude: number(-180, 180),
        waterDepth: number(5, 300),
        shoreNormal: number(0, 360),
        distanceToShore: number(0, 1e6),
      }),
      water: fc.oneof(
        fc.record({
          temperature: number(-1, 32),
          salinity: number(0, 41),
          layerDepth,
          below: fc.record({ temperature: number(-1, 32), salinity: number(0, 41) }),
        }),
        fc.record({
          cast: fc
            .array(fc.record({ step: number(0.5, 40), temperature: number(-1, 32), salinity: number(0, 41) }), {
              minLength: 2,
              maxLength: 8,
            })
            .map((levels) => {
              let depth = 0;
              return levels.map(({ step, temperature, salinity }) => ({
                depth: (depth += step),
                temperature,
                salinity,
              }));
            }),
        }),
      ),
      storm: fc
        .record({
          steps: fc.array(number(60, 21_600), { minLength: n - 1, maxLength: n - 1 }),
          windSpeed: series(0, 70),
          windFrom: series(0, 360),
          windHeight: number(2, 60),
          rain: fc.option(series(0, 100), { nil: undefined }),
          cyclone: fc.option(fc.record({ radiusOfMaximumWind: number(1000, 1e6), translationSpeed: number(0, 50) }), {
            nil: undefined,
          }),
          heat: fc.option(
            fc.oneof(
              fc.record({ net: series(-800, 800) }),
              fc.record({ shortwave: series(0, 900), latent: series(-400, 50) }),
            ),
            {
              nil: undefined,
            },
          ),
        })
        .map(({ steps, rain, heat, cyclone, ...storm }) => {
          let seconds = 0;
          const time = [0, ...steps.map((step) => (seconds += step))];
          return { time, ...storm, ...(rain && { rain }), ...(heat && { heat }), ...(cyclone && { cyclone }) };
        }),
      method: fc.record({
        model: fc.constantFrom(...models),
        dragLaw: fc.constantFrom(...DRAG_LAWS),
        ekman: models.includes("budget")
          ? fc.constantFrom("deep" as const, "finiteDepth" as const)
          : fc.constant("deep" as const),
        heatInterpolation: fc.constantFrom("linear" as const, "hold" as const),
        penetratingShortwave: fc.boolean(),
        rainHeat: fc.boolean(),
        cellSize: fc.constant(2),
      }),
      triggerLevels: fc.array(
        fc.record({
          quantity: fc.constantFrom(...TRIGGER_QUANTITIES),
          side: fc.constantFrom("below" as const, "above" as const),
          value: number(-5, 1100),
          hours: number(0, 24),
        }),
        { maxLength: 3 },
      ),
    });
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
