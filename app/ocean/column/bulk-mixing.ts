import { copyCell, renewDensity, type ColumnState } from "./column-state";

/**
 * Deepens the layer of `m` cells while its bulk Richardson number g Δρ h/(ρ0 |Δw|²) is below the critical one.
 * Heat, salt and momentum are kept.
 * @param gravityOverDensity g/ρ0, m⁴/(kg s²)
 * @returns the number of cells in the layer afterwards
 * @see Price, Weller & Pinkel (1986)
 */
export function mixInBulk(state: ColumnState, m: number, critical: number, gravityOverDensity: number): number {
  const { T, S, u, v, rho, cells, cellSize } = state;
  const start = m;
  let sumT = 0;
  let sumS = 0;
  let sumU = 0;
  let sumV = 0;
  // The layer's own values: at first those of the surface; as it grows they are kept in the cell that it took last.
  let layer = 0;
  while (m < cells) {
    const du = u[layer] - u[m];
    const dv = v[layer] - v[m];
    const shear2 = du * du + dv * dv;
    if (shear2 === 0) break;
    if (gravityOverDensity * (rho[m] - rho[layer]) * m * cellSize >= critical * shear2) break;
    if (m === start) {
      for (let k = 0; k < m; k++) {
        sumT += T[k];
        sumS += S[k];
        sumU += u[k];
        sumV += v[k];
      }
    }
    sumT += T[m];
    sumS += S[m];
    sumU += u[m];
    sumV += v[m];
    layer = m;
    m++;
    T[layer] = sumT / m;
    S[layer] = sumS / m;
    u[layer] = sumU / m;
    v[layer] = sumV / m;
    renewDensity(state, layer, m);
  }
  if (m > start) copyCell(state, layer, 0, layer);
  return m;
}
