import { requireFinite, requirePositive } from "../guards";
import type { DragLaw } from "./drag-law";

/**
 * Wind stress on the sea: τ = ρa Cd |U| U.
 * @param u, v wind at 10 m (relative to the surface current where that is wanted), m/s, east and north
 * @param law drag coefficient @param airDensity kg/m³
 * @returns N/m², east and north; exactly zero in calm, whatever the law says there
 * @throws OceanError INVALID_INPUT
 * @see bulk formula (common practice)
 */
export function windStress(u: number, v: number, law: DragLaw, airDensity: number): { x: number; y: number } {
  requireFinite({ u, v });
  requirePositive({ airDensity });
  const speed = Math.hypot(u, v);
  if (speed === 0) return { x: 0, y: 0 };
  const factor = airDensity * law(speed) * speed;
  return { x: factor * u, y: factor * v };
}
