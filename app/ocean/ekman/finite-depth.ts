import {
  add,
  complex,
  decayed,
  divide,
  exponential,
  modulus,
  multiply,
  scale,
  squareRoot,
  subtract,
  type Complex,
} from "../complex";
import { OceanError } from "../errors";
import { requireDepth, requireFinite, requirePositive } from "../guards";

export interface FiniteDepthSetting {
  /** Coriolis parameter, 1/s; may be zero. */
  f: number;
  /** Eddy viscosity, m²/s. */
  eddyViscosity: number;
  /** Water depth, m. */
  depth: number;
}

/** Below this size of λH the rotation is too weak to tell and the series about no rotation is used. */
export const WEAK_ROTATION = 1e-3;

/** λ = √(if/A), 1/m: the principal root. */
export function ekmanWavenumber({ f, eddyViscosity }: FiniteDepthSetting): Complex {
  return squareRoot(complex(0, f / eddyViscosity));
}

/** @throws OceanError NONPOSITIVE_DEPTH or INVALID_INPUT unless the setting makes sense. */
export function requireSetting({ f, eddyViscosity, depth }: FiniteDepthSetting): void {
  requireFinite({ f });
  requirePositive({ eddyViscosity });
  requireDepth("depth", depth);
}

/**
 * Steady current under a kinematic stress T = τ/ρ over a bed without slip.
 * w(z) = T/(Aλ) sinh(λ(z+H))/cosh(λH), written with decaying exponentials so that deep water cannot overflow.
 * @param T m²/s² @param z m, -depth…0
 * @returns m/s as u + i v
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 * @see Ekman (1905)
 */
export function finiteDepthCurrent(T: Complex, setting: FiniteDepthSetting, z: number): Complex {
  requireSetting(setting);
  requireFinite({ T: T.re + T.im, z });
  const { depth, eddyViscosity } = setting;
  if (z > 0 || z < -depth) throw new OceanError("INVALID_INPUT", `z must lie between -${depth} and 0 m; it is ${z} m.`);
  const lambda = ekmanWavenumber(setting);
  if (modulus(lambda) * depth < WEAK_ROTATION) return scale(T, (z + depth) / eddyViscosity);
  const one = complex(1);
  const above = subtract(one, exponential(scale(lambda, -2 * (z + depth))));
  const below = add(one, exponential(scale(lambda, -2 * depth)));
  const shape = divide(multiply(exponential(scale(lambda, z)), above), below);
  return multiply(divide(T, scale(lambda, eddyViscosity)), shape);
}

/**
 * Mean of `finiteDepthCurrent` from the surface to a depth D:
 * -i(T/fD)(1 - e^(-λD))(1 - e^(-λ(2H-D)))/(1 + e^(-2λH)).
 * @param layerDepth D, m, 0…depth
 * @returns m/s as u + i v
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 */
export function finiteDepthLayerMean(T: Complex, setting: FiniteDepthSetting, layerDepth: number): Complex {
  requireSetting(setting);
  requireDepth("layerDepth", layerDepth);
  const { f, depth, eddyViscosity } = setting;
  if (layerDepth > depth)
    throw new OceanError("INVALID_INPUT", `A layer of ${layerDepth} m does not lie within ${depth} m of water.`);
  const lambda = ekmanWavenumber(setting);
  if (modulus(lambda) * depth < WEAK_ROTATION) return scale(T, (depth - layerDepth / 2) / eddyViscosity);
  const across = multiply(decayed(scale(lambda, layerDepth)), decayed(scale(lambda, 2 * depth - layerDepth)));
  const shape = divide(across, add(complex(1), exponential(scale(lambda, -2 * depth))));
  return multiply(scale(multiply(T, complex(0, -1)), 1 / (f * layerDepth)), shape);
}

/**
 * Volume transport that belongs to `finiteDepthCurrent`: M = -i(T/f)(1 - sech λH).
 * @returns m²/s as Mx + i My
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 */
export function finiteDepthTransport(T: Complex, setting: FiniteDepthSetting): Complex {
  requireSetting(setting);
  const { f, depth, eddyViscosity } = setting;
  const lambda = ekmanWavenumber(setting);
  if (modulus(lambda) * depth < WEAK_ROTATION) {
    const lambdaH2 = multiply(scale(lambda, depth), scale(lambda, depth));
    const shape = subtract(complex(1), scale(lambdaH2, 5 / 12));
    return multiply(scale(T, (depth * depth) / (2 * eddyViscosity)), shape);
  }
  return multiply(scale(multiply(T, complex(0, -1)), 1 / f), subtract(complex(1), sech(scale(lambda, depth))));
}

/**
 * Stress that the current of `finiteDepthCurrent` leaves on the bed: T sech λH.
 * @returns m²/s²
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 */
export function finiteDepthBedStress(T: Complex, setting: FiniteDepthSetting): Complex {
  requireSetting(setting);
  return multiply(T, sech(scale(ekmanWavenumber(setting), setting.depth)));
}

/** 1/cosh for an argument with a real part that is not negative. */
export function sech(a: Complex): Complex {
  const decay = exponential(scale(a, -1));
  const square = multiply(decay, decay);
  return divide(scale(decay, 2), { re: 1 + square.re, im: square.im });
}
