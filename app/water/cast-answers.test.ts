import { describe, expect, it } from "vitest";
import type { CastQuestion } from "~/readers/casts/cast-reading";
import { readCastAnswers } from "./cast-answers";

function posted(fields: Record<string, string>): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return form;
}

const asked = (key: CastQuestion["key"], ...values: string[]): CastQuestion => ({
  key,
  needed: true,
  message: "Which?",
  options: values.map((value) => ({ value, label: value })),
});

describe("the answers of a cast's sheet", () => {
  it("are what was filled in, and nothing else", () => {
    expect(readCastAnswers(posted({ half: "", latitude: " ", name: "Bay", intent: "read" }), [])).toEqual({
      answers: {},
    });
    expect(readCastAnswers(posted({ half: "up", latitude: "-33,5", salinityScale: "absolute" }), [])).toEqual({
      answers: { half: "up", latitude: -33.5, salinityScale: "absolute" },
    });
  });

  it("are of a channel where a column or a unit was asked for", () => {
    const questions = [asked("column-depth", "0", "1"), asked("unit-conductivity", "S/m", "mS/cm")];
    const form = posted({ "column-depth": "1", "unit-conductivity": "mS/cm", "unit-depth": "ft" });
    expect(readCastAnswers(form, questions)).toEqual({
      answers: { columns: { depth: 1 }, units: { conductivity: "mS/cm" } },
    });
  });

  it("are refused beside their field", () => {
    expect(readCastAnswers(posted({ half: "sideways", latitude: "91" }), [])).toEqual({
      errors: { half: ["Choose the way down or the way up."], latitude: ["A latitude lies between −90° and 90°."] },
    });
    expect(readCastAnswers(posted({ latitude: "north" }), [])).toHaveProperty("errors.latitude");
    expect(readCastAnswers(posted({ "column-depth": "7" }), [asked("column-depth", "0")])).toEqual({
      errors: { "column-depth": ["Choose one of the list."] },
    });
  });
});
