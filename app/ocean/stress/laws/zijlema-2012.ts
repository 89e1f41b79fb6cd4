/**
 * Drag coefficient of Zijlema, van Vledder & Holthuijsen (2012), Coastal Engineering 65:19-26 (as transcribed in a wave model's manual).
 * Greatest at 31.4 m/s and smaller again above.
 * @param wind10 m/s; stated for 0…50
 */
export function zijlema2012(wind10: number): number {
  const x = wind10 / 31.5;
  return Math.max(0, (0.55 + 2.97 * x - 1.49 * x * x) * 1e-3);
}
