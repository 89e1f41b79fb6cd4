import { FONT_SIZE } from "./plain-markup";

/**
 * Width of a text in px, a little generous: the figures are drawn where no font can be measured.
 * Advance widths of Roboto Condensed Regular in em, read from the font file.
 */
export function textWidth(text: string, size = FONT_SIZE): number {
  let em = 0;
  for (const letter of text)
    em += /[A-Zmw%−+]/.test(letter) ? 0.62 : /[ ijl.,:'|()tfr\u00a0]/.test(letter) ? 0.28 : 0.49;
  return em * size;
}
