/** Where a lowering turns: records from `downStart` to `turn` go down, those after it come up. */
export interface CastHalves {
  downStart: number;
  turn: number;
  /** Whether enough records go down, and come up, to be a cast of their own; at least one is true. */
  hasDowncast: boolean;
  hasUpcast: boolean;
}

/** dbar: an instrument soaks within this of its shallowest before it is lowered. */
const SOAK = 1;
/** dbar: deeper, a lowering has begun. */
const SOAK_ENDS = 15;
const FEWEST = 5;

/** Parts a cast at its greatest pressure, and the soak at the surface from the lowering. */
export function castHalves(pressure: Float64Array): CastHalves {
  let turn = 0;
  let shallowest = Infinity;
  for (let k = 0; k < pressure.length; k += 1) {
    if (pressure[k] > (pressure[turn] ?? -Infinity) || Number.isNaN(pressure[turn])) turn = k;
  }
  for (let k = 0; k <= turn; k += 1) if (pressure[k] < shallowest) shallowest = pressure[k];
  let downStart = 0;
  for (let k = 0; k <= turn && !(pressure[k] > shallowest + SOAK_ENDS); k += 1) {
    if (pressure[k] <= shallowest + SOAK) downStart = k;
  }
  // A long stay near the surface has many records within the soak: the lowering begins at the shallowest of the last.
  while (downStart > 0 && pressure[downStart - 1] <= pressure[downStart] && pressure[downStart - 1] >= shallowest)
    downStart -= 1;
  const upward = pressure.subarray(turn + 1).filter(Number.isFinite);
  const uppermost = upward.reduce((least, value) => Math.min(least, value), Infinity);
  const range = upward.length < FEWEST ? 0 : pressure[turn] - uppermost;
  // A file that begins at the bottom has no way down to compare with.
  const lowered = turn - downStart < FEWEST ? 0 : pressure[turn] - shallowest;
  return { downStart, turn, hasDowncast: lowered > 0 || range === 0, hasUpcast: range > 0.5 * lowered };
}

/** Records whose pressure exceeds all before them: reversals in a swell are passed over. */
export function monotone(indices: readonly number[], pressure: Float64Array): number[] {
  let deepest = -Infinity;
  return indices.filter((index) => {
    const rises = pressure[index] > deepest;
    if (rises) deepest = pressure[index];
    return rises;
  });
}
