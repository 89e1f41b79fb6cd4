import type { UnitChoices } from "~/units/unit-choices";

/** What every figure needs beside its data. */
export interface FigureContext {
  /** The page's document in the browser; `serverPlotDocument()` on the server. */
  document: Document;
  /** IANA zone, or `UTC`: of the time axis, the caption and the table. */
  zone: string;
  units: UnitChoices;
  /** As `2617-07`: ends the caption, so that a figure always says which run it shows. */
  estimateCode?: string;
  /** px; one of `FIGURE_WIDTHS`, or any from 280 up. Default: `FIGURE_WIDTHS.page`. */
  width?: number;
}

/** Widths the figures are looked at in: a telephone of 360 px, a column of a page, a wide page. */
export const FIGURE_WIDTHS = { narrow: 340, page: 640, wide: 960 } as const;

export function figureWidth(context: FigureContext): number {
  return Math.max(280, context.width ?? FIGURE_WIDTHS.page);
}

/** Prefix of the ids inside an SVG: figures of several estimates and widths stand on one page without a clash. */
export function idPrefix(figureId: string, context: FigureContext): string {
  const run = (context.estimateCode ?? "").replace(/[^A-Za-z0-9]+/g, "-");
  return [figureId, run, figureWidth(context)].filter((part) => part !== "").join("-");
}

/** Ends a caption: the sentences joined, then the run. */
export function caption(sentences: (string | false | null | undefined)[], context: FigureContext): string {
  const run = context.estimateCode ? `Estimate ${context.estimateCode}.` : null;
  return [...sentences, run].filter((sentence) => typeof sentence === "string").join(" ");
}
