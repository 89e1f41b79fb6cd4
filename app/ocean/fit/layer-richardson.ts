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
  const numbers = `A density step of ${densityStep.toFixed(2)} kg/m³ under ${water.layerDepth.toFixed(0)} m moving at ${peakDrift.toFixed(2)} m/s gives a bulk Richardson number of ${value.toFixed(2)}`;
  const message =
    severity === "ok"
      ? `${numbers}: the layer keeps its depth.`
      : `${numbers}: the layer ${severity === "caution" ? "entrains" : "mixes strongly with"} the water beneath, which a fixed layer leaves out; use model column.`;
  return {
    code: "LAYER_RICHARDSON",
    severity,
    message,
    value,
    threshold: severity === "doNotUse" ? MIXING : STABLE,
    source: sourceOf("column").citation,
  };
};
