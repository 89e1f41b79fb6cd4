import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { runningHeat, runningRain, totalAt } from "./running-totals";

const HOUR = 3600;

function samples(hours: number[], values: number[]) {
  return { time: Float64Array.from(hours, (hour) => hour * HOUR), values: Float64Array.from(values) };
}

const inHours = ({ time }: { time: Float64Array }) => Array.from(time, (seconds) => seconds / HOUR);

describe("rain held until the next time", () => {
  it("sums hourly rates to the amount", () => {
    const total = runningRain(samples([0, 1, 2, 3], [2, 4, 0, 1]), { startsAt: 0, endsAt: 4 * HOUR });
    expect(inHours(total)).toEqual([0, 1, 2, 3, 4]);
    expect([...total.values]).toEqual([0, 2, 6, 6, 7]);
  });

  it("does not stretch a rate across a gap", () => {
    const total = runningRain(samples([0, 1, 2, 50, 51], [0, 0, 6, 0, 3]), { startsAt: 0, endsAt: 60 * HOUR });
    expect(inHours(total)).toEqual([0, 1, 2, 3, 50, 51, 52]);
    expect([...total.values]).toEqual([0, 0, 0, 6, 6, 6, 9]);
  });

  it("stops at the end of the window", () => {
    const total = runningRain(samples([0, 1], [0, 10]), { startsAt: 0, endsAt: 1.5 * HOUR });
    expect(inHours(total).at(-1)).toBe(1.5);
    expect(total.values.at(-1)).toBe(5);
  });

  it("takes ten-minute rates for a sixth of an hour each", () => {
    const total = runningRain(samples([0, 1 / 6, 2 / 6], [6, 6, 6]), { startsAt: 0, endsAt: HOUR });
    expect(total.values.at(-1)).toBeCloseTo(3, 12);
  });
});

describe("heat taken up", () => {
  it("is the flux times the time, evenly between samples", () => {
    const total = runningHeat(samples([0, 1, 2], [100, 300, -100]));
    expect([...total.values]).toEqual([0, 200 * HOUR, 300 * HOUR]);
  });

  it("takes up nothing across a pause of more than 6 h, and bridges those of a slower record", () => {
    expect(runningHeat(samples([0, 1, 9, 10], [100, 100, 100, 100])).values.at(-1)).toBe(200 * HOUR);
    expect(runningHeat(samples([0, 24, 48], [100, 100, 100])).values.at(-1)).toBe(4800 * HOUR);
  });
});

describe("a total at other times", () => {
  it("is none before, straight between and the last after", () => {
    const total = runningRain(samples([1, 2], [4, 4]), { startsAt: 0, endsAt: 9 * HOUR });
    expect([...totalAt(total, [0, HOUR, 1.5 * HOUR, 3 * HOUR, 9 * HOUR])]).toEqual([0, 0, 2, 8, 8]);
    expect([...totalAt({ time: new Float64Array(0), values: new Float64Array(0) }, [0, 1])]).toEqual([0, 0]);
  });

  it("never falls while it rains", () => {
    const pauses = fc.array(fc.integer({ min: 1, max: 100_000 }), { minLength: 1, maxLength: 40 });
    fc.assert(
      fc.property(pauses, fc.infiniteStream(fc.double({ min: 0, max: 200, noNaN: true })), (steps, rates) => {
        let at = 0;
        const time = Float64Array.from(steps, (pause) => (at += pause));
        const values = Float64Array.from(steps, () => rates.next().value as number);
        const total = runningRain({ time, values }, { startsAt: 0, endsAt: at + HOUR });
        total.values.forEach((value, index) => {
          if (index > 0) expect(value).toBeGreaterThanOrEqual(total.values[index - 1]);
          if (index > 0) expect(total.time[index]).toBeGreaterThan(total.time[index - 1]);
        });
      }),
    );
  });
});
