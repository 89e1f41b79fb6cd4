import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

const HIGH = 2.5e-3;

/** A constant coefficient is an order of magnitude; a large one is flagged. */
export const dragCoefficient: Indicator = ({ method }) => {
  if (method.dragLaw !== "constant") return null;
  const value = method.dragCoefficient;
  const high = value > HIGH;
  const message = high
    ? `A constant drag coefficient of ${value} is high and suits an order of magnitude only. Choose a drag law that follows the wind for anything finer.`
    : `A constant drag coefficient of ${value} suits an order of magnitude.`;
  return {
    code: "DRAG_COEFFICIENT",
    severity: high ? "caution" : "ok",
    message,
    value,
    threshold: HIGH,
    source: sourceOf("drag-constant").citation,
  };
};
