import { requireFinite, requirePositive, requireRotation } from "../guards";
import { coriolis } from "./coriolis";

/**
 * Ekman volume transport of a steady stress: Mx = τy/(ρf), My = -τx/(ρf).
 * The sign of f alone turns it to the right of the wind in the north and to the left in the south.
 * @param stress N/m² @param latitude degrees @param waterDensity kg/m³
 * @returns m²/s, east and north
 * @throws OceanError EQUATORIAL within 2 degrees; INVALID_INPUT
 * @see Ekman (1905)
 */
export function ekmanTransport(
  stress: { x: number; y: number },
  latitude: number,
  waterDensity: number,
): { x: number; y: number } {
  requireFinite({ stressX: stress.x, stressY: stress.y });
  requirePositive({ waterDensity });
  requireRotation(latitude);
  const perStress = 1 / (waterDensity * coriolis(latitude));
  return { x: stress.y * perStress, y: -stress.x * perStress };
}
