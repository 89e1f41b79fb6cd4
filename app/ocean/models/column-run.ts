import { columnAtRest, renewDensity, type ColumnState } from "../column/column-state";
import { ColumnModel, type ColumnForcing } from "../column/column-model";
import { lightShares } from "../column/light-shares";
import { mixStatically } from "../column/static-mixing";
import type { Place } from "../box/place";
import { FRESH_WATER_DENSITY, HOTTEST, SALTIEST } from "../constants";
import { OceanError } from "../errors";
import type { Forcing } from "../forcing/read-forcing";
import { assumedRainHeatLoss } from "../heat/assumed-rain-heat";
import { latentHeatOfVaporisation } from "../heat/evaporation";
import { waterClarity } from "../heat/shortwave";
import type { ResolvedMethod } from "../method/resolve-method";
import { emptyMotion, vectorBudget, type Motion } from "../motion/motion";
import { potentialFromConservative } from "../seawater/conservative-temperature";
import { potentialDensityInto } from "../seawater/density";
import { freezingTemperature } from "../seawater/freezing";
import { inertialShare } from "../slab/inertial-share";
import type { DragLaw } from "../stress/drag-law";
import { windStress } from "../stress/wind-stress";
import { BELOW_BASE, type InitialWater } from "../water/initial-water";
import { valueAt } from "../water/interpolate";
import { mixedLayerDepth } from "../water/layer-depth";
import type { LayerState } from "./run-model";

/** The column at some of the storm's samples, for the depth–time sections of a response. */
export interface ColumnRecord {
  /** Cell centres, m. */
  depth: Float64Array;
  /** Which of the storm's samples are kept. */
  sample: number[];
  /** By kept sample, then cell. */
  CT: Float64Array[];
  SA: Float64Array[];
  east: Float64Array[];
  north: Float64Array[];
}

/** More profiles than this are not kept: a figure cannot show them and the answer would be too long. */
const MOST_PROFILES = 250;

interface ColumnCase {
  place: Place;
  method: ResolvedMethod;
  law: DragLaw;
  forcing: Forcing;
  water: InitialWater;
}

/**
 * Runs the column through the storm, from rest; the forcing of a step is that at its middle. Order in the step: heat and
 * salt exact, currents of water mixed as a whole second, shear mixing of a smooth profile between half and first; at a
 * sharp interface it has none, and the cooling scatters by up to a seventh (`estimate.steps.test.ts`).
 * @throws OceanError INVALID_INPUT where a cell cannot hold its heat or rain; NOT_CONVERGED
 */
