import { hours, thresholdSource, type Indicator } from "./fit-context";

const STEADY = 2;
const IMPULSIVE = 0.25;

/** A steady drift needs about two inertial periods; a short blow only pushes. */
export const duration: Indicator = ({ duration: seconds, inertialPeriod, method }) => {
  if (inertialPeriod === null) return null;
  const value = seconds / inertialPeriod;
  const steady = method.model === "budget" || method.model === "coastal";
  const lengths = `The storm lasts ${hours(seconds)}, ${value.toFixed(2)} inertial periods of ${hours(inertialPeriod)}`;
  const note = { code: "DURATION", value, source: thresholdSource("fit-duration") };
  if (value >= STEADY) {
    return { ...note, severity: "ok", message: `${lengths}: long enough for the drift to settle.`, threshold: STEADY };
  }
  if (value >= IMPULSIVE) {
    const message = steady
      ? `${lengths}, too short for the steady drift that this model takes. Use model slab or column, which follow the motion from rest.`
      : `${lengths}: too short for a steady drift, but this model follows the motion from rest.`;
    return { ...note, severity: steady ? "caution" : "ok", message, threshold: STEADY };
  }
  const message = steady
    ? `${lengths}, so it gives the water only a push and no steady drift can form. Use model slab or column, which follow the motion from rest.`
    : `${lengths}, so it gives the water only a push and most of the motion comes after it. Extend the record beyond the storm to see how far the water goes.`;
  return { ...note, severity: steady ? "doNotUse" : "caution", message, threshold: IMPULSIVE };
};
