/** A hash of each part of a scenario, so that an estimate can say which of its inputs changed. */
import { sha256 } from "@noble/hashes/sha2.js";
import { bytesToHex, utf8ToBytes } from "@noble/hashes/utils.js";
import { canonicalJson } from "~/ocean/canonical-json";
import type { Scenario } from "~/ocean/scenario";

export const INPUT_PARTS = ["box", "storm", "water", "method", "triggerLevels"] as const;
export type InputPart = (typeof INPUT_PARTS)[number];
export type InputParts = Record<InputPart, string>;

export const PART_NAMES: Record<InputPart, string> = {
  box: "study box",
  storm: "storm",
  water: "water column",
  method: "method sheet",
  triggerLevels: "trigger levels",
};

export function partHash(value: unknown): string {
  return bytesToHex(sha256(utf8ToBytes(canonicalJson(value ?? null))));
}

/** @param known parts whose hashes were made before: series and casts are the long parts of a scenario */
export function inputParts(scenario: Scenario, known: Partial<Pick<InputParts, "storm" | "water">> = {}): InputParts {
  return {
    box: partHash(scenario.box),
    storm: known.storm ?? partHash(scenario.storm),
    water: known.water ?? partHash(scenario.water),
    // Both are chosen on the method sheet; without an ensemble the hash is that of the choices, as it was before there were any.
    method: partHash(scenario.ensemble ? [scenario.method, scenario.ensemble] : scenario.method),
    triggerLevels: partHash(scenario.triggerLevels),
  };
}

export function changedParts(before: InputParts, now: InputParts): InputPart[] {
  return INPUT_PARTS.filter((part) => before[part] !== now[part]);
}
