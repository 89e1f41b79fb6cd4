import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniform } from "../../../tests/factories/uniform";
import { placeOf } from "../box/place";
import type { Forcing } from "../forcing/read-forcing";
import { resolveMethod } from "../method/resolve-method";
import type { InitialWater } from "../water/initial-water";
import { layerContent } from "./layer-content";

const place = placeOf({ latitude: 40, longitude: -40 });
const water: InitialWater = {
  ...{ layerDepth: 20, askedDepth: null, CT: 18, SA: 35 },
  ...{ below: null, profile: null },
};
const method = resolveMethod({ model: "slab" }, { place, layerDepth: 20, meanWind: 10 });

const records = fc
  .array(fc.tuple(uniform(60, 20_000), uniform(0, 3e-5), uniform(0, 1e-6), uniform(-500, 500)), {
    minLength: 3,
    maxLength: 12,
  })
  .chain((knots) =>
    fc.record({
      knots: fc.constant(knots),
      cut: fc.integer({ min: 1, max: knots.length - 2 }),
      heatInterpolation: fc.constantFrom("linear" as const, "hold" as const),
    }),
  );

type Drawn = typeof records extends fc.Arbitrary<infer T> ? T : never;

function forcingOf({ knots, heatInterpolation }: Drawn, from: number, to: number): Forcing {
  let now = 0;
  const seconds = Float64Array.from(knots, ([step]) => (now += step));
  const column = (k: number) => Float64Array.from(knots, (knot) => knot[k]).slice(from, to);
  return {
    seconds: seconds.slice(from, to).map((time) => time - seconds[from]),
    origin: 0,
    windU: new Float64Array(to - from),
    windV: new Float64Array(to - from),
    rain: column(1),
    evaporation: column(2),
    netHeat: column(3),
    shortwave: null,
    latent: null,
    heatInterpolation,
  };
}

describe("a layer's heat and salt in two windows", () => {
  it("come to those of one: heat in a layer of the same depth, salt in one as much deeper as it rained", () => {
    fc.assert(
      fc.property(records, (record) => {
        const { cut, knots } = record;
        const whole = layerContent(forcingOf(record, 0, knots.length), water, method);
        const first = layerContent(forcingOf(record, 0, cut + 1), water, method);
        const rest = forcingOf(record, cut, knots.length);
        const [CT, SA] = [first.CT[cut], first.SA[cut]];
        const warmed = layerContent(rest, { ...water, CT, SA }, method);
        const layerDepth = water.layerDepth + first.freshWater[cut];
        const diluted = layerContent(rest, { ...water, CT, SA, layerDepth }, method);
        const last = knots.length - 1;
        expect(warmed.CT[last - cut]).toBeCloseTo(whole.CT[last], 11);
        expect(diluted.SA[last - cut]).toBeCloseTo(whole.SA[last], 11);
        expect(first.heat.input + warmed.heat.input).toBeCloseTo(whole.heat.input, 4);
      }),
    );
  });

  it("leave no salt below nothing, however much it rains", () => {
    const flood: Drawn = { knots: [1, 2, 3].map(() => [21_600, 0.03, 0, 0]), cut: 1, heatInterpolation: "linear" };
    const { SA } = layerContent(forcingOf(flood, 0, 3), { ...water, SA: 1e-3, layerDepth: 1e-3 }, method);
    expect(Math.min(...SA)).toBeGreaterThanOrEqual(0);
  });
});
