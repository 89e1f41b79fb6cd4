import type { Cell } from "./cf-cells";
import { unpack } from "./cf-unpack";
import type { NetcdfFile, NetcdfVariable } from "./netcdf-file";

/** What is read of a variable besides its place: which dimension is time, and where along the others. */
export interface Sampling {
  time: string;
  /** Dimension of versions of one value (`expver`), of which the first that is there counts. */
  versions: string | null;
  /** Fixed index along other dimensions, as of levels. */
  fixed: ReadonlyMap<string, number>;
}

/** One value a stamp of a variable at one cell, as stored, for one version. */
export function storedAt(
  file: NetcdfFile,
  variable: NetcdfVariable,
  cell: Cell,
  sampling: Sampling,
  version = 0,
): Float64Array {
  const block = variable.dimensions.map((dimension, axis) => {
    if (dimension === sampling.time) return { start: 0, count: variable.shape[axis] ?? 0 };
    const index =
      dimension === sampling.versions ? version : (cell.indices.get(dimension) ?? sampling.fixed.get(dimension));
    return { start: index ?? 0, count: 1 };
  });
  return file.numbers(variable, block);
}

/** One value a stamp at one cell, unpacked; NaN where missing. */
export function valuesAt(file: NetcdfFile, variable: NetcdfVariable, cell: Cell, sampling: Sampling): Float64Array {
  const axis = sampling.versions === null ? -1 : variable.dimensions.indexOf(sampling.versions);
  const versions = axis < 0 ? 1 : (variable.shape[axis] ?? 1);
  const values = unpack(storedAt(file, variable, cell, sampling), variable);
  for (let version = 1; version < versions; version += 1) {
    const other = unpack(storedAt(file, variable, cell, sampling, version), variable);
    for (let index = 0; index < values.length; index += 1)
      if (Number.isNaN(values[index])) values[index] = other[index] ?? NaN;
  }
  return values;
}

/** The mean of several cells by their weights; missing where one of them is. */
export function weightedAt(
  file: NetcdfFile,
  variable: NetcdfVariable,
  cells: readonly Cell[],
  sampling: Sampling,
): Float64Array {
  const [first] = cells;
  if (cells.length === 1 && first !== undefined) return valuesAt(file, variable, first, sampling);
  const sums = cells.map((cell) => ({ weight: cell.weight, values: valuesAt(file, variable, cell, sampling) }));
  return Float64Array.from({ length: sums[0]?.values.length ?? 0 }, (_, index) =>
    sums.reduce((sum, { weight, values }) => sum + weight * (values[index] ?? NaN), 0),
  );
}
