import { MISSING, PASS, SUSPECT, type Flags } from "../flags";

/**
 * Relation of speed and direction: a wind that blows without a direction is suspect; a calm has none.
 * @param speed m/s, NaN where missing
 * @param from degrees true at the same times, NaN where missing
 * @param above m/s; up to this speed no direction is asked
 * @returns 1, 3 or 9 for each speed
 * Source: common practice, no source.
 */
export function directionMissing(speed: ArrayLike<number>, from: ArrayLike<number>, above: number): Flags {
  return Uint8Array.from(speed, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    return value > above && Number.isNaN(from[k]) ? SUSPECT : PASS;
  });
}
