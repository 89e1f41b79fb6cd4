/** What lies where on a sheet, before anything is drawn. Points, y downwards from the top of the sheet. */
import type { ColourToken, PageSize } from "../document";
import type { Segment } from "./typeset";

export type StructType =
  | "Document"
  | "H1"
  | "H2"
  | "H3"
  | "P"
  | "L"
  | "LI"
  | "Lbl"
  | "LBody"
  | "Table"
  | "TR"
  | "TH"
  | "TD"
  | "Caption"
  | "Figure"
  | "Formula"
  | "Note";

/** A node of the structure tree that a screen reader walks; children are in the order in which they are drawn. */
export interface StructNode {
  type: StructType;
  /** null for the root. */
  parent: StructNode | null;
  alt?: string;
  scope?: "Row" | "Column";
}

/** `node` null: furniture of the page, which a screen reader passes over. */
export type Item =
  | { kind: "text"; node: StructNode | null; x: number; baseline: number; segments: Segment[] }
  | { kind: "svg"; node: StructNode | null; x: number; y: number; width: number; height: number; svg: string }
  | { kind: "line"; x1: number; y1: number; x2: number; y2: number; weight: number; colour: LineColour }
  /** A node without content, so that a table keeps its cells in place. */
  | { kind: "hollow"; node: StructNode }
  | { kind: "bookmark"; y: number; title: string; level: 1 | 2 };

export type LineColour = ColourToken | "hairline";

export interface Sheet {
  items: Item[];
}

export interface Geometry {
  width: number;
  height: number;
  /** Left and right edge of the text. */
  left: number;
  right: number;
  /** First and last y of the text on the first sheet and on those after it. */
  firstTop: number;
  top: number;
  bottom: number;
}

/** ISO 216 and ANSI/ASME Y14.1, at 72 points an inch. */
export const PAGE_POINTS: Record<PageSize, { width: number; height: number }> = {
  A4: { width: 595.28, height: 841.89 },
  Letter: { width: 612, height: 792 },
};

/** Moves an item down, and right. */
export function shift(item: Item, down: number, right = 0): Item {
  switch (item.kind) {
    case "text":
      return { ...item, x: item.x + right, baseline: item.baseline + down };
    case "svg":
      return { ...item, x: item.x + right, y: item.y + down };
    case "line":
      return { ...item, x1: item.x1 + right, x2: item.x2 + right, y1: item.y1 + down, y2: item.y2 + down };
    case "bookmark":
      return { ...item, y: item.y + down };
    case "hollow":
      return item;
  }
}

/** The same items as furniture: drawn, and passed over by a screen reader. */
export function asFurniture(items: readonly Item[]): Item[] {
  return items.flatMap((item): Item[] => {
    switch (item.kind) {
      case "hollow":
      case "bookmark":
        return [];
      case "text":
      case "svg":
        return [{ ...item, node: null }];
      case "line":
        return [item];
    }
  });
}
