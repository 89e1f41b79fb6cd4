/** Every block of a memo as strips, in order. */
import type { Block, MemoDocument } from "../document";
import type { Strip } from "./paginate";
import { placeEquation } from "./place-equation";
import { placeFacts } from "./place-facts";
import { placeFigure } from "./place-figure";
import { placeFitNotes } from "./place-fit-notes";
import { placeHeadlines } from "./place-headlines";
import { placeTable } from "./place-table";
import { placeCaution, placeHeading, placeList, placeParagraph, placeReferences, placeTitle } from "./place-text";
import type { Column } from "./scale";
import type { StructNode } from "./sheet";

export function placeMemo(memo: MemoDocument, column: Column): Strip[] {
  const root: StructNode = { type: "Document", parent: null };
  const strips = placeTitle(memo.title, memo.subtitle, root, column);
  let breakBefore = false;
  for (const block of memo.blocks) {
    if (block.kind === "pageBreak") {
      breakBefore = true;
      continue;
    }
    const [first, ...rest] = placeBlock(block, root, column);
    if (!first) continue;
    strips.push(breakBefore ? { ...first, breakBefore } : first, ...rest);
    breakBefore = false;
  }
  return strips;
}

function placeBlock(block: Exclude<Block, { kind: "pageBreak" }>, root: StructNode, column: Column): Strip[] {
  switch (block.kind) {
    case "heading":
      return placeHeading(block, root, column);
    case "paragraph":
      return placeParagraph(block, root, column);
    case "list":
      return placeList(block.items, root, column);
    case "headlines":
      return placeHeadlines(block, root, column);
    case "figure":
      return placeFigure(block, root, column);
    case "table":
      return placeTable(block, root, column);
    case "facts":
      return placeFacts(block.rows, root, column);
    case "fitNotes":
      return placeFitNotes(block, root, column);
    case "equation":
      return placeEquation(block, root, column);
    case "references":
      return placeReferences(block.items, root, column);
    case "caution":
      return placeCaution(block.text, root, column);
  }
}
