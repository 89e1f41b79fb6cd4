/**
 * Superscript and subscript characters as raised and lowered runs: the fonts draw only ¹ ² ³, and of another weight
 * than the digits beside them.
 */
import type { Run } from "../document";

const SUPER: Record<string, string> = {
  "⁰": "0",
  "¹": "1",
  "²": "2",
  "³": "3",
  "⁴": "4",
  "⁵": "5",
  "⁶": "6",
  "⁷": "7",
  "⁸": "8",
  "⁹": "9",
  "⁺": "+",
  "⁻": "−",
  ⁿ: "n",
};

const SUB: Record<string, string> = {
  "₀": "0",
  "₁": "1",
  "₂": "2",
  "₃": "3",
  "₄": "4",
  "₅": "5",
  "₆": "6",
  "₇": "7",
  "₈": "8",
  "₉": "9",
  "₊": "+",
  "₋": "−",
  ₐ: "a",
  ₑ: "e",
  ₒ: "o",
  ₓ: "x",
  ₕ: "h",
  ₖ: "k",
  ₗ: "l",
  ₘ: "m",
  ₙ: "n",
  ₚ: "p",
  ₛ: "s",
  ₜ: "t",
  ᵢ: "i",
  ⱼ: "j",
};

/** Splits runs so that no superscript or subscript character is left in them; styles stay as they are. */
export function raise(runs: readonly Run[]): Run[] {
  return runs.flatMap((run) => (run.rise ? [run] : split(run)));
}

function split(run: Run): Run[] {
  const out: Run[] = [];
  for (const character of run.text) {
    const rise = character in SUPER ? "super" : character in SUB ? "sub" : undefined;
    const text = SUPER[character] ?? SUB[character] ?? character;
    const last = out.at(-1);
    if (last && last.rise === rise) last.text += text;
    else out.push(rise ? { ...run, text, rise } : { ...run, text });
  }
  return out;
}
