import { OceanError } from "../errors";
import { mulberry32 } from "./mulberry32";

export interface MorrisEffects {
  /** Mean size of each input's elementary effect. */
  muStar: number[];
  /** Standard deviation of the effects: interaction or curvature. */
  sigma: number[];
}

/**
 * Elementary effects of a function of d numbers in 0…1 along random paths on a grid.
 * @param levels p, even, of the grid; each move is p/(2(p - 1)) @param trajectories paths @param seed of mulberry32
 * @throws OceanError INVALID_INPUT
 * @see Morris (1991), Technometrics 33:161-174
 */
export function morrisEffects(
  f: (x: readonly number[]) => number,
  d: number,
  { levels, trajectories, seed }: { levels: number; trajectories: number; seed: number },
): MorrisEffects {
  if (
    !Number.isInteger(levels) ||
    levels < 2 ||
    levels % 2 !== 0 ||
    !Number.isInteger(trajectories) ||
    trajectories < 1 ||
    d < 1
  ) {
    throw new OceanError(
      "INVALID_INPUT",
      "Elementary effects need an even number of levels, at least one trajectory and one input.",
    );
  }
  const random = mulberry32(seed);
  const delta = levels / (2 * (levels - 1));
  const effects: number[][] = Array.from({ length: d }, () => []);
  for (let trajectory = 0; trajectory < trajectories; trajectory++) {
    const x = Array.from({ length: d }, () => Math.floor((random() * levels) / 2) / (levels - 1));
    const order = Array.from({ length: d }, (_, i) => i);
    for (let i = d - 1; i >= 1; i--) {
      const k = Math.floor(random() * (i + 1));
      [order[i], order[k]] = [order[k], order[i]];
    }
    let before = f(x);
    for (const i of order) {
      x[i] += delta;
      const after = f(x);
      effects[i].push((after - before) / delta);
      before = after;
    }
  }
  const muStar = effects.map((list) => list.reduce((sum, effect) => sum + Math.abs(effect), 0) / list.length);
  return { muStar, sigma: effects.map(spread) };
}

function spread(values: number[]): number {
  if (values.length < 2) return 0;
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1));
}
