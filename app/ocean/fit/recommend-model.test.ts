import { describe, expect, it } from "vitest";
import { plainScenario } from "../../../tests/factories/scenario-arbitrary";
import { estimate } from "../estimate";
import type { ModelId, Scenario } from "../scenario";

const steady = plainScenario({ hours: 72 });
const veering: Scenario = {
  ...steady,
  storm: { ...steady.storm, windFrom: steady.storm.time.map((_, k) => (k * 15) % 360) },
};
const short = plainScenario({ hours: 20 });
const equatorial = plainScenario({ latitude: 1, hours: 72 });
const coastal: Scenario = {
  ...steady,
  box: { latitude: 45, longitude: 0, waterDepth: 20, shoreNormal: 270, distanceToShore: 1000 },
};
const entraining: Scenario = {
  ...steady,
  water: { temperature: 18, salinity: 35, layerDepth: 5, below: { temperature: 17.8, salinity: 35 } },
  storm: { ...steady.storm, windSpeed: steady.storm.time.map(() => 25) },
};

const choosing = (scenario: Scenario, model: ModelId): Scenario => ({ ...scenario, method: { model } });
const choice = (scenario: Scenario) => estimate(scenario).fitNotes.find(({ code }) => code === "MODEL_CHOICE");

describe("the recommended model", () => {
  it.each<[ModelId, string, Scenario, RegExp]>([
    ["budget", "a long steady wind", steady, /^The wind holds steady for 4\.3 inertial periods, so .*\.$/],
    ["slab", "a wind that veers", veering, /^The wind changes as it blows, so inertial motion .*\.$/],
    ["slab", "a short storm", short, /^The storm lasts only 1\.2 inertial periods, so .*\.$/],
    ["slab", "the equator", equatorial, /^Near the equator there is no steady Ekman drift; .*\.$/],
    ["coastal", "the shore", coastal, /^The box lies within an internal Rossby radius of the shore, .*\.$/],
    ["column", "a layer that takes up water", entraining, /^The layer moves fast enough to mix .*\.$/],
  ])("is %s for %s, whichever was chosen", (model, _, scenario, reason) => {
    const chosen: ModelId[] = scenario === coastal ? ["slab", "coastal"] : ["slab"];
    for (const other of chosen) {
      const { recommendedModel, recommendation } = estimate(choosing(scenario, other));
      expect(recommendedModel).toBe(model);
      expect(recommendation).toMatch(reason);
    }
  });

  it("does not depend on the model that was chosen, save by how fast that one says the water moves", () => {
    for (const model of ["budget", "slab"] as const) {
      expect(estimate(choosing(veering, model)).recommendedModel).toBe("slab");
      expect(estimate(choosing(steady, model)).recommendedModel).toBe("budget");
    }
  });

  it("needs the water depth and the shore normal before it is coastal", () => {
    const withoutNormal = { ...coastal, box: { ...coastal.box, shoreNormal: undefined } };
    expect(estimate(withoutNormal).recommendedModel).toBe("budget");
  });
});

describe("another model than the recommended one", () => {
  it("is noted, with the reason, the number that decided and what to do", () => {
    const note = choice(choosing(veering, "budget"));
    expect(note).toMatchObject({ severity: "caution", threshold: 0.9 });
    expect(note?.value).toBeLessThan(0.9);
    expect(note?.message).toMatch(
      /^Model budget was chosen where model slab is recommended\. The wind changes as it blows, .* Compare with model slab/,
    );
    expect(choice(choosing(coastal, "slab"))).toMatchObject({ severity: "caution", threshold: 1 });
    expect(choice(choosing(entraining, "slab"))?.severity).toBe("caution");
  });

  it("is all right where it follows as much and more", () => {
    expect(choice(choosing(steady, "slab"))).toMatchObject({ severity: "ok", threshold: 2 });
    const shallow = { ...steady, box: { latitude: 45, longitude: 0, waterDepth: 25 } };
    expect(choice(choosing(shallow, "slab"))).toMatchObject({
      severity: "caution",
      message: expect.stringContaining("here that of finite depth, as the bed is felt"),
    });
  });

  it("is not noted where it is none", () => {
    expect(choice(choosing(steady, "budget"))).toBeUndefined();
    expect(choice(choosing(veering, "slab"))).toBeUndefined();
    expect(choice(choosing(entraining, "column"))).toBeUndefined();
    expect(choice(choosing(coastal, "coastal"))).toBeUndefined();
  });
});
