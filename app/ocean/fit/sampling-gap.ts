import { LONGEST_GAP } from "../constants";
import { CONVENTION, type Indicator } from "./fit-context";

const CLOSE = 3600;

/** Between samples the wind is taken as a vector that runs linearly. */
export const samplingGap: Indicator = ({ forcing }) => {
  let longest = 0;
  for (let k = 1; k < forcing.seconds.length; k++)
    longest = Math.max(longest, forcing.seconds[k] - forcing.seconds[k - 1]);
  const value = longest / 3600;
  const severity = longest <= CLOSE ? "ok" : "caution";
  const message =
    severity === "ok"
      ? `Samples are at most ${value.toFixed(2)} h apart.`
      : `Samples are up to ${value.toFixed(1)} h apart; a peak between them is missed, and gaps over ${LONGEST_GAP / 3600} h are refused.`;
  return { code: "SAMPLING", severity, message, value, threshold: CLOSE / 3600, source: CONVENTION };
};
