import type { FeatureCollection } from "geojson";
import { useEffect, useState } from "react";
import { Layer, type MapRef, Source, useMap } from "react-map-gl/maplibre";
import type { MapColours } from "./map-colours.client";
import { graticule, type Graticule } from "~/area/graticule";

interface Labelled {
  /** Changes only when other lines come into view, so that panning does not send them to the map anew. */
  lines: FeatureCollection;
  key: string;
  /** Pixels from the map's left and top edges. */
  places: { key: string; label: string; left?: number; top?: number }[];
}

/** Meridians and parallels with labels along the map's left and upper edges; the labels are text of the page. */
export function GraticuleLayer({ colours }: { colours: MapColours }) {
  const { current: map } = useMap();
  const [drawn, setDrawn] = useState<Labelled | null>(null);
  useEffect(() => {
    if (!map) return;
    const redraw = () => setDrawn((before) => labelled(map, before));
    redraw();
    map.on("move", redraw);
    map.on("resize", redraw);
    return () => {
      map.off("move", redraw);
      map.off("resize", redraw);
    };
  }, [map]);
  if (!drawn) return null;
  return (
    <>
      <Source id="graticule" type="geojson" data={drawn.lines}>
        <Layer
          id="graticule"
          type="line"
          paint={{ "line-color": colours.quiet, "line-width": 0.5, "line-opacity": 0.55 }}
        />
      </Source>
      <div aria-hidden="true" className="graticule-labels">
        {drawn.places.map(({ key, label, left, top }) => (
          <span key={key} className={left === undefined ? "at-left" : "at-top"} style={{ left, top }}>
            {label}
          </span>
        ))}
      </div>
    </>
  );
}

/** Room kept free at the corner where both rows of labels would meet, and at the far ends, pixels. */
const CLEARANCE = 36;

function labelled(map: MapRef, before: Labelled | null): Labelled {
  const bounds = map.getBounds();
  const view = { west: bounds.getWest(), south: bounds.getSouth(), east: bounds.getEast(), north: bounds.getNorth() };
  const lines = graticule(view);
  const { clientWidth: width, clientHeight: height } = map.getContainer();
  const meridians = lines.meridians.map(({ at, label }) => ({
    key: `m${at}`,
    label,
    left: map.project([at, (view.south + view.north) / 2]).x,
  }));
  const parallels = lines.parallels.map(({ at, label }) => ({
    key: `p${at}`,
    label,
    top: map.project([(view.west + view.east) / 2, at]).y,
  }));
  const key = [...lines.meridians, ...lines.parallels].map(({ label }) => label).join();
  return {
    key,
    lines: before?.key === key ? before.lines : toGeoJson(lines),
    places: [
      ...meridians.filter(({ left }) => left > CLEARANCE && left < width - 2 * CLEARANCE),
      ...parallels.filter(({ top }) => top > CLEARANCE && top < height - CLEARANCE),
    ],
  };
}

const POLEWARD = 85;

function toGeoJson({ meridians, parallels }: Graticule): FeatureCollection {
  const line = (coordinates: [number, number][]) => ({
    type: "Feature" as const,
    properties: {},
    geometry: { type: "LineString" as const, coordinates },
  });
  const west = (meridians[0]?.at ?? -180) - 360;
  const east = (meridians.at(-1)?.at ?? 180) + 360;
  return {
    type: "FeatureCollection",
    features: [
      ...meridians.map(({ at }) =>
        line([
          [at, -POLEWARD],
          [at, POLEWARD],
        ]),
      ),
      ...parallels.map(({ at }) =>
        line([
          [west, at],
          [east, at],
        ]),
      ),
    ],
  };
}
