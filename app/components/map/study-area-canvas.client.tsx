import { Marker } from "react-map-gl/maplibre";
import BaseMap from "./base-map.client";
import { BoxLayers } from "./box-layers.client";
import { useMapColours } from "./map-colours.client";
import { RingLayer } from "./ring-layer.client";
import type { StudyAreaMapProps } from "./study-area-map";
import { TrackLayers } from "./track-layers.client";
import { viewOf } from "~/area/view-of";
import { formatQuantity } from "~/units/format-quantity";

export default function StudyAreaCanvas(props: StudyAreaMapProps) {
  const {
    boxes,
    units,
    selectedId,
    depthLabels = [],
    tracks = [],
    rings = [],
    label = "Map of the study boxes",
  } = props;
  const colours = useMapColours();
  const view = viewOf([...boxes.map(({ polygon }) => polygon), ...tracks.map(({ line }) => line), ...rings]);
  return (
    <BaseMap view={view} distanceUnit={units.distance} label={label} calm>
      <BoxLayers boxes={boxes} colours={colours} selectedId={selectedId} />
      <RingLayer rings={rings} colours={colours} />
      <TrackLayers tracks={tracks} colours={colours} />
      {depthLabels.map(({ position: [longitude, latitude], depth }) => (
        <Marker key={`${longitude}/${latitude}`} longitude={longitude} latitude={latitude}>
          <span className="depth-label">{formatQuantity(depth, "depth", units).text}</span>
        </Marker>
      ))}
    </BaseMap>
  );
}
