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
export const MARK_STROKE_WIDTH = 2;

const STROKES = 5;
const FIRST_LENGTH = 18;
/** Each stroke against the one above it. */
const SHORTENING = 0.82;
/** Degrees clockwise from east, y down, of the first stroke, and what each adds. */
const FIRST_TURN = -30;
const TURN = 17;
const FIRST_MIDDLE = 5.9;
const GAP = 3.6;

/** The five strokes from the top, in a square of `MARK_SIZE` with y pointing down. */
export const MARK_STROKES: readonly MarkStroke[] = Array.from({ length: STROKES }, (_, step) => {
  const length = FIRST_LENGTH * SHORTENING ** step;
  const angle = ((FIRST_TURN + TURN * step) * Math.PI) / 180;
  const halfAcross = (length / 2) * Math.cos(angle);
  const halfDown = (length / 2) * Math.sin(angle);
  const middleX = MARK_SIZE / 2;
  const middleY = FIRST_MIDDLE + GAP * step;
  const at = (value: number) => Math.round(value * 100) / 100;
  return {
    x1: at(middleX - halfAcross),
    y1: at(middleY - halfDown),
    x2: at(middleX + halfAcross),
    y2: at(middleY + halfDown),
  };
});
