/** What a press of one of the run buttons asks for. */
import { z } from "zod";
import type { Cell } from "./start-estimates.server";

/** Keeps what each cell has. */
export const KEEP = "keep";

/** On the button: `all`, `outOfDate`, `box:ID`, `storm:ID` or `cell:BOX:STORM`. */
export const runSchema = z.object({
  run: z
    .string("Choose what to run.")
    .regex(/^(all|outOfDate|(box|storm):[0-9a-z]+|cell:[0-9a-z]+:[0-9a-z]+)$/, "Choose what to run."),
  waterColumnId: z.string().default(KEEP),
  methodSheetId: z.string().default(KEEP),
});

export type RunRequest = z.output<typeof runSchema>;

interface KnownCells {
  boxes: { id: string }[];
  storms: { id: string }[];
  cells: { boxId: string; stormId: string; needsRun: boolean }[];
}

/** The cells that a request means, row by row. */
export function requestedCells(run: string, { boxes, storms, cells }: KnownCells): Cell[] {
  const [scope, first, second] = run.split(":");
  if (scope === "cell") return [{ studyBoxId: first ?? "", stormId: second ?? "" }];
  if (scope === "outOfDate") {
    return cells.filter((cell) => cell.needsRun).map(({ boxId, stormId }) => ({ studyBoxId: boxId, stormId }));
  }
  return boxes
    .filter(({ id }) => scope !== "box" || id === first)
    .flatMap((box) =>
      storms
        .filter(({ id }) => scope !== "storm" || id === first)
        .map((storm) => ({ studyBoxId: box.id, stormId: storm.id })),
    );
}

export function choiceOf({ waterColumnId, methodSheetId }: RunRequest) {
  return {
    waterColumnId: waterColumnId === KEEP ? undefined : waterColumnId,
    methodSheetId: methodSheetId === KEEP ? undefined : methodSheetId,
  };
}
