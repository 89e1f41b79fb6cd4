import type { ValueRole } from "../propose-columns";
import { medianOf } from "../scan-column";
import { numberOf, sizeOf, textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";
import { unpack } from "./cf-unpack";

const HEIGHT_ATTRIBUTES = [
  "sensor_height",
  "instrument_height",
  "height_above_sea_level",
  "height",
  "anemometer_height",
];
const HEIGHT_WORDS = /(?:^|[^\d.])(\d{1,3}(?:\.\d+)?)[ _-]?(?:m|met(?:er|re)s?)(?![a-z/²³-])/i;
const LENGTH = /^m(?:et(?:er|re)s?)?$/i;
/** Variables of one number per record: a height that is told anew each time. */
const MOST_HEIGHTS = 100_000;

/**
 * Height above the sea at which a variable was measured, m: from its own attributes, its scalar coordinate, a variable
 * that tells the height of its instrument, or its words.
 * @returns null where the file does not say
 */
export function heightOf(file: NetcdfFile, variable: NetcdfVariable, role: ValueRole): number | null {
  const attribute = HEIGHT_ATTRIBUTES.map((name) => numberOf(variable.attributes, name)).find((value) => value > 0);
  if (attribute !== undefined) return attribute;
  const coordinates = textOf(variable.attributes, "coordinates").split(" ");
  const coordinate = file.variables.find(
    ({ name, attributes, shape }) =>
      (coordinates.includes(name) || variable.dimensions.includes(name)) &&
      textOf(attributes, "standard_name") === "height" &&
      sizeOf(shape) === 1,
  );
  if (coordinate !== undefined) return rounded(medianOf(unpack(file.numbers(coordinate), coordinate)));
  const words = HEIGHT_WORDS.exec(textOf(variable.attributes, "long_name")) ?? HEIGHT_WORDS.exec(variable.name);
  if (words?.[1] !== undefined) return Number(words[1]);
  if (!role.startsWith("wind")) return null;
  const told = file.variables.find((candidate) => tellsWindHeight(candidate, variable));
  return told === undefined ? null : rounded(medianOf(unpack(file.numbers(told), told)));
}

function tellsWindHeight({ name, kind, shape, dimensions, attributes }: NetcdfVariable, wind: NetcdfVariable): boolean {
  const words = `${name.replaceAll("_", " ")} ${textOf(attributes, "long_name")}`;
  return (
    (kind === "integer" || kind === "real") &&
    sizeOf(shape) <= MOST_HEIGHTS &&
    dimensions.every((dimension) => wind.dimensions.includes(dimension)) &&
    /wind|anemom/i.test(words) &&
    /height/i.test(words) &&
    LENGTH.test(textOf(attributes, "units"))
  );
}

/** To the centimetre: single precision turns 3.56 m into 3.5599999. */
function rounded(height: number): number | null {
  return height > 0 ? Number(height.toFixed(2)) : null;
}
