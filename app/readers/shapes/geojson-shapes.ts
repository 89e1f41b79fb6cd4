import type { Feature, Geometry } from "geojson";
import { z } from "zod";
import type { ProblemList } from "../problem-list";
import { nameOf, type RawShapes } from "./raw-shapes";

const position = z.array(z.number()).min(2);
const ring = z.array(position);
const simple = z.discriminatedUnion("type", [
  z.object({ type: z.literal("Point"), coordinates: position }),
  z.object({ type: z.literal("MultiPoint"), coordinates: z.array(position) }),
  z.object({ type: z.literal("LineString"), coordinates: z.array(position) }),
  z.object({ type: z.literal("MultiLineString"), coordinates: z.array(ring) }),
  z.object({ type: z.literal("Polygon"), coordinates: z.array(ring) }),
  z.object({ type: z.literal("MultiPolygon"), coordinates: z.array(z.array(ring)) }),
]);
const geometry = z.union([simple, z.object({ type: z.literal("GeometryCollection"), geometries: z.array(simple) })]);
const feature = z.object({
  type: z.literal("Feature"),
  properties: z.record(z.string(), z.unknown()).nullish(),
  geometry: geometry.nullable(),
});
const document = z.union([
  z.object({ type: z.literal("FeatureCollection"), features: z.array(feature), crs: z.unknown().optional() }),
  feature.extend({ crs: z.unknown().optional() }),
  geometry,
]);

const DEEPEST = 12;

/** Whether a text looks like GeoJSON. */
export function isGeoJson(text: string): boolean {
  const types =
    /"type"\s*:\s*"(?:FeatureCollection|Feature|GeometryCollection|(?:Multi)?(?:Polygon|LineString|Point))"/;
  return /^\s*\{/.test(text) && types.test(text);
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
  if (depthOf(value) > DEEPEST) return refuse("the JSON is nested too deeply for GeoJSON", "Export the shapes anew.");
  const read = document.safeParse(value);
  if (!read.success) {
    const issue = read.error.issues[0];
    return refuse(
      `the JSON is no GeoJSON: ${issue.path.join(".") || "the document"} does not fit RFC 7946`,
      "Export the shapes anew as GeoJSON.",
    );
  }
  const crs = "crs" in read.data ? JSON.stringify(read.data.crs ?? null) : "null";
  if (crs !== "null" && !/CRS84|EPSG:{1,2}4326/.test(crs)) {
    return refuse(
      `its coordinates are in another system: ${crs.slice(0, 120)}`,
      "Export the shapes in longitude and latitude (WGS 84).",
    );
  }
  const features: Feature[] =
    read.data.type === "FeatureCollection"
      ? (read.data.features as Feature[])
      : read.data.type === "Feature"
        ? [read.data as Feature]
        : [{ type: "Feature", properties: {}, geometry: read.data as Geometry }];
  return {
    features: features.map((one) => ({ name: nameOf(one.properties), geometry: one.geometry })),
    understood: [{ what: "Coordinates", taken: "longitude, latitude, WGS 84", confidence: "by the format" }],
    questions: [],
  };
}

function depthOf(value: unknown): number {
  let depth = 0;
  let level: unknown[] = [value];
  while (level.length > 0 && depth <= DEEPEST + 1) {
    depth += 1;
    level = level.flatMap((item) => (typeof item === "object" && item !== null ? Object.values(item) : []));
  }
  return depth;
}
