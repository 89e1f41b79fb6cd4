import { displayUnit } from "~/units/quantities";
import { HAIRLINE, INK } from "./colours";
import { drawTimePanel } from "./draw-time-panel";
import { idPrefix, type FigureContext } from "./figure-context";
import { IdKeeper, plainGroup, roundGeometry } from "./plain-markup";
import { axisHeading, HEADING_HEIGHT, svgSheet } from "./sheet";
import { timeFrame, timePosition, type TimeFrame } from "./time-frame";
import type { PanelLevel, TimePanel } from "./time-panel";

const PANEL_GAP = 8;
const TIME_AXIS_HEIGHT = 20;

export interface DrawnTimeFigure {
  svg: string;
  width: number;
  height: number;
  levelsShown: PanelLevel[];
  /** Levels that lie too far off the data to be drawn: for the caption. */
  levelsBeyond: PanelLevel[];
}

/**
 * Panels stacked above one shared time axis.
 * @param time seconds since 1970-01-01T00:00:00Z, ascending
 */
export function drawTimeFigure(
  id: string,
  panels: TimePanel[],
  time: ArrayLike<number>,
  context: FigureContext,
): DrawnTimeFigure {
  const frame = timeFrame(time, context);
  const ids = new IdKeeper(idPrefix(id, context));
  const levelsShown: PanelLevel[] = [];
  const levelsBeyond: PanelLevel[] = [];
  let markup = "";
  let top = 0;
  panels.forEach((panel, index) => {
    if (index > 0) top += PANEL_GAP;
    markup += axisHeading(`${panel.heading} (${displayUnit(panel.quantity, context.units).unit})`, top, {
      grows: panel.downwards ? "down" : "up",
      colour: panel.colour,
      keys:
        panel.lines.length > 1 ? panel.lines.map((line) => ({ label: line.label ?? "", dash: line.dash ?? "" })) : [],
    });
    top += HEADING_HEIGHT;
    const drawn = drawTimePanel(panel, frame);
    markup += plainGroup(drawn.plot, 0, top, ids);
    top += drawn.height;
    levelsShown.push(...drawn.axis.levels);
    levelsBeyond.push(...drawn.axis.levelsBeyond);
  });
  markup += timeAxis(frame, top);
  const height = Math.ceil(top + TIME_AXIS_HEIGHT);
  return { svg: svgSheet(frame.width, height, markup), width: frame.width, height, levelsShown, levelsBeyond };
}

/** Ticks and labels that all panels share. */
function timeAxis(frame: TimeFrame, top: number): string {
  const right = frame.width - frame.marginRight;
  const line = `<path d="M${frame.marginLeft},${top + 0.5}H${right}" stroke="${HAIRLINE}" fill="none"/>`;
  const ticks = frame.ticks.map((tick) => {
    const x = roundGeometry(String(timePosition(tick.seconds, frame)));
    return (
      `<path d="M${x},${top}v4" stroke="${INK}" fill="none"/>` +
      `<text x="${x}" y="${top + 15}"${tick.midnight ? "" : ` fill="var(--slate)"`}>${tick.label}</text>`
    );
  });
  return line + ticks.join("");
}
