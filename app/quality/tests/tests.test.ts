import { describe, expect, it } from "vitest";
import { attenuatedSignal } from "./attenuated-signal";
import { climatology } from "./climatology";
import { directionMissing } from "./direction-missing";
import { flatLine } from "./flat-line";
import { grossRange } from "./gross-range";
import { gustAndMean } from "./gust-and-mean";
import { jumpWithoutPressure } from "./jump-without-pressure";
import { lightAtNight } from "./light-at-night";
import { rateOfChange } from "./rate-of-change";
import { spike } from "./spike";

const HOUR = 3600;
const hourly = (values: readonly number[]) => values.map((_, hour) => hour * HOUR);
const told = (flags: Uint8Array) => [...flags].join(" ");
const NaNs = Number.NaN;

describe("gross range", () => {
  it("lets the limits themselves pass, and needs none on a side", () => {
    const limits = { failLow: 0, failHigh: null, suspectLow: null, suspectHigh: 75 };
    expect(told(grossRange([-0.1, 0, 75, 75.1, 1e9, NaNs], limits))).toBe("4 1 1 3 3 9");
  });
});

describe("climatology", () => {
  const at = (month: number) => Date.UTC(2026, month - 1, 15) / 1000;
  const winter = { fromMonth: 11, toMonth: 2, low: 0, high: 40 };

  it("goes over the turn of the year, and evaluates no month without a season", () => {
    const months = [1, 2, 3, 10, 11, 12].map(at);
    expect(told(climatology(months, [50, 40, 50, 50, 50, NaNs], [winter]))).toBe("3 1 2 2 3 9");
  });
});

describe("spike", () => {
  const limits = { low: 5, high: 10, method: "differential" as const };

  it("leaves a front alone: a step is no spike", () => {
    expect(told(spike([4, 4, 20, 20, 20], limits))).toBe("2 1 1 1 2");
    expect(told(spike([4, 4, 20, 20, 20], { ...limits, method: "average" }))).toBe("2 3 3 1 2");
  });

  it("is not evaluated beside a gap, nor by a neighbour that judges no other", () => {
    expect(told(spike([4, 4, NaNs, 4, 4, 4], limits))).toBe("2 2 9 2 1 2");
    expect(told(spike([4, 4, 999, 4, 4], limits, [4, 4, NaNs, 4, 4]))).toBe("2 2 4 2 2");
  });

  it("is suspect up to and with the high limit", () => {
    expect(told(spike([0, 5, 0], limits))).toBe("2 1 2");
    expect(told(spike([0, 10, 0], limits))).toBe("2 3 2");
    expect(told(spike([0, 10.1, 0], limits))).toBe("2 4 2");
  });
});

describe("rate of change", () => {
  const limits = { deviations: 3, hours: 8, least: 0.3 };
  const rough = [5, 6, 5, 6, 5, 6, 5, 6, 5];

  it("needs eight steps, and judges the ninth by them alone", () => {
    expect(told(rateOfChange(hourly([...rough, 6]), [...rough, 6], limits))).toBe("2 2 2 2 2 2 2 2 2 1");
    // Eight steps of ±1 have a sample deviation of √(8/7) = 1.069: three of them are 3.207.
    expect(rateOfChange(hourly([...rough, 8.2]), [...rough, 8.2], limits)[9]).toBe(1);
    expect(rateOfChange(hourly([...rough, 8.3]), [...rough, 8.3], limits)[9]).toBe(3);
  });

  it("holds a calm period to the least deviation", () => {
    const calm = Array.from({ length: 9 }, () => 5);
    expect(rateOfChange(hourly([...calm, 5.89]), [...calm, 5.89], limits)[9]).toBe(1);
    expect(rateOfChange(hourly([...calm, 6]), [...calm, 6], limits)[9]).toBe(3);
  });

  it("does not span a gap", () => {
    const values = [...rough, NaNs, 40];
    expect(told(rateOfChange(hourly(values), values, limits).slice(8))).toBe("2 9 2");
  });
});

