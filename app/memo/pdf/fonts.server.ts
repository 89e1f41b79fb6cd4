import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { inflateSync } from "node:zlib";
import { type Coverage, FACE_FILES, splitByFace, type Stretch } from "./faces";
import { codePointsOf, unpackWoff } from "./sfnt";
import type { Typefaces } from "./typeset";

export interface Face {
  /** The unpacked font: pdfkit would unpack it again for every memo. */
  font: Buffer;
  codePoints: ReadonlySet<number>;
}

/** By the names in `FACE_FILES`. */
export type Fonts = ReadonlyMap<string, Face>;

let shipped: Fonts | undefined;

/** The fonts that ship with the application, read once. The files lie beside the bundle in `node_modules`. */
export function shippedFonts(): Fonts {
  const { resolve } = createRequire(import.meta.url);
  shipped ??= new Map(
    [...FACE_FILES].map(([face, path]) => {
      const font = Buffer.from(unpackWoff(readFileSync(resolve(path)), inflateSync));
      return [face, { font, codePoints: codePointsOf(font) }];
    }),
  );
  return shipped;
}

export interface FontSet extends Typefaces {
  covers: Coverage;
}

/** Which characters the shipped fonts draw. */
export const shippedCoverage: Coverage = (face, codePoint) =>
  shippedFonts().get(face)?.codePoints.has(codePoint) ?? false;

/** Registers the faces with a document; those that draw nothing are not embedded. */
export function fontSet(pdf: PDFKit.PDFDocument, fonts: Fonts): FontSet {
  for (const [face, { font }] of fonts) pdf.registerFont(face, font);
  const covers: Coverage = (face, codePoint) => fonts.get(face)?.codePoints.has(codePoint) ?? false;
  const widths = new Map<string, number>();
  const splits = new Map<string, Stretch[]>();
  return {
    covers,
    split(text, style) {
      const key = `${style.bold} ${style.italic} ${text}`;
      let stretches = splits.get(key);
      if (!stretches) {
        stretches = splitByFace(text, style, covers);
        splits.set(key, stretches);
      }
      return stretches;
    },
    width(text, face, size) {
      const key = `${face} ${text}`;
      // Widths scale with the size, so one is enough.
      let perPoint = widths.get(key);
      if (perPoint === undefined) {
        perPoint = pdf.font(face).fontSize(100).widthOfString(text) / 100;
        widths.set(key, perPoint);
      }
      return perPoint * size;
    },
  };
}
