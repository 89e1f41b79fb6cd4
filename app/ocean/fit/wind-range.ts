import { sourceOf } from "../sources";
import { dragRangeWarning, LAW_RANGES } from "../stress/drag-law";
import { DRAG_LAW_NAMES } from "../stress/drag-law-names";
import type { Indicator } from "./fit-context";

/** The strongest wind against the range that the drag law is stated for: the lighter winds of a storm hardly push. */
export const windRange: Indicator = ({ peakWind: value, method }) => {
  const [low, high] = LAW_RANGES[method.dragLaw];
  const source = sourceOf(`drag-${method.dragLaw}`).citation;
  const range = `the ${low} to ${high} m/s that the drag law ${DRAG_LAW_NAMES[method.dragLaw]} is stated for`;
  const peak = `The wind at 10 m reaches ${value.toFixed(1)} m/s`;
  if (value === 0) {
    const message = "No wind blows, so the choice of drag law does not matter.";
    return { code: "WIND_RANGE", severity: "ok", message, value, threshold: high, source };
  }
  const warning = dragRangeWarning(method.dragLaw, value);
  if (!warning) {
    return { code: "WIND_RANGE", severity: "ok", message: `${peak}, within ${range}.`, value, threshold: high, source };
  }
  const held = value > method.highWindCap ? ` The coefficient is held above ${method.highWindCap} m/s.` : "";
  const message =
    value > high
      ? `${peak}, above ${range}, so the stress is uncertain by a factor of up to 2.${held} Compare with another law, or run an ensemble.`
      : `${peak}, below ${range}, so the small stress is known only roughly. Compare with a law that is stated for light winds.`;
  return { code: warning.code, severity: "caution", message, value, threshold: warning.threshold, source };
};
