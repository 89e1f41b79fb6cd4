import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { inertialShare } from "./inertial-share";
import { SlabIntegrator, slabPath } from "./slab-integrator";
import { uniform as number } from "../../../tests/factories/uniform";

const setting = { f: 1e-4, dampingRate: 3e-6, layerDepth: 30, waterDensity: 1025 };

describe("slab", () => {
  it("is exact for linear stress: one step equals many", () => {
    fc.assert(
      fc.property(
        number(-1.5e-4, 1.5e-4),
        number(0, 1e-4),
        number(60, 50_000),
        fc.integer({ min: 2, max: 40 }),
        (f, dampingRate, dt, parts) => {
          const whole = new SlabIntegrator({ ...setting, f, dampingRate });
          const split = new SlabIntegrator({ ...setting, f, dampingRate });
          whole.startFrom(0.3, -0.2, 10, 20);
          split.startFrom(0.3, -0.2, 10, 20);
          const at = (share: number): [number, number] => [0.1 + 0.9 * share, 0.5 - 1.2 * share];
          whole.step(dt, ...at(0), ...at(1));
          for (let part = 0; part < parts; part++)
            split.step(dt / parts, ...at(part / parts), ...at((part + 1) / parts));
          const size = 1e-9 * (1 + Math.hypot(whole.x, whole.y));
          expect(Math.abs(split.u - whole.u)).toBeLessThan(1e-11);
          expect(Math.abs(split.v - whole.v)).toBeLessThan(1e-11);
          expect(Math.abs(split.x - whole.x)).toBeLessThan(size);
          expect(Math.abs(split.y - whole.y)).toBeLessThan(size);
        },
      ),
    );
  });

  it("goes on from where a window ended as if it had never stopped", () => {
    const knots = fc.array(fc.tuple(number(1, 20_000), number(-3, 3), number(-3, 3)), { minLength: 3, maxLength: 20 });
    fc.assert(
      fc.property(knots, number(-1.5e-4, 1.5e-4), number(0, 1e-4), number(0, 1), (drawn, f, dampingRate, share) => {
        let now = 0;
        const seconds = Float64Array.from(drawn, ([step]) => (now += step));
        const [x, y] = [1, 2].map((k) => Float64Array.from(drawn, (knot) => knot[k]));
        const window = (from: number, to: number) => ({
          seconds: seconds.slice(from, to),
          x: x.slice(from, to),
          y: y.slice(from, to),
        });
        const cut = 1 + Math.floor(share * (drawn.length - 2));
        const whole = new SlabIntegrator({ ...setting, f, dampingRate });
        whole.follow({ seconds, x, y }, slabPath(drawn.length));
        const first = new SlabIntegrator({ ...setting, f, dampingRate });
        first.follow(window(0, cut + 1), slabPath(cut + 1));
        const second = new SlabIntegrator({ ...setting, f, dampingRate });
        second.startFrom(first.u, first.v, first.x, first.y);
        second.follow(window(cut, drawn.length), slabPath(drawn.length - cut));
        for (const name of ["u", "v", "x", "y"] as const) expect(second[name]).toBe(whole[name]);
      }),
    );
  });

  it("joins the series of a small step to the closed form without a step", () => {
    const run = (dt: number) => {
      const slab = new SlabIntegrator({ ...setting, f: 1e-4, dampingRate: 0 });
      slab.step(dt, 0.2, 0.1, 0.4, -0.1);
      return [slab.u, slab.v, slab.x, slab.y].map((value, i) => value / (i < 2 ? dt : dt * dt));
    };
    run(99.9999).forEach((value, i) => expect(value).toBeCloseTo(run(100.0001)[i], 10));
  });

  it("circles about the Ekman drift when nothing damps it: twice as fast at half an inertial period", () => {
    const slab = new SlabIntegrator({ ...setting, dampingRate: 0 });
    const half = Math.PI / setting.f;
    slab.step(half, 0.5, 0, 0.5, 0);
    expect(slab.u).toBeCloseTo(0, 12);
    expect(Math.hypot(slab.u, slab.v)).toBeCloseTo((2 * 0.5) / (1025 * 30 * 1e-4), 10);
    slab.step(half, 0.5, 0, 0.5, 0);
    expect(slab.y).toBeCloseTo((-0.5 / (1025 * 30 * 1e-4)) * 2 * half, 6);
  });

  it("goes straight at the equator, as a falling stone does", () => {
    const slab = new SlabIntegrator({ ...setting, f: 0, dampingRate: 0 });
    slab.step(3600, 0.5, 0, 0.5, 0);
    expect(slab.u).toBeCloseTo((0.5 * 3600) / (1025 * 30), 12);
    expect(slab.x).toBeCloseTo((0.5 * 0.5 * 3600 ** 2) / (1025 * 30), 8);
    expect(slab.v).toBe(0);
  });

  it("refuses a layer of no depth, a negative damping and a step of no length", () => {
    expect(() => new SlabIntegrator({ ...setting, layerDepth: 0 })).toThrow(/greater than 0 m/);
    expect(() => new SlabIntegrator({ ...setting, dampingRate: -1 })).toThrow(/negative/);
    expect(() => new SlabIntegrator(setting).step(0, 1, 1, 1, 1)).toThrow(/greater than zero/);
  });

  it("calls steady drift not inertial, and motion without stress all inertial", () => {
    const mass = 1025 * 30;
    const context = { f: 1e-4, dampingRate: 0, mass };
    expect(inertialShare(0, -0.5 / (mass * 1e-4), 0.5, 0, context)).toBeCloseTo(0, 12);
    expect(inertialShare(0.3, 0.1, 0, 0, context)).toBe(1);
    expect(inertialShare(0, 0, 0, 0, context)).toBe(0);
    expect(inertialShare(0.3, 0.1, 0.5, 0, { ...context, f: 0 })).toBe(0);
  });
});
