/**
 * The engine's seawater against a reference library: Debian's python3-gsw (the TEOS-10 toolbox), over 10 000 seeded points
 * and the real casts that the library carries with its own check values. Run where the library is installed.
 */
import { describe, expect, it } from "vitest";
import { absoluteSalinity, salinityRegion } from "~/ocean/seawater/absolute-salinity";
import { conservativeFromPotential, potentialFromConservative } from "~/ocean/seawater/conservative-temperature";
import { seawaterDensity } from "~/ocean/seawater/density";
import { freezingTemperature } from "~/ocean/seawater/freezing";
import { gravityAt } from "~/ocean/seawater/gravity";
import {
  conservativeFromInSitu,
  inSituFromConservative,
  potentialFromInSitu,
} from "~/ocean/seawater/potential-temperature";
import { salinityFromConductivity } from "~/ocean/seawater/practical-salinity";
import { pressureFromDepth } from "~/ocean/seawater/pressure-from-depth";
import { buoyancyFrequencySquared, turnerAngle } from "~/ocean/seawater/stability";
import { mulberry32 } from "~/ocean/statistics/mulberry32";
import { askReference, pythonWith, worst } from "./reference";

const POINTS = 10_000;
const found = pythonWith("gsw");
const python = found ?? "";

interface Water {
  SA: number[];
  CT: number[];
  p: number[];
}

/** From fresh to 42 g/kg, freezing to 40 °C, surface to 8000 dbar: wider than any sea, all that the polynomials allow. */
function sample(seed: number): Water {
  const random = mulberry32(seed);
  const water: Water = { SA: [], CT: [], p: [] };
  for (let k = 0; k < POINTS; k++) {
    const SA = 42 * random();
    const p = 8000 * random() ** 3;
    const coldest = freezingTemperature(SA, p);
    water.SA.push(SA);
    water.p.push(p);
    water.CT.push(coldest + (40 - coldest) * random());
  }
  return water;
}

