import type { ColourToken } from "~/units/quantities";

/** The tokens that figures use, as on white paper: the light values of `app.css`, with the ground turned white. */
export const PRINT_COLOURS = {
  paper: "#ffffff",
  ink: "#17212b",
  slate: "#2b3b49",
  quiet: "#55636f",
  mist: "#e4e9e8",
  hairline: "#c9cfce",
  wind: "#b5482a",
  rain: "#2567a8",
  heat: "#8f5f00",
  "heat-mark": "#b97800",
  density: "#67489a",
  drift: "#17212b",
  shore: "#5b6b3a",
  land: "#e5dec6",
  error: "#a3271b",
} as const;

export type FigureToken = keyof typeof PRINT_COLOURS;

export const INK = "var(--ink)";
export const PAPER = "var(--paper)";
export const HAIRLINE = "var(--hairline)";
export const MIST = "var(--mist)";
export const QUIET = "var(--quiet)";
/** What is wrong. */
export const FAULT = "var(--error)";

/** Colour of lines and marks: heat is lighter than its text, which needs the greater contrast. */
export function markColour(token: ColourToken): string {
  return token === "heat" ? "var(--heat-mark)" : `var(--${token})`;
}

/** Colour of text. */
export function textColour(token: ColourToken): string {
  return `var(--${token})`;
}

/**
 * The same figure for the PDF, where there are no custom properties: every `var(--token)` becomes its print value.
 * @throws Error for a token that has no print value, so that nothing prints black by mistake
 */
export function printColours(svg: string): string {
  return svg.replace(/var\(--([a-z-]+)\)/g, (_, token: string) => {
    if (!(token in PRINT_COLOURS)) throw new Error(`The figure uses --${token}, which has no print colour.`);
    return PRINT_COLOURS[token as FigureToken];
  });
}
