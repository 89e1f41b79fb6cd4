import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readForcing, type StormInput } from "./storm-forcing";
import type { SampledChannels, Samples } from "~/quality/samples";

const HOUR = 3600;
const START = Date.parse("2026-11-03T00:00:00Z") / 1000;
const at = (hour: number) => START + hour * HOUR;

function every(hours: number, step: number, value: (hour: number) => number): Samples {
  const time: number[] = [];
  for (let hour = 0; hour <= hours; hour += step) time.push(at(hour));
  return { time, values: time.map((seconds) => value((seconds - START) / HOUR)) };
}

const wind = (hours = 24): SampledChannels => ({
  windSpeed: every(hours, 1, (hour) => 5 + hour),
  windFrom: every(hours, 1, () => 270),
});

function read(channels: SampledChannels, changes: Partial<StormInput> = {}) {
  const input = { channels, windHeight: 10, startsAt: at(0), endsAt: at(24), heatInterpolation: "linear" as const };
  return readForcing({ ...input, ...changes }, "UTC");
}

describe("the common time axis", () => {
  it("joins the times of all channels within the window, with its ends", () => {
    const rain: Samples = { time: [at(0.5), at(1.5)], values: [2, 4] };
    const { forcing } = read({ ...wind(3), rain }, { startsAt: at(0.25), endsAt: at(2.75) });
    expect(forcing?.time).toEqual([0.25, 0.5, 1, 1.5, 2, 2.5, 2.75].map(at));
  });

  it("keeps measured wind as it was measured", () => {
    const { forcing } = read({ ...wind(), rain: every(24, 0.5, () => 1) });
    const whole = forcing?.time.flatMap((seconds, index) => ((seconds - START) % HOUR === 0 ? [index] : [])) ?? [];
    expect(whole.map((index) => forcing?.windSpeed[index])).toEqual(wind().windSpeed?.values);
    expect(whole.every((index) => forcing?.windFrom[index] === 270)).toBe(true);
  });

  it("turns the wind as a vector: half way from 350° to 10° it comes from north, a little weaker", () => {
    const channels = {
      windSpeed: { time: [at(0), at(1)], values: [10, 10] },
      windFrom: { time: [at(0), at(1)], values: [350, 10] },
      rain: { time: [at(0), at(0.5)], values: [0, 0] },
    };
    const { forcing } = read(channels, { endsAt: at(1) });
    expect(forcing?.windFrom[1]).toBeCloseTo(0, 9);
    expect(forcing?.windSpeed[1]).toBeCloseTo(10 * Math.cos((10 * Math.PI) / 180), 12);
  });

  it("holds rain until its next time and keeps its total, however the axis is cut", () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0, max: 80, noNaN: true }), { minLength: 24, maxLength: 24 }),
        fc.array(fc.double({ min: 0.01, max: 23.99, noNaN: true }), { maxLength: 30 }),
        (rates, cuts) => {
          const rain: Samples = { time: rates.map((_, hour) => at(hour)), values: rates };
          const hours = [...new Set([...rates.keys(), 24, ...cuts])].sort((a, b) => a - b);
          const heat = { netHeat: { time: hours.map(at), values: hours } };
          const { forcing } = read({ ...wind(), rain, ...heat }, { endsAt: at(24) });
          if (!forcing?.rain) return false;
          const { time, rain: held } = forcing;
          const total = time
            .slice(1)
            .reduce((sum, next, index) => sum + (held[index] * (next - time[index])) / HOUR, 0);
          const expected = rates.reduce((sum, rate) => sum + rate, 0);
          return Math.abs(total - expected) <= 1e-9 * Math.max(1, expected);
        },
      ),
    );
  });

  it("lets the last rain stand for one step of its record, then stops it", () => {
    const rain: Samples = { time: [at(0), at(1), at(2)], values: [1, 1, 6] };
    const { forcing } = read({ ...wind(6), rain }, { endsAt: at(6) });
    expect(forcing?.rain).toEqual([1, 1, 6, 0, 0, 0, 0]);
  });

  it("takes heat on the line between its times, or held where the method says so", () => {
    const netHeat: Samples = { time: [at(0), at(2)], values: [0, -100] };
    expect(read({ ...wind(2), netHeat }, { endsAt: at(2) }).forcing?.heat).toEqual({ net: [0, -50, -100] });
    const held = read({ ...wind(2), netHeat }, { endsAt: at(2), heatInterpolation: "hold" });
    expect(held.forcing?.heat).toEqual({ net: [0, 0, -100] });
  });

  it("needs no direction where it is calm", () => {
    const channels = {
      windSpeed: { time: [at(0), at(1), at(2)], values: [3, 0, 3] },
      windFrom: { time: [at(0), at(2)], values: [90, 90] },
    };
    expect(read(channels, { endsAt: at(2) }).forcing?.windSpeed).toEqual([3, 0, 3]);
  });
});

