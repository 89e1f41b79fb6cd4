const SECOND = 1000;
const MINUTE = 60 * SECOND;
const HOUR = 60 * MINUTE;

/** Waits after the first, second … attempt that failed, in milliseconds. */
const DELAYS_MS = [10 * SECOND, MINUTE, 5 * MINUTE, 30 * MINUTE, 2 * HOUR, 6 * HOUR, 12 * HOUR];

/** How long to wait after `attempts` attempts have failed, in milliseconds; null when it is to be given up. */
export function retryDelay(attempts: number): number | null {
  return DELAYS_MS[attempts - 1] ?? null;
}
