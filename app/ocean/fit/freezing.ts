import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

/** The layer was held at its freezing point: ice is not modelled. */
export const freezing: Indicator = ({ layer }) => {
  if (layer.freezingDeficit === 0) return null;
  const value = layer.freezingDeficit;
  const message = `The layer reached its freezing point and was held there; ${(value / 1e6).toFixed(2)} MJ/m² of cooling would have made ice, which is not modelled. Check the heat series, and do not use salinities after that time where ice forms.`;
  return { code: "FREEZING", severity: "caution", message, value, threshold: 0, source: sourceOf("freezing").citation };
};
