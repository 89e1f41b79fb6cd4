import { coriolis } from "../ekman/coriolis";
import type { ScenarioBox } from "../scenario";
import { salinityRegion, type SalinityRegion } from "../seawater/absolute-salinity";
import { ringArea, ringCentre } from "./ring";

/** Where the box lies, as the engine needs it. */
export interface Place {
  /** degrees */
  latitude: number;
  /** Coriolis parameter, 1/s. */
  f: number;
  region: SalinityRegion;
  /** Square root of the box's area, m; null for a point. */
  size: number | null;
  /** m */
  waterDepth: number | null;
  /** degrees true, pointing offshore */
  shoreNormal: number | null;
  /** m */
  distanceToShore: number | null;
}

export function placeOf(box: ScenarioBox): Place {
  const [longitude, latitude] = box.polygon ? ringCentre(box.polygon) : [box.longitude, box.latitude ?? 0];
  return {
    latitude,
    f: coriolis(latitude),
    region: longitude === undefined ? "ocean" : salinityRegion(latitude, longitude),
    size: box.polygon ? Math.sqrt(ringArea(box.polygon)) : null,
    waterDepth: box.waterDepth ?? null,
    shoreNormal: box.shoreNormal ?? null,
    distanceToShore: box.distanceToShore ?? null,
  };
}
