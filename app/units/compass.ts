const POINTS = [
  ["N", "north"],
  ["NNE", "north-north-east"],
  ["NE", "north-east"],
  ["ENE", "east-north-east"],
  ["E", "east"],
  ["ESE", "east-south-east"],
  ["SE", "south-east"],
  ["SSE", "south-south-east"],
  ["S", "south"],
  ["SSW", "south-south-west"],
  ["SW", "south-west"],
  ["WSW", "west-south-west"],
  ["W", "west"],
  ["WNW", "west-north-west"],
  ["NW", "north-west"],
  ["NNW", "north-north-west"],
] as const;

/** The nearest of 8 compass points to a bearing in degrees true, as a word: `south-east`. */
export function compassWord(degrees: number): string {
  return point(degrees, 8)[1];
}

/** The nearest of 16 compass points to a bearing in degrees true, as letters: `ESE`. */
export function compassLetters(degrees: number): string {
  return point(degrees, 16)[0];
}

function point(degrees: number, points: 8 | 16): (typeof POINTS)[number] {
  const turn = (((degrees % 360) + 360) % 360) / 360;
  const index = (Math.round(turn * points) % points) * (16 / points);
  return POINTS[index] ?? POINTS[0];
}

/** The bearing in degrees true, 0…360, that a vector points to; null for a vector without length. */
export function bearingOf(east: number, north: number): number | null {
  if (!(Math.hypot(east, north) > 0)) return null;
  return ((Math.atan2(east, north) * 180) / Math.PI + 360) % 360;
}
