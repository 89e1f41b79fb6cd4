/**
 * The engine's seawater against a reference library: Debian's python3-gsw (the TEOS-10 toolbox), over seeded points. EOS-80
 * has no counterpart there; it stands among the published values of `engine-checks.json`. Run where the library is installed.
 */
import { describe, expect, it } from "vitest";
import { absoluteSalinity } from "~/ocean/seawater/absolute-salinity";
import { conservativeFromPotential, potentialFromConservative } from "~/ocean/seawater/conservative-temperature";
import { seawaterDensity } from "~/ocean/seawater/density";
import { freezingTemperature } from "~/ocean/seawater/freezing";
import { gravityAt } from "~/ocean/seawater/gravity";
import { inSituFromConservative, potentialFromInSitu } from "~/ocean/seawater/potential-temperature";
import { salinityFromConductivity } from "~/ocean/seawater/practical-salinity";
import { pressureFromDepth } from "~/ocean/seawater/pressure-from-depth";
import { buoyancyFrequencySquared, turnerAngle } from "~/ocean/seawater/stability";
import { mulberry32 } from "~/ocean/statistics/mulberry32";
import { askReference, greatest, pythonWith, worst } from "./reference";

const POINTS = 10_000;
const found = pythonWith("gsw");
const python = found ?? "";

interface Water {
  SA: number[];
  CT: number[];
  p: number[];
}

/** Points from freezing to a greatest temperature, more of them near the surface than in the deep. */
function sample(seed: number, range: { SA: [number, number]; hottest: number; deepest: number }): Water {
  const random = mulberry32(seed);
  const water: Water = { SA: [], CT: [], p: [] };
  for (let k = 0; k < POINTS; k++) {
    const SA = range.SA[0] + (range.SA[1] - range.SA[0]) * random();
    const p = range.deepest * random() ** 2;
    const coldest = freezingTemperature(SA, p);
    water.SA.push(SA);
    water.p.push(p);
    water.CT.push(coldest + (range.hottest - coldest) * random());
  }
  return water;
}

const SAMPLES: [string, Water][] = [
  ["as in the sea", sample(20, { SA: [30, 40], hottest: 32, deepest: 5000 })],
  ["all that the polynomials allow", sample(21, { SA: [0, 42], hottest: 40, deepest: 8000 })],
];

/** What the library says of a sample; every list is read once. */
function told(water: Water) {
  const answer = askReference(python, { ask: "points", ...water });
  const names = ["rho", "alpha", "beta", "sigma0", "pt", "CT", "t", "pt0", "freezing", "conductivity"] as const;
  const lists = new Map(names.map((name) => [name, answer.list(name)]));
  return (name: (typeof names)[number]) => lists.get(name) ?? [];
}

describe.skipIf(!found).each(SAMPLES)("seawater against python3-gsw, 10 000 points %s", (_, water) => {
  const theirs = found ? told(water) : () => [];
  const ours = (figure: (SA: number, CT: number, p: number) => number) =>
    water.SA.map((SA, k) => figure(SA, water.CT[k], water.p[k]));
  const value = (name: Parameters<typeof theirs>[0], k: number) => theirs(name)[k] ?? NaN;

  it("has the same density, expansion and contraction: one polynomial of 75 terms", () => {
    const density = ours((SA, CT, p) => seawaterDensity(SA, CT, p).rho);
    expect(worst(density, theirs("rho"))).toBeLessThan(2e-15);
    // Expansion goes through zero in cold fresh water: held against its size in water a little warmer.
    const expansion = ours((SA, CT, p) => seawaterDensity(SA, CT, p).alpha);
    expect(worst(expansion, theirs("alpha"), 1e-5)).toBeLessThan(3e-14);
    const contraction = ours((SA, CT, p) => seawaterDensity(SA, CT, p).beta);
    expect(worst(contraction, theirs("beta"))).toBeLessThan(3e-14);
    // 1000 kg/m³ taken away leaves 2e-15 of it.
    const sigma0 = ours((SA, CT) => seawaterDensity(SA, CT, 0).sigma0);
    expect(greatest(sigma0, theirs("sigma0"))).toBeLessThan(2e-12);
  });

  it("turns conservative, potential and in-situ temperature into each other as the library does, °C", () => {
    // Forwards is a polynomial; backwards stops at a step of 1e-12 °C here and after fixed steps there, in situ at 1e-11.
    const CT = water.SA.map((SA, k) => conservativeFromPotential(SA, value("pt", k)));
    expect(greatest(CT, theirs("CT"))).toBeLessThan(1e-13);
    expect(greatest(ours(potentialFromConservative), theirs("pt"))).toBeLessThan(1e-12);
    expect(greatest(ours(inSituFromConservative), theirs("t"))).toBeLessThan(1e-11);
    const pt0 = water.SA.map((SA, k) => potentialFromInSitu(SA, value("t", k), water.p[k]));
    expect(greatest(pt0, theirs("pt0"))).toBeLessThan(1e-12);
  });

  it("freezes at the same temperature, air-saturated, °C", () => {
    const freezing = ours((SA, _CT, p) => freezingTemperature(SA, p));
    expect(greatest(freezing, theirs("freezing"))).toBeLessThan(1e-13);
  });

  it("finds salinity from conductivity as the library finds conductivity from salinity, within its scale", () => {
    const worstOff = water.SA.reduce((most, SA, k) => {
      const SP = (SA * 35) / 35.16504;
      if (SP < 2 || !(value("t", k) <= 35)) return most;
      return Math.max(
        most,
        Math.abs(salinityFromConductivity(value("conductivity", k), value("t", k), water.p[k]) - SP),
      );
    }, 0);
    expect(worstOff).toBeLessThan(1e-6);
  });
});

