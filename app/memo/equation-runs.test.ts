import { describe, expect, it } from "vitest";
import type { Run } from "./document";
import { equationRuns } from "./equation-runs";

const shown = (runs: Run[]) =>
  runs.map(({ text, rise }) => (rise === "super" ? `^{${text}}` : rise === "sub" ? `_{${text}}` : text)).join("");

describe("equationRuns", () => {
  it.each([
    ["V_abk s^a", "V_{abk} s^{a}"],
    ["n_offshore", "n_{offshore}"],
    ["u* = (κ B h)^(1/3)", "u* = (κ B h)^{1/3}"],
    ["U^0.5.", "U^{0.5}."],
    ["8.84e-6 d", "8.84 × 10^{−6} d"],
    ["c 1e-3", "c 10^{−3}"],
    ["11e3", "11 × 10^{3}"],
    ["-0.15 log10 t", "−0.15 log10 t"],
    ["cool-skin 1 - c", "cool-skin 1 − c"],
    ["exp(-(Rm/r)^B)", "exp(−(Rm/r)^{B})"],
    ["ρ = 1/v", "ρ = 1/v"],
    ["", ""],
  ])("sets %j", (text, expected) => {
    expect(shown(equationRuns(text))).toBe(expected);
  });
});
