import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { type Coverage, FACE_FILES, splitByFace } from "./faces";
import type { Typefaces } from "./typeset";

/** Bytes of each face's font file, by the names in `FACE_FILES`. */
export type FontBytes = ReadonlyMap<string, Buffer>;

/** The part of a loaded font that pdfkit keeps to itself: its types do not say what a font covers. */
interface LoadedFont {
  font: { hasGlyphForCodePoint(codePoint: number): boolean };
}

let shipped: FontBytes | undefined;

/** The fonts that ship with the application, read once. The files lie beside the bundle in `node_modules`. */
export function shippedFonts(): FontBytes {
  const { resolve } = createRequire(import.meta.url);
  shipped ??= new Map([...FACE_FILES].map(([face, path]) => [face, readFileSync(resolve(path))]));
  return shipped;
}

export interface FontSet extends Typefaces {
  covers: Coverage;
}

/** Registers the faces with a document; those that draw nothing are not embedded. */
export function fontSet(pdf: PDFKit.PDFDocument, fonts: FontBytes): FontSet {
  for (const [face, bytes] of fonts) pdf.registerFont(face, bytes);
  const loaded = new Map<string, LoadedFont["font"]>();
  const covered = new Map<string, boolean>();
  const widths = new Map<string, number>();

  const load = (face: string) => {
    const known = loaded.get(face);
    if (known) return known;
    pdf.font(face);
    const { font } = (pdf as unknown as { _font: LoadedFont })._font;
    loaded.set(face, font);
    return font;
  };
  const covers: Coverage = (face, codePoint) => {
    const key = `${face} ${codePoint}`;
    const known = covered.get(key);
    if (known !== undefined) return known;
    const answer = load(face).hasGlyphForCodePoint(codePoint);
    covered.set(key, answer);
    return answer;
  };
  return {
    covers,
    split: (text, style) => splitByFace(text, style, covers),
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
