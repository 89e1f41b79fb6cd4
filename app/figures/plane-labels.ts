import * as Plot from "@observablehq/plot";
import { INK, PAPER } from "./colours";
import { placeLabels } from "./place-labels";
import { FONT_SIZE } from "./plain-markup";
import { planePosition, type PlaneFrame } from "./plane-frame";

export interface PlaneLabel {
  x: number;
  y: number;
  text: string;
}

/** Labels of points on a plane, placed clear of the path as well as they can be. Important ones come first. */
export function planeLabels(labels: PlaneLabel[], path: { x: number; y: number }[], frame: PlaneFrame): Plot.Markish[] {
  const requests = labels.map((label) => ({ text: label.text, ...planePosition(label.x, label.y, frame) }));
  const bounds = { left: 2, right: frame.width - 2, top: 0, bottom: frame.height - frame.marginBottom };
  const obstacles = everyFewPixels(path.map((point) => planePosition(point.x, point.y, frame)));
  return placeLabels(requests, obstacles, bounds).flatMap((offset, index) =>
    offset === null
      ? []
      : [
          Plot.text(labels.slice(index, index + 1), {
            x: "x",
            y: "y",
            text: "text",
            ...offset,
            fill: INK,
            stroke: PAPER,
            strokeWidth: 3,
            fontSize: FONT_SIZE,
          }),
        ],
  );
}

/** A label can lie across a long segment without touching its ends. */
function everyFewPixels(corners: { x: number; y: number }[], spacing = 3): { x: number; y: number }[] {
  return corners.flatMap((corner, index) => {
    const next = corners[index + 1] ?? corner;
    const length = Math.hypot(next.x - corner.x, next.y - corner.y);
    const count = Number.isFinite(length) ? Math.min(500, Math.max(1, Math.ceil(length / spacing))) : 1;
    return Array.from({ length: count }, (_, step) => ({
      x: corner.x + (step / count) * (next.x - corner.x),
      y: corner.y + (step / count) * (next.y - corner.y),
    }));
  });
}
