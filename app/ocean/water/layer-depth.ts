/**
 * Depth of the mixed layer: where potential density first exceeds its surface value by a step, linear between levels.
 * @param depth m, increasing @param sigma0 potential density, kg/m³ (any offset) @param step kg/m³
 * @param bottom m, what is returned where the step is never reached: the deepest level, or the bed of a column
 * @returns m
 * @see de Boyer Montégut et al. (2004), threshold 0.03 kg/m³ (from memory)
 */
export function mixedLayerDepth(
  depth: ArrayLike<number>,
  sigma0: ArrayLike<number>,
  step: number,
  bottom?: number,
): number {
  const limit = sigma0[0] + step;
  for (let k = 1; k < depth.length; k++) {
    if (sigma0[k] < limit) continue;
    const share = (limit - sigma0[k - 1]) / (sigma0[k] - sigma0[k - 1]);
    return depth[k - 1] + share * (depth[k] - depth[k - 1]);
  }
  return bottom ?? depth[depth.length - 1];
}
