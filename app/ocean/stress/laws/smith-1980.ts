/**
 * Drag coefficient of Smith (1980), Journal of Physical Oceanography 10:709-726 (as quoted in a handbook).
 * @param wind10 m/s; stated for 6…22
 */
export function smith1980(wind10: number): number {
  return (0.61 + 0.063 * wind10) * 1e-3;
}
