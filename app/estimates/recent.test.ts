import { expect, it } from "vitest";
import { Recent } from "./recent";

it("forgets what was asked for longest ago", () => {
  const recent = new Recent<number>(2);
  recent.set("a", 1);
  recent.set("b", 2);
  expect(recent.get("a")).toBe(1);
  recent.set("c", 3);
  expect(["a", "b", "c"].map((key) => recent.get(key))).toEqual([1, undefined, 3]);
});
