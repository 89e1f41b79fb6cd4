import { inertialShare } from "../slab/inertial-share";
import { SlabIntegrator, type SlabSetting } from "../slab/slab-integrator";
import type { StressRecord } from "../stress/stress-record";
import { emptyMotion, vectorBudget, type Motion } from "./motion";

/** A slab from rest under the storm's stress; transport is that of the whole slab, inertial motion included. */
export function slabMotion(stress: StressRecord, setting: SlabSetting): Motion {
  const { sample, seconds, x, y } = stress;
  const { f, dampingRate, layerDepth } = setting;
  const mass = setting.waterDensity * layerDepth;
  const motion = emptyMotion(sample.length);
  const slab = new SlabIntegrator(setting);
  const impulse = { x: 0, y: 0 };
  for (let k = 0; k < sample.length; k++) {
    for (let step = k === 0 ? 0 : sample[k - 1]; step < sample[k]; step++) {
      const dt = seconds[step + 1] - seconds[step];
      slab.step(dt, x[step], y[step], x[step + 1], y[step + 1]);
      impulse.x += ((x[step] + x[step + 1]) / 2) * dt;
      impulse.y += ((y[step] + y[step + 1]) / 2) * dt;
    }
    motion.driftEast[k] = slab.u;
    motion.driftNorth[k] = slab.v;
    motion.displacementEast[k] = slab.x;
    motion.displacementNorth[k] = slab.y;
    motion.transportEast[k] = slab.u * layerDepth;
    motion.transportNorth[k] = slab.v * layerDepth;
    motion.inertialShare[k] = inertialShare(slab.u, slab.v, x[sample[k]], y[sample[k]], { f, dampingRate, mass });
  }
  motion.volumeEast = slab.x * layerDepth;
  motion.volumeNorth = slab.y * layerDepth;
  // d(ρHZ)/dt = τ - (r + if) ρHZ, integrated: what came in is the impulse less what damping and rotation took.
  motion.momentum = vectorBudget(
    { x: mass * slab.u, y: mass * slab.v },
    {
      x: impulse.x - mass * (dampingRate * slab.x - f * slab.y),
      y: impulse.y - mass * (dampingRate * slab.y + f * slab.x),
    },
  );
  return motion;
}