describe("pauses", () => {
  const without = (samples: Samples | undefined, from: number, to: number): Samples => {
    const kept = Array.from(samples?.time ?? []).flatMap((seconds, index) =>
      seconds > at(from) && seconds < at(to) ? [] : [index],
    );
    return { time: kept.map((i) => samples?.time[i] ?? 0), values: kept.map((i) => samples?.values[i] ?? 0) };
  };

  it("of more than six hours are told, and stay in the axis although other channels go on", () => {
    const { windSpeed, windFrom } = wind();
    const { forcing, problems } = read({
      windSpeed: without(windSpeed, 5, 15),
      windFrom,
      rain: every(24, 1, () => 1),
    });
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({ path: "storm.windSpeed", code: "GAP" });
    expect(problems[0].message).toContain(
      "wind has no value for 10.0 h, from 2026-11-03 05:00 UTC to 2026-11-03 15:00 UTC",
    );
    expect(forcing?.time.filter((seconds) => seconds > at(5) && seconds < at(15))).toEqual([]);
  });

  it("of six hours are bridged", () => {
    const { windSpeed, windFrom } = wind();
    expect(read({ windSpeed: without(windSpeed, 5, 11), windFrom }).problems).toEqual([]);
  });

  it("are usual for a daily gauge, but not for wind", () => {
    const daily = { ...wind(72), rain: every(72, 24, () => 1), netHeat: every(72, 24, () => 10) };
    expect(read(daily, { endsAt: at(72) }).problems).toEqual([]);
    const slow = { windSpeed: every(72, 12, () => 5), windFrom: every(72, 12, () => 5) };
    expect(read(slow, { endsAt: at(72) }).problems.map(({ code }) => code)).toEqual(Array(6).fill("GAP"));
  });

  it("at an end of the window are told too", () => {
    const { problems } = read(wind(24), { startsAt: at(-8), endsAt: at(25) });
    expect(problems).toHaveLength(1);
    expect(problems[0].message).toContain("from 2026-11-02 16:00 UTC to 2026-11-03 00:00 UTC");
  });

  it("of a rain record that stops early are told", () => {
    const { problems } = read({ ...wind(24), rain: every(10, 1, () => 1) });
    expect(problems.map(({ path, code }) => [path, code])).toEqual([["storm.rain", "GAP"]]);
  });
});

describe("what is missing", () => {
  it("is assumed, and said", () => {
    const { forcing, assumptions } = read(wind(), { windHeight: null });
    expect(forcing).toMatchObject({ windHeight: 10 });
    expect(forcing).not.toHaveProperty("rain");
    expect(forcing).not.toHaveProperty("heat");
    expect(assumptions).toEqual([
      "The record does not state the wind's height: taken as 10 m.",
      "No rain is given: taken as 0 mm/h.",
      "No evaporation is given: taken as 0 mm/h.",
      "No heat flux is given: taken as 0 W/m².",
    ]);
  });

  it("leaves the parts of heat aside where net heat is given", () => {
    const { forcing, assumptions } = read({
      ...wind(),
      netHeat: every(24, 1, () => 5),
      shortwave: every(24, 1, () => 100),
    });
    expect(Object.keys(forcing?.heat ?? {})).toEqual(["net"]);
    expect(assumptions).toContain("Net heat is given; its parts (shortwave radiation) are not added to it.");
  });

  it.each([
    ["no wind", { rain: every(24, 1, () => 1) }, {}, "no wind speed"],
    ["no direction", { windSpeed: every(24, 1, () => 1) }, {}, "no wind direction"],
    ["no confirmed record", wind(), { startsAt: null, endsAt: null }, "no confirmed record"],
    ["a window elsewhere", wind(), { startsAt: at(500), endsAt: at(600) }, "do not overlap"],
    [
      "times that never meet",
      { windSpeed: every(24, 1, () => 1), windFrom: { time: [at(0.5), at(1.5)], values: [1, 2] } },
      {},
      "share their times",
    ],
  ] as [string, SampledChannels, Partial<StormInput>, string][])(
    "stops at %s, in words",
    (_, channels, changes, words) => {
      const { forcing, problems } = read(channels, changes);
      expect(forcing).toBeNull();
      expect(problems.map(({ message }) => message).join(" ")).toContain(words);
    },
  );
});
