import type { Position } from "~/ocean/scenario";
import type { GeographicBounds } from "./graticule";
import { ringExtent, shortestTurn } from "./ring";

/** What a map shows when it has nothing to show: the inhabited latitudes. */
export const WORLD_VIEW: GeographicBounds = { west: -170, south: -58, east: 190, north: 72 };

/**
 * The view that holds several rings or lines, taken the short way round where they lie across the antimeridian.
 * @returns degrees; `east` may be above 180
 */
export function viewOf(shapes: readonly (readonly Position[])[]): GeographicBounds {
  const [first, ...others] = shapes.filter((shape) => shape.length > 0).map((shape) => ringExtent(shape));
  if (!first) return WORLD_VIEW;
  return others.reduce<GeographicBounds>((view, extent) => {
    const middle = (view.west + view.east) / 2;
    const shift = middle + shortestTurn((extent.west + extent.east) / 2 - middle) - (extent.west + extent.east) / 2;
    return {
      west: Math.min(view.west, extent.west + shift),
      east: Math.max(view.east, extent.east + shift),
      south: Math.min(view.south, extent.south),
      north: Math.max(view.north, extent.north),
    };
  }, first);
}
