import { requireNotNegative } from "../guards";

const MM_PER_HOUR_PER_INCH_PER_DAY = 25.4 / 24;
/** Beyond 165.7 kt the fitted radius would turn negative; it is held here, km. */
const LEAST_RADIUS = 5;

/**
 * Climatological rain rate around a tropical cyclone. A mean: single eyewalls bring 2 to 4 times as much.
 * @param distanceKm from the centre, km @param maximumWindKt kt
 * @returns mm/h, ≥ 0
 * @throws OceanError INVALID_INPUT
 * @see Tuleya, DeMaria & Kuligowski (2007), Weather and Forecasting 22:56-70, table 2
 */
export function cycloneRain(distanceKm: number, maximumWindKt: number): number {
  requireNotNegative({ distanceKm, maximumWindKt });
  const U = 1 + (maximumWindKt - 35) / 33;
  const centre = -1.1 + 3.96 * U;
  const peak = -1.6 + 4.8 * U;
  const peakRadius = Math.max(LEAST_RADIUS, 64.5 - 13 * U);
  const foldingRadius = 150 - 16 * U;
  const inchesPerDay =
    distanceKm < peakRadius
      ? centre + ((peak - centre) * distanceKm) / peakRadius
      : peak * Math.exp(-(distanceKm - peakRadius) / Math.max(LEAST_RADIUS, foldingRadius));
  return Math.max(0, inchesPerDay * MM_PER_HOUR_PER_INCH_PER_DAY);
}
