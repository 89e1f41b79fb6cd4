import "maplibre-gl/dist/maplibre-gl.css";
import "./map.css";
import * as maplibre from "maplibre-gl";
import workerUrl from "maplibre-gl/dist/maplibre-gl-worker.mjs?url";
import { type ReactNode, useState } from "react";
import { AttributionControl, Map as ReactMap, NavigationControl, ScaleControl } from "react-map-gl/maplibre";
import { BasemapColours } from "./basemap-colours.client";
import { GraticuleLayer } from "./graticule-layer.client";
import { useMapColours } from "./map-colours.client";
import { basemapStyle } from "./map-style";
import type { GeographicBounds } from "~/area/graticule";
import type { UnitChoices } from "~/units/unit-choices";

maplibre.setWorkerUrl(workerUrl);

interface BaseMapProps {
  /** What is seen at first. */
  view: GeographicBounds;
  distanceUnit: UnitChoices["distance"];
  /** Name of the map for screen readers. */
  label: string;
  /** Ask for two fingers or Ctrl, so that the page can be scrolled over the map. */
  calm?: boolean;
  children?: ReactNode;
}

/** Sea, land, coast, graticule, scale bar and attribution: what every map of the product stands on. */
export default function BaseMap({ view, distanceUnit, label, calm = false, children }: BaseMapProps) {
  const colours = useMapColours();
  const [style] = useState(() => basemapStyle(colours, window.location.origin));
  const { west, south, east, north } = view;
  return (
    <ReactMap
      mapLib={maplibre}
      mapStyle={style}
      initialViewState={{
        bounds: [west, south, east, north],
        // Clear of the zoom buttons, the scale bar and the attribution.
        fitBoundsOptions: { padding: { top: 48, right: 64, bottom: 56, left: 48 }, maxZoom: 11 },
      }}
      maxZoom={15}
      minZoom={0.5}
      maxPitch={0}
      dragRotate={false}
      touchPitch={false}
      cooperativeGestures={calm}
      canvasContextAttributes={{ preserveDrawingBuffer: true }}
      fadeDuration={0}
      attributionControl={false}
      locale={{ "Map.Title": label }}
      onLoad={({ target }) => target.touchZoomRotate.disableRotation()}
      onMoveStart={({ target }) => target.getContainer().setAttribute("aria-busy", "true")}
      onIdle={({ target }) => target.getContainer().setAttribute("aria-busy", "false")}
    >
      <BasemapColours colours={colours} />
      <GraticuleLayer colours={colours} />
      {children}
      <NavigationControl position="top-right" showCompass={false} />
      <ScaleControl position="bottom-left" unit={distanceUnit === "nm" ? "nautical" : "metric"} maxWidth={110} />
      <AttributionControl position="bottom-right" compact={false} />
    </ReactMap>
  );
}
