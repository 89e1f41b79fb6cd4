import * as Plot from "@observablehq/plot";
import { bearingOf, compassWord } from "~/units/compass";
import { formatBearing, formatQuantity, toDisplay } from "~/units/format-quantity";
import { formatTime } from "~/units/format-time";
import { displayUnit } from "~/units/quantities";
import { INK, markColour, PAPER } from "./colours";
import { periodOf } from "./describe";
import { elapsedMarks } from "./elapsed-marks";
import { extremes } from "./extremes";
import type { Figure } from "./figure";
import { caption, figureWidth, idPrefix, type FigureContext } from "./figure-context";
import { IdKeeper, plainGroup } from "./plain-markup";
import { drawPlane, planeFrame } from "./plane-frame";
import { landMarks } from "./land-marks";
import { planeLabels } from "./plane-labels";
import { magnitude } from "./response-panels";
import { acrossHeading, axisHeading, HEADING_HEIGHT, svgSheet } from "./sheet";
import { keepExtremes } from "./thin-line";
import { timeTable } from "./time-table";

/** Metres east and north of the middle of the box. */
export type LocalPosition = readonly [east: number, north: number];

export interface DriftTrackData {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** m from where the layer was at the start, towards east and north */
  displacementEast: ArrayLike<number>;
  displacementNorth: ArrayLike<number>;
  /** Outline of the study box. */
  box?: readonly LocalPosition[];
  /** Outer rings of land nearby; may reach beyond the figure. */
  land?: readonly (readonly LocalPosition[])[];
}

/** A span below which a track is a dot: half a kilometre. */
const LEAST_SPAN_METRES = 500;

/** The way of the layer from the middle of its box, north up, with an open mark each day. */
export function driftTrack(data: DriftTrackData, context: FigureContext): Figure {
  const { time, displacementEast, displacementNorth, box, land } = data;
  const show = (metres: number) => toDisplay(metres, "displacement", context.units);
  const east = Array.from(displacementEast, show);
  const north = Array.from(displacementNorth, show);
  const outline = (box ?? []).map(([x, y]) => ({ x: show(x), y: show(y) }));
  const frame = planeFrame(
    [...east, 0, ...outline.map((corner) => corner.x)],
    [...north, 0, ...outline.map((corner) => corner.y)],
    figureWidth(context),
    show(LEAST_SPAN_METRES),
  );

  const kept = [...new Set([...keepExtremes(east, 750), ...keepExtremes(north, 750)])].sort((a, b) => a - b);
  const path = kept.map((index) => ({ x: east[index] ?? Number.NaN, y: north[index] ?? Number.NaN }));
  const days = elapsedMarks(time, east, north, 24);
  const end = path.findLast((point) => Number.isFinite(point.x) && Number.isFinite(point.y));
  const labels = days.filter((day) => day.hours > 0).map((day) => ({ ...day, text: `${day.hours / 24} d` }));
  const colour = markColour("drift");
  const plot = drawPlane(frame, context.document, {
    beneath: (land ?? []).flatMap((ring) =>
      landMarks(
        ring.map(([x, y]) => ({ x: show(x), y: show(y) })),
        frame,
      ),
    ),
    above: [
      ...(outline.length > 0
        ? [Plot.line([...outline, ...outline.slice(0, 1)], { x: "x", y: "y", stroke: INK, strokeWidth: 1.5 })]
        : []),
      Plot.line(path, { x: "x", y: "y", stroke: colour, strokeWidth: 1.5 }),
      Plot.dot(days, { x: "x", y: "y", r: 2.75, fill: PAPER, stroke: colour, strokeWidth: 1.25 }),
      ...(end ? [Plot.dot([end], { x: "x", y: "y", r: 2.75, fill: colour })] : []),
      ...planeLabels([...labels].reverse(), [...path, ...outline], frame),
    ],
  });
  const unit = displayUnit("displacement", context.units).unit;
  const markup =
    axisHeading(`north of the box's middle (${unit})`, 0) +
    plainGroup(plot, 0, HEADING_HEIGHT, new IdKeeper(idPrefix("drift-track", context))) +
    acrossHeading(
      `east of the box's middle (${unit})`,
      frame.width - frame.marginRight,
      HEADING_HEIGHT + frame.height - 4,
    );
  const height = HEADING_HEIGHT + frame.height;
  const net = netText(data, context);
  return {
    id: "drift-track",
    title: "Where the layer went",
    caption: caption(
      [
        `Path of the layer from the middle of the box, north up; net displacement ${net}.`,
        `An open mark each day from ${formatTime(time[0], context.zone)}; filled at the end.`,
        box ? "Outlined: the study box." : null,
        land && land.length > 0 ? "Tinted: land." : null,
      ],
      context,
    ),
    alt: [
      `Path of the layer, ${periodOf(time, context)}.`,
      `Net displacement ${net}.`,
      `Farthest from the start ${farthestText(data, context)}.`,
    ].join(" "),
    width: frame.width,
    height,
    svg: svgSheet(frame.width, height, markup),
    table: timeTable(
      time,
      [
        { name: "displacement, east", quantity: "displacement", values: displacementEast },
        { name: "displacement, north", quantity: "displacement", values: displacementNorth },
      ],
      context,
    ),
  };
}

function netText(data: DriftTrackData, context: FigureContext): string {
  return vectorText(data, data.time.length - 1, context);
}

function farthestText(data: DriftTrackData, context: FigureContext): string {
  const farthest = extremes(magnitude(data.displacementEast, data.displacementNorth))?.maxAt;
  if (farthest === undefined) return "not known";
  return `${vectorText(data, farthest, context)} at ${formatTime(data.time[farthest], context.zone)}`;
}

function vectorText(data: DriftTrackData, index: number, context: FigureContext): string {
  const east = data.displacementEast[index] ?? Number.NaN;
  const north = data.displacementNorth[index] ?? Number.NaN;
  const distance = formatQuantity(Math.hypot(east, north), "displacement", context.units).text;
  const towards = bearingOf(east, north);
  return towards === null ? distance : `${distance} towards ${formatBearing(towards)} (${compassWord(towards)})`;
}
