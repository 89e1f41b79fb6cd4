import type { Geometry, Position as JsonPosition } from "geojson";
import { ringSense } from "~/ocean/box/ring";
import type { Position } from "~/ocean/scenario";
import type { ProblemList } from "../problem-list";
import type { RawShapes } from "./raw-shapes";
import type { ShapePolygon, ShapeReading } from "./shape-reading";

type Rings = JsonPosition[][];

/** The polygons of all features, told apart where one feature has several; lines and points are counted and left. */
export function collectPolygons(
  { features }: RawShapes,
  problems: ProblemList,
): Pick<ShapeReading, "polygons" | "summary"> {
  const polygons: ShapePolygon[] = [];
  const others = new Map<string, number>();
  let [vertices, raised] = [0, false];
  const bbox: [number, number, number, number] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const { name, geometry } of features) {
    const own = geometry ? polygonsIn(geometry, others) : [];
    own.forEach((rings, part) => {
      for (const [x, y, z] of rings.flat()) {
        vertices += 1;
        raised ||= z !== undefined;
        bbox[0] = Math.min(bbox[0], x);
        bbox[1] = Math.min(bbox[1], y);
        bbox[2] = Math.max(bbox[2], x);
        bbox[3] = Math.max(bbox[3], y);
      }
      const [outer, ...holes] = rings.map(openRing);
      if (!outer || outer.length < 3) return;
      const label = name === "" ? `Shape ${polygons.length + 1}` : name;
      polygons.push({
        name: own.length > 1 ? `${label}, part ${part + 1}` : label,
        outer: turned(outer, 1),
        holes: holes.filter(({ length }) => length >= 3).map((hole) => turned(hole, -1)),
      });
    });
  }
  if (raised) problems.add("note", "heights", "corners have heights", "They were left out.");
  const left = [...others].map(([type, count]) => `${count} ${type}`).join(", ");
  if (others.size > 0 && polygons.length > 0) {
    problems.add("note", "otherShapes", `the file also has ${left}`, "A study box is a polygon: they were left out.");
  }
  if (polygons.length === 0) {
    problems.add(
      "error",
      "noPolygon",
      left === "" ? "the file has no shapes" : `the file has no polygon: it holds ${left}`,
      "Give closed areas: a study box is a polygon.",
    );
  }
  const beyond = bbox[0] < -360 || bbox[2] > 360 || bbox[1] < -90 || bbox[3] > 90;
  if (polygons.length > 0 && beyond) {
    problems.add(
      "error",
      "notDegrees",
      `corners lie outside the Earth's longitudes and latitudes (${bbox.map((value) => value.toFixed(1)).join(", ")})`,
      "They may be metres of a projection: give the file with its projection, or in longitude and latitude.",
    );
  }
  return {
    polygons,
    summary: {
      polygons: polygons.length,
      holes: polygons.reduce((sum, { holes }) => sum + holes.length, 0),
      vertices,
      bbox: polygons.length === 0 ? null : bbox,
    },
  };
}

function polygonsIn(geometry: Geometry, others: Map<string, number>): Rings[] {
  switch (geometry.type) {
    case "Polygon":
      return [geometry.coordinates];
    case "MultiPolygon":
      return geometry.coordinates;
    case "GeometryCollection":
      return geometry.geometries.flatMap((inner) => polygonsIn(inner, others));
    default: {
      const word = /Point/.test(geometry.type) ? "points" : "lines";
      others.set(word, (others.get(word) ?? 0) + 1);
      return [];
    }
  }
}

function openRing(ring: JsonPosition[]): Position[] {
  const corners = ring.map(([x, y]): Position => [x, y]);
  const [first, last] = [corners[0], corners.at(-1)];
  if (first && last && corners.length > 1 && first[0] === last[0] && first[1] === last[1]) corners.pop();
  return corners;
}

/** The ring with this sense: 1 anticlockwise, -1 clockwise. */
function turned(ring: Position[], sense: 1 | -1): Position[] {
  return ringSense(ring) === -sense ? [...ring].reverse() : ring;
}
