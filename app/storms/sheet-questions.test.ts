import { describe, expect, it } from "vitest";
import type { ReadingQuestion } from "~/readers/reading";
import { suggestPlace } from "./sheet-questions";

const place: ReadingQuestion = { key: "place", needed: true, message: "" };

describe("the place of a file of several", () => {
  it("is suggested as the study box's middle for a grid", () => {
    expect(suggestPlace([place], [-63.41234, 44.5])[0]?.suggestion).toBe("44.5000,-63.4123");
  });

  it("is told to be near the study box or far from it, across the antimeridian too", () => {
    const options = ["0,170", "0,-179", "0,0"].map((value) => ({ value, label: `at ${value}` }));
    // A degree and a half of the equator on a sphere of 6371.0088 km.
    expect(suggestPlace([{ ...place, options }], [179.5, 0])[0]?.message).toContain(
      "at 0,-179, 167 km from its middle",
    );
  });

  it("is not suggested without a box, nor where the places have no positions", () => {
    const named = { ...place, options: [{ value: "Laval", label: "Laval" }] };
    expect(suggestPlace([place], null)).toEqual([place]);
    expect(suggestPlace([named], [0, 0])).toEqual([named]);
  });
});
