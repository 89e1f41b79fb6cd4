/** A figure and its caption, which stay together. */
import type { Block } from "../document";
import type { Strip } from "./paginate";
import { lineStrips } from "./place-text";
import { type Column, SMALL } from "./scale";
import type { StructNode } from "./sheet";
import { typeset } from "./typeset";

type FigureBlock = Extract<Block, { kind: "figure" }>;

/** pt: tall figures are made narrower rather than let a sheet hold nothing else. */
const TALLEST = 330;
/** Figures are drawn for the screen at 96 pixels an inch; one is never blown up beyond this. */
const LARGEST_SCALE = 0.85;

export function placeFigure({ number, figure, source }: FigureBlock, parent: StructNode, column: Column): Strip[] {
  const { faces, left, width } = column;
  const scale = Math.min(width / figure.width, TALLEST / figure.height, LARGEST_SCALE);
  const height = figure.height * scale;
  const node: StructNode = { type: "Figure", parent, alt: figure.alt };
  const text = [figure.caption, source].filter((part) => part !== "").join(" ");
  const caption = typeset([{ text: `Figure ${number}. `, bold: true }, { text }], SMALL, width, faces);
  const drawn: Strip = {
    height,
    spaceBefore: 12,
    items: [{ kind: "svg", node, x: left, y: 0, width: figure.width * scale, height, svg: figure.svg }],
    keepWithNext: true,
  };
  const lines = lineStrips(caption, { type: "Caption", parent }, left, 4);
  return [drawn, ...lines.map((strip, index) => ({ ...strip, keepWithNext: index < lines.length - 1 }))];
}
