import { describe, expect, it } from "vitest";
import { plainScenario } from "../../tests/factories/scenario-arbitrary";
import { estimate } from "./estimate";
import { DRAG_LAWS } from "./scenario";
import { methodSources, SOURCES, sourceOf } from "./sources";

describe("sources", () => {
  it("has one entry an id, each complete", () => {
    expect(new Set(SOURCES.map(({ id }) => id)).size).toBe(SOURCES.length);
    for (const { title, citation, equation, validRange, id } of SOURCES) {
      for (const text of [title, citation, equation, validRange]) expect(text, id).not.toBe("");
    }
  });

  it("knows every drag law", () => {
    for (const law of DRAG_LAWS) expect(sourceOf(`drag-${law}`).equation).toContain("Cd");
    expect(() => sourceOf("nothing")).toThrow(/No source/);
  });

  it("gives a response the sources of what it used, in the order of the work", () => {
    const ids = methodSources(
      estimate(plainScenario({ method: { model: "slab", dragLaw: "smith1980", rainHeat: true } })),
    ).map(({ id }) => id);
    expect(ids).toContain("slab");
    expect(ids).toContain("drag-smith1980");
    expect(ids).toContain("rain-heat");
    expect(ids).not.toContain("column");
    expect(ids).not.toContain("drag-wu1982");
    expect(ids.indexOf("density")).toBeLessThan(ids.indexOf("slab"));
  });
});
