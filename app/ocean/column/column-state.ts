import { OceanError } from "../errors";
import { requirePositive } from "../guards";

/** Density from salinity (g/kg) and temperature (°C), kg/m³: what stability is judged by. */
export type ColumnDensity = (SA: number, CT: number) => number;

/** n equal cells from the surface down to the bed; cell k has its centre at (k + ½) cellSize. */
export interface ColumnState {
  readonly cells: number;
  /** m */
  readonly cellSize: number;
  /** Conservative Temperature, °C. */
  readonly T: Float64Array;
  /** Absolute Salinity, g/kg. */
  readonly S: Float64Array;
  /** m/s, east and north */
  readonly u: Float64Array;
  readonly v: Float64Array;
  /** kg/m³; kept in step with T and S */
  readonly rho: Float64Array;
  readonly density: ColumnDensity;
}

/**
 * A column at rest.
 * @param T, S one value a cell @param cellSize m
 * @throws OceanError INVALID_INPUT for fewer than two cells, unequal lengths or values that are no numbers
 */
export function columnAtRest(
  T: ArrayLike<number>,
  S: ArrayLike<number>,
  cellSize: number,
  density: ColumnDensity,
): ColumnState {
  requirePositive({ cellSize });
  const cells = T.length;
  if (cells < 2 || S.length !== cells) {
    throw new OceanError(
      "INVALID_INPUT",
      `A column needs at least two cells with temperature and salinity each; got ${cells} and ${S.length}.`,
    );
  }
  const state: ColumnState = {
    cells,
    cellSize,
    T: Float64Array.from(T),
    S: Float64Array.from(S),
    u: new Float64Array(cells),
    v: new Float64Array(cells),
    rho: new Float64Array(cells),
    density,
  };
  renewDensity(state, 0, cells);
  for (let k = 0; k < cells; k++) {
    if (!Number.isFinite(state.rho[k])) {
      throw new OceanError("INVALID_INPUT", `Cell ${k} has no density: temperature ${T[k]} °C, salinity ${S[k]} g/kg.`);
    }
  }
  return state;
}

/** Brings density up to date in cells from…to - 1. */
export function renewDensity({ T, S, rho, density }: ColumnState, from: number, to: number): void {
  for (let k = from; k < to; k++) rho[k] = density(S[k], T[k]);
}

/** Mixes cells from…to - 1 to one value of everything; heat, salt and momentum are kept. */
export function homogenise(state: ColumnState, from: number, to: number): void {
  const { T, S, u, v, rho } = state;
  const count = to - from;
  let [sumT, sumS, sumU, sumV] = [0, 0, 0, 0];
  for (let k = from; k < to; k++) {
    sumT += T[k];
    sumS += S[k];
    sumU += u[k];
    sumV += v[k];
  }
  const [meanT, meanS, meanU, meanV] = [sumT / count, sumS / count, sumU / count, sumV / count];
  const meanRho = state.density(meanS, meanT);
  for (let k = from; k < to; k++) {
    T[k] = meanT;
    S[k] = meanS;
    u[k] = meanU;
    v[k] = meanV;
    rho[k] = meanRho;
  }
}
