import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

const HIGH = 2.5e-3;

/** A constant coefficient is an order of magnitude; a large one is flagged. */
export const dragCoefficient: Indicator = ({ method }) => {
  if (method.dragLaw !== "constant") return null;
  const value = method.dragCoefficient;
  const severity = value > HIGH ? "caution" : "ok";
  const message =
    severity === "ok"
      ? `A constant drag coefficient of ${value}: good for an order of magnitude.`
      : `A constant drag coefficient of ${value} is high; textbooks use up to 3e-3 for orders of magnitude only.`;
  return {
    code: "DRAG_COEFFICIENT",
    severity,
    message,
    value,
    threshold: HIGH,
    source: sourceOf("drag-constant").citation,
  };
};
