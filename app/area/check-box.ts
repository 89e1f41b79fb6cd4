import { booleanPointOnLine, kinks, lineString, multiLineString } from "@turf/turf";
import type { Position } from "~/ocean/scenario";
import { measureBox } from "./measure-box";
import { normaliseRing } from "./normalise-ring";
import { openRing, ringExtent, unwrapRing } from "./ring";

export type BoxProblemCode =
  | "notARing"
  | "fewCorners"
  | "manyCorners"
  | "notANumber"
  | "latitudeRange"
  | "longitudeRange"
  | "pole"
  | "tooWide"
  | "tooTall"
  | "crossing"
  | "noArea"
  | "equator";

export interface BoxProblem {
  /** Where: `polygon`, or `polygon[2]` for the third corner. */
  field: string;
  code: BoxProblemCode;
  message: string;
}

export type CheckedBox = { ok: true; ring: Position[]; warnings: BoxProblem[] } | { ok: false; problems: BoxProblem[] };

export const BOX_LIMITS = {
  /** One wind record and one column cannot stand for more sea than this; degrees, either way. */
  span: 5,
  /** Degrees; nearer the pole a box in longitude and latitude loses its meaning. */
  latitude: 85,
  corners: 500,
  /** km² (1 m²); below this the corners lie on one line or in one place. */
  areaKm2: 1e-6,
};

/**
 * Checks what was drawn, typed or sent as a study box.
 * @param candidate anything; a good one is [longitude, latitude][] in degrees, open or closed, longitudes in ±180 or
 *   0…360
 * @returns the normalised ring with warnings, or every problem that was found
 */
export function checkBox(candidate: unknown): CheckedBox {
  const read = readPositions(candidate);
  if (read.problems.length > 0) return { ok: false, problems: read.problems };
  const ring = normaliseRing(read.positions);
  const problems = [...cornerProblems(ring), ...shapeProblems(ring)];
  return problems.length > 0 ? { ok: false, problems } : { ok: true, ring, warnings: warningsOf(ring) };
}

function readPositions(candidate: unknown): { positions: Position[]; problems: BoxProblem[] } {
  if (!Array.isArray(candidate)) {
    const message = "A box is a list of corners, each a longitude and a latitude in degrees.";
    return { positions: [], problems: [{ field: "polygon", code: "notARing", message }] };
  }
  if (candidate.length > BOX_LIMITS.corners + 1) {
    const message = `The box has ${candidate.length} corners; up to ${BOX_LIMITS.corners} can be used. Simplify it.`;
    return { positions: [], problems: [{ field: "polygon", code: "manyCorners", message }] };
  }
  const positions: Position[] = [];
  const problems: BoxProblem[] = [];
  candidate.forEach((corner: unknown, i) => {
    const [longitude, latitude] = Array.isArray(corner) ? (corner as unknown[]) : [];
    if (isNumber(longitude) && isNumber(latitude)) {
      positions.push([longitude, latitude]);
      problems.push(...rangeProblems(longitude, latitude, i));
    } else {
      const message = `Corner ${i + 1} is not two numbers. Give a longitude and a latitude in degrees.`;
      problems.push({ field: `polygon[${i}]`, code: "notANumber", message });
    }
  });
  return { positions, problems };
}

function isNumber(value: unknown): value is number {
  return typeof value === "number" && Number.isFinite(value);
}

function rangeProblems(longitude: number, latitude: number, i: number): BoxProblem[] {
  const problems: BoxProblem[] = [];
  const field = `polygon[${i}]`;
  if (Math.abs(latitude) > 90) {
    const swapped = Math.abs(longitude) <= 90 ? " Are latitude and longitude swapped?" : "";
    const message = `Corner ${i + 1}: latitude ${latitude}° is beyond 90°.${swapped}`;
    problems.push({ field, code: "latitudeRange", message });
  }
  if (Math.abs(longitude) > 360) {
    const message = `Corner ${i + 1}: longitude ${longitude}° is not within -180° to 180° (or 0° to 360°).`;
    problems.push({ field, code: "longitudeRange", message });
  }
  return problems;
}

function cornerProblems(ring: Position[]): BoxProblem[] {
  const corners = openRing(ring).length;
  if (corners >= 3) return [];
  const message = `A box needs at least 3 different corners; there ${corners === 1 ? "is 1" : `are ${corners}`}.`;
  return [{ field: "polygon", code: "fewCorners", message }];
}

