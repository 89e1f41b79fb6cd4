/** The table that answers the question: one row a headline figure, with its range mark. */
import type { SmallMark } from "~/figures/small-marks";
import type { Block, HeadlineRow } from "../document";
import type { Strip } from "./paginate";
import { textItem } from "./place-text";
import { BODY, type Column, HAIRLINE, HEAVY_RULE, LEAD, SMALL } from "./scale";
import type { Item, StructNode } from "./sheet";
import { type TypesetText, typeset } from "./typeset";

type Headlines = Extract<Block, { kind: "headlines" }>;

/** Shares of the width: label, value, mark, remark. */
const SHARES = [0.225, 0.235, 0.2, 0.34];
const GAP = 12;
const PAD = 6;

export function placeHeadlines(
  { rows, caption }: Headlines,
  parent: StructNode,
  { faces, left, width }: Column,
): Strip[] {
  const table: StructNode = { type: "Table", parent, alt: caption };
  const edges = SHARES.map((_, index) => left + width * SHARES.slice(0, index).reduce((all, share) => all + share, 0));
  const widths = SHARES.map((share) => width * share - GAP);
  return rows.map((row, index) => {
    const node: StructNode = { type: "TR", parent: table };
    const label = typeset([{ text: row.label }], BODY, widths[0]!, faces);
    const value = typeset(
      [{ text: row.value, bold: true }, { text: row.unit ? ` ${row.unit}` : "" }],
      { ...LEAD, size: 11.5 },
      widths[1]!,
      faces,
    );
    const remark = typeset([{ text: remarkOf(row) }], { ...SMALL, size: 8 }, widths[3]!, faces);
    const height = Math.max(28, ...[label, value, remark].map((cell) => cell.lines.length * cell.lineHeight + 2 * PAD));
    const items: Item[] = [
      ...centred(label, { type: "TH", parent: node, scope: "Row" }, edges[0]!, height),
      ...centred(value, { type: "TD", parent: node }, edges[1]!, height),
      ...(row.mark ? [drawn(row.mark, edges[2]!, widths[2]!, height / 2)] : []),
      ...centred(remark, { type: "TD", parent: node }, edges[3]!, height),
      { kind: "line", x1: left, x2: left + width, y1: height, y2: height, weight: HAIRLINE, colour: "hairline" },
    ];
    if (index === 0)
      items.unshift({ kind: "line", x1: left, x2: left + width, y1: 0, y2: 0, weight: HEAVY_RULE, colour: "ink" });
    return { height, spaceBefore: index === 0 ? 12 : 0, items, keepWithNext: index < rows.length - 1 };
  });
}

function remarkOf({ band, remark }: HeadlineRow): string {
  return [band, remark].filter((part) => part !== "").join("\n");
}

function centred(cell: TypesetText, node: StructNode, x: number, height: number): Item[] {
  if (cell.lines.length === 0) return [{ kind: "hollow", node }];
  const top = (height - cell.lines.length * cell.lineHeight) / 2;
  return cell.lines.map((line, index) => textItem(line, node, x, top + index * cell.lineHeight + cell.ascent));
}

/** The words beside a mark say what it shows, so a screen reader passes over it. */
function drawn({ svg, width, height }: SmallMark, x: number, room: number, middle: number): Item {
  const scale = room / width;
  return { kind: "svg", node: null, x, y: middle - (height * scale) / 2, width: room, height: height * scale, svg };
}
