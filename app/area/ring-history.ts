import type { Position } from "~/ocean/scenario";

/** Corners in the order in which they were given, open; null for no box. */
export type DrawnRing = Position[] | null;

/** What undo and redo walk through. */
export interface RingHistory {
  past: readonly DrawnRing[];
  present: DrawnRing;
  future: readonly DrawnRing[];
}

export function startHistory(present: DrawnRing): RingHistory {
  return { past: [], present, future: [] };
}

/** A finished change: can be undone. The same corners again are no change. */
export function commitRing(history: RingHistory, ring: DrawnRing): RingHistory {
  if (sameRing(history.present, ring)) return history;
  return { past: [...history.past, history.present], present: ring, future: [] };
}

export function undoRing(history: RingHistory): RingHistory {
  const before = history.past.at(-1);
  if (before === undefined) return history;
  return { past: history.past.slice(0, -1), present: before, future: [history.present, ...history.future] };
}

export function redoRing(history: RingHistory): RingHistory {
  const [next, ...future] = history.future;
  if (next === undefined) return history;
  return { past: [...history.past, history.present], present: next, future };
}

export function sameRing(a: DrawnRing, b: DrawnRing): boolean {
  if (a === null || b === null || a.length !== b.length) return a === b;
  return a.every(([longitude, latitude], i) => longitude === b[i][0] && latitude === b[i][1]);
}
