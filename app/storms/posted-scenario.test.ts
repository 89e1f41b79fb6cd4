import { describe, expect, it } from "vitest";
import { postedScenario } from "./posted-scenario";

function form(fields: Record<string, string>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries({ windFactor: "1", rainFactor: "1", shiftHours: "0", ...fields })) {
    data.set(name, value);
  }
  return data;
}

describe("a scenario's form", () => {
  it("takes numbers as they are written, with a comma or a true minus too", () => {
    expect(postedScenario(form({ windFactor: "1,2", rainFactor: " 2 ", shiftHours: "\u22126" }))).toEqual({
      windFactor: 1.2,
      rainFactor: 2,
      shiftHours: -6,
    });
  });

  it.each([
    ["windFactor", "0"],
    ["windFactor", "much"],
    ["windFactor", ""],
    ["rainFactor", "-1"],
    ["rainFactor", "Infinity"],
    ["shiftHours", "87601"],
    ["shiftHours", "1e"],
  ])("refuses %s of %j beside its field", (field, text) => {
    expect(() => postedScenario(form({ [field]: text }))).toThrow(
      expect.objectContaining({ field, messages: [expect.stringMatching(/^Write a number from/)] }),
    );
  });
});
