import { unitFromText, type FileUnit } from "../file-units";
import type { ValueRole } from "../propose-columns";

/** Words that UDUNITS writes out, as their symbols. */
const WORDS: readonly [RegExp, string][] = [
  [/\bmillimet(?:er|re)s?\b/gi, "mm"],
  [/\bcentimet(?:er|re)s?\b/gi, "cm"],
  [/\bkilomet(?:er|re)s?\b/gi, "km"],
  [/\bmet(?:er|re)s?\b/gi, "m"],
  [/\bkilograms?\b/gi, "kg"],
  [/\bwatts?\b/gi, "W"],
  [/\bjoules?\b/gi, "J"],
  [/\bseconds?\b|\bsec\b/gi, "s"],
  [/\bminutes?\b/gi, "min"],
  [/\bhours?\b|\bhr\b/gi, "h"],
  [/\bdays?\b/gi, "d"],
];

/** The unit of a variable of this role; null where it states none that is known. Source of the spellings: UDUNITS-2. */
export function cfUnit(written: string, role: ValueRole): FileUnit | null {
  const symbols = WORDS.reduce((text, [word, symbol]) => text.replace(word, symbol), written);
  const joule = symbols.replace(/^\s*W[ .*]?s[ .*]+(?=m)/, "J ");
  return unitFromText(written, role) ?? unitFromText(joule, role);
}
