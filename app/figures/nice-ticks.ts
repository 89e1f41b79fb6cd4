/** Round values of an axis, and the decimals they need. */
export interface NiceAxis {
  /** Ends on round values. */
  domain: [low: number, high: number];
  ticks: number[];
  decimals: number;
}

/**
 * Steps of 1, 2 or 5 times a power of ten over an interval.
 * @param low, high any finite pair; equal ones are set apart by one
 * @param count about how many steps are wanted, from 1 up
 */
export function niceAxis(low: number, high: number, count: number): NiceAxis {
  const [from, to] = low < high ? [low, high] : [low - 0.5, high + 0.5];
  const step = niceStep((to - from) / Math.max(1, count));
  // Counted in whole steps, so that 0.1 + 0.2 never shows.
  const first = Math.floor(from / step + 1e-9);
  const last = Math.ceil(to / step - 1e-9);
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const at = (index: number) => Number((index * step).toFixed(Math.min(decimals, 20)));
  const ticks = Array.from({ length: last - first + 1 }, (_, index) => at(first + index));
  return { domain: [at(first), at(last)], ticks, decimals };
}

function niceStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(rough));
  const fraction = rough / power;
  const nice = fraction <= 1 ? 1 : fraction <= 2 ? 2 : fraction <= 5 ? 5 : 10;
  return nice * power;
}
