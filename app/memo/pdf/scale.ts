/** The few sizes and distances of a memo's page, pt. */
import type { TextStyle, Typefaces } from "./typeset";

export const TITLE: TextStyle = { size: 19, bold: true, leading: 1.2 };
export const LEAD: TextStyle = { size: 11.5, leading: 1.42 };
export const HEADING: Record<1 | 2, TextStyle> = {
  1: { size: 12.5, bold: true, leading: 1.3 },
  2: { size: 10, bold: true, leading: 1.3 },
};
export const BODY: TextStyle = { size: 10, leading: 1.42 };
export const SMALL: TextStyle = { size: 8.5, colour: "slate", leading: 1.36 };
export const TABLE_TEXT: TextStyle = { size: 8.5, leading: 1.32 };
export const FURNITURE: TextStyle = { size: 7.5, leading: 1.25 };
export const FINE_PRINT: TextStyle = { size: 6.5, colour: "slate", leading: 1.3 };

export const HEAVY_RULE = 1.4;
export const INK_RULE = 0.7;
export const HAIRLINE = 0.5;

/** What every block is placed with. */
export interface Column {
  faces: Typefaces;
  left: number;
  width: number;
}
