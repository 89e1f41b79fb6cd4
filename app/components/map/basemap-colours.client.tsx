import { useEffect } from "react";
import { useMap } from "react-map-gl/maplibre";
import type { MapColours } from "./map-colours.client";
import { BASEMAP_PAINTS } from "./map-style";
import { whenStyled } from "./when-styled.client";

/**
 * Repaints sea, land and coast when the page turns dark or light. In place, because a new style would sweep away what
 * the drawing has put on the map.
 */
export function BasemapColours({ colours }: { colours: MapColours }) {
  const { current: map } = useMap();
  useEffect(() => {
    if (!map) return;
    const repaint = () => {
      for (const { layer, property, colour } of BASEMAP_PAINTS) {
        map.getMap().setPaintProperty(layer, property, colours[colour]);
      }
    };
    return whenStyled(map, repaint);
  }, [map, colours]);
  return null;
}
