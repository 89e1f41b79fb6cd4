import { StormRefusal } from "./refusal";
import type { ScenarioChanges } from "./scenario";

/** What may be written; beyond, a copy would be another storm altogether. Common practice, no source. */
export const SCENARIO_LIMITS = {
  windFactor: { min: 0.1, max: 3 },
  rainFactor: { min: 0, max: 20 },
  shiftHours: { min: -87_600, max: 87_600 },
} as const satisfies Record<keyof ScenarioChanges, { min: number; max: number }>;

/**
 * What a form wants changed.
 * @throws StormRefusal beside the field that is wrong
 */
export function postedScenario(form: FormData): ScenarioChanges {
  return {
    windFactor: numberIn(form, "windFactor"),
    rainFactor: numberIn(form, "rainFactor"),
    shiftHours: numberIn(form, "shiftHours"),
  };
}

function numberIn(form: FormData, field: keyof ScenarioChanges): number {
  const written = form.get(field);
  const text = typeof written === "string" ? written.trim().replace(",", ".").replace("\u2212", "-") : "";
  const value = text === "" ? Number.NaN : Number(text);
  const { min, max } = SCENARIO_LIMITS[field];
  if (!(value >= min && value <= max)) throw new StormRefusal(`Write a number from ${min} to ${max}.`, field);
  return value;
}
