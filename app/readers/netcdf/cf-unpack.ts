import { numberOf, textOf, type Attributes, type NetcdfVariable } from "./netcdf-file";

/** Values that the NetCDF library writes where nothing was; single bytes have none. Source: netcdf.h, NC_FILL_*. */
const LIBRARY_FILL: Readonly<Record<string, number>> = {
  integer2: -32_767,
  integer4: -2_147_483_647,
  real4: 9.969209968386869e36,
  real8: 9.969209968386869e36,
};

/**
 * Values of a variable as they are meant. CF 1.13, sections 2.5.1 and 8.1: missing values and the valid range are
 * compared with the packed value, before scale and offset; then value = packed × scale_factor + add_offset in double.
 * `_Unsigned` (NUG, "Best practices") turns what classic files can only store with a sign.
 * @param packed as stored; not changed
 * @returns NaN where missing
 */
export function unpack(packed: Float64Array, variable: NetcdfVariable): Float64Array {
  const { attributes } = variable;
  const scale = orElse(numberOf(attributes, "scale_factor"), 1);
  const offset = orElse(numberOf(attributes, "add_offset"), 0);
  const signed = signOf(variable);
  const missing = missingTest(variable, signed, scale, offset);
  return packed.map((stored) => {
    const value = signed(stored);
    return missing(value) ? NaN : value * scale + offset;
  });
}

function orElse(value: number, otherwise: number): number {
  return Number.isNaN(value) ? otherwise : value;
}

function signOf({ kind, bytes, attributes }: NetcdfVariable): (value: number) => number {
  const unsigned = kind === "integer" && textOf(attributes, "_Unsigned").toLowerCase() === "true";
  const span = 2 ** (8 * bytes);
  return (value) => (unsigned && value < 0 ? value + span : value);
}

function missingTest(
  variable: NetcdfVariable,
  signed: (value: number) => number,
  scale: number,
  offset: number,
): (value: number) => boolean {
  const { kind, bytes, attributes } = variable;
  const codes = ["_FillValue", "missing_value"].flatMap((name) => numbersOf(attributes, name).map(signed));
  const ownFill = LIBRARY_FILL[`${kind}${bytes}`];
  if (!attributes.has("_FillValue") && ownFill !== undefined) codes.push(ownFill);
  // A code written with more digits than the values are stored with means the stored one.
  const fill = new Set(bytes === 4 && kind === "real" ? codes.flatMap((code) => [code, Math.fround(code)]) : codes);
  const range = validRange(variable, signed);
  const packedRange = kind === "real" || range.integer || (scale === 1 && offset === 0);
  return (value) => {
    if (Number.isNaN(value) || fill.has(value)) return true;
    const compared = packedRange ? value : value * scale + offset;
    return compared < range.low || compared > range.high;
  };
}

function validRange({ attributes }: NetcdfVariable, signed: (value: number) => number) {
  const [low = NaN, high = NaN] = numbersOf(attributes, "valid_range");
  const bounds = [
    Number.isNaN(low) ? numberOf(attributes, "valid_min") : low,
    Number.isNaN(high) ? numberOf(attributes, "valid_max") : high,
  ].map(signed);
  const integer = ["valid_range", "valid_min", "valid_max"].every((name) => attributes.get(name)?.integer !== false);
  return { low: orElse(bounds[0] ?? NaN, -Infinity), high: orElse(bounds[1] ?? NaN, Infinity), integer };
}

function numbersOf(attributes: Attributes, name: string): readonly number[] {
  const numbers = attributes.get(name)?.numbers ?? [];
  if (numbers.length > 0) return numbers;
  const one = numberOf(attributes, name);
  return Number.isNaN(one) ? [] : [one];
}
