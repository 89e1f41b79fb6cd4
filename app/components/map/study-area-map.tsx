import { lazy } from "react";
import { MapFrame } from "./map-frame";
import type { DriftTrack } from "~/area/drift-track";
import type { Position } from "~/ocean/scenario";
import type { UnitChoices } from "~/units/unit-choices";

export interface StudyAreaMapProps {
  boxes: { id?: string; name: string; polygon: Position[] }[];
  units: UnitChoices;
  selectedId?: string;
  /** Water depths to write on the map, m. */
  depthLabels?: { position: Position; depth: number }[];
  tracks?: DriftTrack[];
  /** Thin closed lines, as of wind radii. */
  rings?: Position[][];
  /** Name of the map for screen readers. */
  label?: string;
  className?: string;
}

const StudyAreaCanvas = lazy(() => import("./study-area-canvas.client"));

/** A map to look at: boxes with their names, and where given depths and drift tracks. Rendered in the browser only. */
export function StudyAreaMap(props: StudyAreaMapProps) {
  return (
    <MapFrame withoutMap="The boxes are listed on this page." className={props.className}>
      <StudyAreaCanvas {...props} />
    </MapFrame>
  );
}
