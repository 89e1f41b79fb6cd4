import type { CfColumn } from "./cf-columns";
import { unpack } from "./cf-unpack";
import { textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";

/** Levels that are shown as columns; more are a profile, not a record of one place. */
const MOST_LEVELS = 20;

/** A column at one level of its variable, or of a variable without levels. */
export interface LeveledColumn extends CfColumn {
  name: string;
  fixed: ReadonlyMap<string, number>;
}

/** Takes a variable of several heights apart into one column a height; other levels (pressure, depth) are not told apart. */
export function atEachLevel(file: NetcdfFile, column: CfColumn): LeveledColumn[] {
  const { variable } = column;
  const whole = { ...column, name: variable.name, fixed: new Map<string, number>() };
  const dimension = variable.dimensions.find((name, axis) => variable.shape[axis] !== 1 && isLevel(file, name));
  const axis = file.variables.find(({ name }) => name === dimension);
  if (dimension === undefined || axis === undefined) return [whole];
  const heights = unpack(file.numbers(axis), axis);
  const inMetres = /^m(?:et(?:er|re)s?)?$/i.test(textOf(axis.attributes, "units"));
  const up = textOf(axis.attributes, "positive") === "up" || textOf(axis.attributes, "standard_name") === "height";
  if (!inMetres || !up || heights.length > MOST_LEVELS) {
    return [{ ...whole, role: "leftOut", unit: null, note: `it has ${heights.length} levels along “${dimension}”` }];
  }
  return Array.from(heights, (height, index) => ({
    ...column,
    name: `${variable.name} at ${Number(height.toFixed(2))} m`,
    height: Number(height.toFixed(2)),
    fixed: new Map([[dimension, index]]),
  }));
}

/** Whether a dimension is one of height, depth or pressure. */
function isLevel(file: NetcdfFile, dimension: string): boolean {
  const axis: NetcdfVariable | undefined = file.variables.find(({ name }) => name === dimension);
  if (axis === undefined || axis.kind === "text") return false;
  const { attributes } = axis;
  return (
    textOf(attributes, "axis") === "Z" ||
    attributes.has("positive") ||
    /^(?:height|depth|altitude|air_pressure)$/.test(textOf(attributes, "standard_name")) ||
    /^(?:height|depth|level|lev|plev|pressure_level)$/i.test(dimension)
  );
}
