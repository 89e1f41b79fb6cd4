import { unpack } from "./cf-unpack";
import { sizeOf, textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";

/** A place of the file with a name or a position or both. */
export interface FilePlace {
  name: string;
  /** Degrees north and east; NaN where the file does not say. */
  latitude: number;
  longitude: number;
  index: number;
}

/** Where the values of a variable are from. */
export type Space =
  | { kind: "unknown" }
  | { kind: "fixed"; latitude: number; longitude: number }
  | { kind: "moving"; latitudes: Float64Array; longitudes: Float64Array }
  | { kind: "places"; dimension: string; places: FilePlace[] }
  | { kind: "grid"; rows: string; columns: string; latitudes: Float64Array; longitudes: Float64Array }
  | { kind: "curved"; rows: string; columns: string; width: number; latitudes: Float64Array; longitudes: Float64Array }
  /** Dimensions that no coordinate explains. */
  | { kind: "unread"; dimension: string };

/**
 * Finds the horizontal coordinates of a variable: scalar, along time, along a list of stations, or of a grid. CF 1.13,
 * chapters 4, 5 and 9.
 * @param passed dimensions that are dealt with elsewhere: time, levels, versions
 */
export function spaceOf(file: NetcdfFile, variable: NetcdfVariable, time: string, passed: ReadonlySet<string>): Space {
  const open = variable.dimensions.filter(
    (dimension, axis) => dimension !== time && !passed.has(dimension) && variable.shape[axis] !== 1,
  );
  const latitude = coordinateOf(file, variable, "latitude");
  const longitude = coordinateOf(file, variable, "longitude");
  if (latitude === undefined || longitude === undefined) return withoutPosition(file, open);
  const latitudes = unpack(file.numbers(latitude), latitude);
  const longitudes = unpack(file.numbers(longitude), longitude);
  if (open.length === 0) {
    if (latitudes.length === 1 && longitudes.length === 1)
      return { kind: "fixed", latitude: latitudes[0] ?? NaN, longitude: longitudes[0] ?? NaN };
    if (latitude.dimensions[0] === time && longitude.dimensions[0] === time)
      return { kind: "moving", latitudes, longitudes };
    return { kind: "unknown" };
  }
  const [rows, columns] = open;
  if (rows === undefined || open.length > 2) return { kind: "unread", dimension: open[2] ?? "" };
  const along = (coordinate: NetcdfVariable, dimension: string) =>
    coordinate.dimensions.length === 1 && coordinate.dimensions[0] === dimension;
  if (columns === undefined) {
    if (along(latitude, rows) && along(longitude, rows))
      return { kind: "places", dimension: rows, places: placesOf(file, rows, latitudes, longitudes) };
    // A grid of one row or one column.
    const single = along(latitude, rows) ? longitude : latitude;
    if (sizeOf(single.shape) !== 1) return { kind: "unread", dimension: rows };
    const other = single.dimensions[0] ?? "";
    const ordered = along(latitude, rows) ? [rows, other] : [other, rows];
    return { kind: "grid", rows: ordered[0] ?? "", columns: ordered[1] ?? "", latitudes, longitudes };
  }
  if (latitude.dimensions.length === 2 && longitude.dimensions.length === 2) {
    const [first = "", second = ""] = latitude.dimensions;
    return { kind: "curved", rows: first, columns: second, width: latitude.shape[1] ?? 0, latitudes, longitudes };
  }
  const [north = "", east = ""] = [latitude.dimensions[0], longitude.dimensions[0]];
  if (!open.includes(north) || !open.includes(east) || north === east) return { kind: "unread", dimension: rows };
  return { kind: "grid", rows: north, columns: east, latitudes, longitudes };
}

function withoutPosition(file: NetcdfFile, open: readonly string[]): Space {
  const [dimension] = open;
  if (dimension === undefined) return { kind: "unknown" };
  const names = open.length === 1 ? namesAlong(file, dimension) : null;
  if (names === null) return { kind: "unread", dimension };
  const places = names.map((name, index) => ({ name, latitude: NaN, longitude: NaN, index }));
  return { kind: "places", dimension, places };
}

function placesOf(file: NetcdfFile, dimension: string, latitudes: Float64Array, longitudes: Float64Array): FilePlace[] {
  const names = namesAlong(file, dimension) ?? [];
  return Array.from(latitudes, (latitude, index) => ({
    name: names[index] ?? "",
    latitude,
    longitude: longitudes[index] ?? NaN,
    index,
  }));
}

/** Names of stations: the variable with a role for that, else one with the dimension's own name, else any of text. */
function namesAlong(file: NetcdfFile, dimension: string): string[] | null {
  const texts = file.variables.filter(({ kind, dimensions }) => kind === "text" && dimensions[0] === dimension);
  const found =
    texts.find(({ attributes }) => attributes.has("cf_role")) ??
    texts.find(({ name }) => name === dimension) ??
    texts.find(({ name }) => /name|station|site|id/i.test(name)) ??
    texts[0];
  return found === undefined ? null : file.texts(found);
}

const NAMES = { latitude: /^(?:nav_)?lat(?:itude)?$/i, longitude: /^(?:nav_)?lon(?:gitude)?$/i };
const UNITS = { latitude: /^degrees?_?n(?:orth)?$/i, longitude: /^degrees?_?e(?:ast)?$/i };

/** The latitude or longitude of a variable: named in its `coordinates`, a coordinate of its dimensions, or the file's only one. */
function coordinateOf(
  file: NetcdfFile,
  variable: NetcdfVariable,
  which: "latitude" | "longitude",
): NetcdfVariable | undefined {
  const listed = new Set(textOf(variable.attributes, "coordinates").split(" "));
  const found = file.variables.filter(({ name, kind, attributes, dimensions }) => {
    const says = textOf(attributes, "standard_name") === which || UNITS[which].test(textOf(attributes, "units"));
    const fits = dimensions.every((dimension) => variable.dimensions.includes(dimension));
    const bounds = /_b(?:ou)?nds?$/i.test(name);
    return (kind === "integer" || kind === "real") && !bounds && fits && (says || NAMES[which].test(name));
  });
  return (
    found.find(({ name }) => listed.has(name)) ??
    found.find(({ name }) => variable.dimensions.includes(name)) ??
    found.find(({ attributes }) => textOf(attributes, "standard_name") === which) ??
    found[0]
  );
}
