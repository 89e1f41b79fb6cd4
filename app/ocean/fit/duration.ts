import { CONVENTION, type Indicator } from "./fit-context";

const STEADY = 2;
const IMPULSIVE = 0.25;

/** A steady drift needs about two inertial periods; a short blow only pushes. */
export const duration: Indicator = ({ duration: seconds, inertialPeriod, method }) => {
  if (inertialPeriod === null) return null;
  const value = seconds / inertialPeriod;
  const steady = method.model === "budget" || method.model === "coastal";
  const lengths = `The storm lasts ${(seconds / 3600).toFixed(1)} h, ${value.toFixed(2)} inertial periods of ${(inertialPeriod / 3600).toFixed(1)} h`;
  const note = { code: "DURATION", value, source: CONVENTION };
  if (value >= STEADY)
    return { ...note, severity: "ok", message: `${lengths}: long enough for the drift to settle.`, threshold: STEADY };
  if (value >= IMPULSIVE) {
    const message = steady
      ? `${lengths}: too short for a steady drift; model slab follows the inertial motion.`
      : `${lengths}: inertial motion carries much of the drift, and this model follows it.`;
    return { ...note, severity: steady ? "caution" : "ok", message, threshold: STEADY };
  }
  const message = `${lengths}: an impulse; the current grows with the stress and has hardly begun to turn.`;
  return { ...note, severity: steady ? "doNotUse" : "caution", message, threshold: IMPULSIVE };
};
