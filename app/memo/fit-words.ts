import type { FitSeverity } from "~/ocean/response";
import type { MemoFitNote } from "./document";

export const SEVERITY_WORDS: Record<FitSeverity, string> = {
  doNotUse: "Do not use",
  caution: "Caution",
  ok: "Holds",
};
const ORDER: FitSeverity[] = ["doNotUse", "caution", "ok"];

/** The gravest first, else in the order given. */
export function gravestFirst(notes: readonly MemoFitNote[]): MemoFitNote[] {
  return ORDER.flatMap((severity) => notes.filter((note) => note.severity === severity));
}
