import { driftTrack, type DriftTrack } from "~/area/drift-track";
import { measureBox } from "~/area/measure-box";
import type { ResponseSeries } from "~/ocean/response";
import type { Position } from "~/ocean/scenario";
import { epochSeconds } from "~/units/format-time";

/** More corners than this no map can show, and every one of them travels to the browser. */
const MOST_POINTS = 600;

/** The way of the layer from the middle of its box, for the map. */
export function layerTrack(box: { name: string; polygon: Position[] }, series: ResponseSeries): DriftTrack {
  const step = Math.ceil(series.time.length / MOST_POINTS);
  const last = series.time.length - 1;
  const thin = <Value>(values: Value[]) => values.filter((_, index) => index % step === 0 || index === last);
  return driftTrack(
    box.name,
    measureBox(box.polygon).centroid,
    thin(series.time).map(epochSeconds),
    thin(series.displacementEast),
    thin(series.displacementNorth),
  );
}
