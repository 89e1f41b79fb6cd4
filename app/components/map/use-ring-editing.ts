import { useRef, useState } from "react";
import { type CoordinateStyle, formatCorners } from "~/area/format-coordinates";
import { type CoordinateProblem, parseCoordinates } from "~/area/parse-coordinates";
import { openRing } from "~/area/ring";
import { commitRing, type DrawnRing, redoRing, sameRing, startHistory, undoRing } from "~/area/ring-history";

export interface RingEditing {
  ring: DrawnRing;
  /** What stands in the coordinate field. */
  text: string;
  textProblems: CoordinateProblem[];
  style: CoordinateStyle;
  canUndo: boolean;
  canRedo: boolean;
  /** While a corner or the box is dragged: shown everywhere, not yet a step of undo. */
  preview(ring: DrawnRing): void;
  commit(ring: DrawnRing): void;
  type(text: string): void;
  writeIn(style: CoordinateStyle): void;
  undo(): void;
  redo(): void;
}

/**
 * One model, two editors: the map and the coordinate field both change the same corners, and each shows at once what
 * the other did. Text that cannot be read leaves the corners as they were and says so.
 */
export function useRingEditing(value: DrawnRing, onChange: (ring: DrawnRing) => void): RingEditing {
  const ring = value === null ? null : openRing(value);
  const [history, setHistory] = useState(() => startHistory(ring));
  const [style, setStyle] = useState<CoordinateStyle>("decimal");
  const [typed, setTyped] = useState<{ text: string; problems: CoordinateProblem[] } | null>(null);
  const latest = useRef(ring);

  const show = (next: DrawnRing) => {
    latest.current = next;
    setTyped(null);
    onChange(next);
  };
  const step = (next: typeof history) => {
    setHistory(next);
    show(next.present);
  };
  return {
    ring,
    text: typed?.text ?? formatCorners(ring ?? [], style),
    textProblems: typed?.problems ?? [],
    style,
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
    preview: show,
    commit: (next) => step(commitRing(history, next)),
    type: (text) => {
      const { corners, problems } = parseCoordinates(text);
      setTyped({ text, problems });
      if (problems.length > 0) return;
      const next = corners.length > 0 ? corners : null;
      setHistory(commitRing(history, next));
      if (!sameRing(latest.current, next)) {
        latest.current = next;
        onChange(next);
      }
    },
    writeIn: (next) => {
      setStyle(next);
      if (typed?.problems.length === 0) setTyped(null);
    },
    undo: () => step(undoRing(history)),
    redo: () => step(redoRing(history)),
  };
}
