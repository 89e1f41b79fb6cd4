/**
 * Neutral drag coefficient of Large & Yeager (2009), Climate Dynamics 33:341-364; bounded by construction.
 * @param wind10 m/s; stated for 0.5…60; lighter winds take the value at 0.5 m/s
 */
export function largeYeager2009(wind10: number): number {
  if (wind10 > 33) return 2.34e-3;
  const U = Math.max(0.5, wind10);
  const U2 = U * U;
  return (2.7 / U + 0.142 + 0.0764 * U - 3.14807e-10 * U2 * U2 * U2) * 1e-3;
}
