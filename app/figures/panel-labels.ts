import * as Plot from "@observablehq/plot";
import { formatQuantity, toDisplay } from "~/units/format-quantity";
import { INK, markColour, PAPER, textColour } from "./colours";
import { extremes } from "./extremes";
import { FONT_SIZE } from "./plain-markup";
import { textWidth } from "./text-size";
import { timeAt, timePosition, type TimeFrame } from "./time-frame";
import type { TimePanel } from "./time-panel";
import type { ValueAxis } from "./value-axis";

const HALO = { stroke: PAPER, strokeWidth: 3, fontSize: FONT_SIZE };

/** Dashed levels with their labels, which stand at the end of the line where the data is farther away. */
export function levelMarks(panel: TimePanel, axis: ValueAxis, frame: TimeFrame): Plot.Markish[] {
  const [from, to] = frame.domain;
  const values = panel.lines[0]?.values ?? [];
  const distanceAt = (share: number, level: number) =>
    Math.abs((values[Math.round(share * (values.length - 1))] ?? level) - level);
  return axis.levels.flatMap((level) => {
    const y = toDisplay(level.value, panel.quantity, frame.context.units);
    const left = distanceAt(0.12, level.value) >= distanceAt(0.88, level.value);
    return [
      Plot.ruleY([y], { stroke: INK, strokeWidth: 1, strokeDasharray: "4,3" }),
      Plot.text([level.label], {
        x: () => (left ? from : to),
        y: () => y,
        text: (label: string) => label,
        textAnchor: left ? "start" : "end",
        dx: left ? 6 : -6,
        dy: -7,
        fill: INK,
        ...HALO,
      }),
    ];
  });
}

/** On which side of the marked sample its label goes: outwards. Null where there is none, or where the line is flat. */
export function peakSide(panel: TimePanel): "above" | "below" | null {
  const values = panel.lines[0]?.values;
  if (values === undefined || panel.marked === null || panel.marked === undefined) return null;
  const found = extremes(values);
  const value = values[panel.marked] ?? Number.NaN;
  if (found === null || found.min === found.max || !Number.isFinite(value)) return null;
  const high = value - found.min >= found.max - value;
  return high !== (panel.downwards === true) ? "above" : "below";
}

/** px: a label keeps this far from the lines. */
const CLEARANCE = 9;

/** A dot on the marked sample, with its value and time, clear of all lines of the panel. */
export function peakMarks(panel: TimePanel, frame: TimeFrame, side: "above" | "below"): Plot.Markish[] {
  const index = panel.marked ?? 0;
  const seconds = frame.time[index] ?? 0;
  const value = panel.lines[0]?.values[index] ?? Number.NaN;
  const [, month, day, clockTime] = /-(\d\d)-(\d\d) (.+)$/.exec(frame.clock.dateTime(seconds)) ?? [];
  const label = `${formatQuantity(value, panel.quantity, frame.context.units).text}, ${month}-${day} ${clockTime}`;

  const half = textWidth(label) / 2;
  const at = timePosition(seconds, frame);
  const clamped = Math.min(Math.max(at, frame.marginLeft + half + 2), frame.width - 2 - half);
  const [left, right] = [clamped - half, clamped + half].map((x) => timeAt(x, frame));
  const outermost = outermostBetween(panel, frame, left ?? seconds, right ?? seconds, side) ?? value;
  const shown = (si: number) => toDisplay(si, panel.quantity, frame.context.units);
  return [
    Plot.dot([{ x: seconds, y: shown(value) }], { x: "x", y: "y", r: 2.25, fill: markColour(panel.colour) }),
    Plot.text([{ x: seconds, y: shown(outermost) }], {
      x: "x",
      y: "y",
      text: () => label,
      dx: clamped - at,
      dy: side === "above" ? -CLEARANCE : CLEARANCE,
      fill: textColour(panel.colour),
      ...HALO,
    }),
  ];
}

/** The value of any line that reaches farthest up (or down) the page between two moments. */
function outermostBetween(
  panel: TimePanel,
  frame: TimeFrame,
  from: number,
  to: number,
  side: "above" | "below",
): number | null {
  const greatest = (side === "above") !== (panel.downwards === true);
  let outermost: number | null = null;
  for (const { values } of panel.lines) {
    for (let index = 0; index < values.length; index += 1) {
      const seconds = frame.time[index] ?? 0;
      const value = values[index] ?? Number.NaN;
      if (seconds < from || seconds > to || !Number.isFinite(value)) continue;
      if (outermost === null || (greatest ? value > outermost : value < outermost)) outermost = value;
    }
  }
  return outermost;
}
