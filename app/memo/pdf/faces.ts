/**
 * Which font file draws which character. A family comes as one small file a script, so a line of text is cut into
 * stretches that one file can draw.
 */

export interface FaceStyle {
  bold: boolean;
  italic: boolean;
}

/** Says whether a face holds a character; faces are named by `faceName`. */
export type Coverage = (face: string, codePoint: number) => boolean;

/** Files in the order in which they are asked for a character. */
const SCRIPTS = ["latin", "latin-ext", "greek", "cyrillic", "vietnamese", "cyrillic-ext"] as const;
type Script = (typeof SCRIPTS)[number];

/** Operators, arrows and roots, which the text family has in no style. */
export const SIGNS_FACE = "signs";

/** U+FFFD, which the latin file draws. */
const REPLACEMENT = "\uFFFD";

export function faceName(script: Script, { bold, italic }: FaceStyle): string {
  return `${script}-${bold ? "700" : "400"}-${italic ? "italic" : "normal"}`;
}

/** Module path of each face's file. */
export const FACE_FILES: ReadonlyMap<string, string> = new Map([
  ...SCRIPTS.flatMap((script) =>
    [false, true].flatMap((bold) =>
      [false, true].map((italic): [string, string] => {
        const face = faceName(script, { bold, italic });
        return [face, `@fontsource/roboto-condensed/files/roboto-condensed-${face}.woff`];
      }),
    ),
  ),
  [SIGNS_FACE, "@fontsource/noto-sans-math/files/noto-sans-math-latin-400-normal.woff"],
]);

export interface Stretch {
  face: string;
  text: string;
}

/**
 * Cuts text into stretches of one face each. White space that no face draws becomes a plain space, a hyphen that no
 * text face draws a plain hyphen; any other character without a face becomes U+FFFD, never an empty box.
 */
export function splitByFace(text: string, style: FaceStyle, covers: Coverage): Stretch[] {
  const stretches: Stretch[] = [];
  for (const character of text.normalize("NFC")) {
    const found = drawable(character, style, covers);
    if (found === null) continue;
    const last = stretches.at(-1);
    if (last && last.face === found.face) last.text += found.text;
    else stretches.push(found);
  }
  return stretches;
}

/** Characters of a text that no face draws, each once: what a person should be told before issuing. */
export function undrawable(text: string, covers: Coverage): string[] {
  const style = { bold: false, italic: false };
  return [...new Set(text.normalize("NFC"))].filter(
    (character) => character !== REPLACEMENT && drawable(character, style, covers)?.text === REPLACEMENT,
  );
}

function drawable(character: string, style: FaceStyle, covers: Coverage): Stretch | null {
  const codePoint = character.codePointAt(0)!;
  // A page has no use for control characters, and a zero-width one would print as a box.
  if (/[\p{Cc}\p{Cf}]/u.test(character)) return null;
  for (const script of SCRIPTS) {
    const face = faceName(script, style);
    if (covers(face, codePoint)) return { face, text: character };
  }
  const plain = faceName("latin", style);
  if (/\s/u.test(character)) return { face: plain, text: " " };
  if (character === "\u2010" || character === "\u2011") return { face: plain, text: "-" };
  if (covers(SIGNS_FACE, codePoint)) return { face: SIGNS_FACE, text: character };
  return { face: plain, text: REPLACEMENT };
}
