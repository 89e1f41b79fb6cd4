import type { ShapeReading } from "./shape-reading";

/** What `galeprint read` prints for a file of shapes. */
export function summaryOfShape({
  kind,
  format,
  rows,
  summary,
  polygons,
  understood,
  questions,
  problems,
}: ShapeReading) {
  return {
    kind,
    format,
    rows,
    shapes: summary,
    names: polygons.map(({ name }) => name),
    understood: understood.map(({ what, taken, confidence }) => `${what}: ${taken} (${confidence})`),
    questions,
    problems,
  };
}
