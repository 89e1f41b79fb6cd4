/**
 * Wu (1982) with the constant value that wave models use below 7.5 m/s.
 * @param wind10 m/s
 */
export function wu1982floor(wind10: number): number {
  return wind10 < 7.5 ? 1.2875e-3 : (0.8 + 0.065 * wind10) * 1e-3;
}
