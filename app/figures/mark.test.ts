import { describe, expect, it } from "vitest";
import { MARK_SIZE, MARK_STROKES, MARK_STROKE_WIDTH, type MarkStroke } from "./mark";

const length = (stroke: MarkStroke) => Math.hypot(stroke.x2 - stroke.x1, stroke.y2 - stroke.y1);
const turn = (stroke: MarkStroke) => Math.atan2(stroke.y2 - stroke.y1, stroke.x2 - stroke.x1);

describe("the mark", () => {
  it("has five strokes, each shorter and turned further clockwise than the one above it", () => {
    expect(MARK_STROKES).toHaveLength(5);
    for (let index = 1; index < MARK_STROKES.length; index++) {
      const above = MARK_STROKES[index - 1]!;
      const stroke = MARK_STROKES[index]!;
      expect(length(stroke)).toBeLessThan(length(above));
      expect(turn(stroke)).toBeGreaterThan(turn(above));
      expect(stroke.y1 + stroke.y2).toBeGreaterThan(above.y1 + above.y2);
    }
  });

  it("stays inside its square, line width included", () => {
    for (const { x1, x2, y1, y2 } of MARK_STROKES)
      for (const value of [x1, x2, y1, y2]) {
        expect(value).toBeGreaterThanOrEqual(MARK_STROKE_WIDTH / 2);
        expect(value).toBeLessThanOrEqual(MARK_SIZE - MARK_STROKE_WIDTH / 2);
      }
  });
});
