/** A map-like plane with one scale both ways: east to the right, north up. */
import * as Plot from "@observablehq/plot";
import { formatNumber } from "~/units/format-quantity";
import { HAIRLINE, INK } from "./colours";
import { extremes } from "./extremes";
import { niceAxis } from "./nice-ticks";
import { FONT_SIZE } from "./plain-markup";

export interface PlaneFrame {
  width: number;
  height: number;
  marginLeft: number;
  marginRight: number;
  marginTop: number;
  marginBottom: number;
  /** In the unit shown. */
  xDomain: [number, number];
  yDomain: [number, number];
  ticks: { x: number[]; y: number[]; decimals: number };
}

const MARGINS = { marginLeft: 46, marginRight: 18, marginTop: 6, marginBottom: 34 };
const PADDING = 0.1;
/** px: beyond it a square figure would fill a screen. */
const GREATEST_HEIGHT = 460;

/**
 * Fits both coordinates into the width, with the same number of px for a unit east as for one north; at most as high
 * as it is wide and no higher than a screen, and no lower than two fifths of it.
 * @param least the smallest span shown, in the unit of the coordinates
 */
export function planeFrame(x: ArrayLike<number>, y: ArrayLike<number>, width: number, least: number): PlaneFrame {
  const innerWidth = width - MARGINS.marginLeft - MARGINS.marginRight;
  const [xMiddle, xSpan] = middleAndSpan(x, least);
  const [yMiddle, ySpan] = middleAndSpan(y, least);
  const unitsPerPx = Math.max(xSpan, ySpan) / innerWidth;
  const innerHeight = Math.min(innerWidth, GREATEST_HEIGHT, Math.max(innerWidth * 0.4, ySpan / unitsPerPx));
  const perPx = Math.max(xSpan / innerWidth, ySpan / innerHeight);
  const xDomain = around(xMiddle, perPx * innerWidth);
  const yDomain = around(yMiddle, perPx * innerHeight);
  const axis = niceAxis(0, perPx * innerWidth, Math.min(10, Math.max(3, Math.floor(innerWidth / 45))));
  const step = (axis.ticks[1] ?? 1) - (axis.ticks[0] ?? 0);
  return {
    width,
    height: Math.round(innerHeight + MARGINS.marginTop + MARGINS.marginBottom),
    ...MARGINS,
    xDomain,
    yDomain,
    ticks: { x: multiples(xDomain, step), y: multiples(yDomain, step), decimals: axis.decimals },
  };
}

function middleAndSpan(values: ArrayLike<number>, least: number): [middle: number, span: number] {
  const found = extremes(values);
  if (found === null) return [0, least];
  return [(found.min + found.max) / 2, Math.max((found.max - found.min) * (1 + 2 * PADDING), least)];
}

const around = (middle: number, span: number): [number, number] => [middle - span / 2, middle + span / 2];

function multiples([from, to]: [number, number], step: number): number[] {
  const first = Math.ceil(from / step - 1e-9);
  const last = Math.floor(to / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) =>
    Number(((first + index) * step).toPrecision(12)),
  );
}

/** px from the top left corner of the plot. */
export function planePosition(x: number, y: number, frame: PlaneFrame): { x: number; y: number } {
  const [x0, x1] = frame.xDomain;
  const [y0, y1] = frame.yDomain;
  return {
    x: frame.marginLeft + ((x - x0) / (x1 - x0)) * (frame.width - frame.marginLeft - frame.marginRight),
    y:
      frame.height -
      frame.marginBottom -
      ((y - y0) / (y1 - y0)) * (frame.height - frame.marginTop - frame.marginBottom),
  };
}

/** Grid, zero lines and tick labels, then the marks given. */
export function drawPlane(
  frame: PlaneFrame,
  document: Document,
  marks: { beneath?: Plot.Markish[]; above: Plot.Markish[] },
): Element {
  const { ticks, xDomain, yDomain, ...dimensions } = frame;
  const format = (value: number) => formatNumber(value, ticks.decimals);
  const axis = { label: null, tickSize: 4, tickPadding: 4, fontSize: FONT_SIZE, color: INK, tickFormat: format };
  const zero = { stroke: HAIRLINE, strokeWidth: 1.25 };
  const holds = ([from, to]: [number, number]) => from < 0 && to > 0;
  return Plot.plot({
    document,
    ...dimensions,
    x: { type: "linear", domain: xDomain, axis: null },
    y: { type: "linear", domain: yDomain, axis: null },
    marks: [
      ...(marks.beneath ?? []),
      Plot.ruleX(ticks.x, { stroke: HAIRLINE, strokeWidth: 0.5 }),
      Plot.ruleY(ticks.y, { stroke: HAIRLINE, strokeWidth: 0.5 }),
      ...(holds(xDomain) ? [Plot.ruleX([0], zero)] : []),
      ...(holds(yDomain) ? [Plot.ruleY([0], zero)] : []),
      Plot.axisX(ticks.x, axis),
      Plot.axisY(ticks.y, axis),
      ...marks.above,
    ],
  });
}
