import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

const LOWEST = 1;
const HIGHEST = 50;

/** Heights between which a reading is brought to 10 m by the neutral profile in good faith. */
export const windHeight: Indicator = ({ scenario }) => {
  const value = scenario.storm.windHeight ?? 10;
  if (value === 10) return null;
  const note = { code: "WIND_HEIGHT", value, source: sourceOf("wind-height").citation };
  if (value >= LOWEST && value <= HIGHEST) {
    const message = `The wind was measured at ${value} m and brought to 10 m by the profile of neutral air.`;
    return { ...note, severity: "ok", message, threshold: HIGHEST };
  }
  const message = `The wind was measured at ${value} m, outside the ${LOWEST} to ${HIGHEST} m from which the profile of neutral air leads to 10 m, so the wind used is uncertain. Use another record, or give the wind at 10 m.`;
  return { ...note, severity: "caution", message, threshold: value < LOWEST ? LOWEST : HIGHEST };
};
