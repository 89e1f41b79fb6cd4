import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { FLAGS, MISSING, type Flags } from "../flags";
import { attenuatedSignal } from "./attenuated-signal";
import { climatology } from "./climatology";
import { flatLine } from "./flat-line";
import { grossRange } from "./gross-range";
import { rateOfChange, spreadBefore } from "./rate-of-change";
import { spike } from "./spike";
import { steepestChange } from "./steepest-change";

/** Tenths, so that adding and halving them is exact or nearly so, and some values are alike; some are missing. */
const series = fc.array(
  fc.oneof(
    { weight: 6, arbitrary: fc.integer({ min: -50, max: 50 }) },
    { weight: 1, arbitrary: fc.constant(Number.NaN) },
  ),
  { maxLength: 60 },
);

interface Scale {
  /** Values and thresholds times this, a power of two. */
  times: number;
  plus: number;
}
type Run = (values: readonly number[], scale: Scale) => Flags;

const hourly = (values: readonly number[]) => values.map((_, hour) => hour * 3600);
const AS_IS: Scale = { times: 1, plus: 0 };

/** Each test with thresholds that follow the scale of its values. */
const TESTS: [string, Run][] = [
  [
    "gross range",
    (values, { times, plus }) =>
      grossRange(values, {
        failLow: -40 * times + plus,
        failHigh: 40 * times + plus,
        suspectLow: -20 * times + plus,
        suspectHigh: null,
      }),
  ],
  [
    "climatology",
    (values, { times, plus }) =>
      climatology(hourly(values), values, [
        { fromMonth: 12, toMonth: 1, low: -10 * times + plus, high: 10 * times + plus },
      ]),
  ],
  ["spike, average", (values, { times }) => spike(values, { low: 10 * times, high: 30 * times, method: "average" })],
  [
    "spike, differential",
    (values, { times }) => spike(values, { low: 10 * times, high: 30 * times, method: "differential" }),
  ],
  ["steepest change", (values, { times }) => steepestChange(hourly(values), values, 25 * times)],
  [
    "flat line",
    (values, { times }) =>
      flatLine(hourly(values), values, { suspectCount: 2, failCount: 4, tolerance: 20 * times, leastHours: 0 }),
  ],
  [
    "attenuated signal",
    (values, { times }) =>
      attenuatedSignal(hourly(values), values, { hours: 3, suspect: 40 * times, fail: 20 * times }),
  ],
];

describe.each(TESTS)("%s", (_, run) => {
  it("gives every value a flag, and missing to the missing ones alone", () => {
    fc.assert(
      fc.property(series, (values) => {
        const flags = [...run(values, AS_IS)];
        expect(flags).toHaveLength(values.length);
        expect(flags.every((flag) => FLAGS.some((known) => known === flag))).toBe(true);
        expect(flags.map((flag) => flag === MISSING)).toEqual(values.map(Number.isNaN));
      }),
    );
  });

  it("says the same in another unit: values and thresholds moved and doubled together", () => {
    fc.assert(
      fc.property(series, fc.constantFrom(0.5, 2, 8), fc.integer({ min: -64, max: 64 }), (values, times, plus) => {
        const turned = values.map((value) => value * times + plus);
        expect([...run(turned, { times, plus })]).toEqual([...run(values, AS_IS)]);
      }),
    );
  });
});

describe("order of the samples", () => {
  it("is nothing to the gross range: flags go with their values", () => {
    const [, range] = TESTS[0];
    fc.assert(
      fc.property(series, fc.nat(), (values, turn) => {
        const by = <T>(list: T[]) => [
          ...list.slice(turn % (list.length || 1)),
          ...list.slice(0, turn % (list.length || 1)),
        ];
        expect([...range(by(values), AS_IS)]).toEqual(by([...range(values, AS_IS)]));
      }),
    );
  });

  it.each([TESTS[2], TESTS[3]])("turned round turns the flags of the %s round", (_, run) => {
    fc.assert(
      fc.property(series, (values) => {
        expect([...run([...values].reverse(), AS_IS)]).toEqual([...run(values, AS_IS)].reverse());
      }),
    );
  });

  it("the past alone decides on rate, flat line and attenuation: what comes later changes nothing", () => {
    fc.assert(
      fc.property(series, series, (values, later) => {
        for (const [, run] of TESTS.slice(4)) {
          expect([...run([...values, ...later], AS_IS)].slice(0, values.length)).toEqual([...run(values, AS_IS)]);
        }
      }),
    );
  });
});

describe("against the definition computed in the plainest way", () => {
  it("the range of a span", () => {
    fc.assert(
      fc.property(series, (values) => {
        const flags = attenuatedSignal(hourly(values), values, { hours: 4, suspect: 60, fail: 30 });
        values.forEach((value, k) => {
          const span = values.slice(Math.max(0, k - 4), k + 1);
          const range = Math.max(...span) - Math.min(...span);
          const known = k >= 4 && !span.some(Number.isNaN);
          const expected = Number.isNaN(value) ? 9 : !known ? 2 : range < 30 ? 4 : range < 60 ? 3 : 1;
          expect(flags[k]).toBe(expected);
        });
      }),
    );
  });

  it("the spread of the steps before", () => {
    fc.assert(
      fc.property(series, (values) => {
        const spread = spreadBefore(hourly(values), values, 10);
        values.forEach((_, k) => {
          const steps = values
            .map((value, at) => value - (values[at - 1] ?? Number.NaN))
            .filter((step, at) => at < k && at >= k - 10 && !Number.isNaN(step));
          if (steps.length < 8) return expect(spread[k]).toBeNaN();
          const mean = steps.reduce((sum, step) => sum + step, 0) / steps.length;
          const variance = steps.reduce((sum, step) => sum + (step - mean) ** 2, 0) / (steps.length - 1);
          expect(spread[k]).toBeCloseTo(Math.sqrt(variance), 9);
        });
      }),
    );
  });
});

describe("rate of change", () => {
  it("keeps its verdict in another unit but where a step stands on the limit itself", () => {
    fc.assert(
      fc.property(series, fc.constantFrom(2, 4), (values, times) => {
        const limits = { deviations: 3, hours: 12, least: 0.5 };
        const turned = values.map((value) => value * times);
        const scaled = { ...limits, least: 0.5 * times };
        expect([...rateOfChange(hourly(turned), turned, scaled)]).toEqual([
          ...rateOfChange(hourly(values), values, limits),
        ]);
      }),
    );
  });
});
