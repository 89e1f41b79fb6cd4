/**
 * A NetCDF file as the rules of CF see it, whichever form it is stored in: variables with named dimensions and
 * attributes, and blocks of values as stored (packed). One small interface over both parsers, so that CF is written once.
 */
export interface NetcdfFile {
  /** As `NetCDF classic`, for the reading sheet. */
  label: string;
  variables: readonly NetcdfVariable[];
  attributes: Attributes;
  /**
   * A block of a numeric variable, as stored, row by row (last dimension fastest).
   * @param block one range a dimension; without it the whole variable
   * @throws DamagedNetcdf where the values do not lie within the file, or are too many
   */
  numbers: (variable: NetcdfVariable, block?: readonly Range[]) => Float64Array;
  /** The texts of a variable of text: characters of the last dimension are joined. */
  texts: (variable: NetcdfVariable) => string[];
  /** Gives back what the file holds; nothing can be read from it afterwards. */
  close: () => void;
}

export interface NetcdfVariable {
  name: string;
  kind: "integer" | "real" | "text" | "other";
  /** Bytes of one value as stored; 0 for text and other kinds. */
  bytes: number;
  dimensions: readonly string[];
  /** Length of each dimension. */
  shape: readonly number[];
  attributes: Attributes;
}

/** A Map, since names come from the file. */
export type Attributes = ReadonlyMap<string, Attribute>;

/** An attribute's value: text, or one or more numbers. The one that it is not is empty. */
export interface Attribute {
  text: string;
  numbers: readonly number[];
  /** Whether the numbers are stored as integers. */
  integer: boolean;
}

export interface Range {
  start: number;
  count: number;
}

/** Most values that are read in one block: 38 years of 10-minute records of 25 variables. Beyond, memory gives out. */
export const MAX_BLOCK_VALUES = 50_000_000;

/** A file whose parts do not fit together, or that is of a kind that is not read. */
export class DamagedNetcdf extends Error {
  override name = "DamagedNetcdf";
  /**
   * @param what a phrase after the file's name: `is cut short`
   * @param toDo a sentence
   */
  constructor(
    readonly what: string,
    readonly toDo = "Download or export it again.",
  ) {
    super(`The NetCDF file ${what}.`);
  }
}

/** The text of an attribute, tidied; empty where there is none. */
export function textOf(attributes: Attributes, name: string): string {
  return attributes.get(name)?.text.replace(/\s+/g, " ").trim() ?? "";
}

/** The first number of an attribute; NaN where there is none. Numbers written as text count too. */
export function numberOf(attributes: Attributes, name: string): number {
  const attribute = attributes.get(name);
  if (attribute === undefined) return NaN;
  const text = attribute.text.trim();
  return attribute.numbers[0] ?? (text === "" ? NaN : Number(text));
}

/** How many values a shape holds. */
export function sizeOf(shape: readonly number[]): number {
  return shape.reduce((size, length) => size * length, 1);
}

/** The whole of a variable as a block. */
export function wholeOf(variable: NetcdfVariable): Range[] {
  return variable.shape.map((count) => ({ start: 0, count }));
}

/** @throws DamagedNetcdf where a block lies outside its variable or holds too many values */
export function checkBlock(variable: NetcdfVariable, block: readonly Range[]): void {
  const fits =
    block.length === variable.shape.length &&
    block.every(({ start, count }, axis) => start >= 0 && count >= 0 && start + count <= (variable.shape[axis] ?? 0));
  if (!fits) throw new DamagedNetcdf(`has no such part of its variable “${variable.name}”`);
  if (sizeOf(block.map(({ count }) => count)) > MAX_BLOCK_VALUES) {
    throw new DamagedNetcdf(
      `holds more than ${MAX_BLOCK_VALUES} values in its variable “${variable.name}”`,
      "Cut it to the days around the storm.",
    );
  }
}
