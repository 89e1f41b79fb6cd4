import { bulkRichardson } from "./bulk-richardson";
import { sourceOf } from "../sources";
import { atLeast, type Indicator } from "./fit-context";

const STABLE = 0.65;
const MIXING = 0.25;
/** Slower than this nothing moves that could mix, m/s. */
const STILL = 1e-6;

/** Whether the layer keeps its depth under its own motion: a fixed layer does not entrain. */
export const layerRichardson: Indicator = ({ densityStep, water, peakDrift, method }) => {
  if (densityStep === null || densityStep <= 0 || peakDrift < STILL || method.model === "column") return null;
  const value = bulkRichardson(densityStep, water.layerDepth, peakDrift, method.waterDensity, method.gravity);
  const severity = atLeast(value, STABLE, MIXING);
  const layer = `The layer of ${water.layerDepth.toFixed(0)} m moves at ${peakDrift.toFixed(2)} m/s over water ${densityStep.toFixed(2)} kg/m³ denser (bulk Richardson number ${value.toFixed(2)})`;
  const message =
    severity === "ok"
      ? `${layer}: it keeps its depth.`
      : `${layer}, so it ${severity === "caution" ? "takes up" : "mixes strongly with"} water from beneath, which a layer of fixed depth leaves out. Use model column.`;
  return {
    code: "LAYER_RICHARDSON",
    severity,
    message,
    value,
    threshold: severity === "doNotUse" ? MIXING : STABLE,
    source: sourceOf("column").citation,
  };
};
