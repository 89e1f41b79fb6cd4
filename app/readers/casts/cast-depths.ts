import { depthFromPressure } from "~/ocean/seawater/depth-from-pressure";
import { pressureFromDepth } from "~/ocean/seawater/pressure-from-depth";
import type { Understood } from "../reading";
import type { CastAnswers, CastChannel, CastQuestion } from "./cast-reading";

/** Latitude for depth where the file tells none, degrees: the pole and the equator differ from it by 0.3 %. */
const ASSUMED_LATITUDE = 45;

export interface CastDepths {
  /** dbar, one a record */
  pressure: Float64Array;
  /** m, positive down, one a record */
  depth: Float64Array;
  notes: Understood[];
  question: CastQuestion | null;
}

/**
 * Pressure and depth, each from the other where the file has one alone; in the air both are 0. A depth that is written
 * negative downwards is turned.
 * @param told latitude of the file, degrees, or null
 */
export function castDepths(
  values: ReadonlyMap<CastChannel, Float64Array>,
  told: number | null,
  answers: CastAnswers,
): CastDepths {
  const latitude = answers.latitude ?? told ?? ASSUMED_LATITUDE;
  const notes: Understood[] = [];
  const pressure = values.get("pressure");
  const written = values.get("depth");
  const depth = written && turnedDown(written, notes);
  const derive = (from: Float64Array, formula: (value: number, latitude: number) => number) =>
    from.map((value) => (Number.isNaN(value) ? NaN : formula(Math.max(0, value), latitude)));
  const none = new Float64Array();
  const needsLatitude = depth === undefined && told === null;
  return {
    pressure: pressure ?? derive(depth ?? none, pressureFromDepth),
    depth: depth ?? derive(pressure ?? none, depthFromPressure),
    notes,
    question: needsLatitude ? latitudeQuestion(answers) : null,
  };
}

function turnedDown(depth: Float64Array, notes: Understood[]): Float64Array {
  let [up, down] = [0, 0];
  for (const value of depth) {
    if (value < 0) up += 1;
    if (value > 0) down += 1;
  }
  if (up <= down) return depth;
  notes.push({ what: "Depth", taken: "written negative downwards, turned", confidence: "by content" });
  return depth.map((value) => -value);
}

function latitudeQuestion({ latitude }: CastAnswers): CastQuestion {
  return {
    key: "latitude",
    needed: false,
    message: `Depth follows from pressure by the latitude, which the file does not tell; without one ${ASSUMED_LATITUDE}° is assumed, within 0.3 %.`,
    suggestion: String(ASSUMED_LATITUDE),
    ...(latitude !== undefined && { answer: String(latitude) }),
  };
}
