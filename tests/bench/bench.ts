import { estimate } from "~/ocean/estimate";
import type { Scenario } from "~/ocean/scenario";
import { specificVolumeSlopes, specificVolumeSlopesInto } from "~/ocean/seawater/specific-volume";
import { mulberry32 } from "~/ocean/statistics/mulberry32";
import { quantile } from "~/ocean/statistics/quantile";
import { slabPath } from "~/ocean/slab/slab-integrator";
import { benchmarkKnots, runBenchmarkColumn, runBenchmarkSlab } from "./benchmark-storm";
import { benchReading } from "./bench-reading";
import { fastest, report, sideBySide, timed } from "./measure";
import { compilePlainC } from "./plain-c";

/** Null without a C compiler: then the ratios are left out, and the notice on standard error says so. */
const plainC = compilePlainC();
if (!plainC) console.error("No C compiler was found: ratios to plain C are left out.");

/** Time of one unit of work here and in plain C, and the ratio of the two. */
function reportSpeed(name: string, nanoseconds: number, inC: number | null, n: number): void {
  report(name, nanoseconds, "ns", n);
  if (inC === null) return;
  report(`${name} plainC`, inC, "ns", n);
  report(`${name} ratio`, nanoseconds / inC, "1", n);
}

function benchColumn(levels: number, steps: number, expected: Record<string, number>): void {
  const name = `column ${levels} ${steps}`;
  const { result, nanoseconds, otherNanoseconds } = sideBySide(
    6,
    () => runBenchmarkColumn(levels, steps),
    plainC && (() => plainC.run("column", levels, steps).nanoseconds),
  );
  const per = (n: number) => (otherNanoseconds === null ? null : otherNanoseconds / n);
  reportSpeed(`${name} cellStep`, nanoseconds / (levels * steps), per(levels * steps), levels * steps);
  reportSpeed(`${name} exchange`, nanoseconds / result.exchanges, per(result.exchanges), result.exchanges);
  report(`${name} exchangesPerStep`, result.exchanges / steps, "1", steps);
  const figures: Record<string, [number, string]> = {
    sst: [result.sst, "°C"],
    sss: [result.sss, "g/kg"],
    mld03: [result.mld03, "m"],
    u0: [result.u0, "m/s"],
    v0: [result.v0, "m/s"],
  };
  for (const [key, value] of Object.entries(expected))
    report(`${name} ${key}`, figures[key][0], figures[key][1], 1, value);
}

/** How far the process grew for its first column run, compiled code and all, and how often a run makes the collector work. */
async function benchColumnMemory(): Promise<void> {
  const before = process.resourceUsage().maxRSS;
  runBenchmarkColumn(200, 960);
  report("column 200 960 memory", (process.resourceUsage().maxRSS - before) / 1024, "MiB", 1);
  let collections = 0;
  const observer = new PerformanceObserver((list) => (collections += list.getEntries().length));
  observer.observe({ entryTypes: ["gc"] });
  const runs = 3;
  for (let run = 0; run < runs; run++) runBenchmarkColumn(200, 960);
  await new Promise((resolve) => setImmediate(resolve));
  observer.disconnect();
  report("column 200 960 collections", collections / runs, "1", runs);
}

function benchSlab(): void {
  const knots = benchmarkKnots(960);
  const path = slabPath(961);
  const repeats = 1000;
  const { result, nanoseconds, otherNanoseconds } = sideBySide(
    6,
    () => {
      let last = runBenchmarkSlab(knots, path);
      for (let repeat = 1; repeat < repeats; repeat++) last = runBenchmarkSlab(knots, path);
      return last;
    },
    plainC && (() => plainC.run("slab", 960, repeats).nanoseconds),
  );
  const steps = repeats * 960;
  reportSpeed("slab 960 step", nanoseconds / steps, otherNanoseconds === null ? null : otherNanoseconds / steps, steps);
  report("slab 960 u", result.u, "m/s", 1, -0.168169099617);
  report("slab 960 v", result.v, "m/s", 1, -0.105801850249);
  report("slab 960 x", result.x, "m", 1, 1914.0078647);
  report("slab 960 y", result.y, "m", 1, 3782.54427645);
  report("slab 960 peakSpeed", result.peakSpeed, "m/s", 1, 1.86347783772);
}

