/**
 * Drag coefficient of Wu (1982), Journal of Geophysical Research 87:9704-9706 (as transcribed in a wave model's manual).
 * @param wind10 m/s; stated from breeze to hurricane
 */
export function wu1982(wind10: number): number {
  return (0.8 + 0.065 * wind10) * 1e-3;
}
