import { CONVENTION, type Indicator } from "./fit-context";

const WIDE = 500_000;

/** Across a very large box f differs so much that inertial motion falls out of step. */
export const boxExtent: Indicator = ({ place }) => {
  if (place.size === null) return null;
  const value = place.size / 1000;
  const severity = place.size <= WIDE ? "ok" : "caution";
  const message =
    severity === "ok"
      ? `The box is about ${value.toFixed(0)} km wide: one latitude stands for all of it.`
      : `The box is about ${value.toFixed(0)} km wide: inertial motion falls out of step across it and the wind is not the same everywhere; divide it.`;
  return { code: "BOX_EXTENT", severity, message, value, threshold: WIDE / 1000, source: CONVENTION };
};
