import { expect, test } from "vitest";
import { revisionLabel } from "./revision-label";

test("revisions run A, B, C and leave out I and O", () => {
  const labels = Array.from({ length: 26 }, (_, index) => revisionLabel(index + 1));
  expect(labels.slice(0, 3)).toEqual(["A", "B", "C"]);
  expect(labels).not.toContain("I");
  expect(labels).not.toContain("O");
  expect(labels.slice(22)).toEqual(["Y", "Z", "AA", "AB"]);
});

test("no two revisions share a label", () => {
  const labels = Array.from({ length: 2000 }, (_, index) => revisionLabel(index + 1));
  expect(new Set(labels).size).toBe(2000);
});
