/**
 * Drag coefficient of Garratt (1977), Monthly Weather Review 105:915-929 (coefficients from memory).
 * @param wind10 m/s; stated for 4…21
 */
export function garratt1977(wind10: number): number {
  return (0.75 + 0.067 * wind10) * 1e-3;
}
