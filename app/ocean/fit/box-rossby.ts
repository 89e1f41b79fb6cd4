import { EQUATORIAL_LIMIT } from "../guards";
import { atMost, CONVENTION, type Indicator } from "./fit-context";

const SMALL = 0.1;
const LARGE = 0.5;

/** Where the drift crosses the box quickly, water from outside matters. */
export const boxRossby: Indicator = ({ place, peakDrift }) => {
  if (place.size === null || Math.abs(place.latitude) < EQUATORIAL_LIMIT) return null;
  const value = peakDrift / (Math.abs(place.f) * place.size);
  const severity = atMost(value, SMALL, LARGE);
  const numbers = `Drift of ${peakDrift.toFixed(2)} m/s in a box ${(place.size / 1000).toFixed(1)} km wide gives a Rossby number of ${value.toFixed(2)}`;
  const message =
    severity === "ok"
      ? `${numbers}: exchange with outside is small.`
      : `${numbers}: water from outside the box matters to what is found in it.`;
  return {
    code: "BOX_ROSSBY_NUMBER",
    // The estimate is that of the water, not of the place, so a small box asks for care but does not forbid it.
    severity: severity === "doNotUse" ? "caution" : severity,
    message,
    value,
    threshold: severity === "doNotUse" ? LARGE : SMALL,
    source: CONVENTION,
  };
};
