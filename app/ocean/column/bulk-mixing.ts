import { homogenise, type ColumnState } from "./column-state";

/**
 * Deepens the layer of `m` cells while its bulk Richardson number g Δρ h/(ρ0 |Δw|²) is below the critical one.
 * @returns the number of cells in the layer afterwards
 * @see Price, Weller & Pinkel (1986)
 */
export function mixInBulk(state: ColumnState, m: number, critical: number, gravityOverDensity: number): number {
  const { T, S, u, v, rho, density, cells, cellSize } = state;
  const start = m;
  let [sumT, sumS, sumU, sumV] = [0, 0, 0, 0];
  let [layerRho, layerU, layerV] = [rho[0], u[0], v[0]];
  while (m < cells) {
    const du = layerU - u[m];
    const dv = layerV - v[m];
    const shear2 = du * du + dv * dv;
    if (shear2 === 0) break;
    if (gravityOverDensity * (rho[m] - layerRho) * m * cellSize >= critical * shear2) break;
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
    m++;
    layerU = sumU / m;
    layerV = sumV / m;
    layerRho = density(sumS / m, sumT / m);
  }
  if (m > start) homogenise(state, 0, m);
  return m;
}
