import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

/** A layer over lighter water would sink into it, however still it lies. */
export const layerStability: Indicator = ({ densityStep: value, method }) => {
  if (value === null || value > 0 || method.model === "column") return null;
  const message = `The water beneath is no denser than the layer (${value.toFixed(2)} kg/m³ of difference), so nothing keeps the two apart and a layer of fixed depth does not hold. Check the water column, or use model column.`;
  return {
    code: "LAYER_UNSTABLE",
    severity: "doNotUse",
    message,
    value,
    threshold: 0,
    source: sourceOf("stability").citation,
  };
};
