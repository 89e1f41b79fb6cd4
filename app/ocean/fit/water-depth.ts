import { thresholdSource, type Indicator } from "./fit-context";

const DEEP = 1.25;
const FRICTIONAL = 0.5;

/** Water shallower than the Ekman depth feels its bed. */
export const waterDepth: Indicator = ({ place, ekmanDepth, method }) => {
  if (place.waterDepth === null || ekmanDepth === null) return null;
  const value = place.waterDepth / ekmanDepth;
  const { model, ekman } = method;
  const aware = model === "coastal" || model === "column" || (model === "budget" && ekman === "finiteDepth");
  const depths = `The water is ${place.waterDepth.toFixed(0)} m deep, ${value.toFixed(2)} times the Ekman depth of ${ekmanDepth.toFixed(0)} m`;
  const note = { code: "WATER_DEPTH", value, source: thresholdSource("fit-depth") };
  if (value >= DEEP) {
    const message = `${depths}: deep enough that the bed does not slow the drift.`;
    return { ...note, severity: "ok", message, threshold: DEEP };
  }
  if (aware) {
    const message = `${depths}, so the bed slows and turns the drift; the chosen method reckons with it.`;
    return { ...note, severity: "ok", message, threshold: value < FRICTIONAL ? FRICTIONAL : DEEP };
  }
  const remedy = "Use model budget with the Ekman balance of finite depth, or model coastal.";
  if (value >= FRICTIONAL) {
    const message = `${depths}, so the bed slows and turns the drift, which the chosen method leaves out. ${remedy}`;
    return { ...note, severity: "caution", message, threshold: DEEP };
  }
  const message = `${depths}, so friction on the bed rules and the drift runs nearly along the wind, which the chosen method leaves out. ${remedy}`;
  return { ...note, severity: "doNotUse", message, threshold: FRICTIONAL };
};
