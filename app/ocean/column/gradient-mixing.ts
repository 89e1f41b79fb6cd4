import { OceanError } from "../errors";
import type { ColumnState } from "./column-state";

/** Mixing aims a little past the critical number, at 0.30, so that a pair does not fall back at once. */
const TARGET = 0.3;
/** Shear smaller than this (squared, m²/s²) is no shear. */
const NO_SHEAR = 1e-12;
/** Interfaces a block; the least number is kept for each. */
const BLOCK = 16;
const BLOCK_BITS = 4;

/** Working arrays of the gradient mixing: one set a column, so that no step allocates. */
export interface GradientWork {
  richardson: Float64Array;
  leastInBlock: Float64Array;
}

export function gradientWork(cells: number): GradientWork {
  const interfaces = cells - 1;
  const blocks = Math.ceil(interfaces / BLOCK);
  return {
    // Padded with infinities to whole blocks.
    richardson: new Float64Array(blocks * BLOCK).fill(Number.POSITIVE_INFINITY),
    leastInBlock: new Float64Array(blocks),
  };
}

/**
 * Mixes neighbouring cells, always at the interface with the least gradient Richardson number
 * g Δρ Δz/(ρ0 |Δw|²), until none is below the critical one. A storm needs thousands of exchanges in one step.
 * @param scaled g Δz/ρ0, m⁵/(kg s²)
 * @returns the number of exchanges
 * @throws OceanError NOT_CONVERGED
 * @see Price, Weller & Pinkel (1986)
 */
export function mixAtGradients(state: ColumnState, work: GradientWork, critical: number, scaled: number): number {
  const { T, S, u, v, rho, density, cells } = state;
  const { richardson, leastInBlock } = work;
  const interfaces = cells - 1;
  const blocks = leastInBlock.length;
  const most = Math.max(1e6, 5000 * cells);

  for (let k = 0; k < interfaces; k++) richardson[k] = richardsonAt(rho, u, v, k, scaled);
  for (let block = 0; block < blocks; block++) leastInBlock[block] = leastOf(richardson, block);

  for (let exchanges = 0; ; exchanges++) {
    let block = 0;
    let least = leastInBlock[0];
    for (let b = 1; b < blocks; b++) {
      if (leastInBlock[b] < least) {
        least = leastInBlock[b];
        block = b;
      }
    }
    if (!(least < critical)) return exchanges;
    if (exchanges >= most) {
      throw new OceanError(
        "NOT_CONVERGED",
        `Gradient mixing did not settle in ${most} exchanges; use a shorter time step or larger cells.`,
      );
    }
    let k = block << BLOCK_BITS;
    while (richardson[k] !== least) k++;

    const half = (1 - least / TARGET) / 2;
    const dT = half * (T[k + 1] - T[k]);
    const dS = half * (S[k + 1] - S[k]);
    const du = half * (u[k + 1] - u[k]);
    const dv = half * (v[k + 1] - v[k]);
    T[k] += dT;
    T[k + 1] -= dT;
    S[k] += dS;
    S[k + 1] -= dS;
    u[k] += du;
    u[k + 1] -= du;
    v[k] += dv;
    v[k + 1] -= dv;
    rho[k] = density(S[k], T[k]);
    rho[k + 1] = density(S[k + 1], T[k + 1]);

    const first = k > 0 ? k - 1 : 0;
    const last = k + 1 < interfaces ? k + 1 : k;
    for (let i = first; i <= last; i++) richardson[i] = richardsonAt(rho, u, v, i, scaled);
    const firstBlock = first >> BLOCK_BITS;
    const lastBlock = last >> BLOCK_BITS;
    leastInBlock[firstBlock] = leastOf(richardson, firstBlock);
    if (lastBlock !== firstBlock) leastInBlock[lastBlock] = leastOf(richardson, lastBlock);
  }
}

function richardsonAt(rho: Float64Array, u: Float64Array, v: Float64Array, k: number, scaled: number): number {
  const du = u[k + 1] - u[k];
  const dv = v[k + 1] - v[k];
  const shear2 = du * du + dv * dv;
  if (shear2 < NO_SHEAR) return Number.POSITIVE_INFINITY;
  const step = rho[k + 1] - rho[k];
  return step > 0 ? (scaled * step) / shear2 : 0;
}

function leastOf(richardson: Float64Array, block: number): number {
  const start = block << BLOCK_BITS;
  let least = richardson[start];
  for (let k = start + 1; k < start + BLOCK; k++) {
    if (richardson[k] < least) least = richardson[k];
  }
  return least;
}
