import type { RangeWarning } from "../errors";
import type { ScenarioWater } from "../scenario";
import { practicalSalinityWarning } from "../seawater/absolute-salinity";
import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

/** Practical Salinity that was given beyond the scale's own range. */
export const practicalSalinityRange: Indicator = ({ scenario }) => {
  const warning = farthest(practicalSalinities(scenario.water).map(practicalSalinityWarning));
  if (!warning) return null;
  const message = `${warning.message.replace(/\.$/, "")}, so its conversion to Absolute Salinity is uncertain. Check the conductivity record, or give Absolute Salinity in g/kg.`;
  return { ...warning, severity: "caution", message, source: sourceOf("absolute-salinity").citation };
};

function practicalSalinities(water: ScenarioWater): number[] {
  const levels = "cast" in water ? water.cast : [water, ...(water.below ? [water.below] : [])];
  return levels.map(({ practicalSalinity }) => practicalSalinity).filter((SP) => SP !== undefined);
}

function farthest(warnings: (RangeWarning | null)[]): RangeWarning | null {
  const beyond = ({ value, threshold }: RangeWarning) => Math.abs(value - threshold);
  return warnings.reduce((worst, next) => (next && (!worst || beyond(next) > beyond(worst)) ? next : worst), null);
}
