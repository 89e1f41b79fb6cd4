import type { Response, Uncertainty } from "~/ocean/response";

const START = Date.parse("2026-11-03T00:00:00Z");

/** Two inputs varied: rain that makes the salinity, wind that makes the drift; three members failed. */
export function sampleUncertainty(): Uncertainty {
  const bars = (rain: [number, number], wind: [number, number]) =>
    [
      { factor: "rain", low: { setting: "× 0.7", value: rain[0] }, high: { setting: "× 1.3", value: rain[1] } },
      { factor: "wind speed", low: { setting: "× 0.9", value: wind[0] }, high: { setting: "× 1.1", value: wind[1] } },
    ].sort((a, b) => b.high.value - b.low.value - (a.high.value - a.low.value));
  return {
    members: 203,
    computed: 200,
    failures: [
      { code: "NOT_CONVERGED", message: "Gradient mixing did not settle; use a shorter timeStep.", members: 3 },
    ],
    seed: 7,
    factors: [
      { name: "rain", range: "±30 %", basis: "a convention of this engine" },
      { name: "wind speed", range: "±10 %", basis: "a convention of this engine", failed: ["× 1.1"] },
    ],
    effects: [
      {
        figure: "surfaceSalinity",
        value: 31.9,
        bars: bars([31.5, 32.3], [31.8, 32]),
        firstOrder: [
          { factor: "rain", index: 0.81, chance: 0.05 },
          { factor: "wind speed", index: 0.03, chance: 0.05 },
        ],
      },
      {
        figure: "netDisplacement",
        value: 84_200,
        bars: bars([84_200, 84_200], [70_000, 99_000]),
        firstOrder: [
          { factor: "wind speed", index: 0.4, chance: 0.05 },
          { factor: "rain", index: 0, chance: 0.05 },
        ],
      },
    ],
  };
}

/** A response as the engine gives one: a freshening storm of five days, with an ensemble. */
export function sampleResponse(changes: Partial<Response> = {}): Response {
  const hours = Array.from({ length: 121 }, (_, hour) => hour);
  const time = hours.map((hour) => new Date(START + hour * 3_600_000).toISOString().replace(".000Z", "Z"));
  const freshening = hours.map((hour) => 33.6 - 1.7 * Math.exp(-(((hour - 52) / 24) ** 2)));
  const at = (value: (hour: number) => number) => hours.map(value);
  return {
    headline: {
      peakStress: { value: 0.61, time: time[30]!, p10: 0.52, p50: 0.6, p90: 0.72 },
      peakDrift: { value: 0.42, towards: 131, time: time[34]!, inertialShare: 0.64, p10: 0.33, p50: 0.41, p90: 0.52 },
      netDisplacement: { value: 84_200, towards: 128, p10: 70_400, p50: 83_000, p90: 98_100 },
      transportAlong: { value: 31_000, p10: 26_000, p50: 30_500, p90: 37_000 },
      transportAcross: { value: -124_000, p10: -150_000, p50: -123_000, p90: -101_000 },
      surfaceSalinity: {
        value: 31.9,
        time: time[52]!,
        change: -1.7,
        changeBand: { p10: -2, p50: -1.7, p90: -1.4 },
        p10: 31.6,
        p50: 31.9,
        p90: 32.2,
      },
      surfaceTemperature: {
        value: 11.3,
        change: -0.9,
        changeBand: { p10: -1.2, p50: -0.9, p90: -0.7 },
        p10: 10.8,
        p50: 11.3,
        p90: 11.8,
      },
      layerDepth: { value: 12, p10: 12, p50: 12, p90: 12 },
      densityStep: { value: 1.84, p10: 1.6, p50: 1.83, p90: 2.0 },
      triggers: [
        {
          quantity: "salinity",
          side: "below",
          value: 32.5,
          hours: 6,
          hoursBeyond: 19.2,
          firstAt: time[42]!,
          longestSpell: 19.2,
          met: true,
        },
      ],
    },
    series: {
      time,
      stressX: at(() => 0.4),
      stressY: at(() => -0.3),
      driftEast: at((hour) => 0.3 * Math.sin(hour / 5)),
      driftNorth: at((hour) => -0.3 * Math.cos(hour / 5)),
      displacementEast: at((hour) => hour * 550),
      displacementNorth: at((hour) => hour * -430),
      transportAlong: at(() => 0.8),
      transportAcross: at(() => -3.1),
      temperature: at((hour) => 12.2 - (0.9 * hour) / 120),
      salinity: freshening,
      density: at((hour) => 1025 - (hour % 24) / 40),
      layerDepth: at(() => 12),
    },
    uncertainty: sampleUncertainty(),
    fitNotes: [
      {
        code: "DURATION",
        severity: "ok",
        message: "The storm lasts 120 h, longer than the inertial period of 14.2 h.",
        value: 8.5,
        threshold: 1,
        source: "Pollard & Millard (1970)",
      },
      {
        code: "COAST",
        severity: "caution",
        message:
          "The shore is 4.1 km away, within one internal Rossby radius of 9.0 km. Rising or sinking along it is not carried.",
        value: 4.1,
        threshold: 9,
        source: "Gill (1982)",
      },
    ],
    recommendedModel: "slab",
    recommendation: "The slab model fits: the storm is long against the inertial period and the layer is known.",
    method: {
      model: { value: "slab", unit: "1", source: "chosen for this method sheet", origin: "chosen" },
      dragLaw: { value: "largePond1981", unit: "1", source: "Large & Pond (1981)", origin: "chosen" },
      airDensity: { value: 1.22, unit: "kg/m³", source: "common practice", origin: "default" },
      dampingRate: { value: 0.000002, unit: "1/s", source: "Pollard & Millard (1970)", origin: "default" },
      rainHeat: { value: false, unit: "1", source: "common practice", origin: "default" },
    },
    budgets: {
      heat: { change: -4.4e7, input: -4.4e7, residual: 1.2e-6 },
      salt: { change: 0, input: 0, residual: -3e-13 },
      momentum: { change: 812.4, input: 812.4, residual: 2e-12 },
    },
    inputs: "9f2c7d1b3a5e80644c1d2e3f405162738495a6b7c8d9eafb0c1d2e3f40516273",
    engine: "1.0.0",
    caution: "A screening estimate.",
    ...changes,
  };
}
