/**
 * Drag coefficient of Large & Pond (1981), Journal of Physical Oceanography 11:324-336 (as summarised elsewhere).
 * Held at its value at 25 m/s above that; it steps from 1.2e-3 to 1.205e-3 at 11 m/s, as published.
 * @param wind10 m/s; stated for 4…25, fetch at least 800 measuring heights
 */
export function largePond1981(wind10: number): number {
  if (wind10 < 11) return 1.2e-3;
  return (0.49 + 0.065 * Math.min(wind10, 25)) * 1e-3;
}
