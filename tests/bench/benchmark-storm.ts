import { columnAtRest } from "~/ocean/column/column-state";
import { ColumnModel } from "~/ocean/column/column-model";
import { lightShares } from "~/ocean/column/light-shares";
import { EARTH_ROTATION, GRAVITY, HEAT_CAPACITY, MM_PER_HOUR, REFERENCE_DENSITY } from "~/ocean/constants";
import { waterClarity } from "~/ocean/heat/shortwave";
import { potentialDensityInto } from "~/ocean/seawater/density";
import { SlabIntegrator, type SlabPath, type StressKnots } from "~/ocean/slab/slab-integrator";
import { mixedLayerDepth } from "~/ocean/water/layer-depth";

/** The storm that the engine's hot loops are timed on; each run also gives figures whose right values are known. */
export const TIME_STEP = 900;
const CELL_SIZE = 1;
const CORIOLIS = 2 * EARTH_ROTATION * Math.sin(Math.PI / 6);

function stressAt(hour: number): { x: number; y: number } {
  const rising = 0.05 + (1.95 * hour) / 120;
  const falling = 2 - (1.9 * (hour - 120)) / 120;
  const size = hour < 120 ? rising : hour < 240 ? falling : 0.1;
  const angle = (-2 * Math.PI * hour) / 48;
  return { x: size * Math.cos(angle), y: size * Math.sin(angle) };
}

export interface ColumnFigures {
  sst: number;
  sss: number;
  mld03: number;
  u0: number;
  v0: number;
  exchanges: number;
}

export function runBenchmarkColumn(levels: number, steps: number, windFactor = 1): ColumnFigures {
  const depth = Array.from({ length: levels }, (_, k) => (k + 0.5) * CELL_SIZE);
  const beneath = depth.map((z) => Math.max(0, z - 15));
  const state = columnAtRest(
    beneath.map((b) => Math.max(2, 28 - 0.05 * b)),
    beneath.map((b) => 35 + 0.002 * b),
    CELL_SIZE,
    potentialDensityInto,
  );
  const model = new ColumnModel(state, {
    f: CORIOLIS,
    waterDensity: REFERENCE_DENSITY,
    heatCapacity: HEAT_CAPACITY,
    gravity: GRAVITY,
    bulkRichardson: 0.65,
    gradientRichardson: 0.25,
    gradientMixing: true,
    dampingRate: 0,
    bottomDrag: 0,
    lightShares: lightShares(waterClarity("IB"), levels, CELL_SIZE),
    referenceSalinity: 35,
  });
  const stressFactor = windFactor * windFactor;
  for (let step = 0; step < steps; step++) {
    const hour = ((step + 0.5) * TIME_STEP) / 3600;
    const stress = stressAt(hour);
    model.step(TIME_STEP, {
      tauX: stressFactor * stress.x,
      tauY: stressFactor * stress.y,
      nonSolarHeat: -300,
      shortwave: 600 * Math.max(0, Math.sin((2 * Math.PI * (hour - 6)) / 24)),
      freshWater: hour >= 114 && hour < 126 ? 10 * MM_PER_HOUR : 0,
    });
  }
  return {
    sst: state.T[0],
    sss: state.S[0],
    mld03: mixedLayerDepth(depth, state.rho, 0.03, levels * CELL_SIZE),
    u0: state.u[0],
    v0: state.v[0],
    exchanges: model.exchanges,
  };
}

export interface SlabFigures {
  u: number;
  v: number;
  x: number;
  y: number;
  peakSpeed: number;
}

/** Stress at the knots of a slab run, made beforehand so that only the slab is timed. */
export function benchmarkKnots(steps: number): StressKnots {
  const length = steps + 1;
  const knots = { seconds: new Float64Array(length), x: new Float64Array(length), y: new Float64Array(length) };
  for (let step = 0; step <= steps; step++) {
    knots.seconds[step] = step * TIME_STEP;
    const stress = stressAt((step * TIME_STEP) / 3600);
    knots.x[step] = stress.x;
    knots.y[step] = stress.y;
  }
  return knots;
}

export function runBenchmarkSlab(knots: StressKnots, path: SlabPath): SlabFigures {
  const slab = new SlabIntegrator({
    f: CORIOLIS,
    dampingRate: 1 / (4 * 86400),
    layerDepth: 30,
    waterDensity: REFERENCE_DENSITY,
  });
  slab.follow(knots, path);
  let peakSquared = 0;
  for (let k = 0; k < path.u.length; k++) peakSquared = Math.max(peakSquared, path.u[k] ** 2 + path.v[k] ** 2);
  return { u: slab.u, v: slab.v, x: slab.x, y: slab.y, peakSpeed: Math.sqrt(peakSquared) };
}
