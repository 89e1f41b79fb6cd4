import { describe, expect, it } from "vitest";
import { timeLimitSeconds, tooLong } from "./time-limit";

const column = { model: "column" } as const;

describe("the time limit of a run", () => {
  it("grows with the members, and more with those of the column", () => {
    expect(timeLimitSeconds({})).toBe(300);
    expect(timeLimitSeconds({ ensemble: { members: 200, seed: 1 } })).toBe(360);
    expect(timeLimitSeconds({ method: column, ensemble: { members: 64, seed: 1 } })).toBe(940);
  });

  it("is told with what makes a run shorter", () => {
    expect(tooLong({}).message).toBe(
      "The run took more than 5 minutes and was stopped. Narrow the storm's window, or take larger cells or a longer time step.",
    );
    expect(tooLong({ method: column, ensemble: { members: 64, seed: 1 } }).message).toMatch(
      /more than 16 minutes .* Ask for fewer members/,
    );
  });
});
