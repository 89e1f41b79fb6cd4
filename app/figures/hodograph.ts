import * as Plot from "@observablehq/plot";
import { bearingOf } from "~/units/compass";
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
import { planeLabels } from "./plane-labels";
import { magnitude } from "./response-panels";
import { acrossHeading, axisHeading, HEADING_HEIGHT, svgSheet } from "./sheet";
import { keepExtremes } from "./thin-line";
import { timeTable } from "./time-table";

export interface HodographData {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** m/s, towards east and north */
  driftEast: ArrayLike<number>;
  driftNorth: ArrayLike<number>;
  /** m/s: speed of the inertial part, drawn as a circle around still water */
  inertialAmplitude?: number;
}

/** The tip of the drift vector as it turns: open marks every 12 h, days counted from the start. */
export function hodograph(data: HodographData, context: FigureContext): Figure {
  const { time, driftEast, driftNorth, inertialAmplitude } = data;
  const show = (value: number) => toDisplay(value, "driftSpeed", context.units);
  const east = Array.from(driftEast, show);
  const north = Array.from(driftNorth, show);
  const radius = inertialAmplitude === undefined ? 0 : show(inertialAmplitude);
  const frame = planeFrame([...east, 0, radius, -radius], [...north, 0, radius, -radius], figureWidth(context), 0.05);

  const speed = magnitude(driftEast, driftNorth);
  const peak = extremes(speed)?.maxAt ?? null;
  const peakText = peak === null ? null : driftText(peak, data, speed, context);
  const path = keepPath(east, north).map((index) => ({ x: east[index] ?? Number.NaN, y: north[index] ?? Number.NaN }));
  const marks = elapsedMarks(time, east, north, 12);
  const peakPoint = peak === null ? [] : [{ x: east[peak] ?? 0, y: north[peak] ?? 0, text: peakText ?? "" }];
  const days = marks.filter((mark) => mark.hours > 0 && mark.hours % 24 === 0);
  const colour = markColour("drift");
  const plot = drawPlane(frame, context.document, {
    above: [
      ...(radius > 0 ? [circle(radius)] : []),
      Plot.line(path, { x: "x", y: "y", stroke: colour, strokeWidth: 1.25 }),
      Plot.dot(marks, { x: "x", y: "y", r: 2.75, fill: PAPER, stroke: colour, strokeWidth: 1.25 }),
      Plot.dot(peakPoint, { x: "x", y: "y", r: 2.5, fill: colour }),
      ...planeLabels([...peakPoint, ...days.map((day) => ({ ...day, text: `${day.hours / 24} d` }))], path, frame),
    ],
  });
  const unit = displayUnit("driftSpeed", context.units).unit;
  const markup =
    axisHeading(`drift towards north (${unit})`, 0) +
    plainGroup(plot, 0, HEADING_HEIGHT, new IdKeeper(idPrefix("hodograph", context))) +
    acrossHeading(`drift towards east (${unit})`, frame.width - frame.marginRight, HEADING_HEIGHT + frame.height - 4);
  const height = HEADING_HEIGHT + frame.height;
  const circleText =
    inertialAmplitude === undefined
      ? null
      : `Dashed circle: inertial speed ${formatQuantity(inertialAmplitude, "driftSpeed", context.units).text}.`;
  return {
    id: "hodograph",
    title: "Drift as it turned",
    caption: caption(
      [
        "Drift of the layer: the line follows the tip of its vector.",
        `Open marks every 12 h, days counted from ${formatTime(time[0], context.zone)}.`,
        circleText,
      ],
      context,
    ),
    alt: [
      `Hodograph of the drift of the layer, ${periodOf(time, context)}.`,
      peakText === null || peak === null
        ? "No values."
        : `Highest drift ${peakText}, at ${formatTime(time[peak], context.zone)}.`,
      `Drift at the end ${driftText(speed.length - 1, data, speed, context)}.`,
      ...(circleText === null ? [] : [circleText]),
    ].join(" "),
    width: frame.width,
    height,
    svg: svgSheet(frame.width, height, markup),
    table: timeTable(
      time,
      [
        { name: "drift, east", quantity: "driftSpeed", values: driftEast },
        { name: "drift, north", quantity: "driftSpeed", values: driftNorth },
      ],
      context,
    ),
  };
}

function circle(radius: number): Plot.Markish {
  const points = Array.from({ length: 73 }, (_, index) => {
    const angle = (index / 36) * Math.PI;
    return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
  });
  return Plot.line(points, { x: "x", y: "y", stroke: INK, strokeWidth: 0.9, strokeDasharray: "3,3" });
}

/** Samples that keep the extremes of both components. */
function keepPath(east: number[], north: number[]): number[] {
  return [...new Set([...keepExtremes(east, 750), ...keepExtremes(north, 750)])].sort((a, b) => a - b);
}

function driftText(index: number, data: HodographData, speed: number[], context: FigureContext): string {
  const towards = bearingOf(data.driftEast[index] ?? Number.NaN, data.driftNorth[index] ?? Number.NaN);
  const value = formatQuantity(speed[index], "driftSpeed", context.units).text;
  return towards === null ? value : `${value} towards ${formatBearing(towards)}`;
}
