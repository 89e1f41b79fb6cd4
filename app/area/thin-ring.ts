import { polygon, simplify } from "@turf/turf";
import type { Position } from "~/ocean/scenario";
import { METRES_PER_DEGREE } from "~/ocean/box/ring";
import { BOX_LIMITS, checkBox } from "./check-box";
import { openRing, unwrapRing } from "./ring";

export interface ThinnedRing {
  /** As `checkBox` gives it. */
  ring: Position[];
  /** The outline moves by less than this, m. */
  deviation: number;
}

/** Degrees: about a metre, and about 2 km, beyond which the outline is another one. */
const FINEST = 1e-5;
const COARSEST = 0.02;

/**
 * The outline with as many corners as a study box may have, and no more moved than it takes.
 * @param ring [longitude, latitude] in degrees, open or closed
 * @returns null where even a coarse outline is no study box
 * @see Douglas & Peucker (1973), Cartographica 10:112-122
 */
export function thinRing(ring: readonly Position[]): ThinnedRing | null {
  const corners = unwrapRing(openRing(ring));
  const closed = polygon([[...corners, corners[0]]]);
  for (let tolerance = FINEST; tolerance <= COARSEST; tolerance *= 2) {
    const [thinned] = simplify(closed, { tolerance }).geometry.coordinates;
    if (thinned.length > BOX_LIMITS.corners) continue;
    const checked = checkBox(thinned);
    if (checked.ok) return { ring: checked.ring, deviation: tolerance * METRES_PER_DEGREE };
  }
  return null;
}
