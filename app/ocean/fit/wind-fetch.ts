import { sourceOf } from "../sources";
import type { Indicator } from "./fit-context";

/** Measuring heights of 10 m that the wind must have crossed for the sea to be as the drag laws take it: 8 km. */
const GROWN_FETCH = 8000;

/** A wind off the land meets a young sea near the shore, whose drag is another. Judged at the strongest wind. */
export const windFetch: Indicator = ({ place, forcing }) => {
  if (place.distanceToShore === null || place.shoreNormal === null) return null;
  const { windU, windV } = forcing;
  let strongest = 0;
  for (let k = 1; k < windU.length; k++) {
    if (Math.hypot(windU[k], windV[k]) > Math.hypot(windU[strongest], windV[strongest])) strongest = k;
  }
  const speed = Math.hypot(windU[strongest], windV[strongest]);
  const normal = (place.shoreNormal * Math.PI) / 180;
  const offLand = (windU[strongest] * Math.sin(normal) + windV[strongest] * Math.cos(normal)) / speed;
  if (!(offLand > 0.1)) return null;
  const metres = place.distanceToShore / offLand;
  const value = metres / 1000;
  const blow = `The strongest wind comes off the land over about ${value.toFixed(1)} km of water`;
  const young = metres < GROWN_FETCH;
  return {
    code: "FETCH",
    severity: young ? "caution" : "ok",
    message: young
      ? `${blow}: the sea is young and the drag coefficient uncertain by some 40 %.`
      : `${blow}: far enough for the drag laws.`,
    value,
    threshold: GROWN_FETCH / 1000,
    source: sourceOf("drag-largePond1981").citation,
  };
};
