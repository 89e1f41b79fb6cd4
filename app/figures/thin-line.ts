/** No eye and no printer tells more points apart on one line. */
export const MAX_POINTS = 1500;
/** degrees */
const HALF_CIRCLE = 180;

/**
 * Which samples to draw: at most `limit`. Kept are the two ends and, of every stretch, the lowest and the highest value,
 * and one missing sample where the stretch has a gap, so that the gap stays open.
 * @param values one a sample, NaN where missing
 * @returns ascending indices; all of them where there are few enough
 */
export function keepExtremes(values: ArrayLike<number>, limit = MAX_POINTS): number[] {
  const { length } = values;
  if (length <= limit) return Array.from({ length }, (_, index) => index);
  const bins = Math.max(1, Math.floor((limit - 2) / 3));
  const kept: number[] = [0];
  for (let bin = 0; bin < bins; bin += 1) {
    const start = Math.floor((bin * length) / bins);
    const end = Math.floor(((bin + 1) * length) / bins);
    for (const index of extremesOf(values, start, end)) if (index > (kept.at(-1) ?? 0)) kept.push(index);
  }
  if (kept.at(-1) !== length - 1) kept.push(length - 1);
  return kept;
}

function extremesOf(values: ArrayLike<number>, start: number, end: number): number[] {
  let lowest = -1;
  let highest = -1;
  let missing = -1;
  for (let index = start; index < end; index += 1) {
    const value = values[index] ?? Number.NaN;
    if (!Number.isFinite(value)) {
      missing = index;
      continue;
    }
    if (lowest < 0 || value < (values[lowest] ?? Number.NaN)) lowest = index;
    if (highest < 0 || value > (values[highest] ?? Number.NaN)) highest = index;
  }
  return [...new Set([lowest, highest, missing])].filter((index) => index >= 0).sort((a, b) => a - b);
}

/**
 * Puts a missing sample into every pause of more than three median steps, so that no line is drawn across it.
 * @param time seconds, ascending
 */
export function openPauses(time: ArrayLike<number>, values: ArrayLike<number>): { time: number[]; values: number[] } {
  const steps = Array.from({ length: Math.max(0, time.length - 1) }, (_, i) => (time[i + 1] ?? 0) - (time[i] ?? 0));
  const median = [...steps].sort((a, b) => a - b)[Math.floor(steps.length / 2)] ?? 0;
  const opened = { time: [] as number[], values: [] as number[] };
  for (let index = 0; index < time.length; index += 1) {
    const moment = time[index] ?? 0;
    opened.time.push(moment);
    opened.values.push(values[index] ?? Number.NaN);
    if ((steps[index] ?? 0) > 3 * median) {
      opened.time.push(moment + median);
      opened.values.push(Number.NaN);
    }
  }
  return opened;
}

/**
 * Puts a missing sample wherever a bearing turns by more than half a circle from one sample to the next, so that no line is
 * drawn across the axis where it passes north.
 * @param time seconds, ascending
 * @param values degrees
 */
export function openTurns(time: ArrayLike<number>, values: ArrayLike<number>): { time: number[]; values: number[] } {
  const opened = { time: [] as number[], values: [] as number[] };
  for (let index = 0; index < time.length; index += 1) {
    if (index > 0 && Math.abs(values[index] - values[index - 1]) > HALF_CIRCLE) {
      opened.time.push((time[index - 1] + time[index]) / 2);
      opened.values.push(Number.NaN);
    }
    opened.time.push(time[index]);
    opened.values.push(values[index]);
  }
  return opened;
}
