import { sourceOf } from "../sources";
import { LAW_RANGES } from "../stress/drag-law";
import { DRAG_LAW_NAMES } from "../stress/drag-law-names";
import type { Indicator } from "./fit-context";

/** The strongest wind against the range that the drag law is stated for. Light winds below the range hardly push. */
export const windRange: Indicator = ({ peakWind: value, method }) => {
  const [low, threshold] = LAW_RANGES[method.dragLaw];
  const source = sourceOf(`drag-${method.dragLaw}`).citation;
  const range = `the ${low}…${threshold} m/s of the drag law ${DRAG_LAW_NAMES[method.dragLaw]}`;
  const peak = `The wind at 10 m reaches ${value.toFixed(1)} m/s`;
  if (value <= threshold)
    return { code: "WIND_RANGE", severity: "ok", message: `${peak}, within ${range}.`, value, threshold, source };
  const message = `${peak}, beyond ${range}; the coefficient is held above ${method.highWindCap} m/s and the stress is uncertain by a factor of up to 2.`;
  return { code: "OUT_OF_RANGE", severity: "caution", message, value, threshold, source };
};
