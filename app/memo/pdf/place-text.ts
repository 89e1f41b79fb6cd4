/** Headings, paragraphs, lists, references and the caution as strips. */
import type { Block, ReferenceItem, Run } from "../document";
import type { Strip } from "./paginate";
import { BODY, type Column, HAIRLINE, HEADING, LEAD, SMALL, TITLE } from "./scale";
import type { Item, StructNode, StructType } from "./sheet";
import { type Line, type TextStyle, type TypesetText, typeset } from "./typeset";

type HeadingBlock = Extract<Block, { kind: "heading" }>;
type ParagraphBlock = Extract<Block, { kind: "paragraph" }>;

export const PARAGRAPH_STYLES: Record<ParagraphBlock["style"], { text: TextStyle; before: number }> = {
  lead: { text: LEAD, before: 10 },
  body: { text: BODY, before: 7 },
  small: { text: SMALL, before: 6 },
};

export function textItem(line: Line, node: StructNode | null, x: number, baseline: number): Item {
  return { kind: "text", node, x, baseline, segments: line.segments };
}

/** One strip a line; neither the first nor the last line of a paragraph is left alone on a sheet. */
export function lineStrips(text: TypesetText, node: StructNode | null, x: number, before: number): Strip[] {
  const last = text.lines.length - 1;
  return text.lines.map((line, index) => ({
    height: text.lineHeight,
    spaceBefore: index === 0 ? before : 0,
    items: [textItem(line, node, x, text.ascent)],
    keepWithNext: index < last && (index === 0 || index === last - 1),
  }));
}

export function placeHeading(block: HeadingBlock, parent: StructNode, { faces, left, width }: Column): Strip[] {
  const style = HEADING[block.level];
  const node: StructNode = { type: block.level === 1 ? "H2" : "H3", parent };
  const strips = lineStrips(
    typeset([{ text: block.text }], style, width, faces),
    node,
    left,
    block.level === 1 ? 18 : 12,
  );
  strips[0]?.items.unshift({ kind: "bookmark", y: 0, title: block.text, level: block.level });
  return strips.map((strip) => ({ ...strip, keepWithNext: true }));
}

export function placeTitle(
  title: string,
  subtitle: string,
  parent: StructNode,
  { faces, left, width }: Column,
): Strip[] {
  return [
    ...lineStrips(typeset([{ text: title }], TITLE, width, faces), { type: "H1", parent }, left, 0),
    ...lineStrips(typeset([{ text: subtitle }], SMALL, width, faces), { type: "P", parent }, left, 3),
  ].map((strip) => ({ ...strip, keepWithNext: true }));
}

export function placeParagraph(block: ParagraphBlock, parent: StructNode, { faces, left, width }: Column): Strip[] {
  const { text, before } = PARAGRAPH_STYLES[block.style];
  return lineStrips(typeset(block.runs, text, width, faces), { type: "P", parent }, left, before);
}

/** A label to the left of text that hangs beside it. */
function hanging(
  label: string,
  runs: readonly Run[],
  style: TextStyle,
  indent: number,
  list: StructNode,
  { faces, left, width }: Column,
): Strip[] {
  const entry: StructNode = { type: "LI", parent: list };
  const mark = typeset([{ text: label }], style, indent, faces);
  const strips = lineStrips(
    typeset(runs, style, width - indent, faces),
    { type: "LBody", parent: entry },
    left + indent,
    3,
  );
  const line = mark.lines[0];
  if (line) strips[0]?.items.unshift(textItem(line, { type: "Lbl", parent: entry }, left, mark.ascent));
  return strips;
}

export function placeList(items: readonly Run[][], parent: StructNode, column: Column): Strip[] {
  const list: StructNode = { type: "L", parent };
  return items.flatMap((runs) => hanging("–", runs, BODY, 11, list, column));
}

export function placeReferences(items: readonly ReferenceItem[], parent: StructNode, column: Column): Strip[] {
  const list: StructNode = { type: "L", parent };
  return items.flatMap(({ text, link }, index) => {
    const runs: Run[] = link ? [{ text: `${text} ` }, { text: link, link, colour: "rain" }] : [{ text }];
    return hanging(`[${index + 1}]`, runs, { ...SMALL, colour: "ink" }, 20, list, column);
  });
}

/** Between two hairlines and never cut: the caution is read whole or not at all. */
export function placeCaution(text: string, parent: StructNode, { faces, left, width }: Column): Strip[] {
  const pad = 5;
  const set = typeset([{ text: "Caution. ", bold: true }, { text }], SMALL, width, faces);
  const node: StructNode = { type: "P" satisfies StructType, parent };
  const height = set.lines.length * set.lineHeight + 2 * pad;
  const rule = (y: number): Item => ({
    kind: "line",
    x1: left,
    x2: left + width,
    y1: y,
    y2: y,
    weight: HAIRLINE,
    colour: "slate",
  });
  const lines = set.lines.map((line, index) => textItem(line, node, left, pad + index * set.lineHeight + set.ascent));
  return [{ height, spaceBefore: 12, items: [rule(0), ...lines, rule(height)] }];
}
