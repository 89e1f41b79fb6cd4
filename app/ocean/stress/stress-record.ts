import type { Forcing } from "../forcing/read-forcing";
import type { DragLaw } from "./drag-law";
import { windStress } from "./wind-stress";

/** Stress at the engine's steps: every storm sample and the equal steps between. It runs linearly from one to the next. */
export interface StressRecord {
  /** s since the first sample */
  seconds: Float64Array;
  /** N/m² */
  x: Float64Array;
  y: Float64Array;
  /** Where each storm sample stands among the steps. */
  sample: Int32Array;
}

/**
 * Wind interpolated as a vector to the engine's steps, then turned to stress.
 * @param timeStep longest step, s; each interval between samples is divided into equal parts
 */
export function stressRecord(forcing: Forcing, law: DragLaw, airDensity: number, timeStep: number): StressRecord {
  const { seconds, windU, windV } = forcing;
  const n = seconds.length;
  const sample = new Int32Array(n);
  for (let k = 1; k < n; k++) {
    sample[k] = sample[k - 1] + Math.max(1, Math.ceil((seconds[k] - seconds[k - 1]) / timeStep - 1e-9));
  }
  const length = sample[n - 1] + 1;
  const record = {
    seconds: new Float64Array(length),
    x: new Float64Array(length),
    y: new Float64Array(length),
    sample,
  };
  for (let k = 0; k < n; k++) {
    const parts = k + 1 < n ? sample[k + 1] - sample[k] : 1;
    for (let part = 0; part < parts; part++) {
      const share = part / parts;
      const next = Math.min(k + 1, n - 1);
      const u = windU[k] + share * (windU[next] - windU[k]);
      const v = windV[k] + share * (windV[next] - windV[k]);
      const stress = windStress(u, v, law, airDensity);
      const at = sample[k] + part;
      record.seconds[at] = seconds[k] + share * (seconds[next] - seconds[k]);
      record.x[at] = stress.x;
      record.y[at] = stress.y;
    }
  }
  return record;
}
