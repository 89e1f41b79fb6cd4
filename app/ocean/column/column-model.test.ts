import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { columnAtRest, renewDensity } from "./column-state";
import { ColumnModel, type ColumnForcing } from "./column-model";
import { lightShares } from "./light-shares";
import { mixStatically } from "./static-mixing";
import { SlabIntegrator } from "../slab/slab-integrator";
import { waterClarity } from "../heat/shortwave";
import { potentialDensityInto } from "../seawater/density";
import { uniform as number } from "../../../tests/factories/uniform";

const CELLS = 40;
const CELL = 2;
const still: ColumnForcing = { tauX: 0, tauY: 0, nonSolarHeat: 0, shortwave: 0, freshWater: 0 };

interface Change {
  f?: number;
  bottomDrag?: number;
  cells?: number;
}

function column(T: (z: number) => number, S: (z: number) => number, change: Change = {}) {
  const cells = change.cells ?? CELLS;
  const centres = Array.from({ length: cells }, (_, k) => (k + 0.5) * CELL);
  const state = columnAtRest(centres.map(T), centres.map(S), CELL, potentialDensityInto);
  return new ColumnModel(state, {
    f: change.f ?? 1e-4,
    waterDensity: 1025,
    heatCapacity: 3991.86795711963,
    gravity: 9.81,
    bulkRichardson: 0.65,
    gradientRichardson: 0.25,
    gradientMixing: true,
    dampingRate: 0,
    bottomDrag: change.bottomDrag ?? 0,
    lightShares: lightShares(waterClarity("IB"), cells, CELL),
    referenceSalinity: state.S[0],
  });
}

const sum = (values: Float64Array) => values.reduce((total, value) => total + value, 0);
const stratified = () =>
  column(
    (z) => 20 - 0.1 * z,
    (z) => 35 + 0.005 * z,
  );

