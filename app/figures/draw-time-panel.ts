import * as Plot from "@observablehq/plot";
import { formatNumber, toDisplay } from "~/units/format-quantity";
import { arrowStrip } from "./arrow-strip";
import { HAIRLINE, INK, markColour, MIST } from "./colours";
import { flagMarks } from "./flag-marks";
import { levelMarks, peakMarks, peakSide } from "./panel-labels";
import { FONT_SIZE } from "./plain-markup";
import { keepExtremes, openPauses, openTurns } from "./thin-line";
import type { TimeFrame } from "./time-frame";
import type { PanelLine, TimePanel } from "./time-panel";
import { valueAxis, type ValueAxis } from "./value-axis";

export interface DrawnPanel {
  plot: Element;
  height: number;
  axis: ValueAxis;
}

export const PANEL_HEIGHT = 92;
/** Room for the label of a peak above or below the data. */
const LABEL_ROOM = 15;
/** A line at the very top of its axis is still seen whole. */
const AIR = 3;
const ARROW_ROOM = 18;

interface Point {
  x: number;
  y: number;
}

/** Draws one panel without its heading. */
export function drawTimePanel(panel: TimePanel, frame: TimeFrame): DrawnPanel {
  const plotHeight = panel.height ?? PANEL_HEIGHT;
  const axis = valueAxis(panel, frame.context.units, plotHeight);
  const marginBottom = panel.arrows ? ARROW_ROOM : 3;
  const height = plotHeight + marginBottom + 4;
  const side = peakSide(panel);
  const plot = Plot.plot({
    document: frame.context.document,
    width: frame.width,
    height,
    marginTop: 4,
    marginBottom,
    marginLeft: frame.marginLeft,
    marginRight: frame.marginRight,
    x: { type: "linear", domain: frame.domain, axis: null },
    y: {
      type: "linear",
      domain: axis.domain,
      axis: null,
      reverse: panel.downwards === true,
      insetTop: side === "above" ? LABEL_ROOM : AIR,
      insetBottom: side === "below" ? LABEL_ROOM : 0,
    },
    marks: [
      ...ground(panel, axis, frame),
      ...bandMarks(panel, frame),
      ...panel.lines.flatMap((line) => lineMarks(line, panel, frame)),
      ...levelMarks(panel, axis, frame),
      ...flagMarks(panel, axis, frame),
      ...(side ? peakMarks(panel, frame, side) : []),
      ...(panel.arrows ? [arrowStrip(panel.arrows, frame, markColour(panel.colour))] : []),
    ],
  });
  return { plot, height, axis };
}

function ground(panel: TimePanel, axis: ValueAxis, frame: TimeFrame): Plot.Markish[] {
  const midnights = frame.ticks.filter((tick) => tick.midnight).map((tick) => tick.seconds);
  const [low, high] = axis.domain;
  const window = panel.window ? insideFrame(panel.window, frame) : null;
  return [
    ...(window ? [Plot.rect([window], { x1: "start", x2: "end", y1: low, y2: high, fill: MIST })] : []),
    Plot.ruleX(midnights, { stroke: HAIRLINE, strokeWidth: 0.5 }),
    Plot.ruleY(axis.ticks, { stroke: HAIRLINE, strokeWidth: 0.5 }),
    ...(panel.zero ? [Plot.ruleY([0], { stroke: INK, strokeWidth: 0.75 })] : []),
    Plot.axisY(axis.ticks, {
      label: null,
      tickSize: 4,
      tickPadding: 4,
      fontSize: FONT_SIZE,
      color: INK,
      tickFormat: (value: number) => formatNumber(value, axis.decimals),
    }),
  ];
}

/** The part of an interval that the axis shows; null where it shows none. */
function insideFrame(window: NonNullable<TimePanel["window"]>, frame: TimeFrame): TimePanel["window"] | null {
  const start = Math.max(window.start, frame.domain[0]);
  const end = Math.min(window.end, frame.domain[1]);
  return start < end ? { start, end } : null;
}

function displayed(values: ArrayLike<number>, time: ArrayLike<number>, panel: TimePanel, frame: TimeFrame): Point[] {
  return keepExtremes(values).map((index) => ({
    x: time[index] ?? Number.NaN,
    y: toDisplay(values[index] ?? Number.NaN, panel.quantity, frame.context.units),
  }));
}

function lineMarks(line: PanelLine, panel: TimePanel, frame: TimeFrame): Plot.Markish[] {
  const paused = line.openPauses ? openPauses(frame.time, line.values) : { time: frame.time, values: line.values };
  const opened = line.turns ? openTurns(paused.time, paused.values) : paused;
  const points = displayed(opened.values, opened.time, panel, frame);
  const colour = markColour(panel.colour);
  const hold = line.shape === "hold";
  const curve = hold ? "step-after" : "linear";
  const marks: Plot.Markish[] = [
    Plot.line(points, {
      x: "x",
      y: "y",
      stroke: colour,
      strokeWidth: 1.5,
      strokeDasharray: line.dash || undefined,
      curve,
    }),
  ];
  if (hold) marks.unshift(Plot.areaY(points, { x: "x", y1: 0, y2: "y", fill: colour, fillOpacity: 0.22, curve }));
  const lonely = points.filter((point, i) => Number.isFinite(point.y) && stands(points, i));
  if (lonely.length > 0) marks.push(Plot.dot(lonely, { x: "x", y: "y", r: 1.6, fill: colour }));
  return marks;
}

/** A sample between two gaps has no line to show it. */
function stands(points: Point[], index: number): boolean {
  const missing = (point: Point | undefined) => point === undefined || !Number.isFinite(point.y);
  return missing(points[index - 1]) && missing(points[index + 1]);
}

function bandMarks(panel: TimePanel, frame: TimeFrame): Plot.Markish[] {
  if (!panel.band) return [];
  const { low, high } = panel.band;
  const units = frame.context.units;
  const points = keepExtremes(low).map((index) => ({
    x: frame.time[index] ?? Number.NaN,
    y1: toDisplay(low[index] ?? Number.NaN, panel.quantity, units),
    y2: toDisplay(high[index] ?? Number.NaN, panel.quantity, units),
  }));
  return [Plot.areaY(points, { x: "x", y1: "y1", y2: "y2", fill: markColour(panel.colour), fillOpacity: 0.18 })];
}
