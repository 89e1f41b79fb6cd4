import { GRAVITY, VON_KARMAN } from "../../constants";
import { OceanError } from "../../errors";
import { requirePositive } from "../../guards";

/** Kinematic viscosity of air at 20 °C, m²/s: 1.326e-5 (1 + 6.542e-3 t + 8.301e-6 t² - 4.84e-9 t³), COARE algorithm. */
export const AIR_VISCOSITY = 1.5038453476800001e-5;

export interface NeutralDrag {
  cd: number;
  /** Friction velocity, m/s. */
  ustar: number;
  /** Roughness length, m. */
  z0: number;
}

/**
 * Charnock's parameter as a line in the neutral 10 m wind (m/s), level above 19 m/s.
 * The slope is 0.0017 as in the corrigendum; the abstract of 2013 misprints 0.017.
 * @see Edson et al. (2013), Journal of Physical Oceanography 43:1589-1610, and corrigendum (2014) 44:1436
 */
export function charnock(wind10Neutral: number): number {
  return 0.0017 * Math.min(wind10Neutral, 19) - 0.005;
}

/**
 * Neutral drag of COARE 3.5 from the neutral 10 m wind: friction velocity and roughness found together, to 1e-15.
 * The fit covers 0…25 m/s.
 * @param wind10Neutral m/s, > 0 @param viscosity of air, m²/s @param gravity m/s²
 * @throws OceanError INVALID_INPUT; NOT_CONVERGED
 */
export function coare35Neutral(wind10Neutral: number, viscosity = AIR_VISCOSITY, gravity = GRAVITY): NeutralDrag {
  requirePositive({ wind10Neutral, viscosity, gravity });
  const alpha = charnock(wind10Neutral);
  let ustar = 0.03 * wind10Neutral;
  let z0 = roughness(ustar);
  for (let iteration = 0; iteration < 200; iteration++) {
    const next = (VON_KARMAN * wind10Neutral) / Math.log(10 / z0);
    const change = Math.abs(next - ustar);
    ustar = next;
    z0 = roughness(ustar);
    if (change <= 1e-15 * ustar) return { cd: (ustar / wind10Neutral) ** 2, ustar, z0 };
    if (change <= 4e-16) return { cd: (ustar / wind10Neutral) ** 2, ustar, z0 };
  }
  throw new OceanError("NOT_CONVERGED", `No friction velocity found for a neutral wind of ${wind10Neutral} m/s.`);

  function roughness(friction: number): number {
    // Charnock's parameter is negative below 2.94 m/s; roughness itself must not be.
    return Math.max(1e-9, (0.11 * viscosity) / friction + (alpha * friction * friction) / gravity);
  }
}
