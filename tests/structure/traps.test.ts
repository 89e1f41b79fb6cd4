import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { sourceFiles } from "./source-files";

/** Wind 1 to 12, time 13 to 21, rain 22 to 28, heat 29 to 33, text 34 and 35, places 36 to 43. */
const TRAPS = 43;

test("every trap that files set for their readers has a test that names it", () => {
  const tests = ["app", "tests"].flatMap(sourceFiles).filter((file) => /\.test\.tsx?$/.test(file));
  // A title, or a row of a table of cases.
  const titles = tests.flatMap((file) => readFileSync(file, "utf8").match(/["`][^"`\n]*\btrap \d+[^"`\n]*["`]/g) ?? []);
  const named = new Set(
    titles.flatMap((title) => [...title.matchAll(/trap (\d+)/g)].map(([, number]) => Number(number))),
  );
  const missing = Array.from({ length: TRAPS }, (_, k) => k + 1).filter((number) => !named.has(number));
  expect(missing).toEqual([]);
});
