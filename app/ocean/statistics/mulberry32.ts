import { OceanError } from "../errors";

/** Numbers in 0 ≤ u < 1, one a call. */
export type Random = () => number;

/**
 * The 32-bit generator mulberry32: the same seed gives the same numbers everywhere.
 * @param seed whole number, 0…4294967295
 * @throws OceanError INVALID_INPUT for another seed
 * @see Ettinger (2017), public domain
 */
export function mulberry32(seed: number): Random {
  if (!Number.isInteger(seed) || seed < 0 || seed > 0xffffffff) {
    throw new OceanError("INVALID_INPUT", `A seed must be a whole number from 0 to 4294967295; it is ${String(seed)}.`);
  }
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}