function shapeProblems(ring: Position[]): BoxProblem[] {
  if (openRing(ring).length < 3) return [];
  const { west, east, south, north } = ringExtent(ring);
  const unwrapped = unwrapRing(ring);
  const aroundPole = Math.abs(unwrapped[unwrapped.length - 1][0] - unwrapped[0][0]) > 180;
  if (aroundPole || Math.max(north, -south) > BOX_LIMITS.latitude) {
    const message = `The box reaches beyond ${BOX_LIMITS.latitude}° of latitude. Keep it away from the pole.`;
    return [{ field: "polygon", code: "pole", message }];
  }
  const problems: BoxProblem[] = [];
  if (east - west > BOX_LIMITS.span) problems.push(spanProblem("tooWide", "west to east", east - west));
  if (north - south > BOX_LIMITS.span) problems.push(spanProblem("tooTall", "south to north", north - south));
  const flat = onOneLine(unwrapped) || measureBox(ring).areaKm2 < BOX_LIMITS.areaKm2;
  const crossing = findCrossing(ring);
  if (flat && (!crossing || onOneLine(unwrapped))) {
    const message = "The box has no area: its corners lie on one line. Move one of them aside.";
    problems.push({ field: "polygon", code: "noArea", message });
  } else if (crossing) problems.push(crossing);
  return problems;
}

function spanProblem(code: "tooWide" | "tooTall", way: string, span: number): BoxProblem {
  const message = `The box spans ${span.toFixed(2)}° from ${way}; at most ${BOX_LIMITS.span}° can share one storm and one water column. Draw a smaller box, or several.`;
  return { field: "polygon", code, message };
}

function warningsOf(ring: Position[]): BoxProblem[] {
  const { south, north } = ringExtent(ring);
  if (!(south < 0 && north > 0)) return [];
  const message = "The box straddles the equator, where the Coriolis parameter f changes sign. Split it at 0°.";
  return [{ field: "polygon", code: "equator", message }];
}

type Side = [from: Position, to: Position];

/** The first pair of sides that cross, touch or run over each other, told by the numbers of their corners. */
function findCrossing(ring: Position[]): BoxProblem | null {
  const corners = unwrapRing(openRing(ring));
  const count = corners.length;
  const side = (i: number): Side => [corners[i], corners[(i + 1) % count]];
  for (let i = 0; i < count; i++) {
    for (let j = i + 1; j < count; j++) {
      const adjacent = j === i + 1 || (i === 0 && j === count - 1);
      const meet = adjacent
        ? foldsBack(side(i), side(j), j === i + 1)
        : mayMeet(side(i), side(j)) && sidesMeet(side(i), side(j));
      if (meet) return crossingProblem(i, j, count);
    }
  }
  return null;
}

function crossingProblem(i: number, j: number, count: number): BoxProblem {
  const name = (k: number) => `${k + 1}–${((k + 1) % count) + 1}`;
  return {
    field: `polygon[${i}]`,
    code: "crossing",
    message: `The side between corners ${name(i)} meets the side between corners ${name(j)}. Change the order of the corners, or move one.`,
  };
}

function onOneLine(corners: Position[]): boolean {
  const [[x, y], [nextX, nextY]] = corners;
  return corners.every((corner) => (nextX - x) * (corner[1] - y) === (nextY - y) * (corner[0] - x));
}

/** Whether the extents of two sides overlap or touch: nearly all pairs of a ring of many corners do not. */
function mayMeet([[ax, ay], [bx, by]]: Side, [[cx, cy], [dx, dy]]: Side): boolean {
  return (
    Math.max(ax, bx) >= Math.min(cx, dx) &&
    Math.max(cx, dx) >= Math.min(ax, bx) &&
    Math.max(ay, by) >= Math.min(cy, dy) &&
    Math.max(cy, dy) >= Math.min(ay, by)
  );
}

function sidesMeet(one: Side, other: Side): boolean {
  return kinks(multiLineString([one, other])).features.length > 0;
}

/** Neighbouring sides share a corner; they only collide when one runs back over the other. */
function foldsBack(first: Side, second: Side, inOrder: boolean): boolean {
  const [before, corner] = inOrder ? first : second;
  const after = inOrder ? second[1] : first[1];
  return (
    booleanPointOnLine(after, lineString([before, corner])) || booleanPointOnLine(before, lineString([corner, after]))
  );
}
