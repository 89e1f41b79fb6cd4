/** Unit vectors (east, north) across and along the shore. */
export interface ShoreAxes {
  across: { x: number; y: number };
  along: { x: number; y: number };
}

/**
 * Across: offshore. Along: to the right when looking offshore. Without a shore: east and north.
 * @param shoreNormal degrees true, pointing offshore
 */
export function shoreAxes(shoreNormal: number | null): ShoreAxes {
  if (shoreNormal === null) return { across: { x: 1, y: 0 }, along: { x: 0, y: 1 } };
  const angle = (shoreNormal * Math.PI) / 180;
  const across = { x: Math.sin(angle), y: Math.cos(angle) };
  return { across, along: { x: across.y, y: -across.x } };
}
