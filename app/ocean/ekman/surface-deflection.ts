import { complex, type Complex } from "../complex";
import { requireDepth, requirePositive } from "../guards";
import { finiteDepthCurrent, type FiniteDepthSetting } from "./finite-depth";

/**
 * Angle that the surface current is turned from the wind, over a bed without slip.
 * @returns degrees, positive to the right of the wind (northern hemisphere), negative to the left; 0 without rotation
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 * @see Ekman (1905)
 */
export function surfaceDeflection(setting: FiniteDepthSetting): number {
  return angleToTheRight(complex(1), finiteDepthCurrent(complex(1), setting, 0));
}

/**
 * The same from the ratio of water depth to Ekman depth alone, in the northern hemisphere.
 * @param ratio H/D_E, > 0
 */
export function surfaceDeflectionOfRatio(ratio: number): number {
  requirePositive({ ratio });
  requireDepth("depth", ratio);
  // Any f and A give the same angle at the same H/D_E; with f = 2 and A = 1 the Ekman depth is π metres.
  return surfaceDeflection({ f: 2, eddyViscosity: 1, depth: ratio * Math.PI });
}

/** Degrees clockwise from one vector to another, -180…180. */
export function angleToTheRight(from: Complex, to: Complex): number {
  const cross = from.re * to.im - from.im * to.re;
  const dot = from.re * to.re + from.im * to.im;
  const degrees = (-Math.atan2(cross, dot) * 180) / Math.PI;
  return degrees === 0 ? 0 : degrees;
}
