import { LONGEST_GAP } from "../constants";
import { hours, thresholdSource, type Indicator } from "./fit-context";

const CLOSE = 3600;

/** Between samples the wind is taken as a vector that runs linearly. */
export const samplingGap: Indicator = ({ forcing }) => {
  let longest = 0;
  for (let k = 1; k < forcing.seconds.length; k++)
    longest = Math.max(longest, forcing.seconds[k] - forcing.seconds[k - 1]);
  const note = {
    code: "SAMPLING",
    value: longest / 3600,
    threshold: CLOSE / 3600,
    source: thresholdSource("fit-sampling"),
  };
  if (longest <= CLOSE) {
    return { ...note, severity: "ok", message: `Samples are at most ${(longest / 3600).toFixed(2)} h apart.` };
  }
  const message = `Samples are up to ${hours(longest)} apart, so a peak between them is missed. Use a record sampled at least every hour if there is one; gaps over ${LONGEST_GAP / 3600} h are refused.`;
  return { ...note, severity: "caution", message };
};
