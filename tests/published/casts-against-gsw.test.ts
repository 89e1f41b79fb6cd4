/**
 * The engine's seawater on real casts: the three that Debian's python3-gsw carries with its check values, of two places in
 * the tropical Pacific and one in the Baltic, from the surface to some 5000 dbar. Run where the library is installed.
 */
import { describe, expect, it } from "vitest";
import { absoluteSalinity, salinityRegion } from "~/ocean/seawater/absolute-salinity";
import { seawaterDensity } from "~/ocean/seawater/density";
import { conservativeFromInSitu } from "~/ocean/seawater/potential-temperature";
import { buoyancyFrequencySquared, turnerAngle } from "~/ocean/seawater/stability";
import { askReference, greatest, pythonWith, worst } from "./reference";

const found = pythonWith("gsw");
const python = found ?? "";

const FIGURES = ["SP", "t", "p", "SA", "CT", "rho", "alpha", "beta", "rho_exact"] as const;

/** One level that has water: the library's figures by name, and the cast's place. */
interface Level {
  figure: (name: (typeof FIGURES)[number]) => number;
  latitude: number;
  longitude: number;
}

function readCasts(): Level[][] {
  const answer = askReference(python, { ask: "casts" });
  const tables = new Map(FIGURES.map((name) => [name, answer.table(name)]));
  const [latitudes, longitudes] = [answer.list("latitude"), answer.list("longitude")];
  return answer.table("SA").map((column, cast) =>
    column.flatMap((SA, k): Level[] => {
      if (SA === null) return [];
      const [latitude, longitude] = [latitudes[cast] ?? NaN, longitudes[cast] ?? NaN];
      return [{ figure: (name) => tables.get(name)?.[cast][k] ?? NaN, latitude, longitude }];
    }),
  );
}

describe.skipIf(!found)("real casts against python3-gsw", () => {
  const casts = found ? readCasts() : [];
  const levels = casts.flat();
  const of = (name: (typeof FIGURES)[number]) => levels.map(({ figure }) => figure(name));
  const sample = ({ figure }: Level) => ({ SA: figure("SA"), CT: figure("CT"), p: figure("p") });

  it("are three, one of them in the Baltic, with some hundred levels", () => {
    expect(casts.map(([first]) => salinityRegion(first.latitude, first.longitude))).toEqual([
      "ocean",
      "ocean",
      "baltic",
    ]);
    expect(levels.length).toBeGreaterThan(90);
    expect(Math.max(...of("p"))).toBeGreaterThan(4000);
  });

  it("have the same density, expansion and contraction to rounding", () => {
    const water = levels.map(sample).map(({ SA, CT, p }) => seawaterDensity(SA, CT, p));
    const ours = (name: "rho" | "alpha" | "beta") => water.map((figures) => figures[name]);
    expect(worst(ours("rho"), of("rho"))).toBeLessThan(2e-15);
    expect(worst(ours("alpha"), of("alpha"))).toBeLessThan(3e-14);
    expect(worst(ours("beta"), of("beta"))).toBeLessThan(3e-14);
    // The full Gibbs function, which the polynomial of 75 terms was fitted to, within 6e-4 kg/m³ here.
    expect(greatest(ours("rho"), of("rho_exact"))).toBeLessThan(1e-3);
  });

  it("have the same Conservative Temperature, °C", () => {
    const CT = levels.map(({ figure }) => conservativeFromInSitu(figure("SA"), figure("t"), figure("p")));
    expect(greatest(CT, of("CT"))).toBeLessThan(1e-12);
  });

  it("have the same stability and Turner angle from level to level", () => {
    for (const cast of casts) {
      const column = (name: "SA" | "CT" | "p") => [cast.map(({ figure }) => figure(name))];
      const answer = askReference(python, { ask: "stability", SA: column("SA"), CT: column("CT"), p: column("p") });
      const pairs = cast.slice(1).map((lower, k) => [sample(cast[k]), sample(lower)] as const);
      // Without a latitude the library takes its standard gravity, 9.7963 m/s².
      const N2 = pairs.map(([upper, lower]) => buoyancyFrequencySquared(upper, lower, 9.7963));
      expect(worst(N2, answer.table("N2")[0], 1e-7)).toBeLessThan(1e-13);
      const Tu = pairs.map(([upper, lower]) => turnerAngle(upper, lower).Tu);
      expect(greatest(Tu, answer.table("Tu")[0])).toBeLessThan(1e-11);
    }
  });

  it("show what it costs to do without the atlas of salinity anomalies: 0.002 g/kg at the surface, 0.03 in the deep Pacific", () => {
    const anomaly = ({ figure, latitude, longitude }: Level) =>
      Math.abs(absoluteSalinity(figure("SP"), salinityRegion(latitude, longitude)) - figure("SA"));
    expect(Math.max(...levels.map(anomaly))).toBeLessThan(0.03);
    expect(Math.max(...levels.filter(({ figure }) => figure("p") < 50).map(anomaly))).toBeLessThan(0.002);
  });
});
