/** What is known of one thing, a line each: its name to the left, hairlines between. */
import type { FactRow } from "../document";
import type { Strip } from "./paginate";
import { lineStrips, textItem } from "./place-text";
import { type Column, HAIRLINE, SMALL, TABLE_TEXT } from "./scale";
import type { StructNode } from "./sheet";
import { typeset } from "./typeset";

const LABEL_SHARE = 0.25;
const PAD = 2;

export function placeFacts(rows: readonly FactRow[], parent: StructNode, { faces, left, width }: Column): Strip[] {
  const table: StructNode = { type: "Table", parent };
  const labelWidth = width * LABEL_SHARE;
  return rows.flatMap(({ label, value }, index) => {
    const node: StructNode = { type: "TR", parent: table };
    const cell: StructNode = { type: "TD", parent: node };
    const name = typeset([{ text: label }], SMALL, labelWidth - 8, faces);
    const text = typeset(value, TABLE_TEXT, width - labelWidth, faces);
    const strips = lineStrips(text, cell, left + labelWidth, 0);
    if (strips.length === 0)
      strips.push({ height: text.lineHeight, spaceBefore: 0, items: [{ kind: "hollow", node: cell }] });
    const first = strips[0]!;
    const last = strips.at(-1)!;
    const head: StructNode = { type: "TH", parent: node, scope: "Row" };
    // A long name runs on beside the lines of its value, or below them.
    name.lines.forEach((line, at) => {
      const beside = strips[Math.min(at, strips.length - 1)]!;
      const below = Math.max(0, at - strips.length + 1) * name.lineHeight;
      beside.items.unshift(textItem(line, head, left, below + text.ascent));
      if (below > 0) last.height = Math.max(last.height, below + name.lineHeight);
    });
    first.spaceBefore = index === 0 ? 4 : PAD;
    last.height += PAD;
    last.items.push({
      kind: "line",
      x1: left,
      x2: left + width,
      y1: last.height,
      y2: last.height,
      weight: HAIRLINE,
      colour: "hairline",
    });
    return strips;
  });
}
