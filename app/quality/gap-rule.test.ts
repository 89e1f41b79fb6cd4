import { describe, expect, it } from "vitest";
import { medianStep } from "~/storms/channel-series";
import { forcingOf, longestBridged, unbridgedPauses } from "./gap-rule";
import { pairWind } from "./pair-wind";
import type { Samples } from "./samples";

const HOUR = 3600;
const at = (...hours: number[]): Samples => ({ time: hours.map((hour) => hour * HOUR), values: hours.map(() => 5) });
const told = (channels: Parameters<typeof unbridgedPauses>[0], from: number, to: number) =>
  unbridgedPauses(channels, from * HOUR, to * HOUR).map((pause) => [pause.channel, pause.from / HOUR, pause.to / HOUR]);

describe("the usual step", () => {
  it("is the middle one of all steps", () => {
    expect(medianStep([0, 1, 2, 3, 50])).toBe(1);
    expect(medianStep([7])).toBeNull();
  });
});

// The limit of 6 h is the engine's own; the rest is common practice, no source.
describe("the rule for pauses", () => {
  it("bridges 6 h of wind and no second more", () => {
    expect(told({ windSpeed: at(0, 6, 12), windFrom: at(0, 6, 12) }, 0, 12)).toEqual([]);
    expect(told({ windSpeed: at(0, 6.001, 12), windFrom: at(0, 6.001, 12) }, 0, 12)).toEqual([["windSpeed", 0, 6.001]]);
  });

  it("lets a daily gauge pause for a day and a half, but not the wind", () => {
    expect(longestBridged("rain", at(0, 24, 48).time)).toBe(36 * HOUR);
    expect(longestBridged("windSpeed", at(0, 24, 48).time)).toBe(6 * HOUR);
  });

  it("counts a wind without its direction as missing", () => {
    const windFrom = at(0, 1, 9, 10);
    expect(told({ windSpeed: at(0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10), windFrom }, 0, 10)).toEqual([["windSpeed", 1, 9]]);
  });

  it("asks of the wind to cover the window, and of the rest to cover the wind", () => {
    const wind = { windSpeed: at(8, 9, 10), windFrom: at(8, 9, 10) };
    expect(told({ ...wind, rain: at(9, 10, 11) }, 0, 18)).toEqual([
      ["windSpeed", 0, 8],
      ["windSpeed", 10, 18],
    ]);
    expect(told({ ...wind, rain: at(30, 31) }, 8, 10)).toEqual([["rain", 8, 10]]);
    expect(told(wind, 20, 40)).toEqual([["windSpeed", 20, 40]]);
  });

  it("cuts a pause to the window", () => {
    const steady = at(...Array.from({ length: 31 }, (_, hour) => hour));
    expect(told({ windSpeed: steady, windFrom: steady, rain: at(0, 1, 20, 21) }, 5, 15)).toEqual([["rain", 5, 15]]);
  });

  it("leaves the parts of the heat aside where the net is given", () => {
    expect(forcingOf({ windSpeed: at(0), netHeat: at(0), latent: at(0) })).toEqual(["windSpeed", "netHeat"]);
    expect(forcingOf({ windSpeed: at(0), latent: at(0) })).toEqual(["windSpeed", "latent"]);
  });
});

describe("pairing the wind", () => {
  it("blows from west towards the east: u positive, v none", () => {
    const { east, north } = pairWind({ time: [0], values: [10] }, { time: [0], values: [270] });
    expect(east[0]).toBeCloseTo(10, 12);
    expect(north[0]).toBeCloseTo(0, 12);
  });

  it("needs no direction for a calm, and takes none for a missing speed", () => {
    const speed = { time: [0, 1, 2], values: [0, 4, Number.NaN] };
    expect(pairWind(speed, { time: [2], values: [90] }).time).toEqual([0]);
  });
});
