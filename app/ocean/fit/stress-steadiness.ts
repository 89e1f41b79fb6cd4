import type { StressRecord } from "../stress/stress-record";

/**
 * Size of the mean stress over the mean of its sizes: 1 for a stress that keeps its direction, 0 for one that turns full
 * circle, and for a calm.
 * @returns 0…1
 */
export function stressSteadiness({ seconds, x, y }: StressRecord): number {
  let sumX = 0;
  let sumY = 0;
  let sumOfSizes = 0;
  for (let step = 0; step + 1 < seconds.length; step++) {
    const dt = seconds[step + 1] - seconds[step];
    sumX += x[step] * dt;
    sumY += y[step] * dt;
    sumOfSizes += Math.hypot(x[step], y[step]) * dt;
  }
  return sumOfSizes === 0 ? 0 : Math.hypot(sumX, sumY) / sumOfSizes;
}
