/** What every sheet carries: the organisation's name and the mark at its head, title block and caution at its foot. */
import { MARK_SIZE, MARK_STROKES, MARK_STROKE_WIDTH } from "~/figures/mark";
import type { MemoDocument } from "../document";
import { titleBlockCells } from "../title-block";
import { textItem } from "./place-text";
import { type Column, FINE_PRINT, FURNITURE, HAIRLINE, HEAVY_RULE, INK_RULE, SMALL } from "./scale";
import { type Geometry, type Item, PAGE_POINTS } from "./sheet";
import { type Line, type Typefaces, typeset } from "./typeset";

const SIDE = 48;
const HEAD_TOP = 40;
const FOOT = 30;
const CELL_PAD = 6;
const CELL_LINES = 2;
const FIRST_HEAD = 34;
const LATER_HEAD = 30;
const ABOVE_FOOT = 16;

export function columnOf(memo: MemoDocument, faces: Typefaces): Column {
  return { faces, left: SIDE, width: PAGE_POINTS[memo.pageSize].width - 2 * SIDE };
}

/** Where text may go, which depends on how tall this memo's title block and caution are. */
export function geometryOf(memo: MemoDocument, column: Column): Geometry {
  const { width, height } = PAGE_POINTS[memo.pageSize];
  return {
    width,
    height,
    left: column.left,
    right: column.left + column.width,
    firstTop: HEAD_TOP + FIRST_HEAD,
    top: HEAD_TOP + LATER_HEAD,
    bottom: footTop(memo, column) - ABOVE_FOOT,
  };
}

function cautionLines(memo: MemoDocument, { faces, width }: Column) {
  return typeset([{ text: memo.caution }], FINE_PRINT, width, faces);
}

function titleBlockHeight(): number {
  return 2 * CELL_PAD + (CELL_LINES + 1) * FURNITURE.size * FURNITURE.leading! + 2;
}

function footTop(memo: MemoDocument, column: Column): number {
  const caution = cautionLines(memo, column);
  const { height } = PAGE_POINTS[memo.pageSize];
  return height - FOOT - caution.lines.length * caution.lineHeight - 6 - titleBlockHeight();
}

/** Head and foot of sheet `number` of `count`, counted from 1. */
export function furniture(memo: MemoDocument, number: number, count: number, column: Column): Item[] {
  return [...headOf(memo, number, column), ...titleBlock(memo, number, count, column), ...footCaution(memo, column)];
}

function headOf(memo: MemoDocument, number: number, { faces, left, width }: Column): Item[] {
  const first = number === 1;
  const size = first ? 17 : 12;
  const style = first ? { size: 12.5, bold: true } : { size: 8.5, bold: true };
  const room = first && memo.notice === "" ? width - 24 : width * 0.4;
  const name = typeset([{ text: memo.organisation }], style, room, faces);
  const middle = HEAD_TOP + 8;
  const items = mark(left, middle - size / 2, size);
  const nameLine = name.lines[0];
  const baseline = middle + style.size * 0.34;
  if (nameLine) items.push(textItem(nameLine, null, left + size + 7, baseline));
  const running = [
    ...(memo.notice ? [{ text: `${memo.notice}.`, bold: true, colour: "wind" as const }] : []),
    ...(first ? [] : [{ text: `${memo.notice ? "  " : ""}${memo.titleBlock.memoNumber} · ${memo.title}` }]),
  ];
  const line = typeset(running, SMALL, width * 0.55, faces).lines[0];
  if (line) items.push(textItem(line, null, left + width - line.width, baseline));
  if (!first)
    items.push({
      kind: "line",
      x1: left,
      x2: left + width,
      y1: HEAD_TOP + 19,
      y2: HEAD_TOP + 19,
      weight: HAIRLINE,
      colour: "hairline",
    });
  return items;
}

function mark(x: number, y: number, size: number): Item[] {
  const scale = size / MARK_SIZE;
  return MARK_STROKES.map(({ x1, y1, x2, y2 }) => ({
    kind: "line",
    x1: x + x1 * scale,
    x2: x + x2 * scale,
    y1: y + y1 * scale,
    y2: y + y2 * scale,
    weight: MARK_STROKE_WIDTH * scale,
    colour: "ink",
  }));
}

function titleBlock(memo: MemoDocument, number: number, count: number, column: Column): Item[] {
  const { faces, left, width } = column;
  const top = footTop(memo, column);
  const height = titleBlockHeight();
  const bottom = top + height;
  const items: Item[] = [
    line(left, top, left + width, top, HEAVY_RULE),
    line(left, bottom, left + width, bottom, HEAVY_RULE),
    line(left, top, left, bottom, HEAVY_RULE),
    line(left + width, top, left + width, bottom, HEAVY_RULE),
  ];
  let x = left;
  titleBlockCells(memo.titleBlock, `${number} of ${count}`).forEach(({ label, value, share }, index) => {
    const room = width * share - 2 * CELL_PAD;
    if (index > 0) items.push(line(x, top, x, bottom, INK_RULE));
    const name = typeset([{ text: label, colour: "slate" }], { ...FURNITURE, size: 6.5 }, room, faces);
    const text = typeset([{ text: value }], FURNITURE, room, faces);
    const shown = text.lines.length > CELL_LINES ? shortened(text.lines, room, faces) : text.lines;
    const nameLine = name.lines[0];
    if (nameLine) items.push(textItem(nameLine, null, x + CELL_PAD, top + CELL_PAD + name.ascent));
    shown.forEach((part, at) =>
      items.push(textItem(part, null, x + CELL_PAD, top + CELL_PAD + 2 + (at + 1) * text.lineHeight + text.ascent)),
    );
    x += width * share;
  });
  return items;
}

/** As much of a value as the cell holds, and an ellipsis; the whole stands in the memo's own text. */
function shortened(lines: readonly Line[], room: number, faces: Typefaces): Line[] {
  const fitting = lines.slice(0, CELL_LINES).flatMap((part) => part.segments.map((segment) => segment.text));
  const letters = [...fitting.join("").trimEnd()];
  for (;;) {
    const set = typeset([{ text: `${letters.join("").trimEnd()}…` }], FURNITURE, room, faces);
    if (set.lines.length <= CELL_LINES || letters.length === 0) return set.lines.slice(0, CELL_LINES);
    letters.pop();
  }
}

function footCaution(memo: MemoDocument, column: Column): Item[] {
  const { lines, lineHeight, ascent } = cautionLines(memo, column);
  const top = footTop(memo, column) + titleBlockHeight() + 6;
  return lines.map((part, index) => textItem(part, null, column.left, top + index * lineHeight + ascent));
}

function line(x1: number, y1: number, x2: number, y2: number, weight: number): Item {
  return { kind: "line", x1, y1, x2, y2, weight, colour: "ink" };
}
