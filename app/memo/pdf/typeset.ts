/** Breaks runs of text into lines of a given width. Lengths are in points. */
import type { ColourToken, Run } from "../document";
import { type FaceStyle, type Stretch } from "./faces";
import { raise } from "./raised";

export interface Typefaces {
  split(text: string, style: FaceStyle): Stretch[];
  /** Advance of a text in one face, pt. */
  width(text: string, face: string, size: number): number;
}

export interface TextStyle {
  size: number;
  bold?: boolean;
  colour?: ColourToken;
  /** Line height as a multiple of the size; default 1.36. */
  leading?: number;
}

/** A stretch of a line that is drawn in one go. */
export interface Segment {
  text: string;
  face: string;
  size: number;
  colour: ColourToken;
  /** From the start of the line. */
  x: number;
  width: number;
  /** Upwards from the baseline. */
  rise: number;
  link?: string;
}

export interface Line {
  segments: Segment[];
  width: number;
}

export interface TypesetText {
  lines: Line[];
  lineHeight: number;
  /** From the top of a line to its baseline. */
  ascent: number;
}

const LEADING = 1.36;
const RISE_SIZE = 0.68;
const SUPER_RISE = 0.34;
const SUB_RISE = -0.14;
/** Roboto Condensed: ascender and descender against the size. */
const ASCENDER = 0.928;
const DESCENDER = 0.244;

type Piece = Omit<Segment, "x"> & { space: boolean; breakAfter: boolean };

/**
 * Breaks runs into lines no wider than `width`; a line feed starts a new one, several no more than one. A word that is wider than the line is
 * broken after a separator where it has one, else between letters. No runs give no lines.
 */
export function typeset(runs: readonly Run[], style: TextStyle, width: number, faces: Typefaces): TypesetText {
  const lineHeight = style.size * (style.leading ?? LEADING);
  const ascent = (lineHeight - (ASCENDER + DESCENDER) * style.size) / 2 + ASCENDER * style.size;
  const lines = paragraphsOf(runs).flatMap((paragraph) => fill(words(pieces(paragraph, style, faces)), width, faces));
  return { lines, lineHeight, ascent };
}

/** Width of runs where nothing is broken but at line feeds. */
export function naturalWidth(runs: readonly Run[], style: TextStyle, faces: Typefaces): number {
  const widths = paragraphsOf(runs).map((part) => sum(pieces(part, style, faces).map((piece) => piece.width)));
  // A hair more than the sum, so that a text fits the width it asked for.
  return Math.max(0, ...widths) + 0.01;
}

function paragraphsOf(runs: readonly Run[]): Run[][] {
  const paragraphs: Run[][] = [[]];
  for (const run of raise(runs)) {
    run.text.split("\n").forEach((text, index) => {
      if (index > 0) paragraphs.push([]);
      if (text !== "") paragraphs.at(-1)!.push({ ...run, text });
    });
  }
  return paragraphs.filter((paragraph) => paragraph.length > 0);
}

/** Words, spaces, and the parts of words that a line may end after (`south-` of `south-east`; never within a date or a number). */
const PARTS = /[ \t\u2000-\u200a\u200b]+|[^ \t\u2000-\u200b]+?(?:[-–](?=\p{L})|$|(?=[ \t\u2000-\u200b]))/gu;

function pieces(runs: readonly Run[], style: TextStyle, faces: Typefaces): Piece[] {
  return runs.flatMap((run) => {
    const raised = run.rise !== undefined;
    const size = raised ? style.size * RISE_SIZE : style.size;
    const rise = run.rise === "super" ? style.size * SUPER_RISE : run.rise === "sub" ? style.size * SUB_RISE : 0;
    const face = { bold: run.bold ?? style.bold ?? false, italic: run.italic ?? false };
    return (run.text.match(PARTS) ?? []).flatMap((part) => {
      const space = /^[ \t\u2000-\u200b]/u.test(part);
      const stretches = faces.split(space ? part.replaceAll("\t", " ") : part, face);
      return stretches.map((stretch, index): Piece => ({
        ...stretch,
        size,
        rise,
        colour: run.colour ?? style.colour ?? "ink",
        width: faces.width(stretch.text, stretch.face, size),
        ...(run.link ? { link: run.link } : {}),
        space,
        breakAfter: index === stretches.length - 1 && /\p{L}[-–]$/u.test(part),
      }));
    });
  });
}

interface Word {
  pieces: Piece[];
  width: number;
  space: boolean;
}

function words(all: readonly Piece[]): Word[] {
  const out: Word[] = [];
  let open = false;
  for (const piece of all) {
    const last = out.at(-1);
    if (last && open && last.space === piece.space) {
      last.pieces.push(piece);
      last.width += piece.width;
    } else out.push({ pieces: [piece], width: piece.width, space: piece.space });
    open = !piece.breakAfter;
  }
  return out;
}

function fill(all: readonly Word[], width: number, faces: Typefaces): Line[] {
  const lines: Line[] = [];
  let current: Piece[] = [];
  let used = 0;
  const close = () => {
    lines.push(toLine(current));
    current = [];
    used = 0;
  };
  for (const word of all) {
    if (word.space) {
      // A space that ends a line stays in it unseen, so that the text reads on without running words together.
      if (current.length > 0) {
        current.push(...word.pieces);
        used += word.width;
      }
      continue;
    }
    if (used + word.width > width && current.length > 0) close();
    if (word.width <= width) {
      current.push(...word.pieces);
      used += word.width;
      continue;
    }
    for (const part of breakWord(word, width, faces)) {
      if (current.length > 0) close();
      current.push(...part);
      used = sum(part.map((piece) => piece.width));
    }
  }
  if (current.length > 0) close();
  return lines;
}

/** Cuts a word that is wider than a line into line-sized parts. */
function breakWord(word: Word, width: number, faces: Typefaces): Piece[][] {
  const letters = word.pieces.flatMap((piece) =>
    [...piece.text].map((text) => ({ ...piece, text, width: faces.width(text, piece.face, piece.size) })),
  );
  const parts: Piece[][] = [];
  let start = 0;
  while (start < letters.length) {
    let end = start;
    let used = 0;
    while (end < letters.length && (end === start || used + letters[end]!.width <= width))
      used += letters[end++]!.width;
    if (end < letters.length) {
      for (let cut = end; cut > start + (end - start) / 2; cut--)
        if (/[-–_/.,:;@&?=]/.test(letters[cut - 1]!.text)) {
          end = cut;
          break;
        }
    }
    parts.push(letters.slice(start, end));
    start = end;
  }
  return parts;
}

function toLine(all: readonly Piece[]): Line {
  const segments: Segment[] = [];
  let x = 0;
  let width = 0;
  for (const piece of all) {
    const last = segments.at(-1);
    if (last && joins(last, piece)) {
      last.text += piece.text;
      last.width += piece.width;
    } else segments.push(segmentAt(piece, x));
    x += piece.width;
    if (!piece.space) width = x;
  }
  return { segments, width };
}

function segmentAt({ text, face, size, colour, width, rise, link }: Piece, x: number): Segment {
  return { text, face, size, colour, x, width, rise, ...(link === undefined ? {} : { link }) };
}

function joins(left: Segment, right: Omit<Segment, "x">): boolean {
  return (
    left.face === right.face &&
    left.size === right.size &&
    left.rise === right.rise &&
    left.colour === right.colour &&
    left.link === right.link
  );
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
