/**
 * Share of a slab's motion that is inertial: what is left when the steady drift Z_s = τ/(ρH(r + if)) of the moment's
 * stress is taken away, compared with both. 0: all steady drift; 1: all inertial; 0 where nothing moves or nothing turns.
 * @param u, v drift, m/s @param tauX, tauY stress, N/m² @param f 1/s @param dampingRate 1/s
 * @param mass ρH, kg/m²
 * @see a convention of this engine after Pollard & Millard (1970)
 */
export function inertialShare(
  u: number,
  v: number,
  tauX: number,
  tauY: number,
  { f, dampingRate, mass }: { f: number; dampingRate: number; mass: number },
): number {
  const size = mass * (dampingRate * dampingRate + f * f);
  // Where nothing turns or brakes there is no steady drift to take away; so near the equator the squares vanish.
  if (f * f === 0 || size === 0) return 0;
  const steadyU = (tauX * dampingRate + tauY * f) / size;
  const steadyV = (tauY * dampingRate - tauX * f) / size;
  const steady = Math.hypot(steadyU, steadyV);
  const inertial = Math.hypot(u - steadyU, v - steadyV);
  return steady + inertial === 0 ? 0 : inertial / (steady + inertial);
}
