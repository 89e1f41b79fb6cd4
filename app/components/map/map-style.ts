import type { StyleSpecification } from "maplibre-gl";
import { BASEMAP_ATTRIBUTION, BASEMAP_TILES, LAND_LAYER } from "~/area/basemap";
import { MAX_ZOOM } from "~/area/cut-tiles";

export interface BasemapColours {
  sea: string;
  land: string;
  /** Coastline. */
  quiet: string;
}

/**
 * The basemap as a style: sea, land and coast, nothing else.
 * @param origin of the page, as tile addresses must be absolute
 */
export function basemapStyle(colours: BasemapColours, origin: string): StyleSpecification {
  return {
    version: 8,
    sources: {
      basemap: {
        type: "vector",
        tiles: [origin + BASEMAP_TILES],
        minzoom: 0,
        maxzoom: MAX_ZOOM,
        attribution: BASEMAP_ATTRIBUTION,
      },
    },
    layers: [
      { id: "sea", type: "background", paint: { "background-color": colours.sea } },
      {
        id: "land",
        type: "fill",
        source: "basemap",
        "source-layer": LAND_LAYER,
        paint: { "fill-color": colours.land, "fill-antialias": false },
      },
      {
        id: "coast",
        type: "line",
        source: "basemap",
        "source-layer": LAND_LAYER,
        paint: {
          "line-color": colours.quiet,
          "line-width": ["interpolate", ["linear"], ["zoom"], 2, 0.4, 8, 0.8, 12, 1.2],
        },
      },
    ],
  };
}

/** Where the basemap's colours sit in its style, to change them in place. */
export const BASEMAP_PAINTS = [
  { layer: "sea", property: "background-color", colour: "sea" },
  { layer: "land", property: "fill-color", colour: "land" },
  { layer: "coast", property: "line-color", colour: "quiet" },
] as const;
