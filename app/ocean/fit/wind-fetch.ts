import type { Forcing } from "../forcing/read-forcing";
import { kilometres, thresholdSource, type Indicator } from "./fit-context";

/** Measuring heights of 10 m that the wind must have crossed for the sea to be as the drag laws take it: 8 km. */
const GROWN_FETCH = 8000;
/** Where less of the wind than this blows off the land, the sea upwind is open. */
const ALONGSHORE = 0.1;

/**
 * A wind off the land meets a young sea near the shore, whose drag is another. Judged at the strongest wind: over the
 * slanting way from a straight shore, or, where its direction is not known, over the distance to the nearest shore.
 */
export const windFetch: Indicator = ({ place, forcing, peakWind }) => {
  if (place.distanceToShore === null || peakWind === 0) return null;
  const offLand = place.shoreNormal === null ? 1 : shareOffLand(forcing, place.shoreNormal);
  if (offLand <= ALONGSHORE) return null;
  const metres = place.distanceToShore / offLand;
  const note = { code: "FETCH", value: metres / 1000, threshold: GROWN_FETCH / 1000 };
  const source = thresholdSource("fit-fetch");
  const blow =
    place.shoreNormal === null
      ? `The wind crosses at least ${kilometres(metres)} of water, the distance to the nearest shore`
      : `The strongest wind comes off the land over about ${kilometres(metres)} of water`;
  if (metres >= GROWN_FETCH) {
    const message = `${blow}: the 8 km or more that the drag laws are stated for.`;
    return { ...note, severity: "ok", message, source };
  }
  const message = `${blow}, less than the 8 km that the drag laws are stated for: the sea is young and the drag coefficient uncertain by some 40 %. Compare two drag laws, or run an ensemble.`;
  return { ...note, severity: "caution", message, source };
};

/** Share of the strongest wind that blows from the shore out to sea, -1…1. */
function shareOffLand({ windU, windV }: Forcing, shoreNormal: number): number {
  let strongest = 0;
  for (let k = 1; k < windU.length; k++) {
    if (Math.hypot(windU[k], windV[k]) > Math.hypot(windU[strongest], windV[strongest])) strongest = k;
  }
  const [u, v] = [windU[strongest], windV[strongest]];
  const normal = (shoreNormal * Math.PI) / 180;
  return (u * Math.sin(normal) + v * Math.cos(normal)) / Math.hypot(u, v);
}