export function runColumn({ place, method, law, forcing, water }: ColumnCase): {
  motion: Motion;
  layer: LayerState;
  column: ColumnRecord;
} {
  const { state, reachesBed } = initialColumn(water, place, method);
  const saltReference = state.S[0];
  const model = new ColumnModel(state, {
    f: place.f,
    waterDensity: method.waterDensity,
    heatCapacity: method.heatCapacity,
    gravity: method.gravity,
    bulkRichardson: method.bulkRichardson,
    gradientRichardson: method.gradientRichardson,
    gradientMixing: method.gradientMixing,
    dampingRate: method.dampingRate,
    bottomDrag: reachesBed ? method.bottomDrag : 0,
    lightShares: lightShares(
      method.penetratingShortwave ? waterClarity(method.waterType) : null,
      state.cells,
      state.cellSize,
    ),
    referenceSalinity: saltReference,
  });
  const n = forcing.seconds.length;
  const motion = emptyMotion(n);
  const layerDepth = new Float64Array(n);
  const [CT, SA] = [new Float64Array(n), new Float64Array(n)];
  const depth = Float64Array.from({ length: state.cells }, (_, k) => (k + 0.5) * state.cellSize);
  const keepEvery = Math.ceil(n / MOST_PROFILES);
  const column: ColumnRecord = { depth, sample: [], CT: [], SA: [], east: [], north: [] };
  const totals = { heatIn: 0, saltIn: 0, deficit: 0, momentumX: 0, momentumY: 0, displacementX: 0, displacementY: 0 };
  const start = { heat: sum(state.T), salt: sum(state.S) };
  const step: ColumnForcing = { tauX: 0, tauY: 0, nonSolarHeat: 0, shortwave: 0, freshWater: 0 };

  for (let k = 0; k < n; k++) {
    if (k > 0) advance(k - 1);
    record(k);
  }
  const perCell = method.waterDensity * state.cellSize;
  const heatChange = perCell * method.heatCapacity * (sum(state.T) - start.heat);
  const saltChange = (perCell / 1000) * (sum(state.S) - start.salt);
  motion.momentum = vectorBudget(
    { x: perCell * sum(state.u), y: perCell * sum(state.v) },
    { x: method.waterDensity * totals.momentumX, y: method.waterDensity * totals.momentumY },
  );
  return {
    motion,
    column,
    layer: {
      CT,
      SA,
      layerDepth,
      below: waterUnder(layerDepth[n - 1]),
      freezingDeficit: totals.deficit,
      heat: { change: heatChange, input: totals.heatIn, residual: heatChange - totals.heatIn },
      salt: { change: saltChange, input: totals.saltIn, residual: saltChange - totals.saltIn },
    },
  };

  /** Through the interval from sample k to the next. */
  function advance(k: number): void {
    const interval = forcing.seconds[k + 1] - forcing.seconds[k];
    const parts = Math.max(1, Math.ceil(interval / method.timeStep - 1e-9));
    const dt = interval / parts;
    for (let part = 0; part < parts; part++) {
      forceAt(k, (part + 0.5) / parts);
      const [u0, v0] = [state.u[0], state.v[0]];
      const [transportX, transportY] = [sum(state.u), sum(state.v)];
      const [lostX, lostY] = [model.lostX, model.lostY];
      model.step(dt, step);
      requireBearable(forcing.seconds[k] + (part + 1) * dt);
      totals.deficit += holdAtFreezing();
      totals.heatIn += (step.nonSolarHeat + step.shortwave) * dt;
      totals.saltIn -= ((method.waterDensity * saltReference) / 1000) * step.freshWater * dt;
      totals.displacementX += ((u0 + state.u[0]) / 2) * dt;
      totals.displacementY += ((v0 + state.v[0]) / 2) * dt;
      motion.volumeEast += ((transportX + sum(state.u)) / 2) * state.cellSize * dt;
      motion.volumeNorth += ((transportY + sum(state.v)) / 2) * state.cellSize * dt;
      turnMomentum(dt, model.lostX - lostX, model.lostY - lostY);
    }
  }

  /** What the whole column's momentum (per ρ0) must be: turned, pushed by the stress, less what bed and damping took. */
  function turnMomentum(dt: number, lostX: number, lostY: number): void {
    const angle = (place.f * dt) / 2;
    const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
    const x = totals.momentumX * cos + totals.momentumY * sin + (step.tauX * dt) / method.waterDensity;
    const y = totals.momentumY * cos - totals.momentumX * sin + (step.tauY * dt) / method.waterDensity;
    totals.momentumX = x * cos + y * sin - lostX;
    totals.momentumY = y * cos - x * sin - lostY;
  }

  function forceAt(k: number, share: number): void {
    const between = (series: Float64Array) => series[k] + share * (series[k + 1] - series[k]);
    const heatAt = (series: Float64Array) => (forcing.heatInterpolation === "hold" ? series[k] : between(series));
    const stress = windStress(between(forcing.windU), between(forcing.windV), law, method.airDensity);
    step.tauX = stress.x;
    step.tauY = stress.y;
    step.shortwave = forcing.shortwave ? heatAt(forcing.shortwave) : 0;
    step.nonSolarHeat = heatAt(forcing.netHeat) - step.shortwave;
    if (method.rainHeat && forcing.rain[k] > 0) {
      step.nonSolarHeat -= assumedRainHeatLoss(forcing.rain[k], surfaceTemperature());
    }
    step.freshWater = forcing.rain[k];
    if (forcing.evaporation) step.freshWater -= forcing.evaporation[k];
    else if (forcing.latent)
      step.freshWater +=
        heatAt(forcing.latent) / (FRESH_WATER_DENSITY * latentHeatOfVaporisation(surfaceTemperature()));
  }

  /** °C, as the air meets it: in fresh water it is a degree and more below the Conservative Temperature. */
  function surfaceTemperature(): number {
    return potentialFromConservative(state.S[0], state.T[0]);
  }

  function requireBearable(seconds: number): void {
    if (state.S[0] >= 0 && state.S[0] <= SALTIEST && state.T[0] <= HOTTEST) return;
    const hours = (seconds / 3600).toFixed(1);
    throw new OceanError(
      "INVALID_INPUT",
      `After ${hours} h the uppermost cell of ${state.cellSize} m cannot hold its rain or heat; use larger cells (cellSize) or a shorter timeStep, or check the series.`,
    );
  }

  /** @returns the heat that was not taken from cells at their freezing point, J/m² */
  function holdAtFreezing(): number {
    let kept = 0;
    for (let cell = 0; cell < state.cells && state.T[cell] < 0.1; cell++) {
      const freezing = freezingTemperature(state.S[cell], 0);
      if (state.T[cell] >= freezing) break;
      kept += freezing - state.T[cell];
      state.T[cell] = freezing;
      renewDensity(state, cell, cell + 1);
    }
    if (kept === 0) return 0;
    // Near freezing brackish water is the lighter the colder it is: what was held may now lie too high.
    mixStatically(state);
    const heat = kept * method.waterDensity * method.heatCapacity * state.cellSize;
    totals.heatIn += heat;
    return heat;
  }

  function record(k: number): void {
    CT[k] = state.T[0];
    SA[k] = state.S[0];
    layerDepth[k] = mixedLayerDepth(depth, state.rho, method.layerDensityStep, state.cells * state.cellSize);
    motion.driftEast[k] = state.u[0];
    motion.driftNorth[k] = state.v[0];
    motion.displacementEast[k] = totals.displacementX;
    motion.displacementNorth[k] = totals.displacementY;
    motion.transportEast[k] = sum(state.u) * state.cellSize;
    motion.transportNorth[k] = sum(state.v) * state.cellSize;
    const stress = windStress(forcing.windU[k], forcing.windV[k], law, method.airDensity);
    const mass = method.waterDensity * layerDepth[k];
    motion.inertialShare[k] = inertialShare(state.u[0], state.v[0], stress.x, stress.y, {
      f: place.f,
      dampingRate: method.dampingRate,
      mass,
    });
    if (k % keepEvery !== 0 && k !== n - 1) return;
    column.sample.push(k);
    column.CT.push(state.T.slice());
    column.SA.push(state.S.slice());
    column.east.push(state.u.slice());
    column.north.push(state.v.slice());
  }

  function waterUnder(base: number): { CT: number; SA: number } | null {
    if (base >= depth[depth.length - 1]) return null;
    return { CT: valueAt(depth, state.T, base + BELOW_BASE), SA: valueAt(depth, state.S, base + BELOW_BASE) };
  }
}

/** Cells filled from the profile at their centres, down to the bed or the greatest depth asked for. */
function initialColumn(
  water: InitialWater,
  place: Place,
  method: ResolvedMethod,
): { state: ColumnState; reachesBed: boolean } {
  const { profile } = water;
  if (profile === null)
    throw new OceanError("INVALID_INPUT", "The column model needs a cast, or the water below the layer.");
  const reachesBed = place.waterDepth !== null && place.waterDepth <= method.maxDepth;
  const bottom = reachesBed && place.waterDepth !== null ? place.waterDepth : method.maxDepth;
  const cells = Math.max(2, Math.round(bottom / method.cellSize));
  const cellSize = bottom / cells;
  const centres = Array.from({ length: cells }, (_, k) => (k + 0.5) * cellSize);
  const T = centres.map((z) => valueAt(profile.depth, profile.CT, z));
  const S = centres.map((z) => valueAt(profile.depth, profile.SA, z));
  return { state: columnAtRest(T, S, cellSize, potentialDensityInto), reachesBed };
}

function sum(values: Float64Array): number {
  let total = 0;
  for (let k = 0; k < values.length; k++) total += values[k];
  return total;
}
