import type { Budget } from "../response";

/** How the layer moved, at each of the storm's n samples. */
export interface Motion {
  /** m/s */
  driftEast: Float64Array;
  driftNorth: Float64Array;
  /** m from the start */
  displacementEast: Float64Array;
  displacementNorth: Float64Array;
  /** m²/s, summed over the moving water */
  transportEast: Float64Array;
  transportNorth: Float64Array;
  /** Volume moved through a metre of line since the start, m³/m, in the last sample. */
  volumeEast: number;
  volumeNorth: number;
  /** 0…1 */
  inertialShare: Float64Array;
  /** kg/m/s per m² of sea surface */
  momentum: Budget;
}

export function emptyMotion(n: number): Motion {
  return {
    driftEast: new Float64Array(n),
    driftNorth: new Float64Array(n),
    displacementEast: new Float64Array(n),
    displacementNorth: new Float64Array(n),
    transportEast: new Float64Array(n),
    transportNorth: new Float64Array(n),
    volumeEast: 0,
    volumeNorth: 0,
    inertialShare: new Float64Array(n),
    momentum: { change: 0, input: 0, residual: 0 },
  };
}

/** Budget of a vector: sizes of what changed, of what was put in, and of the difference between the two. */
export function vectorBudget(change: { x: number; y: number }, input: { x: number; y: number }): Budget {
  return {
    change: Math.hypot(change.x, change.y),
    input: Math.hypot(input.x, input.y),
    residual: Math.hypot(change.x - input.x, change.y - input.y),
  };
}
