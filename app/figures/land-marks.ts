import * as Plot from "@observablehq/plot";
import { markColour } from "./colours";
import type { PlaneFrame } from "./plane-frame";

interface Point {
  x: number;
  y: number;
}

/**
 * Land as a tint, its coast as a line. Both are cut at the frame, so that the file carries no coast that nobody sees;
 * where land is cut, no coast is drawn.
 * @param ring open or closed, in the frame's unit
 */
export function landMarks(ring: Point[], frame: PlaneFrame): Plot.Markish[] {
  const points = clipRing(ring, frame);
  if (points.length < 3) return [];
  const coast = points.flatMap((point, index) => {
    const next = points[(index + 1) % points.length] ?? point;
    return alongFrame(point, next, frame) ? [{ x: Number.NaN, y: Number.NaN }] : [point, next];
  });
  return [
    Plot.line([...points, ...points.slice(0, 1)], { x: "x", y: "y", fill: "var(--land)", stroke: "none" }),
    Plot.line(coast, { x: "x", y: "y", stroke: markColour("shore"), strokeWidth: 1 }),
  ];
}

/** How far a point lies inside each side of the frame. */
function sidesOf({ xDomain: [x0, x1], yDomain: [y0, y1] }: PlaneFrame): ((point: Point) => number)[] {
  return [(point) => point.x - x0, (point) => x1 - point.x, (point) => point.y - y0, (point) => y1 - point.y];
}

function alongFrame(from: Point, to: Point, frame: PlaneFrame): boolean {
  const hair = 1e-9 * (frame.xDomain[1] - frame.xDomain[0]);
  return sidesOf(frame).some((inward) => Math.abs(inward(from)) <= hair && Math.abs(inward(to)) <= hair);
}

/** Sutherland and Hodgman (1974): the ring is cut by the four sides of the frame, one after another. */
export function clipRing(ring: Point[], frame: PlaneFrame): Point[] {
  return sidesOf(frame).reduce(
    (points, inward) =>
      points.flatMap((point, index) => {
        const before = points.at(index - 1) ?? point;
        const [from, to] = [inward(before), inward(point)];
        if (from >= 0 === to >= 0) return to >= 0 ? [point] : [];
        const share = from / (from - to);
        const crossing = { x: before.x + share * (point.x - before.x), y: before.y + share * (point.y - before.y) };
        return to >= 0 ? [crossing, point] : [crossing];
      }),
    ring,
  );
}
