import type { ColumnState } from "./column-state";

/** A step upwards in density smaller than this is rounding, kg/m³. */
const TOLERANCE = 1e-10;

/**
 * Mixes only what is statically unstable: each unstable pair becomes a block, which grows up and down while it is
 * unstable against its neighbour (pool adjacent violators). Under surface cooling this is mixing from the surface;
 * it also holds where light absorbed at the bed makes the lowest cell buoyant.
 */
export function mixStatically(state: ColumnState): void {
  const { rho, cells } = state;
  for (let k = 0; k + 1 < cells; k++) {
    if (rho[k + 1] < rho[k] - TOLERANCE) k = pool(state, k) - 1;
  }
}

/** Pools around the unstable pair k, k + 1. @returns the first cell below the block */
function pool({ T, S, u, v, rho, density, cells }: ColumnState, k: number): number {
  let top = k;
  let bottom = k + 1;
  let sumT = T[k] + T[k + 1];
  let sumS = S[k] + S[k + 1];
  let sumU = u[k] + u[k + 1];
  let sumV = v[k] + v[k + 1];
  let count = 2;
  let mean = density(sumS / count, sumT / count);
  for (;;) {
    let joining: number;
    if (bottom + 1 < cells && rho[bottom + 1] < mean - TOLERANCE) joining = ++bottom;
    else if (top > 0 && mean < rho[top - 1] - TOLERANCE) joining = --top;
    else break;
    sumT += T[joining];
    sumS += S[joining];
    sumU += u[joining];
    sumV += v[joining];
    count++;
    mean = density(sumS / count, sumT / count);
  }
  for (let cell = top; cell <= bottom; cell++) {
    T[cell] = sumT / count;
    S[cell] = sumS / count;
    u[cell] = sumU / count;
    v[cell] = sumV / count;
    rho[cell] = mean;
  }
  return bottom + 1;
}
