/** Where the method does and does not apply here, the gravest first. */
import type { Block, Run } from "../document";
import { gravestFirst, SEVERITY_WORDS } from "../fit-words";
import type { Strip } from "./paginate";
import { placeTable } from "./place-table";
import type { Column } from "./scale";
import type { StructNode } from "./sheet";

type FitNotesBlock = Extract<Block, { kind: "fitNotes" }>;

export function placeFitNotes({ notes }: FitNotesBlock, parent: StructNode, column: Column): Strip[] {
  const rows = gravestFirst(notes).map((note): Run[][] => [
    [{ text: SEVERITY_WORDS[note.severity], bold: note.severity !== "ok" }],
    [{ text: note.message }],
    [{ text: note.source, colour: "slate" }],
  ]);
  const columns = ["Fit", "Note", "Source"].map((label) => ({
    label,
    unit: "",
    align: "left" as const,
  }));
  return placeTable({ caption: "", columns, rows }, parent, column);
}
