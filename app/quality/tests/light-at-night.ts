import { FAIL, MISSING, NOT_EVALUATED, PASS, type Flags } from "../flags";
import { sunElevation } from "../sun-elevation";

export interface NightLimits {
  /** W/m², above which there is light. */
  light: number;
  /** Degrees; below this elevation of the sun it is night. */
  elevation: number;
  /** [longitude, latitude] in degrees; null where nobody knows. */
  place: readonly [number, number] | null;
  /** s, of the record: a stamp may begin, centre or end the mean that it stands for. */
  step: number;
}

/**
 * Relation of light and sun: shortwave radiation while the sun is below the horizon is bad, and mostly a mistake of the time
 * zone. Night is where the sun is down at the stamp and a step before and after it, since the mean reaches over one of them.
 * @param time seconds since 1970-01-01T00:00:00Z
 * @param shortwave W/m² into the sea, NaN where missing
 * @returns 1, 2, 4 or 9 for each value
 * Source: common practice, no source.
 */
export function lightAtNight(time: ArrayLike<number>, shortwave: ArrayLike<number>, limits: NightLimits): Flags {
  const { light, elevation, place, step } = limits;
  return Uint8Array.from(shortwave, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    if (place === null) return NOT_EVALUATED;
    if (!(value > light)) return PASS;
    return isNight(time[k], step, elevation, place) ? FAIL : PASS;
  });
}

/** Looked at every ten minutes of the step before and after, so that no short day is missed. */
function isNight(at: number, step: number, elevation: number, place: readonly [number, number]): boolean {
  const looks = Math.ceil(step / 600);
  for (let look = -looks; look <= looks; look++) {
    if (sunElevation(at + (look / Math.max(looks, 1)) * step, place) >= elevation) return false;
  }
  return true;
}
