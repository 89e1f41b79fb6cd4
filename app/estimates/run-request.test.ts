import { describe, expect, it } from "vitest";
import { choiceOf, KEEP, requestedCells, runSchema } from "./run-request";

const known = {
  boxes: [{ id: "a" }, { id: "b" }],
  storms: [{ id: "x" }, { id: "y" }],
  cells: [
    { boxId: "a", stormId: "x", needsRun: false },
    { boxId: "b", stormId: "y", needsRun: true },
  ],
};
const cells = (run: string) => requestedCells(run, known).map(({ studyBoxId, stormId }) => studyBoxId + stormId);

describe("requestedCells", () => {
  it.each([
    ["cell:a:y", ["ay"]],
    ["box:b", ["bx", "by"]],
    ["storm:x", ["ax", "bx"]],
    ["all", ["ax", "ay", "bx", "by"]],
    ["outOfDate", ["by"]],
    ["box:gone", []],
  ])("%s means %s", (run, expected) => {
    expect(cells(run)).toEqual(expected);
  });
});

describe("runSchema", () => {
  it("keeps what each cell has unless something is chosen", () => {
    const read = runSchema.parse({ run: "all" });
    expect(read).toEqual({ run: "all", waterColumnId: KEEP, methodSheetId: KEEP });
    expect(choiceOf(read)).toEqual({ waterColumnId: undefined, methodSheetId: undefined });
    expect(choiceOf({ ...read, waterColumnId: "w" }).waterColumnId).toBe("w");
  });

  it.each(["", "cell:a", "cell:a:b:c", "everything", "box:", "box:<b>"])("refuses %j", (run) => {
    expect(runSchema.safeParse({ run }).success).toBe(false);
  });
});
