import { medianOf } from "./scan-column";

/** How the rows of a file lie in time. */
export interface TimeAxis {
  order: "ascending" | "descending" | "unsorted";
  /** Rows in time order; of equal stamps, in the order of the file. */
  sorted: number[];
  /** First row in the file of each stamp, in time order. */
  unique: number[];
  duplicates: number;
  /** Duplicate rows whose values are those of the kept row, and those whose values differ. */
  identical: number[];
  differing: number[];
  medianStepSeconds: number | null;
  gaps: { count: number; longestSeconds: number; longestAfter: number } | null;
}

/**
 * Sorts rows by time and finds duplicates, median step and gaps.
 * @param utc seconds, one a row
 * @param rows rows with a stamp, in the order of the file
 * @param sameValues whether two rows carry the same values
 */
export function timeAxis(
  utc: Float64Array,
  rows: readonly number[],
  sameValues: (a: number, b: number) => boolean,
): TimeAxis {
  const at = (row: number): number => utc[row] ?? NaN;
  let forward = true;
  let backward = true;
  for (let index = 1; index < rows.length; index += 1) {
    const step = at(rows[index] ?? 0) - at(rows[index - 1] ?? 0);
    if (step < 0) forward = false;
    if (step > 0) backward = false;
  }
  const sorted = forward ? [...rows] : [...rows].sort((a, b) => at(a) - at(b) || a - b);
  const unique: number[] = [];
  const identical: number[] = [];
  const differing: number[] = [];
  for (const row of sorted) {
    const kept = unique.at(-1);
    if (kept === undefined || at(kept) !== at(row)) unique.push(row);
    else if (sameValues(kept, row)) identical.push(row);
    else differing.push(row);
  }
  const steps = new Float64Array(Math.max(0, unique.length - 1));
  for (let index = 0; index < steps.length; index += 1)
    steps[index] = at(unique[index + 1] ?? 0) - at(unique[index] ?? 0);
  const median = medianOf(steps);
  const medianStepSeconds = Number.isNaN(median) ? null : median;
  const gaps = { count: 0, longestSeconds: 0, longestAfter: 0 };
  for (const [index, step] of steps.entries()) {
    if (medianStepSeconds === null || step <= 1.5 * medianStepSeconds) continue;
    gaps.count += 1;
    if (step > gaps.longestSeconds) {
      gaps.longestSeconds = step;
      gaps.longestAfter = unique[index] ?? 0;
    }
  }
  return {
    order: forward ? "ascending" : backward ? "descending" : "unsorted",
    sorted,
    unique,
    duplicates: rows.length - unique.length,
    identical,
    differing,
    medianStepSeconds,
    gaps: gaps.count === 0 ? null : gaps,
  };
}