describe("column", () => {
  it("keeps heat, salt and momentum whatever it mixes, and never leaves a step upside down", () => {
    const forcing = fc.record({
      tauX: number(-2, 2),
      tauY: number(-2, 2),
      nonSolarHeat: number(-800, 200),
      shortwave: number(0, 900),
      freshWater: number(-2e-7, 1e-5),
    });
    fc.assert(
      fc.property(fc.array(forcing, { minLength: 1, maxLength: 8 }), number(-1.4e-4, 1.4e-4), (steps, f) => {
        const model = column(
          (z) => 20 - 0.1 * z,
          (z) => 35 + 0.005 * z,
          { f },
        );
        const { T, S, u, v, rho } = model.state;
        const start = { heat: sum(T), salt: sum(S) };
        let [heat, salt, x, y] = [0, 0, 0, 0];
        const dt = 900;
        for (const step of steps) {
          model.step(dt, step);
          heat += ((step.nonSolarHeat + step.shortwave) * dt) / (1025 * 3991.86795711963 * CELL);
          salt -= (35.005 * step.freshWater * dt) / CELL;
          const [cos, sin] = [Math.cos((f * dt) / 2), Math.sin((f * dt) / 2)];
          const [a, b] = [x * cos + y * sin + (step.tauX * dt) / 1025, y * cos - x * sin + (step.tauY * dt) / 1025];
          [x, y] = [a * cos + b * sin, b * cos - a * sin];
          for (let k = 1; k < CELLS; k++) expect(rho[k]).toBeGreaterThan(rho[k - 1] - 1e-9);
        }
        expect(sum(T) - start.heat).toBeCloseTo(heat, 9);
        expect(sum(S) - start.salt).toBeCloseTo(salt, 9);
        expect(CELL * sum(u)).toBeCloseTo(x, 9);
        expect(CELL * sum(v)).toBeCloseTo(y, 9);
      }),
      { numRuns: 40 },
    );
  });

  it("changes nothing in a calm without fluxes", () => {
    const model = stratified();
    const before = { T: model.state.T.slice(), S: model.state.S.slice() };
    for (let step = 0; step < 20; step++) model.step(900, still);
    expect(model.state.T).toEqual(before.T);
    expect(model.state.S).toEqual(before.S);
    expect(sum(model.state.u)).toBe(0);
  });

  it("warms a calm, uniform, shallow column by all the light it takes, the bed's share too", () => {
    const model = column(
      () => 15,
      () => 35,
    );
    for (let step = 0; step < 96; step++) model.step(900, { ...still, shortwave: 200 });
    const mean = sum(model.state.T) / CELLS;
    expect(mean - 15).toBeCloseTo((200 * 86400) / (1025 * 3991.86795711963 * CELLS * CELL), 9);
    // Mixing from the surface would have carried the top's warmth down; only the lowest cells may have turned over.
    expect(model.state.T[0]).toBeGreaterThan(15.5);
  });

  it("leaves a stable column as it is and turns an unstable pair over without touching the rest", () => {
    const model = stratified();
    const { state } = model;
    const before = state.T.slice();
    mixStatically(state);
    expect(state.T).toEqual(before);
    state.T[20] = 10;
    renewDensity(state, 20, 21);
    mixStatically(state);
    expect(state.T[0]).toBe(before[0]);
    expect(state.T[5]).toBe(before[5]);
    expect(state.T[20]).toBeCloseTo(state.T[21], 12);
  });

  it("deepens further the harder it blows", () => {
    const depths = [0.2, 0.8, 2].map((tauX) => {
      const model = stratified();
      for (let step = 0; step < 40; step++) model.step(900, { ...still, tauX });
      let cells = 1;
      while (cells < CELLS && model.state.rho[cells] - model.state.rho[0] < 0.03) cells++;
      return cells;
    });
    expect(depths[0]).toBeLessThan(depths[1]);
    expect(depths[1]).toBeLessThan(depths[2]);
  });

  it("turns with the stress", () => {
    const turned = (angle: number) => {
      const model = stratified();
      for (let step = 0; step < 20; step++) model.step(900, { ...still, tauX: Math.cos(angle), tauY: Math.sin(angle) });
      return model.state;
    };
    const [a, b] = [turned(0), turned(1)];
    expect(b.u[0]).toBeCloseTo(a.u[0] * Math.cos(1) - a.v[0] * Math.sin(1), 6);
    expect(b.T[0]).toBeCloseTo(a.T[0], 6);
  });

  it("goes on from any state as if it had never stopped", () => {
    const forcing = (k: number): ColumnForcing => ({
      tauX: Math.sin(k / 9),
      tauY: 0.5,
      nonSolarHeat: -200,
      shortwave: Math.max(0, 600 * Math.sin(k / 15)),
      freshWater: k > 20 && k < 30 ? 3e-6 : 0,
    });
    const whole = stratified();
    const first = stratified();
    for (let k = 0; k < 60; k++) whole.step(900, forcing(k));
    for (let k = 0; k < 25; k++) first.step(900, forcing(k));
    const second = stratified();
    for (const name of ["T", "S", "u", "v", "rho"] as const) second.state[name].set(first.state[name]);
    for (let k = 25; k < 60; k++) second.step(900, forcing(k));
    for (const name of ["T", "S", "u", "v"] as const) expect(second.state[name]).toEqual(whole.state[name]);
  });

  it("converges at second order where nothing switches: halving the step quarters the error of an inertial current", () => {
    // Uniform water moves as one slab of its depth, whose current is known exactly for a stress that grows linearly.
    const hours = 40;
    const depth = CELLS * CELL;
    const exact = new SlabIntegrator({ f: 1e-4, dampingRate: 0, layerDepth: depth, waterDensity: 1025 });
    exact.step(hours * 3600, 0, 0.3, 1, 0.1);
    const errorOf = (dt: number) => {
      const model = column(
        () => 15,
        () => 35,
      );
      const steps = (hours * 3600) / dt;
      for (let k = 0; k < steps; k++) {
        const share = (k + 0.5) / steps;
        model.step(dt, { ...still, tauX: share, tauY: 0.3 - 0.2 * share });
      }
      return Math.hypot(model.state.u[0] - exact.u, model.state.v[0] - exact.v);
    };
    const errors = [3600, 1800, 900, 450].map(errorOf);
    for (let k = 1; k < errors.length; k++) expect(errors[k - 1] / errors[k]).toBeCloseTo(4, 1);
  });

  it("is statically stable after every step, whatever stratification it starts from", () => {
    const profile = fc.array(fc.tuple(number(-1, 30), number(5, 40)), { minLength: CELLS, maxLength: CELLS });
    const forcing = fc.record({
      tauX: number(-2, 2),
      tauY: number(-2, 2),
      nonSolarHeat: number(-800, 400),
      shortwave: number(0, 900),
      freshWater: number(-2e-7, 1e-5),
    });
    fc.assert(
      fc.property(profile, fc.array(forcing, { minLength: 1, maxLength: 4 }), (levels, steps) => {
        const model = column(
          (z) => levels[Math.floor(z / CELL)][0],
          (z) => levels[Math.floor(z / CELL)][1],
        );
        for (const step of steps) {
          model.step(900, step);
          const { rho } = model.state;
          for (let k = 1; k < CELLS; k++) expect(rho[k]).toBeGreaterThanOrEqual(rho[k - 1] - 1e-10);
        }
      }),
      { numRuns: 60 },
    );
  });

  it("spreads shear through water of one density in few exchanges, taking the greatest first", () => {
    const uniform = column(
      () => 15,
      () => 35,
      { f: 0 },
    );
    // As the wind leaves it when a lighter layer has just been mixed away: a jet above water that is still.
    uniform.state.u.fill(1, 0, CELLS / 2);
    uniform.step(900, still);
    expect(uniform.exchanges).toBeGreaterThan(0);
    expect(uniform.exchanges).toBeLessThan(100_000);
    expect(CELL * sum(uniform.state.u)).toBeCloseTo((CELL * CELLS) / 2, 9);
  });

  it("settles a last trace of shear in deep water of one density", () => {
    // Just above what counts as shear, from cell to cell: exchanged one pair at a time it would take 10⁶ and more.
    const model = column(
      () => 23,
      () => 35,
      { f: 0, cells: 200 },
    );
    const { u } = model.state;
    for (let k = 0; k < u.length; k++) u[k] = 0.5 - 1.1e-6 * k;
    const momentum = sum(u);
    model.step(450, still);
    expect(model.exchanges).toBeLessThan(10);
    expect(Math.max(...u) - Math.min(...u)).toBeLessThan(1e-12);
    expect(sum(u)).toBeCloseTo(momentum, 10);
  });

  it("is braked by its bed, never reversed, and works at the equator", () => {
    const free = column(
      () => 15,
      () => 35,
      { f: 0 },
    );
    const braked = column(
      () => 15,
      () => 35,
      { f: 0, bottomDrag: 2.5e-3 },
    );
    for (let step = 0; step < 400; step++) {
      free.step(900, { ...still, tauX: 1 });
      braked.step(900, { ...still, tauX: 1 });
    }
    expect(braked.state.u[0]).toBeGreaterThan(0);
    expect(braked.state.u[0]).toBeLessThan(free.state.u[0]);
    // Steady: the bed's drag CD u² balances τ/ρ.
    expect(braked.state.u[0]).toBeLessThanOrEqual(Math.sqrt(1 / 1025 / 2.5e-3) + 1e-3);
    expect(braked.lostX).toBeGreaterThan(0);
  });

  it("shares out all of the light", () => {
    for (const clarity of [null, waterClarity("I"), waterClarity("III")]) {
      expect(sum(lightShares(clarity, 30, 0.5))).toBeCloseTo(1, 14);
    }
  });

  it("refuses columns that are none", () => {
    expect(() => columnAtRest([1], [1], 1, potentialDensityInto)).toThrow(/at least two cells/);
    expect(() => columnAtRest([1, 2], [1], 1, potentialDensityInto)).toThrow(/at least two cells/);
    expect(() => columnAtRest([1, Number.NaN], [1, 1], 1, potentialDensityInto)).toThrow(/no density/);
  });
});
