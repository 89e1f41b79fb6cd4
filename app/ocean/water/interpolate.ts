/**
 * Value of a profile at a depth, linear between levels, held beyond the first and the last.
 * @param depth strictly increasing, m @param values one a level @param at m
 */
export function valueAt(depth: ArrayLike<number>, values: ArrayLike<number>, at: number): number {
  const last = depth.length - 1;
  if (at <= depth[0]) return values[0];
  if (at >= depth[last]) return values[last];
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (depth[middle] <= at) low = middle;
    else high = middle;
  }
  return values[low] + ((values[high] - values[low]) * (at - depth[low])) / (depth[high] - depth[low]);
}

/** Mean of a profile from the surface to a depth, exact for the piecewise linear profile of `valueAt`. */
export function meanAbove(depth: ArrayLike<number>, values: ArrayLike<number>, base: number): number {
  let sum = 0;
  let top = 0;
  let topValue = values[0];
  for (let k = 0; k < depth.length && top < base; k++) {
    if (depth[k] <= top) continue;
    const bottom = Math.min(depth[k], base);
    const bottomValue = valueAt(depth, values, bottom);
    sum += ((topValue + bottomValue) / 2) * (bottom - top);
    top = bottom;
    topValue = bottomValue;
  }
  sum += topValue * Math.max(0, base - top);
  return sum / base;
}
