import * as Plot from "@observablehq/plot";
import { toDisplay } from "~/units/format-quantity";
import { FAULT, INK, PAPER, QUIET } from "./colours";
import { timePosition, type TimeFrame } from "./time-frame";
import type { FlagMark, FlagMarkKind, TimePanel } from "./time-panel";
import type { ValueAxis } from "./value-axis";

/** What each shape means, for captions. */
const FLAG_MARK_WORDS: Record<FlagMarkKind, string> = {
  suspect: "open triangles: suspect or of high interest",
  bad: "crosses: bad",
  missing: "short strokes at the foot: missing",
  set: "rings: flag set by a person",
};

/** In the order that they are told in. */
export const FLAG_MARK_KINDS: readonly FlagMarkKind[] = ["suspect", "bad", "missing", "set"];

/** Says what the shapes mean that are met; null without any mark. */
export function flagKey(marks: readonly FlagMark[]): string | null {
  const key = FLAG_MARK_KINDS.filter((kind) => marks.some((mark) => mark.kind === kind))
    .map((kind) => FLAG_MARK_WORDS[kind])
    .join("; ");
  return key === "" ? null : `${key[0].toUpperCase()}${key.slice(1)}.`;
}

/** px between two marks of one kind that are still told apart. */
const APART = 3;
/** px; area of a symbol is about its square. */
const SYMBOL_RADIUS = 4;
/** Of the axis: how long the stroke of a missing sample is. */
const FOOT_SHARE = 0.09;

/** Marks in shapes of their own, so that they are told apart without colour; those that would fall on one another are left out. */
export function flagMarks(panel: TimePanel, axis: ValueAxis, frame: TimeFrame): Plot.Markish[] {
  const all = panel.flagMarks ?? [];
  const of = (kind: FlagMarkKind) =>
    apart(
      all.filter((mark) => mark.kind === kind),
      frame,
    ).map(({ seconds, value }) => ({ x: seconds, y: toDisplay(value, panel.quantity, frame.context.units) }));
  const place = { x: "x", y: "y" };
  const [low, high] = axis.domain;
  return [
    Plot.ruleX(of("missing"), {
      x: "x",
      y1: low,
      y2: low + FOOT_SHARE * (high - low),
      stroke: QUIET,
      strokeWidth: 1.5,
    }),
    Plot.dot(of("set"), { ...place, r: 6, stroke: INK, strokeWidth: 1.25 }),
    Plot.dot(of("suspect"), {
      ...place,
      r: SYMBOL_RADIUS,
      symbol: "triangle",
      fill: PAPER,
      stroke: INK,
      strokeWidth: 1.25,
    }),
    Plot.dot(of("bad"), { ...place, r: SYMBOL_RADIUS, symbol: "times", stroke: FAULT, strokeWidth: 2 }),
  ];
}

/** Of those that share a few px only the lowest and the highest. */
function apart(marks: readonly FlagMark[], frame: TimeFrame): FlagMark[] {
  const [from, to] = frame.domain;
  const columns = new Map<number, FlagMark[]>();
  for (const mark of marks) {
    if (mark.seconds < from || mark.seconds > to) continue;
    const column = Math.floor(timePosition(mark.seconds, frame) / APART);
    const [low = mark, high = mark] = columns.get(column) ?? [];
    columns.set(column, [mark.value < low.value ? mark : low, mark.value > high.value ? mark : high]);
  }
  return [...columns.values()].flatMap(([low, high]) => (low === high ? [low] : [low, high]));
}
