import { columnAtRest } from "~/ocean/column/column-state";
import { ColumnModel } from "~/ocean/column/column-model";
import { lightShares } from "~/ocean/column/light-shares";
import { linearDensity } from "~/ocean/column/linear-density";
import { cycloneSurfaceWind } from "~/ocean/cyclone/surface-wind";
import { coriolis } from "~/ocean/ekman/coriolis";
import { dragLaw } from "~/ocean/stress/drag-law";
import { windStress } from "~/ocean/stress/wind-stress";
import { valueAt } from "~/ocean/water/interpolate";
import { mixedLayerDepth } from "~/ocean/water/layer-depth";
import type { CaseInputs } from "./case-inputs";
import type { CheckMethods } from "../check-methods";
import { dragOptionsOf, lawOf } from "./wind-methods";

const REFERENCE = { rho0: 1025, cp: 3991.86795711963, gravity: 9.81 };

interface Wake {
  /** °C, end less start */
  dSST: number;
  /** m */
  mld03: number;
  mld125: number;
  /** m/s, mean of the speed at 25 m from 12 to 36 h after the peak */
  speed25After: number;
}

/** The column under a cyclone that passes at a distance to the left (positive: the place lies to the right of its way). */
function wakeAt(inputs: CaseInputs, offKm: number): Wake {
  const dz = inputs.number("dz");
  const dt = inputs.number("dt");
  const zprof = inputs.numbers("zprof");
  const cells = Math.round(zprof[zprof.length - 1] / dz);
  const depth = Array.from({ length: cells }, (_, k) => (k + 0.5) * dz);
  const T = depth.map((z) => valueAt(zprof, inputs.numbers("Tprof"), z));
  const S = depth.map(() => inputs.number("S"));
  const density = linearDensity({
    rho0: REFERENCE.rho0,
    alpha: inputs.number("alpha"),
    beta: inputs.number("beta"),
    T0: T[0],
    S0: S[0],
  });
  const state = columnAtRest(T, S, dz, density);
  const latitude = inputs.number("lat");
  const model = new ColumnModel(state, {
    f: coriolis(latitude),
    waterDensity: REFERENCE.rho0,
    heatCapacity: REFERENCE.cp,
    gravity: REFERENCE.gravity,
    bulkRichardson: 0.65,
    gradientRichardson: 0.25,
    gradientMixing: true,
    dampingRate: 0,
    bottomDrag: 0,
    lightShares: lightShares(null, cells, dz),
    referenceSalinity: S[0],
  });
  const cyclone = {
    centralPressure: inputs.number("pc") * 100,
    ambientPressure: inputs.number("pn") * 100,
    radiusOfMaximumWind: inputs.number("Rm") * 1000,
    B: inputs.number("B"),
    latitude,
    airDensity: inputs.number("rhoAir", 1.15),
  };
  const motion = {
    translationSpeed: inputs.number("vt"),
    translationTo: 0,
    reduction: inputs.number("reduction", 0.9),
  };
  const law = dragLaw(lawOf(inputs), dragOptionsOf(inputs));
  const scale = inputs.number("windScale", 1);
  const peak = inputs.number("peakAtHour") * 3600;
  const steps = Math.round((inputs.number("hours") * 3600) / dt);
  let [speeds, count] = [0, 0];
  for (let step = 0; step < steps; step++) {
    const t = (step + 0.5) * dt;
    const wind = cycloneSurfaceWind(cyclone, motion, offKm * 1000, -motion.translationSpeed * (t - peak));
    const stress = windStress(scale * wind.u, scale * wind.v, law, cyclone.airDensity);
    const inWindow = Math.abs(t - peak) < (inputs.number("heatFluxWindowHours") * 3600) / 2;
    model.step(dt, {
      tauX: stress.x,
      tauY: stress.y,
      nonSolarHeat: inWindow ? inputs.number("Q") : 0,
      shortwave: 0,
      freshWater: 0,
    });
    const after = (step + 1) * dt - peak;
    if (after < 12 * 3600 || after > 36 * 3600) continue;
    speeds += Math.hypot(valueAt(depth, state.u, 25), valueAt(depth, state.v, 25));
    count++;
  }
  return {
    dSST: state.T[0] - T[0],
    mld03: mixedLayerDepth(depth, state.rho, 0.03, cells * dz),
    mld125: mixedLayerDepth(depth, state.rho, 0.125, cells * dz),
    speed25After: count === 0 ? 0 : speeds / count,
  };
}

export const stormMethods: CheckMethods = {
  "endToEnd.storm": (inputs) => ({ ...wakeAt(inputs, inputs.number("offKm")) }),
  "endToEnd.stormSection": (inputs) => {
    const offsets = inputs.numbers("offsKm");
    const cooling = offsets.map((offKm) => -wakeAt(inputs, offKm).dSST);
    const most = Math.max(...cooling);
    const nearest = (target: number) =>
      offsets.reduce((best, _, k) => (Math.abs(offsets[k] - target) < Math.abs(offsets[best] - target) ? k : best), 0);
    return {
      ratioTrackToMax: cooling[nearest(0)] / most,
      ratioLeftToMax: cooling[offsets.indexOf(Math.min(...offsets))] / most,
      maxAtKm: offsets[cooling.indexOf(most)],
      maxCooling: most,
    };
  },
};
