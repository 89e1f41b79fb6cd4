import { Layer, Source } from "react-map-gl/maplibre";
import type { MapColours } from "./map-colours.client";
import type { Position } from "~/ocean/scenario";

/** Thin closed lines over the sea. */
export function RingLayer({ rings, colours }: { rings: readonly Position[][]; colours: MapColours }) {
  if (rings.length === 0) return null;
  const geometry = { type: "MultiLineString" as const, coordinates: rings.map((ring) => [...ring]) };
  return (
    <Source id="rings" type="geojson" data={{ type: "Feature", properties: {}, geometry }}>
      <Layer id="rings" type="line" paint={{ "line-color": colours.drift, "line-width": 1, "line-opacity": 0.7 }} />
    </Source>
  );
}
