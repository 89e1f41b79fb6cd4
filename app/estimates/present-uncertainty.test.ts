import { describe, expect, it } from "vitest";
import { presentUncertainty } from "./present-uncertainty";
import { sampleUncertainty } from "../../tests/factories/response";

describe("what an answer depends on", () => {
  it("names the members, and blames their failures on what they ended with", () => {
    const view = presentUncertainty(sampleUncertainty(), true);
    expect(view.ensemble).toBe("Range from 200 members, seed 7: 10th to 90th percentile.");
    expect(view.failures).toEqual([
      "3 of 203 members could not be computed and are left out: Gradient mixing did not settle; use a shorter timeStep.",
    ]);
    expect(view.factors.map(({ failed }) => failed)).toEqual(["", "By itself it could not be computed at × 1.1."]);
  });

  it("shows the shares that chance does not reach, and says so of the others", () => {
    const [salinity, displacement] = presentUncertainty(sampleUncertainty(), true).effects;
    expect(salinity.shares).toEqual([{ factor: "rain", share: "0.81" }]);
    expect(salinity.others).toBe("no more than chance");
    expect(salinity.sentence).toBe("Most of the spread comes from rain (share 0.81).");
    expect(displacement.tornado.bars[0].factor).toBe("wind speed");
    expect(displacement.sentence).toBe(
      "What stands out is wind speed (share 0.40); the rest comes from several inputs together.",
    );
  });

  it("says that too few members have no shares", () => {
    const sample = sampleUncertainty();
    const few = {
      ...sample,
      members: 20,
      computed: 20,
      failures: undefined,
      effects: sample.effects.map((effect) => ({ ...effect, firstOrder: [] })),
    };
    const view = presentUncertainty(few, true);
    expect(view.tooFew).toBe("Shares of the spread need at least 64 members; these are 20.");
    expect(view.failures).toEqual([]);
    expect(view.effects[0].shares).toEqual([]);
    expect(view.effects[0].sentence).toBe("By itself, rain moves it most.");
  });

  it("leaves out figures that nothing moves", () => {
    const sample = sampleUncertainty();
    const still = sample.effects.map((effect) => ({
      ...effect,
      bars: effect.bars.map((bar) => ({ ...bar, high: bar.low })),
    }));
    expect(presentUncertainty({ ...sample, effects: still }, false).effects).toEqual([]);
  });
});
