import { OceanError } from "../errors";
import { requirePositive } from "../guards";

/**
 * What stability is judged by: writes the density (kg/m³) of cells from…to - 1 from their salinity (g/kg) and
 * temperature (°C). Arrays, because numbers that are handed over one by one would be boxed in every exchange.
 */
export type ColumnDensity = (rho: Float64Array, SA: Float64Array, CT: Float64Array, from: number, to: number) => void;

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
  density(rho, S, T, from, to);
}

/** Gives cells from…to - 1 everything that cell `model` has. */
export function copyCell({ T, S, u, v, rho }: ColumnState, model: number, from: number, to: number): void {
  T.fill(T[model], from, to);
  S.fill(S[model], from, to);
  u.fill(u[model], from, to);
  v.fill(v[model], from, to);
  rho.fill(rho[model], from, to);
}
