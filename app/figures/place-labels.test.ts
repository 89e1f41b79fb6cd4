import { describe, expect, it } from "vitest";
import { placeLabels } from "./place-labels";

const bounds = { left: 0, right: 200, top: 0, bottom: 100 };

describe("placeLabels", () => {
  it("prefers the right-hand side", () => {
    const [label] = placeLabels([{ text: "1 d", x: 100, y: 50 }], [], bounds);
    expect(label?.dx).toBeGreaterThan(0);
    expect(label?.dy).toBe(0);
  });

  it("keeps off the path and inside the frame", () => {
    const path = Array.from({ length: 30 }, (_, index) => ({ x: 100 + index, y: 50 }));
    expect(placeLabels([{ text: "1 d", x: 100, y: 50 }], path, bounds)[0]?.dy).not.toBe(0);
    expect(placeLabels([{ text: "1 d", x: 197, y: 50 }], [], bounds)[0]?.dx).toBeLessThanOrEqual(0);
  });

  it("never lays one label over another, and leaves out what finds no place", () => {
    const requests = Array.from({ length: 30 }, (_, index) => ({ text: `${index} d`, x: 100, y: 50 }));
    const placed = placeLabels(requests, [], bounds);
    expect(placed).toHaveLength(30);
    const found = placed.filter((offset) => offset !== null);
    expect(found.length).toBeGreaterThan(3);
    expect(found.length).toBeLessThan(9);
    expect(new Set(found.map(({ dx, dy }) => `${Math.sign(dx)},${Math.sign(dy)}`)).size).toBe(found.length);
  });
});