describe.skipIf(!found)("seawater against python3-gsw", () => {
  const water = found ? sample(20) : { SA: [], CT: [], p: [] };
  const theirs = found ? askReference(python, { ask: "points", ...water }) : null;
  const ours = (figure: (SA: number, CT: number, p: number) => number) =>
    water.SA.map((SA, k) => figure(SA, water.CT[k], water.p[k]));
  const off = (name: string, figure: (SA: number, CT: number, p: number) => number, floor = 0) =>
    worst(ours(figure), theirs?.list(name) ?? [], floor);

  it("has the same density, expansion and contraction to rounding: one polynomial, other order of sums", () => {
    expect(off("rho", (SA, CT, p) => seawaterDensity(SA, CT, p).rho)).toBeLessThan(4e-15);
    // Expansion goes through zero in cold fresh water: compared with its size in warm water.
    expect(off("alpha", (SA, CT, p) => seawaterDensity(SA, CT, p).alpha, 1e-4)).toBeLessThan(3e-13);
    expect(off("beta", (SA, CT, p) => seawaterDensity(SA, CT, p).beta)).toBeLessThan(3e-13);
    expect(off("sigma0", (SA, CT) => seawaterDensity(SA, CT, 0).sigma0, 1)).toBeLessThan(1e-12);
  });

  it("turns conservative, potential and in-situ temperature into each other as the library does", () => {
    expect(off("pt", (SA, CT) => potentialFromConservative(SA, CT), 1)).toBeLessThan(1e-11);
    const pt = theirs?.list("pt") ?? [];
    const CT = water.SA.map((SA, k) => conservativeFromPotential(SA, pt[k] ?? NaN));
    expect(worst(CT, theirs?.list("CT") ?? [], 1)).toBeLessThan(1e-13);
    expect(off("t", (SA, CT, p) => inSituFromConservative(SA, CT, p), 1)).toBeLessThan(1e-11);
    const t = theirs?.list("t") ?? [];
    const pt0 = water.SA.map((SA, k) => potentialFromInSitu(SA, t[k] ?? NaN, water.p[k]));
    expect(worst(pt0, theirs?.list("pt0") ?? [], 1)).toBeLessThan(1e-12);
  });

  it("finds salinity from conductivity as the library finds conductivity from salinity, within its scale", () => {
    const conductivity = theirs?.list("conductivity") ?? [];
    const t = theirs?.list("t") ?? [];
    const worstOff = water.SA.reduce((most, SA, k) => {
      const SP = (SA * 35) / 35.16504;
      if (SP < 2 || (t[k] ?? 99) > 35) return most;
      return Math.max(most, Math.abs(salinityFromConductivity(conductivity[k] ?? NaN, t[k] ?? NaN, water.p[k]) - SP));
    }, 0);
    expect(worstOff).toBeLessThan(1e-6);
  });

  it("freezes at the same temperature, air-saturated", () => {
    expect(off("freezing", (SA, _, p) => freezingTemperature(SA, p), 1)).toBeLessThan(1e-13);
  });

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
    expect(worst(N2, answer.table("N2").flat(), 1e-6)).toBeLessThan(1e-9);
    const turner = levels.map(([upper, lower]) => turnerAngle(upper, lower));
    expect(
      worst(
        turner.map(({ Tu }) => Tu),
        answer.table("Tu").flat(),
        1,
      ),
    ).toBeLessThan(1e-9);
    expect(
      worst(
        turner.map(({ Rrho }) => Rrho),
        answer.table("Rrho").flat(),
        1,
      ),
    ).toBeLessThan(1e-8);
  });

  it("agrees on the real casts that the library carries", () => {
    const casts = askReference(python, { ask: "casts" });
    const [SP, t, p] = [casts.table("SP"), casts.table("t"), casts.table("p")];
    const [SA, CT] = [casts.table("SA"), casts.table("CT")];
    const wet = SA.flatMap((values, cast) =>
      values.flatMap((value, level) => (value === null ? [] : [{ cast, level }])),
    );
    expect(wet.length).toBeGreaterThan(90);
    const at = (table: (number | null)[][]) => wet.map(({ cast, level }) => table[cast][level] ?? NaN);
    const [SAs, CTs, ts, ps, SPs] = [SA, CT, t, p, SP].map(at);
    expect(
      worst(
        SAs.map((value, k) => conservativeFromInSitu(value, ts[k], ps[k])),
        CTs,
        1,
      ),
    ).toBeLessThan(1e-11);
    // The 75-term fit against the full Gibbs function: within the fit's stated error, about 1e-3 kg/m³ at depth.
    const rho = SAs.map((value, k) => seawaterDensity(value, CTs[k], ps[k]).rho);
    expect(Math.max(...rho.map((value, k) => Math.abs(value - (at(casts.table("rho"))[k] ?? NaN))))).toBeLessThan(3e-3);
    // Reference salinity instead of the atlas of anomalies, which is not shipped: what that costs in the deep Pacific. The
    // Baltic, where one of the casts was taken, has its own formula.
    const regions = casts
      .list("latitude")
      .map((latitude, cast) => salinityRegion(latitude ?? NaN, casts.list("longitude")[cast] ?? NaN));
    expect(regions).toContain("baltic");
    const anomaly = wet.map(({ cast }, k) => Math.abs(absoluteSalinity(SPs[k], regions[cast]) - SAs[k]));
    expect(Math.max(...anomaly)).toBeLessThan(0.03);
    const N2 = askReference(python, { ask: "stability", SA, CT, p }).table("N2");
    const mine = N2.flatMap((values, cast) =>
      values.flatMap((value, level) => {
        const sampleAt = (k: number) => ({ SA: SA[cast][k], CT: CT[cast][k], p: p[cast][k] });
        const [upper, lower] = [sampleAt(level), sampleAt(level + 1)];
        if (value === null || !isWater(upper) || !isWater(lower)) return [];
        return [Math.abs(buoyancyFrequencySquared(upper, lower, 9.7963) - value) / (Math.abs(value) + 1e-7)];
      }),
    );
    expect(mine.length).toBeGreaterThan(90);
    expect(Math.max(...mine)).toBeLessThan(1e-8);
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

  it("has the same gravity, and pressure within 0.1 % (Saunders 1981 here, the integral of TEOS-10 there)", () => {
    const latitude = Array.from({ length: 181 }, (_, k) => k - 90);
    const depth = latitude.map((_, k) => 5 + 10 * k);
    const answer = askReference(python, { ask: "earth", latitude, depth });
    expect(worst(latitude.map(gravityAt), answer.list("gravity"))).toBeLessThan(1e-14);
    expect(
      worst(
        depth.map((d, k) => pressureFromDepth(d, latitude[k])),
        answer.list("p"),
      ),
    ).toBeLessThan(1e-3);
  });
});

function isWater(level: {
  SA: number | null;
  CT: number | null;
  p: number | null;
}): level is Record<"SA" | "CT" | "p", number> {
  return level.SA !== null && level.CT !== null && level.p !== null;
}
