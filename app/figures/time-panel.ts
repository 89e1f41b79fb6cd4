/** One panel of a figure through time: what it shows. How it is drawn is in `draw-time-panel.ts`. */
import type { ColourToken, QuantityId } from "~/units/quantities";

export interface PanelLine {
  /** One a time, SI, NaN where missing. */
  values: ArrayLike<number>;
  /** Named beside the heading where a panel has several lines. */
  label?: string;
  /** SVG dash pattern; solid where absent. */
  dash?: string;
  /** `hold`: the value stands until the next time, as rain does; drawn in steps, the ground beneath tinted. */
  shape?: "line" | "hold";
  /** Leave the line open across pauses in the record. */
  openPauses?: boolean;
  /** A bearing: leave the line open where it passes north, rather than across the whole axis. */
  turns?: boolean;
}

/** `set`: by a person, whatever the flag. */
export type FlagMarkKind = "suspect" | "bad" | "missing" | "set";

export interface FlagMark {
  kind: FlagMarkKind;
  /** Seconds since 1970-01-01T00:00:00Z. */
  seconds: number;
  /** SI; not looked at where missing. */
  value: number;
}

export interface PanelLevel {
  /** SI */
  value: number;
  /** `trigger level 32.5 g/kg` */
  label: string;
}

export interface TimePanel {
  quantity: QuantityId;
  /** Without its unit: `wind at 10 m`. */
  heading: string;
  colour: ColourToken;
  lines: PanelLine[];
  /** 10th and 90th percentile, SI. */
  band?: { low: ArrayLike<number>; high: ArrayLike<number> };
  levels?: PanelLevel[];
  /** Zero belongs to the axis, and is drawn. */
  zero?: boolean;
  /** Values grow downwards, as depth does. */
  downwards?: boolean;
  /** Sample of the first line that is marked and labelled. */
  marked?: number | null;
  /** One a time: degrees true that the arrows beneath point to, and the speed that weighs them. */
  arrows?: { towards: ArrayLike<number>; speed: ArrayLike<number> };
  /** Flags of quality on samples, each kind in a shape of its own. */
  flagMarks?: readonly FlagMark[];
  /** Interval of time, in seconds, on a tinted ground. */
  window?: { start: number; end: number };
  /** px of the plotting area. */
  height?: number;
}
