import { VON_KARMAN } from "../constants";
import { requireNotNegative, requirePositive } from "../guards";
import type { DragLaw } from "../stress/drag-law";

/**
 * Wind at 10 m by the neutral logarithmic profile whose friction velocity belongs to the drag law in use.
 * Fixed point to 1e-10 m/s; where a law jumps the iteration may swing between two values, whose mean is returned.
 * @param speed m/s at `height` @param height m above the sea, > 0 @param law drag coefficient as a function of the 10 m wind
 * @returns m/s
 * @throws OceanError INVALID_INPUT
 * @see logarithmic surface layer (common practice), as in Large & Pond (1981)
 */
export function logLawWind10(speed: number, height: number, law: DragLaw): number {
  requireNotNegative({ speed });
  requirePositive({ height });
  if (speed === 0 || height === 10) return speed;
  const logHeight = Math.log(height / 10);
  let wind = speed;
  let before = speed;
  for (let iteration = 0; iteration < 60; iteration++) {
    const growth = 1 + (Math.sqrt(law(wind)) / VON_KARMAN) * logHeight;
    // Very close to the sea the profile of a rough law has no wind left; the reading is then taken as it is.
    const next = growth > 0 ? speed / growth : speed;
    before = wind;
    wind = next;
    if (Math.abs(wind - before) < 1e-10) return wind;
  }
  return (wind + before) / 2;
}
