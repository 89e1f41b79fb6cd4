import { FONT_SIZE } from "./plain-markup";
import { textWidth } from "./text-size";

export interface LabelRequest {
  text: string;
  /** px of the point that it names. */
  x: number;
  y: number;
}

/** px from the point to the middle of the text. */
export interface LabelOffset {
  dx: number;
  dy: number;
}

interface Rectangle {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

const GAP = 7;
const HEIGHT = FONT_SIZE + 2;

/**
 * Finds each label a place beside its point: within the bounds, off the labels placed before it, and over as little of
 * the drawing as can be. Earlier requests choose first.
 * @param obstacles points of the drawing in px
 * @returns one a request; null where there is no place: the label is left out, its point keeps its mark
 */
export function placeLabels(
  requests: LabelRequest[],
  obstacles: { x: number; y: number }[],
  bounds: Rectangle,
): (LabelOffset | null)[] {
  const taken: Rectangle[] = [];
  return requests.map((request) => {
    const half = textWidth(request.text) / 2;
    let best: (LabelOffset & { box: Rectangle; cost: number }) | null = null;
    for (const [sideways, down] of SIDES) {
      const dx = sideways * (half + (down === 0 ? GAP : GAP / 2));
      const dy = down * (HEIGHT / 2 + (sideways === 0 ? GAP - 1 : GAP / 2));
      const box = boxAround(request.x + dx, request.y + dy, half);
      if (!inside(box, bounds) || taken.some((other) => overlap(box, other))) continue;
      const cost = obstacles.filter((point) => contains(box, point)).length;
      if (best === null || cost < best.cost) best = { dx, dy, box, cost };
    }
    if (best === null) return null;
    taken.push(best.box);
    return { dx: best.dx, dy: best.dy };
  });
}

/** Right first, as one reads; then around. */
const SIDES = [
  [1, 0],
  [1, -1],
  [1, 1],
  [0, -1],
  [0, 1],
  [-1, 0],
  [-1, -1],
  [-1, 1],
] as const;

function boxAround(x: number, y: number, half: number): Rectangle {
  return { left: x - half, right: x + half, top: y - HEIGHT / 2, bottom: y + HEIGHT / 2 };
}

function inside(box: Rectangle, bounds: Rectangle): boolean {
  return box.left >= bounds.left && box.right <= bounds.right && box.top >= bounds.top && box.bottom <= bounds.bottom;
}

function overlap(a: Rectangle, b: Rectangle): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}

function contains(box: Rectangle, point: { x: number; y: number }): boolean {
  return point.x > box.left && point.x < box.right && point.y > box.top && point.y < box.bottom;
}
