import type { FeatureCollection } from "geojson";
import { Layer, Marker, Source } from "react-map-gl/maplibre";
import type { MapColours } from "./map-colours.client";
import { openRing, ringExtent, unwrapRing } from "~/area/ring";
import type { Position } from "~/ocean/scenario";

export interface MapBox {
  id?: string;
  name: string;
  polygon: Position[];
}

interface BoxLayersProps {
  boxes: readonly MapBox[];
  colours: MapColours;
  selectedId?: string;
}

/** Boxes as double strokes (paper under ink), so that they stand out on land and sea alike, with their names. */
export function BoxLayers({ boxes, colours, selectedId }: BoxLayersProps) {
  return (
    <>
      <Source id="boxes" type="geojson" data={toGeoJson(boxes, selectedId)}>
        <Layer id="boxes-fill" type="fill" paint={{ "fill-color": colours.ink, "fill-opacity": 0.05 }} />
        <Layer
          id="boxes-casing"
          type="line"
          paint={{ "line-color": colours.paper, "line-width": ["case", ["get", "selected"], 8, 5] }}
        />
        <Layer
          id="boxes-outline"
          type="line"
          paint={{ "line-color": colours.ink, "line-width": ["case", ["get", "selected"], 4, 1.75] }}
        />
      </Source>
      {boxes.map(({ id, name, polygon }, i) => {
        const { west, north } = ringExtent(polygon);
        return (
          <Marker key={id ?? i} longitude={west} latitude={north} anchor="bottom-left" offset={[0, -4]}>
            <span className="box-label" data-selected={id !== undefined && id === selectedId}>
              {name}
            </span>
          </Marker>
        );
      })}
    </>
  );
}

function toGeoJson(boxes: readonly MapBox[], selectedId: string | undefined): FeatureCollection {
  return {
    type: "FeatureCollection",
    features: boxes.map(({ id, polygon }) => ({
      type: "Feature",
      properties: { selected: id !== undefined && id === selectedId },
      geometry: { type: "Polygon", coordinates: [unwrapRing([...openRing(polygon), polygon[0]])] },
    })),
  };
}
