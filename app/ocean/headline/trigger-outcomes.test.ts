import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { ResponseSeries } from "../response";
import type { TriggerLevel } from "../scenario";
import { shoreAxes } from "./shore-axes";
import { spellsAbove, triggerOutcomes } from "./trigger-outcomes";

const hours = [0, 1, 2, 3, 4].map((hour) => hour * 3600);
const seriesOf = (salinity: number[]) =>
  ({ salinity, driftEast: salinity.map(() => 3), driftNorth: salinity.map(() => 4) }) as unknown as ResponseSeries;
const below: TriggerLevel = { quantity: "salinity", side: "below", value: 30, hours: 2 };

describe("trigger levels", () => {
  it("counts time beyond to the moment of crossing", () => {
    const [outcome] = triggerOutcomes({ time: hours, windSpeed: [], windFrom: [] }, seriesOf([32, 28, 28, 31, 31]), [
      below,
    ]);
    // Crosses half-way through the first hour and two thirds through the third.
    expect(outcome.hoursBeyond).toBeCloseTo(0.5 + 1 + 2 / 3, 12);
    expect(outcome.firstAt).toBe(1800);
    expect(outcome.longestSpell).toBeCloseTo(outcome.hoursBeyond, 12);
    expect(outcome.met).toBe(true);
  });

  it("meets the level by one spell that is long enough, not by several short ones", () => {
    const [outcome] = triggerOutcomes({ time: hours, windSpeed: [], windFrom: [] }, seriesOf([28, 28, 32, 28, 28]), [
      below,
    ]);
    expect(outcome.hoursBeyond).toBeCloseTo(3, 12);
    expect(outcome.longestSpell).toBeCloseTo(1.5, 12);
    expect(outcome.met).toBe(false);
  });

  it("never starts where the level is only touched", () => {
    const [outcome] = triggerOutcomes({ time: hours, windSpeed: [], windFrom: [] }, seriesOf([31, 30, 31, 30, 30]), [
      { ...below, hours: 0 },
    ]);
    expect(outcome).toMatchObject({ hoursBeyond: 0, firstAt: null, longestSpell: 0, met: false });
  });

  it("writes the first moment the way the storm writes its times", () => {
    const time = hours.map((seconds) => new Date(seconds * 1000).toISOString());
    const [outcome] = triggerOutcomes({ time, windSpeed: [], windFrom: [] }, seriesOf([32, 28, 28, 31, 31]), [below]);
    expect(outcome.firstAt).toBe("1970-01-01T00:30:00Z");
  });

  it("takes the size of a vector for drift speed", () => {
    const drift: TriggerLevel = { quantity: "driftSpeed", side: "above", value: 4.9, hours: 4 };
    const [outcome] = triggerOutcomes({ time: hours, windSpeed: [], windFrom: [] }, seriesOf([1, 1, 1, 1, 1]), [drift]);
    expect(outcome).toMatchObject({ hoursBeyond: 4, met: true, firstAt: 0 });
  });

  it("splits all of time between above and below", () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.double({ min: -5, max: 5, noNaN: true }).filter((value) => value !== 0),
          { minLength: 2, maxLength: 20 },
        ),
        (excess) => {
          const seconds = excess.map((_, k) => k * 600);
          const length = (spells: { from: number; to: number }[]) =>
            spells.reduce((sum, { from, to }) => sum + to - from, 0);
          const total =
            length(spellsAbove(seconds, excess)) +
            length(
              spellsAbove(
                seconds,
                excess.map((value) => -value),
              ),
            );
          expect(total).toBeCloseTo(seconds[seconds.length - 1], 6);
        },
      ),
    );
  });
});

describe("shore axes", () => {
  it("looks offshore, with along to the right", () => {
    const west = shoreAxes(270);
    expect(west.across.x).toBeCloseTo(-1, 12);
    expect(west.along.y).toBeCloseTo(1, 12);
    expect(shoreAxes(null)).toEqual({ across: { x: 1, y: 0 }, along: { x: 0, y: 1 } });
  });
});
