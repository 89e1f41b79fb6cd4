import { describe, expect, it } from "vitest";
import { readCastAnswers } from "./cast-answers";

function posted(fields: Record<string, string>): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return form;
}

describe("the answers of a cast's sheet", () => {
  it("are what was filled in, and nothing else", () => {
    expect(readCastAnswers(posted({ half: "", latitude: " ", name: "Bay", intent: "read" }))).toEqual({ answers: {} });
    expect(readCastAnswers(posted({ half: "up", latitude: "-33,5", salinityScale: "absolute" }))).toEqual({
      answers: { half: "up", latitude: -33.5, salinityScale: "absolute" },
    });
  });

  it("are refused beside their field", () => {
    const read = readCastAnswers(posted({ half: "sideways", latitude: "91" }));
    expect(read).toEqual({
      errors: { half: ["Choose the way down or the way up."], latitude: ["A latitude lies between −90° and 90°."] },
    });
    expect(readCastAnswers(posted({ latitude: "north" }))).toHaveProperty("errors.latitude");
  });
});
