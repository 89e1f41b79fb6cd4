import type { Geometry, Position } from "geojson";
import type { ProblemList } from "../problem-list";
import { nameOf, type NamedShape, type RawShapes } from "./raw-shapes";

/** Geometries inside geometries, as a file made by hand or by an enemy may have them. */
const DEEPEST = 12;

/** Whether a text looks like GeoJSON. */
export function isGeoJson(text: string): boolean {
  const named = /"(?:FeatureCollection|Feature|GeometryCollection|(?:Multi)?(?:Point|LineString|Polygon))"/;
  return /^\s*\{/.test(text) && named.test(text);
}

/** What stands where RFC 7946 wants something else: the path to it. */
class Misfit extends Error {
  constructor(readonly path: string) {
    super(`${path} does not fit RFC 7946`);
  }
}

/**
 * Takes GeoJSON apart. A `crs` member of the older draft is refused where it names another than WGS 84.
 * @returns null where it is none; `problems` says why
 * @see RFC 7946
 */
export function geoJsonShapes(text: string, problems: ProblemList): RawShapes | null {
  const refuse = (what: string, toDo: string) => {
    problems.add("error", "badGeoJson", what, toDo);
    return null;
  };
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch (error) {
    const reason = error instanceof SyntaxError ? error.message : "it cannot be parsed";
    return refuse(`the text is not JSON: ${reason}`, "Export the shapes anew as GeoJSON.");
  }
  const crs = isObject(value) ? crsOf(value.crs) : null;
  if (crs !== null && !/CRS84|EPSG:{1,2}4326/.test(crs)) {
    return refuse(
      `its coordinates are in another system: ${crs.slice(0, 120)}`,
      "Export the shapes in longitude and latitude (WGS 84).",
    );
  }
  try {
    return {
      features: featuresOf(value),
      understood: [{ what: "Coordinates", taken: "longitude, latitude, WGS 84", confidence: "by the format" }],
      questions: [],
    };
  } catch (error) {
    if (!(error instanceof Misfit)) throw error;
    return refuse(`the JSON is no GeoJSON: ${error.message}`, "Export the shapes anew as GeoJSON.");
  }
}

/** The name of the system in a `crs` member of the older draft; null where there is none. */
function crsOf(crs: unknown): string | null {
  if (crs === null || crs === undefined) return null;
  const properties = isObject(crs) && isObject(crs.properties) ? crs.properties : {};
  return typeof properties.name === "string" ? properties.name : "one that is not named";
}

function featuresOf(value: unknown): NamedShape[] {
  if (!isObject(value)) throw new Misfit("the document");
  if (value.type === "FeatureCollection") {
    return listOf(value.features, "features").map((one, index) => featureOf(one, `features.${index}`));
  }
  if (value.type === "Feature") return [featureOf(value, "the document")];
  return [{ name: "", geometry: geometryOf(value, "the document", 0) }];
}

function featureOf(value: unknown, path: string): NamedShape {
  if (!isObject(value) || value.type !== "Feature") throw new Misfit(path);
  const { properties, geometry } = value;
  return {
    name: nameOf(isObject(properties) ? properties : null),
    geometry: geometry === null || geometry === undefined ? null : geometryOf(geometry, `${path}.geometry`, 0),
  };
}

function geometryOf(value: unknown, path: string, depth: number): Geometry {
  if (!isObject(value) || depth > DEEPEST) throw new Misfit(path);
  const at = `${path}.coordinates`;
  const { type, coordinates } = value;
  switch (type) {
    case "Point":
      return { type, coordinates: positionOf(coordinates) ?? misfit(at) };
    case "MultiPoint":
    case "LineString":
      return { type, coordinates: positionsOf(coordinates, at) };
    case "MultiLineString":
    case "Polygon":
      return { type, coordinates: ringsOf(coordinates, at) };
    case "MultiPolygon":
      return { type, coordinates: listOf(coordinates, at).map((rings, k) => ringsOf(rings, `${at}.${k}`)) };
    case "GeometryCollection": {
      const inner = listOf(value.geometries, `${path}.geometries`);
      return { type, geometries: inner.map((one, k) => geometryOf(one, `${path}.geometries.${k}`, depth + 1)) };
    }
    default:
      throw new Misfit(path);
  }
}

function ringsOf(value: unknown, path: string): Position[][] {
  return listOf(value, path).map((ring, k) => positionsOf(ring, `${path}.${k}`));
}

function positionsOf(value: unknown, path: string): Position[] {
  return listOf(value, path).map((one, k) => positionOf(one) ?? misfit(`${path}.${k}`));
}

function positionOf(value: unknown): Position | null {
  if (!Array.isArray(value) || value.length < 2) return null;
  const position: Position = [];
  for (const part of value) {
    if (typeof part !== "number" || !Number.isFinite(part)) return null;
    position.push(part);
  }
  return position;
}

function misfit(path: string): never {
  throw new Misfit(path);
}

function listOf(value: unknown, path: string): unknown[] {
  if (!Array.isArray(value)) throw new Misfit(path);
  return value;
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}
