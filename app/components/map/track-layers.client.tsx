import { Layer, Marker, Source } from "react-map-gl/maplibre";
import type { MapColours } from "./map-colours.client";
import type { DriftTrack } from "~/area/drift-track";

/** Told apart by dash, as colour belongs to the quantity. */
const DASHES = [[1], [4, 2], [1.5, 1.5], [6, 2, 1.5, 2]];

/** Drift tracks with a dot and a label at every full day. */
export function TrackLayers({ tracks, colours }: { tracks: readonly DriftTrack[]; colours: MapColours }) {
  return tracks.map(({ name, line, dayMarks }, i) => (
    <Source
      key={name}
      id={`track-${i}`}
      type="geojson"
      data={{ type: "Feature", properties: {}, geometry: { type: "LineString", coordinates: line } }}
    >
      <Layer id={`track-${i}-casing`} type="line" paint={{ "line-color": colours.paper, "line-width": 5 }} />
      <Layer
        id={`track-${i}`}
        type="line"
        paint={{ "line-color": colours.drift, "line-width": 2, "line-dasharray": DASHES[i % DASHES.length] }}
      />
      {dayMarks.map(({ position: [longitude, latitude], label }) => (
        <Marker key={label} longitude={longitude} latitude={latitude} anchor="left" offset={[-4, 0]}>
          <span className="day-label">
            <span aria-hidden="true">● </span>
            {tracks.length > 1 ? `${name}, ${label}` : label}
          </span>
        </Marker>
      ))}
    </Source>
  ));
}