describe.skipIf(!found)("stability, salinity, gravity and pressure against python3-gsw", () => {
  it("has the same stability and Turner angle over 1000 seeded pairs of levels, stable or not", () => {
    const random = mulberry32(21);
    const column = () => {
      const [SA, CT, p] = [30 + 8 * random(), 2 + 26 * random(), 500 * random()];
      return {
        SA: [SA, SA + random() - 0.5],
        CT: [CT, CT + 2 * (random() - 0.5)],
        p: [p, p + 1 + 40 * random()],
      };
    };
    const columns = Array.from({ length: 1000 }, column);
    const answer = askReference(python, {
      ask: "stability",
      SA: columns.map(({ SA }) => SA),
      CT: columns.map(({ CT }) => CT),
      p: columns.map(({ p }) => p),
    });
    const levels = columns.map(({ SA, CT, p }) => ([0, 1] as const).map((k) => ({ SA: SA[k], CT: CT[k], p: p[k] })));
    // Without a latitude the library takes its standard gravity, 9.7963 m/s².
    const N2 = levels.map(([upper, lower]) => buoyancyFrequencySquared(upper, lower, 9.7963));
    expect(worst(N2, answer.table("N2").flat(), 1e-6)).toBeLessThan(1e-12);
    const turner = levels.map(([upper, lower]) => turnerAngle(upper, lower));
    const [Tu, Rrho] = [turner.map((pair) => pair.Tu), turner.map((pair) => pair.Rrho)];
    expect(greatest(Tu, answer.table("Tu").flat())).toBeLessThan(1e-11);
    expect(worst(Rrho, answer.table("Rrho").flat(), 1e-3)).toBeLessThan(1e-12);
  });

  it("takes reference salinity within 0.002 g/kg of the atlas at the surface of the open sea, and the Baltic by its formula", () => {
    const places = [
      ["North Sea", 3, 56, 34.5],
      ["Bermuda", -64, 32, 36.5],
      ["Gulf of Mexico", -90, 25, 36.2],
      ["off Oregon", -126, 44, 32.5],
      ["Bay of Bengal", 88, 15, 33],
      ["off Sydney", 153, -34, 35.5],
      ["Sea of Okhotsk", 148, 54, 32.8],
    ] as const;
    const answer = askReference(python, {
      ask: "salinity",
      SP: [...places.map(([, , , SP]) => SP), 7],
      p: [...places.map(() => 10), 10],
      longitude: [...places.map(([, longitude]) => longitude), 20],
      latitude: [...places.map(([, , latitude]) => latitude), 59],
    });
    const SA = answer.list("SA");
    places.forEach(([name, , , SP], k) =>
      expect(Math.abs(absoluteSalinity(SP) - (SA[k] ?? NaN)), name).toBeLessThan(0.002),
    );
    expect(absoluteSalinity(7, "baltic")).toBeCloseTo(SA[places.length] ?? NaN, 12);
  });

  it("has the same gravity, and pressure within 0.05 %", () => {
    const latitude = Array.from({ length: 181 }, (_, k) => k - 90);
    const depth = latitude.map((_, k) => 5 + 10 * k);
    const answer = askReference(python, { ask: "earth", latitude, depth });
    expect(worst(latitude.map(gravityAt), answer.list("gravity"))).toBeLessThan(1e-14);
    // Saunders (1981) fitted a quadratic to the whole depth of the ocean of EOS-80, 0.04 % high near the surface; the
    // library integrates TEOS-10. At 1000 m that is 0.3 dbar, of which a density feels 1e-6.
    const pressure = depth.map((d, k) => pressureFromDepth(d, latitude[k]));
    expect(worst(pressure, answer.list("p"))).toBeLessThan(5e-4);
  });
});
