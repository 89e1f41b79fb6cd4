/** An equation on a line of its own with its number, and under it what each symbol means. */
import type { Block, Run } from "../document";
import type { Strip } from "./paginate";
import { lineStrips, textItem } from "./place-text";
import { BODY, type Column, SMALL } from "./scale";
import type { Item, StructNode } from "./sheet";
import { type TypesetText, typeset } from "./typeset";

type EquationBlock = Extract<Block, { kind: "equation" }>;

const INDENT = 18;
const NUMBER_WIDTH = 30;
const SYMBOL_WIDTH = 46;
const UNIT_WIDTH = 56;

export function placeEquation(block: EquationBlock, parent: StructNode, column: Column): Strip[] {
  const { faces, left, width } = column;
  const named = lineStrips(
    typeset([{ text: block.name, colour: "ink" }], SMALL, width, faces),
    { type: "P", parent },
    left,
    9,
  );
  const set = typeset(block.runs, { ...BODY, size: 11 }, width - INDENT - NUMBER_WIDTH, faces);
  const lines = lineStrips(set, { type: "Formula", parent, alt: spoken(block) }, left + INDENT, 3);
  const label = typeset([{ text: `(${block.number})` }], SMALL, NUMBER_WIDTH, faces);
  const labelLine = label.lines[0];
  if (labelLine)
    lines[0]?.items.push(textItem(labelLine, { type: "P", parent }, left + width - labelLine.width, set.ascent));
  const source = block.source
    ? lineStrips(
        typeset([{ text: block.source }], SMALL, width - INDENT, faces),
        { type: "P", parent },
        left + INDENT,
        2,
      )
    : [];
  // An equation is read with its symbols and its source, so they share a sheet.
  const all = [...named, ...lines, ...symbolStrips(block, parent, column), ...source];
  return all.map((strip, index) => ({ ...strip, keepWithNext: index < all.length - 1 }));
}

function spoken({ name, runs }: EquationBlock): string {
  return `${name}: ${runs.map((run) => run.text).join("")}`;
}

function symbolStrips({ symbols }: EquationBlock, parent: StructNode, { faces, left, width }: Column): Strip[] {
  if (symbols.length === 0) return [];
  const table: StructNode = { type: "Table", parent };
  const meaningWidth = width - INDENT - SYMBOL_WIDTH - UNIT_WIDTH;
  return symbols.map(({ symbol, meaning, unit }, index) => {
    const row: StructNode = { type: "TR", parent: table };
    const set = (runs: readonly Run[], room: number) => typeset(runs, SMALL, room, faces);
    const cells: [TypesetText, StructNode, number][] = [
      [set(symbol, SYMBOL_WIDTH - 6), { type: "TH", parent: row, scope: "Row" }, left + INDENT],
      [set([{ text: unit }], UNIT_WIDTH - 6), { type: "TD", parent: row }, left + INDENT + SYMBOL_WIDTH],
      [
        set([{ text: meaning }], meaningWidth - 8),
        { type: "TD", parent: row },
        left + INDENT + SYMBOL_WIDTH + UNIT_WIDTH,
      ],
    ];
    const items = cells.flatMap(([cell, node, x]): Item[] =>
      cell.lines.length === 0
        ? [{ kind: "hollow", node }]
        : cell.lines.map((line, at) => textItem(line, node, x, at * cell.lineHeight + cell.ascent)),
    );
    const height = Math.max(...cells.map(([cell]) => Math.max(1, cell.lines.length) * cell.lineHeight));
    return { height, spaceBefore: index === 0 ? 3 : 0, items };
  });
}
