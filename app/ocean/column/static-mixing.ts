import { copyCell, renewDensity, type ColumnState } from "./column-state";

/** A step in density smaller than this is rounding, kg/m³. */
export const DENSITY_ROUNDING = 1e-10;

/**
 * Mixes only what is statically unstable: each unstable pair becomes a block, which grows up and down while it is
 * unstable against its neighbour (pool adjacent violators). Under surface cooling this is mixing from the surface;
 * it also holds where light absorbed at the bed makes the lowest cell buoyant.
 */
export function mixStatically(state: ColumnState): void {
  const { rho, cells } = state;
  for (let k = 0; k + 1 < cells; k++) {
    if (rho[k + 1] < rho[k] - DENSITY_ROUNDING) k = pool(state, k) - 1;
  }
}

/** Pools around the unstable pair k, k + 1. @returns the first cell below the block */
function pool(state: ColumnState, k: number): number {
  const { T, S, u, v, rho, cells } = state;
  let top = k;
  let bottom = k + 1;
  let sumT = T[k] + T[k + 1];
  let sumS = S[k] + S[k + 1];
  let sumU = u[k] + u[k + 1];
  let sumV = v[k] + v[k + 1];
  // The block's own values are kept in the cell that it took last.
  let block = k + 1;
  for (;;) {
    const count = bottom - top + 1;
    T[block] = sumT / count;
    S[block] = sumS / count;
    u[block] = sumU / count;
    v[block] = sumV / count;
    renewDensity(state, block, block + 1);
    if (bottom + 1 < cells && rho[bottom + 1] < rho[block] - DENSITY_ROUNDING) block = ++bottom;
    else if (top > 0 && rho[block] < rho[top - 1] - DENSITY_ROUNDING) block = --top;
    else break;
    sumT += T[block];
    sumS += S[block];
    sumU += u[block];
    sumV += v[block];
  }
  copyCell(state, block, top, bottom + 1);
  return bottom + 1;
}
