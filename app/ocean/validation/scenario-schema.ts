import { z } from "zod";
import { SALTIEST, SALINITY_PER_PSS, THINNEST_LAYER } from "../constants";
import { DRAG_LAWS, TRIGGER_QUANTITIES } from "../scenario";
import { depthWithin, numberWithin, oneOf, seriesOf, yesOrNo } from "./fields";

/** The deepest water of the ocean, rounded up, m. */
const DEEPEST = 12000;

/** The Practical Salinity that is the greatest Absolute Salinity, rounded down. */
const SALTIEST_PRACTICAL = Math.floor((10 * SALTIEST) / SALINITY_PER_PSS) / 10;

// Strict throughout: a misspelt key would otherwise fall back on a default, or on nothing, without a word.

const position = z.tuple([numberWithin(-360, 360, "degrees east"), numberWithin(-90, 90, "degrees north")], {
  error: "Must be a pair [longitude, latitude].",
});

export const boxSchema = z.strictObject({
  name: z.string().optional(),
  polygon: z.array(position, { error: "Must be a list of [longitude, latitude] pairs." }).optional(),
  latitude: numberWithin(-90, 90, "degrees").optional(),
  longitude: numberWithin(-360, 360, "degrees").optional(),
  waterDepth: depthWithin(THINNEST_LAYER, DEEPEST).optional(),
  shoreNormal: numberWithin(0, 360, "degrees true").optional(),
  distanceToShore: numberWithin(0, 2e7, "m").optional(),
});

const salinities = {
  salinity: numberWithin(0, SALTIEST, "g/kg").optional(),
  practicalSalinity: numberWithin(0, SALTIEST_PRACTICAL, "").optional(),
};
const temperature = numberWithin(-4, 45, "°C");

export const twoLayerSchema = z.strictObject({
  temperature,
  ...salinities,
  layerDepth: depthWithin(THINNEST_LAYER, DEEPEST),
  below: z.strictObject({ temperature, ...salinities }).optional(),
});

export const castSchema = z.strictObject({
  cast: z
    .array(z.strictObject({ depth: numberWithin(0, DEEPEST, "m"), temperature, ...salinities }), {
      error: "Must be a list of levels.",
    })
    .min(2, { error: "A cast needs at least two levels." })
    .max(20000, { error: "A cast may hold at most 20000 levels; thin it first." }),
  layerDepth: depthWithin(THINNEST_LAYER, DEEPEST).optional(),
});

const heatFlux = seriesOf(numberWithin(-5000, 5000, "W/m²")).optional();

export const stormSchema = z.strictObject({
  time: z
    .array(z.union([z.string(), z.number()], { error: "Must be an ISO 8601 time or a number of seconds." }), {
      error: "Must be a list of times.",
    })
    .min(2, { error: "A storm needs at least two times." })
    .max(500_000, { error: "A storm may hold at most 500000 samples; average it to longer intervals first." }),
  windSpeed: seriesOf(numberWithin(0, 150, "m/s")),
  windFrom: seriesOf(numberWithin(0, 360, "degrees true")),
  windHeight: numberWithin(0.1, 200, "m").optional(),
  rain: seriesOf(numberWithin(0, 100_000, "mm/h")).optional(),
  evaporation: seriesOf(numberWithin(-100, 1000, "mm/h")).optional(),
  heat: z
    .strictObject({ net: heatFlux, shortwave: heatFlux, longwave: heatFlux, sensible: heatFlux, latent: heatFlux })
    .optional(),
  cyclone: z
    .strictObject({
      radiusOfMaximumWind: numberWithin(1000, 1_000_000, "m"),
      translationSpeed: numberWithin(0, 50, "m/s"),
      parametricWind: yesOrNo().optional(),
    })
    .optional(),
});

export const methodSchema = z.strictObject({
  model: oneOf(["budget", "slab", "column", "coastal"]).optional(),
  dragLaw: oneOf(DRAG_LAWS).optional(),
  dragCoefficient: numberWithin(1e-5, 0.02, "").optional(),
  highWindCap: numberWithin(1, 150, "m/s").optional(),
  airDensity: numberWithin(0.8, 1.6, "kg/m³").optional(),
  waterDensity: numberWithin(900, 1100, "kg/m³").optional(),
  heatCapacity: numberWithin(3000, 5000, "J/kg/K").optional(),
  gravity: numberWithin(9.7, 9.9, "m/s²").optional(),
  timeStep: numberWithin(1, 21600, "s").optional(),
  dampingRate: numberWithin(0, 0.01, "1/s").optional(),
  ekman: oneOf(["deep", "finiteDepth"]).optional(),
  eddyViscosity: numberWithin(1e-6, 10, "m²/s").optional(),
  penetratingShortwave: yesOrNo().optional(),
  waterType: oneOf(["I", "IA", "IB", "II", "III"]).optional(),
  heatInterpolation: oneOf(["linear", "hold"]).optional(),
  rainHeat: yesOrNo().optional(),
  cellSize: numberWithin(0.05, 50, "m").optional(),
  maxDepth: numberWithin(1, DEEPEST, "m").optional(),
  bottomDrag: numberWithin(0, 0.1, "").optional(),
  gradientMixing: yesOrNo().optional(),
  bulkRichardson: numberWithin(0.01, 10, "").optional(),
  gradientRichardson: numberWithin(0.01, 0.29, "").optional(),
  layerDensityStep: numberWithin(0.001, 10, "kg/m³").optional(),
});

export const triggersSchema = z
  .array(
    z.strictObject({
      quantity: oneOf(TRIGGER_QUANTITIES),
      side: oneOf(["below", "above"]),
      value: numberWithin(-1e6, 1e6, ""),
      hours: numberWithin(0, 1e5, "h"),
    }),
    { error: "Must be a list of trigger levels." },
  )
  .max(100, { error: "At most 100 trigger levels." });

export const ensembleSchema = z.strictObject({
  members: numberWithin(2, 5000, "").refine(Number.isInteger, { error: "Must be a whole number." }),
  seed: numberWithin(0, 4294967295, "").refine(Number.isInteger, { error: "Must be a whole number." }),
});
