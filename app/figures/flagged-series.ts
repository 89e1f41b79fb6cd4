import type { QuantityId } from "~/units/quantities";
import { quantity } from "~/units/quantities";
import { periodOf, rangeSentence } from "./describe";
import { drawTimeFigure } from "./draw-time-figure";
import type { Figure } from "./figure";
import { caption, type FigureContext } from "./figure-context";
import { FLAG_MARK_KINDS, flagKey } from "./flag-marks";
import type { FlagMark, FlagMarkKind, PanelLine } from "./time-panel";
import { timeTable } from "./time-table";

export interface FlaggedSeriesData {
  id: string;
  /** `wind speed` */
  label: string;
  quantity: QuantityId;
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** SI, one a time, NaN where missing. */
  values: ArrayLike<number>;
  /** How the values are joined: `turn` for a bearing. */
  between: "linear" | "hold" | "turn";
  marks: readonly FlagMark[];
  /** A longer table is left out. */
  mostTableRows: number;
}

const HEIGHT = 120;

/** One channel of a record with the flags of its quality; the same on the page and in print. */
export function flaggedSeries(data: FlaggedSeriesData, context: FigureContext): Figure {
  const { id, label, time, values, between, marks, mostTableRows } = data;
  const name = label[0].toUpperCase() + label.slice(1);
  const line: PanelLine = {
    values,
    openPauses: true,
    ...(between === "hold" && { shape: "hold" }),
    ...(between === "turn" && { turns: true }),
  };
  const panel = {
    quantity: data.quantity,
    heading: label,
    colour: quantity(data.quantity).colour,
    lines: [line],
    zero: between === "hold",
    flagMarks: marks,
    height: HEIGHT,
  };
  const { svg, width, height } = drawTimeFigure(id, [panel], time, context);
  const count = (kind: FlagMarkKind) => marks.filter((mark) => mark.kind === kind).length;
  const met = FLAG_MARK_KINDS.filter((kind) => count(kind) > 0);
  return {
    id,
    title: name,
    caption: caption(
      [`${name} as recorded, ${periodOf(time, context)}.`, flagKey(marks) ?? "No sample is flagged."],
      context,
    ),
    alt: [
      rangeSentence(name, data.quantity, time, values, context),
      met.length === 0
        ? "No sample is flagged."
        : `Flagged: ${met.map((kind) => `${count(kind)} ${kind}`).join(", ")}.`,
    ].join(" "),
    width,
    height,
    svg,
    table: timeTable(
      time.length > mostTableRows ? [] : time,
      [{ name: label, quantity: data.quantity, values }],
      context,
    ),
  };
}
