import type { TitleBlock } from "./document";

/** `2617-M2 revision B.pdf`: what a client sees in their downloads. */
export function pdfName({ memoNumber, revision }: Pick<TitleBlock, "memoNumber" | "revision">): string {
  const state = revision === "" || revision === "draft" ? "draft" : `revision ${revision}`;
  return `${memoNumber} ${state}.pdf`.replace(/[/\\:*?"<>|]/g, "-");
}
