import { complex, divide, exponential, multiply, scale, type Complex } from "../complex";
import { OceanError } from "../errors";
import { requireFinite, requirePositive, requireRotation } from "../guards";
import { coriolis } from "./coriolis";

/** Ekman depth D_E = π √(2A/|f|), m, for an eddy viscosity A in m²/s and f in 1/s. */
export function ekmanDepth(eddyViscosity: number, f: number): number {
  requirePositive({ eddyViscosity });
  return Math.PI * Math.sqrt((2 * eddyViscosity) / Math.abs(f));
}

/**
 * Current of the Ekman spiral in deep water with constant eddy viscosity.
 * @param stress N/m² @param latitude degrees @param eddyViscosity m²/s @param z m, 0 at the surface and negative below
 * @returns m/s, east and north
 * @throws OceanError EQUATORIAL within 2 degrees; INVALID_INPUT
 * @see Ekman (1905)
 */
export function ekmanSpiral(
  stress: { x: number; y: number },
  latitude: number,
  eddyViscosity: number,
  z: number,
  waterDensity: number,
): { u: number; v: number } {
  requireFinite({ stressX: stress.x, stressY: stress.y, z });
  requirePositive({ eddyViscosity, waterDensity });
  requireRotation(latitude);
  if (z > 0) throw new OceanError("INVALID_INPUT", `z must be 0 or negative (below the surface); it is ${z} m.`);
  const f = coriolis(latitude);
  const perLength = 1 / Math.sqrt((2 * eddyViscosity) / Math.abs(f));
  const lambda = complex(perLength, Math.sign(f) * perLength);
  const T: Complex = complex(stress.x / waterDensity, stress.y / waterDensity);
  const surface = divide(T, scale(lambda, eddyViscosity));
  const current = multiply(surface, exponential(scale(lambda, z)));
  return { u: current.re, v: current.im };
}