describe("flat line", () => {
  const limits = { suspectCount: 3, failCount: 5, tolerance: 0, leastHours: 0 };

  it("flags with a tolerance of none where values are equal, which a strict comparison never does", () => {
    expect(told(flatLine(hourly([1, 2, 2, 2, 2, 2]), [1, 2, 2, 2, 2, 2], limits))).toBe("1 1 1 3 3 4");
  });

  it("does not span a gap, and starts anew after it", () => {
    const values = [2, 2, NaNs, 2, 2, 2];
    expect(told(flatLine(hourly(values), values, limits))).toBe("1 1 9 2 2 3");
  });

  it("may ask for a time as well: rain that is the same for six hours", () => {
    const sixHours = { ...limits, failCount: null, leastHours: 6 };
    const rain = Array.from({ length: 8 }, () => 2);
    expect(told(flatLine(hourly(rain), rain, sixHours))).toBe("1 1 1 1 1 1 3 3");
  });

  it("does not evaluate what may stay as it is", () => {
    const calm = [0, 0, 0, 0, 0, 4];
    expect(told(flatLine(hourly(calm), calm, limits, (k) => calm[k] <= 0.5))).toBe("2 2 2 2 2 1");
  });
});

describe("attenuated signal", () => {
  it("is evaluated once the record is as long as its span", () => {
    const values = [5, 5.1, 5.2, 5.1, 5, 9];
    const limits = { hours: 3, suspect: 0.5, fail: 0.15 };
    expect(told(attenuatedSignal(hourly(values), values, limits))).toBe("2 2 2 3 3 1");
    expect(told(attenuatedSignal(hourly(values), values, { ...limits, fail: 0.3 }))).toBe("2 2 2 4 4 1");
  });
});

describe("wind and pressure", () => {
  const quiet = [5, 6, 5, 6, 5, 6, 5, 6, 5];
  const steady = [1000, 1001, 1000, 1001, 1000, 1001, 1000, 1001, 1000];
  const limits = { wind: { deviations: 2, hours: 8, least: 0.3 }, pressure: { deviations: 2, hours: 8, least: 0.3 } };
  const last = (wind: number, pressure: number) =>
    jumpWithoutPressure(hourly([...quiet, 0]), [...quiet, wind], [...steady, pressure], limits)[9];

  it("is suspect where the wind jumps and the pressure does not", () => {
    expect(last(15, 1001)).toBe(3);
    expect(last(15, 990)).toBe(1);
    expect(last(6, 990)).toBe(1);
    expect(last(15, NaNs)).toBe(2);
  });
});

describe("gust and mean", () => {
  it("are suspect where the gust is below the mean, or far above it in more than light air", () => {
    const limits = { ratio: 2.5, above: 5 };
    expect(told(gustAndMean([4, 13, 12, 15.1, NaNs, 9], [5, 5, 5, 6, 6, NaNs], limits))).toBe("3 1 1 3 9 2");
  });
});

describe("direction missing", () => {
  it("is suspect in more than 1 m/s", () => {
    expect(told(directionMissing([0, 1, 1.1, 5, NaNs], [NaNs, NaNs, NaNs, 90, NaNs], 1))).toBe("1 1 3 1 9");
  });
});

describe("light at night", () => {
  const noon = Date.UTC(2026, 5, 21, 12) / 1000;
  const greenwich = { light: 20, elevation: -6, place: [0, 40] as const, step: HOUR };

  it("is bad, and mostly a wrong time zone", () => {
    const times = [noon, noon + 12 * HOUR, noon + 12 * HOUR];
    expect(told(lightAtNight(times, [800, 0, 300], greenwich))).toBe("1 1 4");
    expect(told(lightAtNight(times, [800, 0, 300], { ...greenwich, place: [180, 40] }))).toBe("4 1 1");
  });

  it("lets a mean that ends after dusk pass, and evaluates nothing without a place", () => {
    // The sun sets at about 19:32 there and stands at -6° at about 20:05: the mean from 19:06 has light in it.
    const dusk = Date.UTC(2026, 5, 21, 20, 6) / 1000;
    expect(told(lightAtNight([dusk], [40], greenwich))).toBe("1");
    expect(told(lightAtNight([noon], [800], { ...greenwich, place: null }))).toBe("2");
  });
});
