import { EQUATORIAL_LIMIT } from "../guards";
import { hours, kilometres, thresholdSource, type Indicator } from "./fit-context";
import { rossbyNumber } from "./rossby-number";

const SMALL = 0.1;
const LARGE = 0.5;

/**
 * Where the drift crosses the box quickly, water from outside matters. The estimate is that of the water, not of the
 * place, so a small box asks for care but does not forbid it.
 */
export const boxRossby: Indicator = ({ place, peakDrift }) => {
  if (place.size === null || Math.abs(place.latitude) < EQUATORIAL_LIMIT) return null;
  const value = rossbyNumber(peakDrift, place.size, place.latitude);
  const note = { code: "BOX_ROSSBY_NUMBER", value, source: thresholdSource("fit-rossby") };
  const numbers = `Rossby number ${value.toFixed(2)}`;
  if (value <= SMALL) {
    const message = `The drift is slow for a box of ${kilometres(place.size)} (${numbers}): little water comes from outside.`;
    return { ...note, severity: "ok", message, threshold: SMALL };
  }
  const crossing = `At its fastest the drift crosses the box of ${kilometres(place.size)} in ${hours(place.size / peakDrift)} (${numbers})`;
  if (value <= LARGE) {
    const message = `${crossing}, so some of the water found there comes from outside. Read the response as that of the drifting water.`;
    return { ...note, severity: "caution", message, threshold: SMALL };
  }
  const message = `${crossing}, so water from outside decides what is found there. Draw a box as wide as the drift goes, or read the response as that of the drifting water.`;
  return { ...note, severity: "caution", message, threshold: LARGE };
};
