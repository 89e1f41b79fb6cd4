import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { complex, decayed, divide, exponential, modulus, multiply, scale, subtract, type Complex } from "../complex";
import { coriolis, inertialPeriod } from "./coriolis";
import { coastalBalance } from "./finite-depth-coast";
import { finiteDepthCurrent, finiteDepthLayerMean, finiteDepthTransport } from "./finite-depth";
import { ekmanDepth, ekmanSpiral } from "./spiral";
import { surfaceDeflectionOfRatio } from "./surface-deflection";
import { ekmanTransport } from "./transport";
import { uniformOrTiny as number } from "../../../tests/factories/uniform";

const midLatitude = fc.oneof(number(5, 85), number(-85, -5));

describe("steady Ekman", () => {
  it("carries water at right angles to the stress: to the right in the north, to the left in the south", () => {
    fc.assert(
      fc.property(number(-2, 2), number(-2, 2), midLatitude, (x, y, latitude) => {
        const M = ekmanTransport({ x, y }, latitude, 1025);
        expect(Math.abs(M.x * x + M.y * y)).toBeLessThan(1e-12 * (1 + Math.hypot(M.x, M.y)));
        const turning = x * M.y - y * M.x;
        expect(turning * Math.sign(latitude)).toBeLessThanOrEqual(0);
      }),
    );
  });

  it("has a spiral that adds up to the transport", () => {
    const [latitude, viscosity] = [40, 0.03];
    const depth = 12 * ekmanDepth(viscosity, coriolis(latitude));
    const n = 20_000;
    let [u, v] = [0, 0];
    for (let k = 0; k < n; k++) {
      const current = ekmanSpiral({ x: 0.2, y: 0.1 }, latitude, viscosity, (-(k + 0.5) * depth) / n, 1025);
      u += (current.u * depth) / n;
      v += (current.v * depth) / n;
    }
    const M = ekmanTransport({ x: 0.2, y: 0.1 }, latitude, 1025);
    expect(u).toBeCloseTo(M.x, 5);
    expect(v).toBeCloseTo(M.y, 5);
  });

  it("goes over to deep water when the bed is far, and to a straight profile without rotation", () => {
    const T = complex(1e-4, 5e-5);
    const deep = finiteDepthTransport(T, { f: 1e-4, eddyViscosity: 0.01, depth: 3000 });
    const open = scale(multiply(T, complex(0, -1)), 1 / 1e-4);
    expect(deep.re).toBeCloseTo(open.re, 9);
    expect(deep.im).toBeCloseTo(open.im, 9);
    const still = finiteDepthCurrent(T, { f: 0, eddyViscosity: 0.01, depth: 20 }, -5);
    expect(still.re).toBeCloseTo((1e-4 * 15) / 0.01, 12);
  });

  it("joins the series of weak rotation to the closed form without a step", () => {
    const T = complex(1e-4);
    const just = (factor: number) =>
      finiteDepthTransport(T, { f: (factor * 1e-6 * 0.02) / 400, eddyViscosity: 0.02, depth: 20 });
    const [below, above] = [just(0.999), just(1.001)];
    expect(modulus({ re: below.re - above.re, im: below.im - above.im })).toBeLessThan(1e-8 * modulus(above));
  });

  it("vanishes at the bed and is finite in the deepest water", () => {
    fc.assert(
      fc.property(number(-1.4e-4, 1.4e-4), number(1e-5, 1), number(1, 10_000), (f, eddyViscosity, depth) => {
        const setting = { f, eddyViscosity, depth };
        expect(modulus(finiteDepthCurrent(complex(1e-3), setting, -depth))).toBeLessThan(1e-12);
        expect(Number.isFinite(modulus(finiteDepthCurrent(complex(1e-3), setting, 0)))).toBe(true);
      }),
    );
  });

  it("lets nothing through a shore, whatever the wind", () => {
    fc.assert(
      fc.property(
        number(-1e-3, 1e-3),
        number(-1e-3, 1e-3),
        number(0, 360),
        number(-1.4e-4, 1.4e-4),
        (x, y, onshoreTo, f) => {
          const balance = coastalBalance(complex(x, y), { f, eddyViscosity: 0.02, depth: 25 }, onshoreTo, 9.81);
          expect(Math.abs(balance.crossTransport)).toBeLessThan(1e-12);
          expect(Number.isFinite(balance.alongTransport)).toBe(true);
        },
      ),
    );
  });

  const anyLayer = fc.record({
    f: fc.oneof(number(-1.4e-4, 1.4e-4), number(-1e-8, 1e-8), fc.constant(0)),
    eddyViscosity: fc.oneof(number(1e-6, 10), number(1e-6, 1e-4)),
    depth: fc.oneof(number(0.001, 12_000), number(1, 100)),
    onshoreTo: number(0, 360),
  });
  const relative = (a: Complex, b: Complex) => modulus(subtract(a, b)) / modulus(b);

  it("has a mean over the whole depth that is the transport over it, in boundary layers of any thickness, shore or none", () => {
    const T = complex(1e-4, -3e-4);
    fc.assert(
      fc.property(anyLayer, ({ onshoreTo, ...setting }) => {
        const carried = scale(finiteDepthLayerMean(T, setting, setting.depth), setting.depth);
        // Where rotation is weak the mean is that without any; the transport has one term more of the series.
        expect(relative(carried, finiteDepthTransport(T, setting))).toBeLessThan(1e-6);
        const shore = coastalBalance(T, setting, onshoreTo, 9.81);
        const azimuth = (onshoreTo * Math.PI) / 180;
        const fromShore = multiply(shore.layerMean(setting.depth), complex(Math.sin(azimuth), -Math.cos(azimuth)));
        const acrossAndAlong = complex(shore.crossTransport, shore.alongTransport);
        expect(relative(scale(fromShore, setting.depth), acrossAndAlong)).toBeLessThan(1e-5);
      }),
    );
  });

  it("has the mean over a layer that its currents add up to", () => {
    const setting = { f: -8e-5, eddyViscosity: 0.03, depth: 60 };
    const T = complex(2e-4, 1e-4);
    const balance = coastalBalance(T, setting, 70, 9.81);
    const panels = 2000;
    for (const D of [0.5, 17, 60]) {
      // Midpoint rule: its error falls with the square of the panels, to 1e-7 of the mean here.
      const added = (currentAt: (z: number) => Complex) =>
        Array.from({ length: panels }, (_, k) => currentAt((-(k + 0.5) * D) / panels)).reduce((sum, { re, im }) => ({
          re: sum.re + re,
          im: sum.im + im,
        }));
      const open = scale(
        added((z) => finiteDepthCurrent(T, setting, z)),
        1 / panels,
      );
      expect(relative(open, finiteDepthLayerMean(T, setting, D))).toBeLessThan(1e-6);
      expect(relative(scale(added(balance.currentAt), 1 / panels), balance.layerMean(D))).toBeLessThan(1e-6);
    }
    expect(() => finiteDepthLayerMean(T, setting, 60.1)).toThrow(/does not lie within 60 m/);
  });

  it("takes 1 - e^(-a) without loss for small a, and without a step where the series ends", () => {
    expect(decayed(complex(1e-12, 2e-12))).toEqual({ re: 1e-12 - (1e-24 - 4e-24) / 2, im: 2e-12 - 2e-24 });
    const a = complex(6e-4, 7.9e-4);
    const direct = subtract(complex(1), exponential(scale(a, -1)));
    expect(relative(decayed(a), direct)).toBeLessThan(1e-12);
  });

  it("turns the surface current by 45 degrees in deep water and hardly at all in shallow", () => {
    expect(surfaceDeflectionOfRatio(5)).toBeCloseTo(45, 6);
    expect(surfaceDeflectionOfRatio(0.02)).toBeLessThan(0.2);
  });

  it("has no inertial period at the equator", () => {
    expect(inertialPeriod(0)).toBeNull();
    expect(inertialPeriod(coriolis(30))).toBeCloseTo(86164.1, 0);
  });

  it("divides complex numbers as it multiplies them", () => {
    const a = complex(3, -2);
    const b = complex(-0.5, 4);
    const back = multiply(divide(a, b), b);
    expect(back.re).toBeCloseTo(3, 12);
    expect(back.im).toBeCloseTo(-2, 12);
  });
});
