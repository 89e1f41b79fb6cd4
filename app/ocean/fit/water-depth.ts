import type { Indicator } from "./fit-context";

const DEEP = 1.25;
const FRICTIONAL = 0.5;

/** Water shallower than the Ekman depth feels its bed. */
export const waterDepth: Indicator = ({ place, ekmanDepth, method }) => {
  if (place.waterDepth === null || ekmanDepth === null) return null;
  const value = place.waterDepth / ekmanDepth;
  const aware = method.model === "coastal" || method.model === "column" || method.ekman === "finiteDepth";
  const depths = `Water depth ${place.waterDepth.toFixed(0)} m against an Ekman depth of ${ekmanDepth.toFixed(0)} m`;
  const source = "Ekman (1905), finite depth; computed here";
  if (value >= DEEP) {
    return {
      code: "WATER_DEPTH",
      severity: "ok",
      message: `${depths}: deep water for the drift.`,
      value,
      threshold: DEEP,
      source,
    };
  }
  if (value >= FRICTIONAL || aware) {
    const message = aware
      ? `${depths}: the bed is felt, and this method reckons with it.`
      : `${depths}: the bed is felt; a finite-depth drift would turn and carry differently.`;
    return { code: "WATER_DEPTH", severity: aware ? "ok" : "caution", message, value, threshold: DEEP, source };
  }
  const message = `${depths}: bed friction rules and the drift follows the wind; use a finite-depth or coastal method.`;
  return { code: "WATER_DEPTH", severity: "doNotUse", message, value, threshold: FRICTIONAL, source };
};
