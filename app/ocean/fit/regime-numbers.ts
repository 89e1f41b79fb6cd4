import { coriolis } from "../ekman/coriolis";
import { requireNotNegative, requirePositive, requireRotation } from "../guards";

/** Internal Rossby radius c/|f|, m. @param waveSpeed m/s @param latitude degrees @throws OceanError EQUATORIAL, INVALID_INPUT */
export function rossbyRadius(waveSpeed: number, latitude: number): number {
  requireNotNegative({ waveSpeed });
  requireRotation(latitude);
  return waveSpeed / Math.abs(coriolis(latitude));
}

/**
 * Storm speed number π Vt/(4 |f| Rm): about 1 resonant, far below slow (upwelling matters), far above fast.
 * @param translationSpeed m/s @param radiusOfMaximumWind m @param latitude degrees
 * @throws OceanError EQUATORIAL, INVALID_INPUT
 * @see Price, Sanford & Forristall (1994) (from memory)
 */
export function stormSpeedNumber(translationSpeed: number, radiusOfMaximumWind: number, latitude: number): number {
  requireNotNegative({ translationSpeed });
  requirePositive({ radiusOfMaximumWind });
  requireRotation(latitude);
  return (Math.PI * translationSpeed) / (4 * Math.abs(coriolis(latitude)) * radiusOfMaximumWind);
}

/** Rossby number U/(|f| L). @param speed m/s @param length m @param latitude degrees @throws OceanError EQUATORIAL, INVALID_INPUT */
export function rossbyNumber(speed: number, length: number, latitude: number): number {
  requireNotNegative({ speed });
  requirePositive({ length });
  requireRotation(latitude);
  return speed / (Math.abs(coriolis(latitude)) * length);
}
