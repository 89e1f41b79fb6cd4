import { shortwaveFraction, waterClarity } from "../heat/shortwave";
import { sourceOf } from "../sources";
import { atMost, type FitContext, type Indicator } from "./fit-context";

const LITTLE = 0.05;
const MUCH = 0.2;

/**
 * Light that passes the layer's base, or reaches the bed, makes the warming hang on how clear the water is. That asks
 * for care with the temperature only, so it never forbids the estimate.
 */
export const shortwaveAtBase: Indicator = (context) => {
  const { forcing, method } = context;
  if (!forcing.shortwave) return null;
  const { bed, depth } = depthReached(context);
  const value = shortwaveFraction(waterClarity(method.waterType), depth);
  const share = `${(100 * value).toFixed(1)} % of the sunlight ${bed ? "reaches the bed" : "passes the layer's base"} at ${depth.toFixed(0)} m in water of Jerlov type ${method.waterType}`;
  const note = { code: bed ? "SHORTWAVE_AT_BED" : "SHORTWAVE_AT_BASE", value, source: sourceOf("shortwave").citation };
  const judged = atMost(value, LITTLE, MUCH);
  if (judged === "ok") {
    const message = `${share}, so the choice of water type matters little.`;
    return { ...note, severity: "ok", message, threshold: LITTLE };
  }
  const counted = countedAs(context, bed);
  const weight = judged === "caution" ? "depends on" : "is ruled by";
  const message = `${share}, so the warming ${weight} the choice of water type; ${counted}. Compare a clearer and a murkier type.`;
  return { ...note, severity: "caution", message, threshold: judged === "caution" ? LITTLE : MUCH };
};

/** The bed, where the column or the layer reaches it; else the layer's base. m */
function depthReached({ place, water, method }: FitContext): { bed: boolean; depth: number } {
  const { waterDepth } = place;
  const bed = waterDepth !== null && (method.model === "column" || waterDepth <= water.layerDepth);
  return { bed, depth: bed ? waterDepth : water.layerDepth };
}

function countedAs({ method }: FitContext, bed: boolean): string {
  if (!method.penetratingShortwave) return "this estimate keeps all of it in the layer";
  if (bed && method.model === "column") return "this estimate gives what reaches the bed to the water above it";
  return bed ? "this estimate leaves it to the bed" : "this estimate lets it pass into the water beneath";
}
