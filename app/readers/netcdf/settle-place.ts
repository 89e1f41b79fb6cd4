import type { ProblemList } from "../problem-list";
import type { ReadingAnswers, ReadingQuestion, Understood } from "../reading";
import type { Cell } from "./cf-cells";
import type { LeveledColumn } from "./cf-levels";
import { choosePlace, type PlaceChoice, type SeaTest } from "./cf-place";
import { storedAt, valuesAt, weightedAt, type Sampling } from "./cf-sample";
import { spaceOf, type Space } from "./cf-space";
import { unpack } from "./cf-unpack";
import { textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";

export interface SettledPlace {
  /** False while a person has to say which of several places; values are then those of the first, and not to be shown. */
  isSettled: boolean;
  understood: Understood[];
  questions: ReadingQuestion[];
  /** One value a record; or why a column has none, for its note. */
  valuesOf: (column: LeveledColumn) => Float64Array | { unread: string };
  /** What is stored beside a column's values, as its flags are; null where they are of several cells, or elsewhere. */
  storedBeside: (column: LeveledColumn, beside: NetcdfVariable) => Float64Array | null;
}

const FIRST: Cell = { indices: new Map(), weight: 1, position: { latitude: NaN, longitude: NaN } };

/** Settles the place of every column. Variables may lie on different grids, as staggered winds do: each has its own cell. */
export function settlePlace(
  file: NetcdfFile,
  time: string,
  columns: readonly LeveledColumn[],
  answers: ReadingAnswers,
  problems: ProblemList,
): SettledPlace {
  const spaces = new Map<string, Space>();
  const choices = new Map<string, PlaceChoice>();
  const spaceFor = (column: LeveledColumn): Space => {
    const found = spaces.get(keyOf(column)) ?? spaceOf(file, column.variable, time, passedBy(column));
    spaces.set(keyOf(column), found);
    return found;
  };
  const choiceFor = (column: LeveledColumn): PlaceChoice => {
    const key = keyOf(column);
    const space = spaceFor(column);
    const beside = columns.filter((other) => other.role !== "leftOut" && keyOf(other) === key);
    const choice =
      choices.get(key) ??
      choosePlace(
        space,
        answers,
        seaTest(file, space, beside, (each) => samplingOf(each, time)),
        problems,
      );
    choices.set(key, choice);
    return choice;
  };
  const used = columns.filter((column) => column.role !== "leftOut" && spaceFor(column).kind !== "unread");
  const primary = used.find(({ role }) => role === "windSpeed" || role === "windU") ?? used[0];
  const first = primary === undefined ? null : choiceFor(primary);
  const isSettled = first === null || first.cells !== null;
  const cellsFor = (column: LeveledColumn): Cell[] | null => {
    if (spaceFor(column).kind === "unread") return null;
    return isSettled ? choiceFor(column).cells : [FIRST];
  };
  return {
    isSettled,
    understood: first?.understood ?? [],
    questions: first?.questions ?? [],
    valuesOf: (column) => {
      const cells = cellsFor(column);
      const space = spaceFor(column);
      if (space.kind === "unread")
        return { unread: `“${space.dimension}”, one of its dimensions, is neither time nor place` };
      if (cells === null) return { unread: "its grid does not reach the place" };
      return weightedAt(file, column.variable, cells, samplingOf(column, time));
    },
    storedBeside: (column, beside) => {
      const cells = cellsFor(column);
      const [only] = cells ?? [];
      const along = beside.dimensions.join() === column.variable.dimensions.join();
      return only === undefined || cells?.length !== 1 || !along
        ? null
        : storedAt(file, beside, only, samplingOf(column, time));
    },
  };
}

/** Columns with the same key lie on the same grid or list of places. */
function keyOf({ variable, fixed }: LeveledColumn): string {
  return [variable.dimensions.join(), textOf(variable.attributes, "coordinates"), [...fixed.keys()].join()].join("|");
}

function versionsOf(variable: NetcdfVariable): string | null {
  return variable.dimensions.find((dimension) => /^expver$/i.test(dimension)) ?? null;
}

function passedBy({ variable, fixed }: LeveledColumn): Set<string> {
  const versions = versionsOf(variable);
  return new Set([...fixed.keys(), ...(versions === null ? [] : [versions])]);
}

function samplingOf({ variable, fixed }: LeveledColumn, time: string): Sampling {
  return { time, versions: versionsOf(variable), fixed };
}

const MASKS: Readonly<Record<string, (value: number) => boolean>> = {
  land_binary_mask: (value) => value < 0.5,
  land_area_fraction: (value) => value < 0.5,
  sea_area_fraction: (value) => value >= 0.5,
  sea_binary_mask: (value) => value >= 0.5,
};

/** What tells sea from land: a mask in the file, else where the sea's temperature has values, else where any has. */
function seaTest(
  file: NetcdfFile,
  space: Space,
  columns: readonly LeveledColumn[],
  sampling: (column: LeveledColumn) => Sampling,
): SeaTest {
  if (space.kind !== "grid" && space.kind !== "curved") return { by: "", isSea: () => true };
  for (const variable of file.variables) {
    const standardName = textOf(variable.attributes, "standard_name");
    const mask = /^lsm$/i.test(variable.name) ? MASKS.land_binary_mask : MASKS[standardName];
    const along = variable.dimensions.includes(space.rows) && variable.dimensions.includes(space.columns);
    if (mask === undefined || !along) continue;
    const isSea = (cell: Cell): boolean => {
      const block = variable.dimensions.map((dimension) => ({ start: cell.indices.get(dimension) ?? 0, count: 1 }));
      return mask(unpack(file.numbers(variable, block), variable)[0] ?? NaN);
    };
    return { by: `the land mask “${variable.name}”`, isSea };
  }
  const column = columns.find(({ role }) => role === "seaTemperature") ?? columns[0];
  if (column === undefined) return { by: "", isSea: () => true };
  return {
    by: `where “${column.name}” has values`,
    isSea: (cell) => valuesAt(file, column.variable, cell, sampling(column)).some((value) => !Number.isNaN(value)),
  };
}
