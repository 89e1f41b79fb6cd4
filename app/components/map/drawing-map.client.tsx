import { useEffect, useEffectEvent, useLayoutEffect, useRef, useState } from "react";
import { type MapRef, useMap } from "react-map-gl/maplibre";
import BaseMap from "./base-map.client";
import { BoxDrawing } from "./box-drawing.client";
import type { DrawingTool } from "./box-editor";
import { BoxLayers } from "./box-layers.client";
import { whenStyled } from "./when-styled.client";
import { type MapColours, useMapColours } from "./map-colours.client";
import type { DrawnRing } from "~/area/ring-history";
import { viewOf } from "~/area/view-of";
import type { Position } from "~/ocean/scenario";
import type { UnitChoices } from "~/units/unit-choices";

interface DrawingProps {
  ring: DrawnRing;
  tool: DrawingTool;
  onTool(tool: DrawingTool): void;
  onPreview(ring: DrawnRing): void;
  onCommit(ring: DrawnRing): void;
  /** Esc with nothing left to end: the keyboard goes on to the text. */
  onLeave(): void;
}

interface DrawingMapProps extends DrawingProps {
  otherBoxes: { name: string; polygon: Position[] }[];
  units: UnitChoices;
}

export default function DrawingMap({ otherBoxes, units, ...drawing }: DrawingMapProps) {
  const colours = useMapColours();
  const [view] = useState(() =>
    viewOf(drawing.ring && drawing.ring.length > 0 ? [drawing.ring] : otherBoxes.map(({ polygon }) => polygon)),
  );
  return (
    <BaseMap view={view} distanceUnit={units.distance} label="Map for drawing the study box">
      <BoxLayers boxes={otherBoxes} colours={colours} />
      <Drawing {...drawing} colours={colours} />
    </BaseMap>
  );
}

/** Puts the drawing on the map it lies in, and keeps both in step. */
function Drawing({
  ring,
  tool,
  onTool,
  onPreview,
  onCommit,
  onLeave,
  colours,
}: DrawingProps & { colours: MapColours }) {
  const { current: map } = useMap();
  const drawing = useRef<BoxDrawing | null>(null);
  const preview = useEffectEvent(onPreview);
  const commit = useEffectEvent(onCommit);
  const drawn = useEffectEvent(() => onTool("edit"));
  const start = useEffectEvent((on: BoxDrawing) => {
    on.show(ring);
    on.use(tool);
  });

  // A layout effect, so that the drawing leaves before the map under it is taken away.
  useLayoutEffect(() => {
    if (!map) return;
    const begin = () => {
      const events = {
        onPreview: (next: DrawnRing) => preview(next),
        onCommit: (next: DrawnRing) => commit(next),
        onDrawn: () => drawn(),
      };
      drawing.current = new BoxDrawing(map.getMap(), Math.round(map.getCenter().lng), colours, events);
      start(drawing.current);
    };
    const stopWaiting = whenStyled(map, begin);
    return () => {
      stopWaiting();
      drawing.current?.stop();
      drawing.current = null;
    };
  }, [map, colours]);

  useEffect(() => {
    const shape = drawing.current?.show(ring);
    if (map && shape) bringIntoView(map, shape);
  }, [map, ring]);
  useEffect(() => drawing.current?.use(tool), [tool]);

  const leave = useEffectEvent((event: KeyboardEvent) => {
    if (event.key !== "Escape") return;
    if (tool !== "edit" && ring !== null) onTool("edit");
    else onLeave();
  });
  useEffect(() => {
    const canvas = map?.getCanvas();
    const onKey = (event: KeyboardEvent) => leave(event);
    canvas?.addEventListener("keyup", onKey);
    return () => canvas?.removeEventListener("keyup", onKey);
  }, [map]);
  return null;
}

/** Corners that were typed may lie far from what the map shows. */
function bringIntoView(map: MapRef, ring: Position[]): void {
  const { west, south, east, north } = viewOf([ring]);
  const corners = [map.project([west, north]), map.project([east, south])];
  const { clientWidth: width, clientHeight: height } = map.getContainer();
  if (corners.every(({ x, y }) => x >= 0 && y >= 0 && x <= width && y <= height)) return;
  map.fitBounds([west, south, east, north], { padding: 64, maxZoom: 11, animate: false });
}
