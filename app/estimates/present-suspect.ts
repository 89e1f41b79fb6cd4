/** What suspect values change, in rows that can be read. */
import { FIGURE_IDS, headlineFigure, type FigureContext } from "./headline-figures";
import type { SuspectComparison, SuspectVariant } from "./with-and-without-suspect.server";
import { formatQuantity } from "~/units/format-quantity";

export interface SuspectView {
  suspect: number;
  /** Why one of the two cannot be run, a sentence each. */
  problems: string[];
  /** Empty where one of the two cannot be run. */
  rows: { label: string; kept: string; leftOut: string; difference: string }[];
}

export function presentSuspect({ suspect, kept, leftOut }: SuspectComparison, context: FigureContext): SuspectView {
  const problems = [...problemsOf(kept, "With"), ...problemsOf(leftOut, "Without")];
  if (!("headline" in kept) || !("headline" in leftOut)) return { suspect, problems, rows: [] };
  return {
    suspect,
    problems,
    rows: FIGURE_IDS.flatMap((id) => {
      const [one, other] = [kept, leftOut].map(({ headline }) => headlineFigure(id, headline, context));
      if (one.si === null || other.si === null) return [];
      const told = one.quantity === "salinity" ? "salinityChange" : one.quantity;
      const difference = formatQuantity(other.si - one.si, told, context.units, { sign: true });
      return [{ label: one.label, kept: one.value.text, leftOut: other.value.text, difference: difference.text }];
    }),
  };
}

function problemsOf(variant: SuspectVariant, word: string): string[] {
  if ("headline" in variant) return [];
  return variant.problems.map(({ message }) => `${word} suspect values no estimate can be made: ${message}`);
}
