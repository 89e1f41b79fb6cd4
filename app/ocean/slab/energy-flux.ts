import { requireFinite } from "../guards";

/**
 * Power that the wind puts into the layer's motion: Π = τ · u.
 * @param stress N/m² @param current m/s
 * @returns W/m², negative where the wind brakes the layer
 * @throws OceanError INVALID_INPUT
 * @see mechanical work (common practice)
 */
export function windEnergyFlux(stress: { x: number; y: number }, current: { u: number; v: number }): number {
  requireFinite({ stressX: stress.x, stressY: stress.y, u: current.u, v: current.v });
  return stress.x * current.u + stress.y * current.v;
}
