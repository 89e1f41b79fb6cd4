import { inertialShare } from "../slab/inertial-share";
import { SlabIntegrator, slabPath, type SlabSetting } from "../slab/slab-integrator";
import type { StressRecord } from "../stress/stress-record";
import { emptyMotion, vectorBudget, type Motion } from "./motion";

/** A slab from rest under the storm's stress; transport is that of the whole slab, inertial motion included. */
export function slabMotion(stress: StressRecord, setting: SlabSetting): Motion {
  const { sample, seconds, x, y } = stress;
  const { f, dampingRate, layerDepth } = setting;
  const mass = setting.waterDensity * layerDepth;
  const motion = emptyMotion(sample.length);
  const slab = new SlabIntegrator(setting);
  const path = slabPath(seconds.length);
  slab.follow(stress, path);
  for (let k = 0; k < sample.length; k++) {
    const knot = sample[k];
    motion.driftEast[k] = path.u[knot];
    motion.driftNorth[k] = path.v[knot];
    motion.displacementEast[k] = path.x[knot];
    motion.displacementNorth[k] = path.y[knot];
    motion.transportEast[k] = path.u[knot] * layerDepth;
    motion.transportNorth[k] = path.v[knot] * layerDepth;
    motion.inertialShare[k] = inertialShare(path.u[knot], path.v[knot], x[knot], y[knot], { f, dampingRate, mass });
  }
  const impulse = { x: 0, y: 0 };
  for (let k = 0; k + 1 < seconds.length; k++) {
    const dt = seconds[k + 1] - seconds[k];
    impulse.x += ((x[k] + x[k + 1]) / 2) * dt;
    impulse.y += ((y[k] + y[k + 1]) / 2) * dt;
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
