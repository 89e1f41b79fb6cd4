const POINTS = [
  "N",
  "NNE",
  "NE",
  "ENE",
  "E",
  "ESE",
  "SE",
  "SSE",
  "S",
  "SSW",
  "SW",
  "WSW",
  "W",
  "WNW",
  "NW",
  "NNW",
] as const;

/** Words for a wind without one direction. */
const VARIABLE = new Set(["VRB", "VAR", "VARIABLE", "CALM", "CLM", "C", "CALMO", "CALMA"]);

/** Whether a tidied cell says that the wind had no one direction (`VRB`, `calm`). */
export function isVariable(text: string): boolean {
  return VARIABLE.has(text.toUpperCase());
}

/**
 * How `O` is to be read in a column of compass words: west (Oeste, Ouest, Ovest) where E stands for east, east (Ost)
 * where W stands for west; null where the column does not tell.
 */
export function meaningOfO(words: Iterable<string>): "W" | "E" | null {
  let hasE = false;
  let hasW = false;
  for (const word of words) {
    const upper = word.toUpperCase();
    if (!/^[NSEWO]{1,3}$/.test(upper)) continue;
    hasE ||= upper.includes("E");
    hasW ||= upper.includes("W");
  }
  if (hasW === hasE) return null;
  return hasE ? "W" : "E";
}

/**
 * Degrees of a 16-point compass word.
 * @returns null where the text is no compass word
 */
export function compassDegrees(text: string, o: "W" | "E" | null): number | null {
  const upper = text.toUpperCase();
  if (!/^[NSEWO]{1,3}$/.test(upper)) return null;
  if (upper.includes("O") && o === null) return null;
  const index = (POINTS as readonly string[]).indexOf(upper.replaceAll("O", o ?? "O"));
  return index < 0 ? null : index * 22.5;
}
