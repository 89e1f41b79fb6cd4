import { MARK_SIZE, MARK_STROKE_WIDTH, MARK_STROKES } from "~/figures/mark";

export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox={`0 0 ${MARK_SIZE} ${MARK_SIZE}`} aria-hidden="true">
      {MARK_STROKES.map((stroke) => (
        <line key={stroke.y1} {...stroke} stroke="currentColor" strokeWidth={MARK_STROKE_WIDTH} strokeLinecap="round" />
      ))}
    </svg>
  );
}
