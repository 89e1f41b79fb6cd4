import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

const HIGHEST = 42;

/** Saltier than the density polynomial was fitted to. */
export const salinityRange: Indicator = ({ layer }) => {
  const value = layer.SA.reduce((most, SA) => Math.max(most, SA), 0);
  if (value <= HIGHEST) return null;
  const message = `Salinity reaches ${value.toFixed(2)} g/kg, above the ${HIGHEST} g/kg that the density formula was fitted to. Check the salinities and the evaporation; take densities as indications.`;
  return {
    code: "OUT_OF_RANGE",
    severity: "caution",
    message,
    value,
    threshold: HIGHEST,
    source: sourceOf("density").citation,
  };
};
