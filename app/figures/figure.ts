/** A figure is made once and used by the page and the PDF: one SVG, one caption, one table of what it shows. */

export interface FigureColumn {
  name: string;
  /** Empty for text and times. */
  unit: string;
  /** To read it by on a page, one more than the methods support; files carry the numbers unrounded. */
  decimals?: number;
}

export interface FigureTable {
  columns: FigureColumn[];
  /** ISO times as text; numbers unrounded; null where missing. */
  rows: (string | number | null)[][];
}

export interface Figure {
  /** Short and stable: `drift-hodograph`. */
  id: string;
  title: string;
  /** Says what is shown, with units and time zone. */
  caption: string;
  /** What a reader who cannot see it needs to know: ranges, peaks, directions. */
  alt: string;
  width: number;
  height: number;
  /** Markup of one `<svg>`; colours are the tokens of `app.css` as `var(--…)`. */
  svg: string;
  table: FigureTable;
}
