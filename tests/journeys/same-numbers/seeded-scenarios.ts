import { DRAG_LAWS, type ModelId, type Scenario } from "~/ocean/scenario";
import { mulberry32 } from "~/ocean/statistics/mulberry32";

const MODELS: readonly ModelId[] = ["budget", "slab", "column", "coastal"];
const HOURS = 18;
/** For each model every drag law, and one more with the law left to the engine and an ensemble over the uncertain inputs. */
const ROUNDS = [...DRAG_LAWS, undefined];

/** A storm that turns and gusts, over a box, a water column and a method that follow from a seed. */
function seededScenario(model: ModelId, round: number): Scenario {
  const random = mulberry32(1000 * (MODELS.indexOf(model) + 1) + round);
  const between = (low: number, high: number) => low + (high - low) * random();
  const dragLaw = ROUNDS[round];
  const latitude = (random() < 0.5 ? -1 : 1) * between(5, 70);
  const time = Array.from({ length: HOURS + 1 }, (_, hour) => hour * 3600);
  const series = (low: number, high: number) => time.map(() => between(low, high));
  const veer = between(-15, 15);
  const start = between(0, 360);
  return {
    box: {
      polygon: [
        [10, latitude],
        [10.2, latitude],
        [10.2, latitude + 0.1],
      ],
      waterDepth: between(40, 60),
      shoreNormal: between(0, 360),
      distanceToShore: between(500, 50_000),
    },
    water:
      round % 2 === 0
        ? {
            temperature: between(8, 28),
            practicalSalinity: between(30, 37),
            layerDepth: between(5, 20),
            below: { temperature: between(3, 7), practicalSalinity: 37 },
          }
        : {
            cast: [0, 8, 15, 30, 60].map((depth) => ({
              depth,
              temperature: 24 - depth / 4,
              salinity: 34 + depth / 50,
            })),
          },
    storm: {
      time,
      windSpeed: series(2, 28),
      windFrom: time.map((_, hour) => (start + veer * hour + between(0, 10) + 360) % 360),
      windHeight: between(2, 40),
      rain: series(0, 20),
      heat: { shortwave: series(0, 700), latent: series(-300, 0), longwave: series(-80, -20) },
      cyclone: { radiusOfMaximumWind: between(20_000, 60_000), translationSpeed: between(1, 12) },
    },
    method: {
      model,
      dragLaw,
      eddyViscosity: between(0.01, 0.1),
      ekman: round % 3 === 0 ? "finiteDepth" : "deep",
      rainHeat: round % 2 === 0,
      penetratingShortwave: round % 3 !== 0,
    },
    triggerLevels: [
      { quantity: "salinity", side: "below", value: between(30, 36), hours: 2 },
      { quantity: "driftSpeed", side: "above", value: between(0.05, 0.5), hours: 2 },
    ],
    ...(dragLaw === undefined && { ensemble: { members: 6, seed: round } }),
  };
}

export const SEEDED_SCENARIOS: readonly { name: string; scenario: Scenario }[] = MODELS.flatMap((model) =>
  ROUNDS.map((law, round) => ({
    name: `${model}, ${law ?? "ensemble"}`,
    scenario: seededScenario(model, round),
  })),
);
