import type { Samples } from "~/quality/samples";

/** Index of the last element of an ascending list that is not above `moment`; -1 before the first. */
export function lastAtOrBefore(time: ArrayLike<number>, moment: number): number {
  let low = 0;
  let high = time.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (time[middle] <= moment) low = middle + 1;
    else high = middle;
  }
  return low - 1;
}

/** The value at `moment` on the straight line between its neighbours; the nearest value outside the samples. */
export function linearAt({ time, values }: Samples, moment: number): number {
  const before = lastAtOrBefore(time, moment);
  if (before < 0) return values[0];
  if (before >= time.length - 1 || time[before] === moment) return values[Math.min(before, time.length - 1)];
  const share = (moment - time[before]) / (time[before + 1] - time[before]);
  return values[before] + share * (values[before + 1] - values[before]);
}

/** The value that holds at `moment`; NaN before the first sample. */
export function heldAt({ time, values }: Samples, moment: number): number {
  const before = lastAtOrBefore(time, moment);
  return before < 0 ? Number.NaN : values[before];
}

/** All moments of several ascending lists within [from, to], and both ends: ascending, each once. */
export function unionAxis(lists: ArrayLike<number>[], from: number, to: number): number[] {
  const moments = new Set([from, to]);
  for (const list of lists) {
    for (let index = 0; index < list.length; index++) {
      if (list[index] >= from && list[index] <= to) moments.add(list[index]);
    }
  }
  return [...moments].sort((a, b) => a - b);
}
