import { OceanError } from "../errors";
import { copyCell, renewDensity, type ColumnState } from "./column-state";
import type { LeastInterface } from "./least-interface";
import { DENSITY_ROUNDING } from "./static-mixing";

/** Mixing aims a little past the critical number, at 0.30, so that a pair does not fall back at once. */
const TARGET = 0.3;
/** Shear smaller than this (squared, m²/s²) is no shear. */
const NO_SHEAR = 1e-12;

/**
 * Mixes neighbouring cells, always at the interface with the least gradient Richardson number
 * g Δρ Δz/(ρ0 |Δw|²), until none is below the critical one. A storm needs thousands of exchanges in one step.
 *
 * Six times in seven the next interface is the neighbour of the last: so it is looked for among the three numbers that
 * an exchange has changed, as long as they are below everything else.
 *
 * Water of one density that shears is mixed as a whole: that is where its exchanges, all by halves, would end. One by one
 * they may not: a last trace of shear creeps up and down two hundred cells in more exchanges than a step can have.
 * @param search working arrays, one set a column, so that no step allocates
 * @param scaled g Δz/ρ0, m⁵/(kg s²)
 * @returns the number of exchanges
 * @throws OceanError NOT_CONVERGED
 * @see Price, Weller & Pinkel (1986)
 */
export function mixAtGradients(state: ColumnState, search: LeastInterface, critical: number, scaled: number): number {
  const { richardson, rival } = search;
  const interfaces = state.cells - 1;
  const most = Math.max(1e6, 5000 * state.cells);
  renewRichardson(state, richardson, scaled, 0, interfaces);
  search.touch(0, interfaces);
  let exchanges = 0;
  for (;;) {
    let k = search.find();
    if (!(richardson[k] < critical)) return exchanges;
    if (richardson[k] < 0) {
      exchanges++;
      mixUniformWater(state, search, k, scaled);
      continue;
    }
    let first = k;
    let last = k;
    do {
      if (++exchanges > most) {
        throw new OceanError(
          "NOT_CONVERGED",
          `Gradient mixing did not settle in ${most} exchanges; use a shorter timeStep or larger cells (cellSize).`,
          "method",
        );
      }
      exchange(state, k, (1 - richardson[k] / TARGET) / 2);
      const above = k > 0 ? k - 1 : 0;
      const below = k + 1 < interfaces ? k + 1 : k;
      renewRichardson(state, richardson, scaled, above, below + 1);
      if (above < first) first = above;
      if (below > last) last = below;
      // The neighbour that is left behind is from now on one of the rivals.
      const next = richardson[below] < richardson[above] ? below : above;
      const behind = next === below ? above : below;
      if (richardson[next] <= richardson[k]) {
        if (richardson[behind] < rival[0]) rival[0] = richardson[behind];
        k = next;
      }
    } while (richardson[k] >= 0 && richardson[k] < critical && richardson[k] < rival[0]);
    search.touch(first, last + 1);
  }
}

/** Exchanges a share of the difference between cells k and k + 1: what one loses the other gains. */
function exchange(state: ColumnState, k: number, share: number): void {
  const { T, S, u, v } = state;
  const dT = share * (T[k + 1] - T[k]);
  const dS = share * (S[k + 1] - S[k]);
  const du = share * (u[k + 1] - u[k]);
  const dv = share * (v[k + 1] - v[k]);
  T[k] += dT;
  T[k + 1] -= dT;
  S[k] += dS;
  S[k + 1] -= dS;
  u[k] += du;
  u[k + 1] -= du;
  v[k] += dv;
  v[k + 1] -= dv;
  renewDensity(state, k, k + 2);
}

/** Mixes the whole water around interface k that has one density. */
function mixUniformWater(state: ColumnState, search: LeastInterface, k: number, scaled: number): void {
  const { T, S, u, v, rho, cells } = state;
  let top = k;
  let bottom = k + 1;
  while (top > 0 && rho[top] - rho[top - 1] <= DENSITY_ROUNDING) top--;
  while (bottom + 1 < cells && rho[bottom + 1] - rho[bottom] <= DENSITY_ROUNDING) bottom++;
  let sumT = 0;
  let sumS = 0;
  let sumU = 0;
  let sumV = 0;
  for (let cell = top; cell <= bottom; cell++) {
    sumT += T[cell];
    sumS += S[cell];
    sumU += u[cell];
    sumV += v[cell];
  }
  const count = bottom - top + 1;
  T[top] = sumT / count;
  S[top] = sumS / count;
  u[top] = sumU / count;
  v[top] = sumV / count;
  renewDensity(state, top, top + 1);
  copyCell(state, top, top + 1, bottom + 1);
  const from = Math.max(0, top - 1);
  const to = Math.min(cells - 1, bottom + 1);
  renewRichardson(state, search.richardson, scaled, from, to);
  search.touch(from, to);
}

/**
 * Richardson numbers of the interfaces from…to - 1. Where nothing is stratified the number is 0 whatever the shear, so
 * these are told apart by it, as negative numbers: the greatest shear is mixed first.
 */
function renewRichardson(
  { u, v, rho }: ColumnState,
  richardson: Float64Array,
  scaled: number,
  from: number,
  to: number,
): void {
  for (let k = from; k < to; k++) {
    const du = u[k + 1] - u[k];
    const dv = v[k + 1] - v[k];
    const shear2 = du * du + dv * dv;
    const step = rho[k + 1] - rho[k];
    if (shear2 < NO_SHEAR) richardson[k] = Number.POSITIVE_INFINITY;
    else richardson[k] = step > DENSITY_ROUNDING ? (scaled * step) / shear2 : -shear2;
  }
}
