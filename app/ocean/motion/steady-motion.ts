import type { StressRecord } from "../stress/stress-record";
import { emptyMotion, vectorBudget, type Motion } from "./motion";

/** A linear answer to the stress of the moment: rows east and north, columns τx and τy. */
export interface Matrix2 {
  xx: number;
  xy: number;
  yx: number;
  yy: number;
}

export interface SteadyResponse {
  /** Layer-mean drift per stress, (m/s)/(N/m²). */
  drift: Matrix2;
  /** Volume transport per stress, (m²/s)/(N/m²). */
  transport: Matrix2;
  /** Stress on the bed, and pressure on the shore, per wind stress. */
  resistance: Matrix2;
  /** Coriolis parameter 1/s and density kg/m³, for the momentum balance. */
  f: number;
  waterDensity: number;
}

export function apply(matrix: Matrix2, x: number, y: number): { x: number; y: number } {
  return { x: matrix.xx * x + matrix.xy * y, y: matrix.yx * x + matrix.yy * y };
}

/** Drift that follows the stress at once; its displacement is exact for a stress that runs linearly between steps. */
export function steadyMotion(stress: StressRecord, response: SteadyResponse): Motion {
  const { sample, seconds, x, y } = stress;
  const motion = emptyMotion(sample.length);
  const impulse = { x: 0, y: 0 };
  for (let k = 0; k < sample.length; k++) {
    for (let step = k === 0 ? 0 : sample[k - 1]; step < sample[k]; step++) {
      const dt = seconds[step + 1] - seconds[step];
      impulse.x += ((x[step] + x[step + 1]) / 2) * dt;
      impulse.y += ((y[step] + y[step + 1]) / 2) * dt;
    }
    const at = sample[k];
    const drift = apply(response.drift, x[at], y[at]);
    const transport = apply(response.transport, x[at], y[at]);
    const displacement = apply(response.drift, impulse.x, impulse.y);
    motion.driftEast[k] = drift.x;
    motion.driftNorth[k] = drift.y;
    motion.transportEast[k] = transport.x;
    motion.transportNorth[k] = transport.y;
    motion.displacementEast[k] = displacement.x;
    motion.displacementNorth[k] = displacement.y;
  }
  const volume = apply(response.transport, impulse.x, impulse.y);
  motion.volumeEast = volume.x;
  motion.volumeNorth = volume.y;
  // Steady: nothing is stored; the wind's impulse goes into turning the transport, the bed and the shore.
  const resisted = apply(response.resistance, impulse.x, impulse.y);
  const turning = response.waterDensity * response.f;
  motion.momentum = vectorBudget(
    { x: 0, y: 0 },
    { x: impulse.x + turning * volume.y - resisted.x, y: impulse.y - turning * volume.x - resisted.y },
  );
  return motion;
}
