/** Every text that a memo's sheets draw, with the place in which its author would look for it. */
import { textOf, type Block, type MemoDocument } from "./document";
import { raise } from "./pdf/raised";
import { textOfSvg } from "./pdf/svg-text";

export interface DrawnText {
  /** As `the title` or `section “Question”`. */
  where: string;
  text: string;
}

export function drawnTexts(memo: MemoDocument): DrawnText[] {
  const texts: DrawnText[] = [
    { where: "the title", text: raised(memo.title) },
    { where: "the line under the title", text: raised(memo.subtitle) },
    { where: "the notice", text: raised(memo.notice) },
    { where: "the organisation's name", text: raised(memo.organisation) },
    { where: "the title block", text: raised(Object.values(memo.titleBlock).join(" ")) },
    { where: "the caution", text: raised(memo.caution) },
  ];
  let section: string | null = null;
  for (const block of memo.blocks) {
    if (block.kind === "heading" && block.level === 1) section = block.text;
    const where = placeOf(block, section);
    texts.push({ where, text: raised(textsIn(block).join(" ")) });
    if (block.kind === "figure") texts.push({ where, text: textOfSvg(block.figure.svg) });
  }
  return texts;
}

/** Set text has its superscripts and subscripts raised and lowered; a figure's text is drawn as it is. */
function raised(text: string): string {
  return textOf(raise([{ text }]));
}

function placeOf(block: Block, section: string | null): string {
  if (block.kind === "figure") return `figure ${block.number}`;
  if (section !== null) return `section “${section}”`;
  return block.kind === "headlines" ? "the headline figures" : "the bottom line";
}

function textsIn(block: Block): string[] {
  switch (block.kind) {
    case "heading":
    case "caution":
      return [block.text];
    case "paragraph":
      return [textOf(block.runs)];
    case "list":
      return block.items.map(textOf);
    case "headlines":
      return [
        block.caption,
        ...block.rows.flatMap(({ label, value, unit, band, remark }) => [label, value, unit, band, remark]),
      ];
    case "figure":
      return [block.figure.caption, block.source];
    case "table":
      return [
        block.caption,
        ...block.columns.flatMap(({ label, unit }) => [label, unit]),
        ...block.rows.flatMap((cells) => cells.map(textOf)),
      ];
    case "facts":
      return block.rows.flatMap(({ label, value }) => [label, textOf(value)]);
    case "fitNotes":
      return block.notes.flatMap(({ message, source }) => [message, source]);
    case "equation":
      return [
        block.name,
        textOf(block.runs),
        block.source,
        ...block.symbols.flatMap(({ symbol, meaning, unit }) => [textOf(symbol), meaning, unit]),
      ];
    case "references":
      return block.items.map(({ text }) => text);
    case "pageBreak":
      return [];
  }
}
