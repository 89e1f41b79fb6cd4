import type { MapRef } from "react-map-gl/maplibre";

/**
 * Runs once the map has its style, so that layers can be added and repainted. Not the same as `isStyleLoaded`, which
 * also waits for every tile and every pending repaint.
 * @returns stops waiting
 */
export function whenStyled(map: MapRef, run: () => void): () => void {
  if (map.getMap().getLayer("sea")) {
    run();
    return () => {};
  }
  map.once("styledata", run);
  return () => {
    map.off("styledata", run);
  };
}
