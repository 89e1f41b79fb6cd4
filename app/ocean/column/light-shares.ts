import { shortwaveFraction, type WaterClarity } from "../heat/shortwave";

/**
 * Share of the net shortwave radiation that each cell takes; the bed's share goes into the lowest cell, so they add up to 1.
 * @param clarity null: all in the uppermost cell @param cellSize m
 */
export function lightShares(clarity: WaterClarity | null, cells: number, cellSize: number): Float64Array {
  const shares = new Float64Array(cells);
  if (clarity === null) {
    shares[0] = 1;
    return shares;
  }
  for (let k = 0; k < cells; k++) {
    const below = k === cells - 1 ? 0 : shortwaveFraction(clarity, (k + 1) * cellSize);
    shares[k] = shortwaveFraction(clarity, k * cellSize) - below;
  }
  return shares;
}
