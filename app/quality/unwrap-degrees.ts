/**
 * Directions as an angle that runs on over north, so that 359° and 1° are two degrees apart.
 * @param from degrees, NaN where missing
 */
export function unwrapDegrees(from: Float64Array): Float64Array {
  let last = Number.NaN;
  return from.map((degrees) => {
    if (Number.isNaN(degrees)) return Number.NaN;
    const turned = Number.isNaN(last) ? degrees : degrees + 360 * Math.round((last - degrees) / 360);
    last = turned;
    return turned;
  });
}
