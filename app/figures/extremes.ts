/** Lowest and highest finite sample, where they stand, and how many there are. */
export interface Extremes {
  min: number;
  max: number;
  minAt: number;
  maxAt: number;
  count: number;
}

/** @returns null where no sample is finite */
export function extremes(values: ArrayLike<number>): Extremes | null {
  let found: Extremes | null = null;
  for (let index = 0; index < values.length; index += 1) {
    const value = values[index] ?? Number.NaN;
    if (!Number.isFinite(value)) continue;
    if (found === null) {
      found = { min: value, max: value, minAt: index, maxAt: index, count: 1 };
      continue;
    }
    found.count += 1;
    if (value < found.min) Object.assign(found, { min: value, minAt: index });
    if (value > found.max) Object.assign(found, { max: value, maxAt: index });
  }
  return found;
}

/** The sample farthest from the first finite one; null where there is none. */
export function farthestFromStart(values: ArrayLike<number>): number | null {
  const found = extremes(values);
  if (found === null) return null;
  const start = Array.from(values).find((value) => Number.isFinite(value)) ?? Number.NaN;
  return start - found.min > found.max - start ? found.minAt : found.maxAt;
}
