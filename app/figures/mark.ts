/**
 * Geometry of the mark: five short strokes seen from above, each turned further clockwise and shorter than the one
 * above it, as wind-driven water turns with depth.
 */

export interface MarkStroke {
  x1: number;
  y1: number;
  x2: number;
  y2: number;
}

/** Side of the square that the mark is drawn in. */
export const MARK_SIZE = 24;
export const MARK_STROKE_WIDTH = 1.7;

const STROKES = 5;
const FIRST_LENGTH = 19;
/** Each stroke against the one above it. */
const SHORTENING = 0.84;
/** Degrees clockwise from east, y down, of the first stroke, and what each adds. */
const FIRST_TURN = -22;
const TURN = 11;
/** Left end of the first stroke, and how far each following one starts from the one above it. */
const FIRST_START = { x: 3, y: 8.4 };
const STEP = { x: 0.8, y: 2.7 };

/** The five strokes from the top, in a square of `MARK_SIZE` with y pointing down. */
export const MARK_STROKES: readonly MarkStroke[] = Array.from({ length: STROKES }, (_, step) => {
  const length = FIRST_LENGTH * SHORTENING ** step;
  const angle = ((FIRST_TURN + TURN * step) * Math.PI) / 180;
  const x = FIRST_START.x + STEP.x * step;
  const y = FIRST_START.y + STEP.y * step;
  const at = (value: number) => Math.round(value * 100) / 100;
  return { x1: at(x), y1: at(y), x2: at(x + length * Math.cos(angle)), y2: at(y + length * Math.sin(angle)) };
});
