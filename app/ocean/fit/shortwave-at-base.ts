import { shortwaveFraction, waterClarity } from "../heat/shortwave";
import { sourceOf } from "../sources";
import { atMost, type Indicator } from "./fit-context";

const LITTLE = 0.05;
const MUCH = 0.2;

/** Light that passes the layer's base (or reaches the bed) makes the warming hang on how clear the water is. */
export const shortwaveAtBase: Indicator = ({ forcing, water, place, method }) => {
  if (!forcing.shortwave) return null;
  const toBed = place.waterDepth !== null && place.waterDepth <= water.layerDepth;
  const depth = toBed
    ? water.layerDepth
    : method.model === "column" && place.waterDepth !== null
      ? place.waterDepth
      : water.layerDepth;
  const value = shortwaveFraction(waterClarity(method.waterType), depth);
  const judged = atMost(value, LITTLE, MUCH);
  const share = `${(100 * value).toFixed(1)} % of the sunlight passes ${depth.toFixed(0)} m in Jerlov ${method.waterType} water`;
  const kept = method.penetratingShortwave
    ? "and leaves the layer in this estimate"
    : "though this estimate keeps it all in the layer";
  return {
    code: "SHORTWAVE_AT_BASE",
    severity: judged === "doNotUse" ? "caution" : judged,
    message: judged === "ok" ? `${share}.` : `${share}, ${kept}; the warming hangs on the water's clarity.`,
    value,
    threshold: judged === "doNotUse" ? MUCH : LITTLE,
    source: sourceOf("shortwave").citation,
  };
};
