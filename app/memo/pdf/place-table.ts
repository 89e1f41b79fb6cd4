/** Tables as strips: the head is set again on each sheet, a row stays whole unless it is taller than half a sheet. */
import type { Run, TableColumn } from "../document";
import type { Strip } from "./paginate";
import { lineStrips, textItem } from "./place-text";
import { type Column, HAIRLINE, INK_RULE, SMALL, TABLE_TEXT } from "./scale";
import type { Item, StructNode } from "./sheet";
import { naturalWidth, type TextStyle, type TypesetText, typeset } from "./typeset";

const GAP = 10;
const PAD = 3;
const HEAD_TEXT: TextStyle = { ...TABLE_TEXT, bold: true };
const TALLEST_ROW = 260;

export interface TableData {
  caption: string;
  columns: readonly TableColumn[];
  rows: readonly (readonly (readonly Run[])[])[];
}

export function placeTable({ caption, columns, rows }: TableData, parent: StructNode, column: Column): Strip[] {
  const { faces, left, width } = column;
  if (columns.length === 0) return [];
  const table: StructNode = { type: "Table", parent };
  const widths = columnWidths(columns, rows, column);
  const edges = widths.map((_, index) => left + total(widths.slice(0, index)) + GAP * index);

  const head = headStrip(columns, widths, edges, table, column);
  const captionStrips = caption
    ? lineStrips(typeset([{ text: caption }], SMALL, width, faces), { type: "Caption", parent: table }, left, 10)
    : [];
  const body = rows.flatMap((row) => rowStrips(row, columns, widths, edges, table, column, head));
  // Neither the first nor the last row stands alone on a sheet.
  for (const index of [0, body.length - 2]) if (index >= 0 && index < body.length - 1) body[index]!.keepWithNext = true;
  const empty: Strip[] =
    rows.length > 0
      ? []
      : lineStrips(typeset([{ text: "No rows." }], SMALL, width, faces), { type: "P", parent }, left, PAD);
  return [
    ...captionStrips.map((strip) => ({ ...strip, keepWithNext: true })),
    { ...head, spaceBefore: caption ? 3 : 10, keepWithNext: true },
    ...body,
    ...empty,
  ];
}

function headRuns({ label, unit }: TableColumn): Run[] {
  return unit ? [{ text: `${label} ` }, { text: `(${unit})`, bold: false, colour: "slate" }] : [{ text: label }];
}

function headStrip(
  columns: readonly TableColumn[],
  widths: readonly number[],
  edges: readonly number[],
  table: StructNode,
  { faces, left, width }: Column,
): Strip {
  const row: StructNode = { type: "TR", parent: table };
  const cells = columns.map((entry, index) => typeset(headRuns(entry), HEAD_TEXT, widths[index]!, faces));
  const height = tallest(cells) + 2 * PAD;
  // Labels stand on the rule, as the numbers below hang from it.
  const items = cells.flatMap((cell, index) =>
    cellItems(
      cell,
      columns[index]!,
      edges[index]!,
      widths[index]!,
      height - PAD - cell.lines.length * cell.lineHeight,
      {
        type: "TH",
        parent: row,
        scope: "Column",
      },
    ),
  );
  return {
    height,
    spaceBefore: 0,
    items: [rule(left, width, 0, INK_RULE, "ink"), ...items, rule(left, width, height, INK_RULE, "ink")],
  };
}

function rowStrips(
  row: readonly (readonly Run[])[],
  columns: readonly TableColumn[],
  widths: readonly number[],
  edges: readonly number[],
  table: StructNode,
  { faces, left, width }: Column,
  head: Strip,
): Strip[] {
  const node: StructNode = { type: "TR", parent: table };
  const cells = columns.map((_, index) => typeset(row[index] ?? [], TABLE_TEXT, widths[index]!, faces));
  const nodes = columns.map((): StructNode => ({ type: "TD", parent: node }));
  const height = tallest(cells) + 2 * PAD;
  const closing = (y: number) => rule(left, width, y, HAIRLINE, "hairline");
  if (height <= TALLEST_ROW) {
    const items = cells.flatMap((cell, index) =>
      cellItems(cell, columns[index]!, edges[index]!, widths[index]!, PAD, nodes[index]!),
    );
    return [{ height, spaceBefore: 0, items: [...items, closing(height)], head }];
  }
  const lines = Math.max(...cells.map((cell) => cell.lines.length));
  return Array.from({ length: lines }, (_, line): Strip => {
    const lineHeight = cells[0]!.lineHeight + (line === lines - 1 ? PAD : 0);
    const items = cells.flatMap((cell, index) =>
      cellItems(
        { ...cell, lines: cell.lines.slice(line, line + 1) },
        columns[index]!,
        edges[index]!,
        widths[index]!,
        line === 0 ? PAD : 0,
        nodes[index]!,
      ),
    );
    return {
      height: lineHeight,
      spaceBefore: 0,
      items: line === lines - 1 ? [...items, closing(lineHeight)] : items,
      head,
    };
  });
}

function cellItems(
  cell: TypesetText,
  { align }: TableColumn,
  x: number,
  width: number,
  top: number,
  node: StructNode,
): Item[] {
  if (cell.lines.length === 0) return [{ kind: "hollow", node }];
  return cell.lines.map((line, index) =>
    textItem(line, node, align === "right" ? x + width - line.width : x, top + index * cell.lineHeight + cell.ascent),
  );
}

/** Natural widths where they fit; else narrow columns keep theirs and the wide ones share what is left by what they want. */
function columnWidths(
  columns: readonly TableColumn[],
  rows: readonly (readonly (readonly Run[])[])[],
  { faces, width }: Column,
): number[] {
  const room = width - GAP * (columns.length - 1);
  const natural = columns.map((entry, index) =>
    rows.reduce(
      (most, row) => Math.max(most, naturalWidth(row[index] ?? [], TABLE_TEXT, faces)),
      naturalWidth(headRuns(entry), HEAD_TEXT, faces),
    ),
  );
  if (total(natural) <= room) {
    // Left over room goes to columns of text, so that figures stay close to what they belong to.
    const texts = columns.filter((entry) => entry.align === "left").length;
    const spare = (room - total(natural)) / (texts || columns.length);
    return natural.map((want, index) => want + (columns[index]!.align === "left" || texts === 0 ? spare : 0));
  }
  return shareRoom(natural, room);
}

/** Widths that fill `room`: no column gets more than it wants, none less than an even share that it wants. */
function shareRoom(natural: readonly number[], room: number): number[] {
  let open = natural.map((_, index) => index);
  let left = room;
  const widths = natural.map(() => 0);
  for (;;) {
    const content = open.filter((index) => natural[index]! <= left / open.length);
    if (content.length === 0) break;
    for (const index of content) {
      widths[index] = natural[index]!;
      left -= natural[index]!;
    }
    open = open.filter((index) => !content.includes(index));
  }
  // The square root keeps one very long cell from pressing its neighbours flat.
  const weights = total(open.map((index) => Math.sqrt(natural[index]!)));
  for (const index of open) widths[index] = (Math.sqrt(natural[index]!) / weights) * left;
  return widths;
}

function rule(left: number, width: number, y: number, weight: number, colour: "ink" | "hairline"): Item {
  return { kind: "line", x1: left, x2: left + width, y1: y, y2: y, weight, colour };
}

function tallest(cells: readonly TypesetText[]): number {
  return Math.max(0, ...cells.map((cell) => Math.max(1, cell.lines.length) * cell.lineHeight));
}

function total(values: readonly number[]): number {
  return values.reduce((all, value) => all + value, 0);
}
