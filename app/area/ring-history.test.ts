import { describe, expect, it } from "vitest";
import { commitRing, type DrawnRing, redoRing, startHistory, undoRing } from "./ring-history";

const a: DrawnRing = [
  [0, 0],
  [1, 0],
  [1, 1],
];
const b: DrawnRing = [
  [0, 0],
  [2, 0],
  [1, 1],
];

describe("ring history", () => {
  it("walks back and forth through every change, deletion included", () => {
    const drawn = [a, b, null].reduce<ReturnType<typeof startHistory>>(commitRing, startHistory(null));
    const back = undoRing(drawn);
    expect(back.present).toEqual(b);
    expect(undoRing(back).present).toEqual(a);
    expect(undoRing(undoRing(back)).present).toBeNull();
    expect(redoRing(back).present).toBeNull();
    expect(redoRing(undoRing(back)).present).toEqual(b);
  });

  it("stops at either end", () => {
    const fresh = startHistory(a);
    expect(undoRing(fresh)).toBe(fresh);
    expect(redoRing(fresh)).toBe(fresh);
  });

  it("takes the same corners for no change", () => {
    const history = startHistory(a);
    expect(
      commitRing(history, [
        [0, 0],
        [1, 0],
        [1, 1],
      ]),
    ).toBe(history);
  });

  it("forgets what was undone once something new is drawn", () => {
    const history = commitRing(undoRing(commitRing(startHistory(a), b)), null);
    expect(history.future).toEqual([]);
    expect(undoRing(history).present).toEqual(a);
  });
});