function benchDensity(): void {
  const n = 1_000_000;
  const random = mulberry32(1);
  const [SA, CT, p] = [new Float64Array(n), new Float64Array(n), new Float64Array(n)];
  for (let k = 0; k < n; k++) {
    SA[k] = 42 * random();
    CT[k] = -2 + 42 * random();
    p[k] = 8000 * random();
  }
  const slopes = specificVolumeSlopes(n);
  const { result, nanoseconds, otherNanoseconds } = sideBySide(
    6,
    () => {
      specificVolumeSlopesInto(slopes, SA, CT, p);
      const sums = { rho: 0, alpha: 0, beta: 0 };
      for (let k = 0; k < n; k++) {
        const rho = 1 / slopes.v[k];
        sums.rho += rho;
        sums.alpha += slopes.dvdCT[k] * rho;
        sums.beta -= slopes.dvdSA[k] * rho;
      }
      return sums;
    },
    plainC && (() => plainC.run("density", n).nanoseconds),
  );
  reportSpeed(
    "density 1000000 evaluation",
    nanoseconds / n,
    otherNanoseconds === null ? null : otherNanoseconds / n,
    n,
  );
  report("density 1000000 meanRho", result.rho / n, "kg/m³", n, 1030.58095950942);
  report("density 1000000 meanAlpha", result.alpha / n, "1/K", n, 2.70788083398e-4);
  report("density 1000000 meanBeta", result.beta / n, "kg/g", n, 7.07294086404e-4);
}

function benchEnsemble(): void {
  const members = 20;
  const { result, nanoseconds } = timed(() => {
    const random = mulberry32(12345);
    return Array.from({ length: members }, () => runBenchmarkColumn(200, 960, 0.8 + 0.4 * random()));
  });
  report("ensemble 20 200 960 member", nanoseconds / members / 1e6, "ms", members);
  const expected = { sst: [25.29694, 25.57129, 25.95697], mld03: [99.375, 116.486, 128.544] };
  for (const figure of ["sst", "mld03"] as const) {
    [0.1, 0.5, 0.9].forEach((p, k) => {
      const value = quantile(
        result.map((member) => member[figure]),
        p,
      );
      report(
        `ensemble 20 200 960 ${figure} p${p * 100}`,
        value,
        figure === "sst" ? "°C" : "m",
        members,
        expected[figure][k],
      );
    });
  }
}

/** Five days, hourly: what a consultant waits for. */
function benchEstimates(): void {
  const hours = Array.from({ length: 121 }, (_, k) => k);
  const scenario = (model: "budget" | "slab" | "column"): Scenario => ({
    box: { latitude: 30, longitude: -60 },
    water: { temperature: 28, salinity: 35, layerDepth: 15, below: { temperature: 24, salinity: 35.2 } },
    storm: {
      time: hours.map((hour) => hour * 3600),
      windSpeed: hours.map((hour) => 5 + 20 * Math.exp(-(((hour - 60) / 24) ** 2))),
      windFrom: hours.map((hour) => (7.5 * hour) % 360),
      rain: hours.map((hour) => (hour > 54 && hour < 66 ? 10 : 0)),
      heat: { net: hours.map(() => -200) },
    },
    method: { model },
  });
  for (const model of ["budget", "slab", "column"] as const) {
    const { nanoseconds } = fastest(model === "column" ? 3 : 10, () => estimate(scenario(model)));
    report(`estimate ${model} five days hourly`, nanoseconds / 1e6, "ms", hours.length);
  }
}

await benchColumnMemory();
benchColumn(200, 960, { sst: 25.76100939, sss: 35.04259284, mld03: 108.5367842, u0: -0.1165087891, v0: -0.0021908655 });
benchColumn(100, 960, { sst: 25.96362679, sss: 35.03025, mld03: 100 });
benchSlab();
benchDensity();
benchEnsemble();
benchEstimates();
benchReading();
plainC?.remove();
