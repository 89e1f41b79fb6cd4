import type { MemoDocument } from "./document";
import { drawnTexts } from "./drawn-texts";
import { undrawable, type Coverage } from "./pdf/faces";

/** More characters of one place than these are only counted. */
const MOST_NAMED = 6;

/** What to tell an author whose memo holds characters that its fonts do not draw, and where; null where all are drawn. */
export function undrawableWords(memo: MemoDocument, covers: Coverage): string | null {
  const places = new Map<string, Set<string>>();
  for (const { where, text } of drawnTexts(memo)) {
    const found = undrawable(text, covers);
    if (found.length > 0) places.set(where, new Set([...(places.get(where) ?? []), ...found]));
  }
  if (places.size === 0) return null;
  const named = [...places].map(([where, characters]) => `${listed([...characters])} in ${where}`);
  return `The memo's fonts cannot draw ${named.join("; ")}. Write this in other letters: the PDF would show a replacement sign.`;
}

function listed(characters: string[]): string {
  const named = characters.slice(0, MOST_NAMED).map((character) => `“${character}” (${codeOf(character)})`);
  const more = characters.length - named.length;
  return more > 0 ? `${named.join(", ")} and ${more} more` : named.join(", ");
}

function codeOf(character: string): string {
  return `U+${(character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, "0")}`;
}
