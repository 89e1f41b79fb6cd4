/** Puts what was drawn onto one sheet: a single `<svg>` that needs nothing from the page but its colour tokens. */
import { INK, markColour } from "./colours";
import { escapeXml, FONT_FAMILY, FONT_SIZE, roundGeometry } from "./plain-markup";
import { textWidth } from "./text-size";
import type { ColourToken } from "~/units/quantities";

/** Without a width of its own: the page gives it one by CSS, svg-to-pdfkit by its options. */
export function svgSheet(width: number, height: number, markup: string): string {
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${Math.ceil(height)}" fill="${INK}" ` +
    `font-family="${FONT_FAMILY}" font-size="${FONT_SIZE}" text-anchor="middle">${markup}</svg>`
  );
}

export interface HeadingKey {
  label: string;
  dash: string;
}

/** px above the baseline that a heading takes, and below it. */
export const HEADING_HEIGHT = 18;

/**
 * Heading of an axis at the left edge: an arrow in the direction in which values grow (drawn, since the typeface has
 * none), then what is shown with its unit, then a key of the lines where there are several.
 */
export function axisHeading(
  text: string,
  top: number,
  options: { grows?: "up" | "down"; keys?: HeadingKey[]; colour?: ColourToken } = {},
): string {
  const baseline = top + 12;
  const arrow =
    options.grows === "down" ? `M4,${baseline - 9}v9m-2.5,-3l2.5,3l2.5,-3` : `M4,${baseline}v-9m-2.5,3l2.5,-3l2.5,3`;
  let x = 11;
  let markup =
    `<path d="${arrow}" fill="none" stroke="${INK}" stroke-width="0.9"/>` +
    `<text x="${x}" y="${baseline}" text-anchor="start">${escapeXml(text)}</text>`;
  x += textWidth(text) + 14;
  for (const key of options.keys ?? []) {
    const colour = markColour(options.colour ?? "ink");
    const dash = key.dash === "" ? "" : ` stroke-dasharray="${key.dash}"`;
    markup +=
      `<path d="${roundGeometry(`M${x},${baseline - 4}h20`)}" fill="none" stroke="${colour}" stroke-width="1.5"${dash}/>` +
      `<text x="${roundGeometry(String(x + 25))}" y="${baseline}" text-anchor="start">${escapeXml(key.label)}</text>`;
    x += 25 + textWidth(key.label) + 12;
  }
  return markup;
}

/** Heading of the axis across, at the right edge beneath its ticks, with an arrow to the right. */
export function acrossHeading(text: string, right: number, baseline: number): string {
  const tip = right - 1;
  return (
    `<text x="${right - 14}" y="${baseline}" text-anchor="end">${escapeXml(text)}</text>` +
    `<path d="M${tip - 9},${baseline - 4}h9m-3,-2.5l3,2.5l-3,2.5" fill="none" stroke="${INK}" stroke-width="0.9"/>`
  );
}
