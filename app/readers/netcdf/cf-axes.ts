import type { ReadingAnswers, ReadingQuestion, Understood } from "../reading";
import type { Bounds } from "./cf-amounts";
import { isTimeVariable, stampsOf, timeUnitsOf, type TimeUnits } from "./cf-time";
import { textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";

/** A time coordinate and the variables along it. */
export interface TimeAxis {
  variable: NetcdfVariable;
  dimension: string;
  units: TimeUnits;
}

export interface AxesFound {
  axes: TimeAxis[];
  /** Why a time variable cannot be used, as a phrase after its name. */
  refused: { name: string; why: string }[];
}

/** Finds the coordinates of time: those of a dimension of their own, `time` before what else counts since a date. */
export function timeAxesOf(file: NetcdfFile): AxesFound {
  const found: AxesFound = { axes: [], refused: [] };
  for (const variable of file.variables) {
    const { name, dimensions } = variable;
    if (!isTimeVariable(variable) || isBoundsName(file, name)) continue;
    const [dimension] = dimensions;
    if (dimension === undefined) continue;
    if (dimensions.length > 1) {
      found.refused.push({ name, why: "has two dimensions, as of several forecasts (give a file of one)" });
      continue;
    }
    const units = timeUnitsOf(variable);
    if ("refused" in units) found.refused.push({ name, why: units.refused });
    else found.axes.push({ variable, dimension, units });
  }
  const order = ({ variable }: TimeAxis): number =>
    textOf(variable.attributes, "standard_name") === "time" ? 0 : variable.name === variable.dimensions[0] ? 1 : 2;
  found.axes.sort((a, b) => order(a) - order(b));
  // Of several along one dimension (the valid time and the time of the forecast), one.
  found.axes = found.axes.filter((axis, index) =>
    found.axes.slice(0, index).every(({ dimension }) => dimension !== axis.dimension),
  );
  return found;
}

function isBoundsName(file: NetcdfFile, name: string): boolean {
  return file.variables.some(({ attributes }) => textOf(attributes, "bounds") === name);
}

/** Stamps of an axis, seconds since 1970, NaN where missing. */
export function stampsOfAxis(file: NetcdfFile, { variable, units }: TimeAxis): Float64Array {
  return stampsOf(file.numbers(variable), variable, units);
}

/** The intervals that an axis states by its bounds, or null. */
export function boundsOfAxis(file: NetcdfFile, { variable, units }: TimeAxis): Bounds | null {
  const name = textOf(variable.attributes, "bounds");
  const bounds = file.variables.find((candidate) => candidate.name === name);
  if (bounds === undefined || bounds.shape.length !== 2 || bounds.shape[1] !== 2) return null;
  // Bounds are in the unit of their coordinate, whatever they say themselves (CF 1.13, section 7.1).
  const stamps = stampsOf(file.numbers(bounds), bounds, units);
  const side = (offset: number) =>
    Float64Array.from({ length: stamps.length / 2 }, (_, i) => stamps[2 * i + offset] ?? NaN);
  return { start: side(0), end: side(1) };
}

/** Of several axes the one asked for, else the one that carries most; which one is a question that may be left. */
export function chooseAxis(
  axes: readonly TimeAxis[],
  weight: (axis: TimeAxis) => number,
  answers: ReadingAnswers,
): { axis: TimeAxis | undefined; understood: Understood[]; questions: ReadingQuestion[] } {
  const weighed = axes.map((axis) => ({ axis, weight: weight(axis) })).filter((each) => each.weight > 0);
  const heaviest = [...weighed].sort((a, b) => b.weight - a.weight)[0]?.axis ?? axes[0];
  const asked = axes.find(({ variable }) => variable.name === answers.timeAxis);
  const axis = asked ?? heaviest;
  if (axis === undefined || weighed.length < 2) return { axis, understood: [], questions: [] };
  const label = ({ variable }: TimeAxis) => `“${variable.name}”, ${variable.shape[0] ?? 0} stamps`;
  return {
    axis,
    understood: [
      { what: "Time axis", taken: `${label(axis)}, of ${weighed.length}`, confidence: asked ? "answered" : "assumed" },
    ],
    questions: [
      {
        key: "timeAxis",
        needed: false,
        message: "The file has several axes of time; one is read at a time. Bring the file again for another.",
        options: weighed.map((each) => ({ value: each.axis.variable.name, label: label(each.axis) })),
        ...(heaviest === undefined ? {} : { suggestion: heaviest.variable.name }),
        ...(asked === undefined ? {} : { answer: asked.variable.name }),
      },
    ],
  };
}
