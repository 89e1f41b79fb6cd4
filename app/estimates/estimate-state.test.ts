import { describe, expect, it } from "vitest";
import { estimateState, needsRun, stateSentence, type LastRun, type Now } from "./estimate-state";
import type { InputParts } from "./input-parts";

const parts: InputParts = { box: "b", storm: "s", water: "w", method: "m", triggerLevels: "t" };
const done: LastRun = { state: "done", problems: null, parts, engineVersion: "1" };
const now: Now = { parts, engineVersion: "1", responseStored: true };
const problem = { path: "water", code: "INVALID_INPUT", message: "No." };

describe("estimateState", () => {
  it.each([
    ["not run", null, now],
    ["queued", { ...done, state: "queued" }, now],
    ["running", { ...done, state: "running" }, now],
    ["current", done, now],
    ["out of date: water column changed", done, { ...now, parts: { ...parts, water: "x" }, responseStored: false }],
    [
      "out of date: study box, water column and trigger levels changed",
      done,
      { ...now, parts: { ...parts, water: "x", box: "x", triggerLevels: "x" }, responseStored: false },
    ],
    ["out of date: newer engine", done, { ...now, engineVersion: "2", responseStored: false }],
    [
      "out of date: method sheet changed, newer engine",
      done,
      { parts: { ...parts, method: "x" }, engineVersion: "2", responseStored: false },
    ],
    ["out of date: storm changed", done, { ...now, parts: null, responseStored: false }],
    ["out of date: its stored response is gone", done, { ...now, responseStored: false }],
    ["failed", { ...done, state: "failed", problems: [problem] }, { ...now, responseStored: false }],
    [
      "failed; since then storm changed",
      { ...done, state: "failed", problems: [problem] },
      { ...now, parts: { ...parts, storm: "x" }, responseStored: false },
    ],
  ] as [string, LastRun | null, Now][])("%s", (sentence, run, present) => {
    expect(stateSentence(estimateState(run, present))).toBe(sentence);
  });

  it("sees that a storm that could not be read now can be", () => {
    const failed: LastRun = { ...done, state: "failed", problems: [problem], parts: null };
    expect(estimateState(failed, { ...now, responseStored: false })).toMatchObject({ changed: ["storm"] });
    expect(estimateState(failed, { ...now, parts: null, responseStored: false })).toMatchObject({ changed: [] });
  });

  it("is current again after a failure when the inputs are those of a stored response", () => {
    expect(estimateState({ ...done, state: "failed", problems: [problem] }, now)).toEqual({ kind: "current" });
  });

  it("asks for a run where one would tell something new", () => {
    const elsewhere = { ...now, parts: { ...parts, storm: "x" }, responseStored: false };
    const failed: LastRun = { ...done, state: "failed", problems: [problem] };
    expect(needsRun(estimateState(done, now))).toBe(false);
    expect(needsRun(estimateState(done, elsewhere))).toBe(true);
    expect(needsRun(estimateState(failed, { ...now, responseStored: false }))).toBe(false);
    expect(needsRun(estimateState(failed, elsewhere))).toBe(true);
  });
});
