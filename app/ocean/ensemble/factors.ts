import { DRAG_LAWS, type DragLawId, type Scenario } from "../scenario";

/** One uncertain input: where its number in 0…1 leads, and how the scenario changes. */
export interface Factor {
  name: string;
  /** Range in words, with its unit. */
  range: string;
  /** Whether the scenario has what the factor varies. */
  applies: (scenario: Scenario) => boolean;
  vary: (scenario: Scenario, u: number) => Scenario;
}

/** Laws that members draw from: every published one; the constant is an order of magnitude only. */
const LAWS: readonly DragLawId[] = DRAG_LAWS.filter((law) => law !== "constant");

const between = (low: number, high: number, u: number): number => low + (high - low) * u;

const model = ({ method }: Scenario) => method?.model ?? "slab";

/**
 * What members vary, with the ranges of this engine's convention. The drag law is drawn anew only where it was left to
 * the engine: a law that was chosen is the user's own statement.
 */
export const FACTORS: readonly Factor[] = [
  {
    name: "drag law",
    range: LAWS.join(", "),
    applies: ({ method }) => method?.dragLaw === undefined,
    vary: (scenario, u) =>
      withMethod(scenario, { dragLaw: LAWS[Math.min(LAWS.length - 1, Math.floor(u * LAWS.length))] }),
  },
  {
    name: "wind speed",
    range: "±10 %",
    applies: () => true,
    vary: (scenario, u) =>
      withStorm(scenario, { windSpeed: scenario.storm.windSpeed.map((speed) => speed * between(0.9, 1.1, u)) }),
  },
  {
    name: "wind direction",
    range: "±10°",
    applies: () => true,
    vary: (scenario, u) =>
      withStorm(scenario, {
        windFrom: scenario.storm.windFrom.map((from) => (from + between(-10, 10, u) + 360) % 360),
      }),
  },
  {
    name: "layer depth",
    range: "±20 %",
    applies: () => true,
    vary: (scenario, u) => stretched(scenario, between(0.8, 1.2, u)),
  },
  {
    name: "step below the layer",
    range: "±30 %",
    applies: ({ water }) => "cast" in water || water.below !== undefined,
    vary: (scenario, u) => steepened(scenario, between(0.7, 1.3, u)),
  },
  {
    name: "damping",
    range: "1/2 to 1/10 per day",
    applies: (scenario) => model(scenario) === "slab" && scenario.method?.dampingRate === undefined,
    vary: (scenario, u) => withMethod(scenario, { dampingRate: 1 / (86400 * between(2, 10, u)) }),
  },
  {
    name: "eddy viscosity",
    range: "a third to three times, evenly in its logarithm",
    applies: (scenario) =>
      scenario.method?.eddyViscosity !== undefined &&
      (model(scenario) === "coastal" || scenario.method.ekman === "finiteDepth"),
    vary: (scenario, u) =>
      withMethod(scenario, {
        eddyViscosity: Math.min(10, (scenario.method?.eddyViscosity ?? 0) * 3 ** between(-1, 1, u)),
      }),
  },
  {
    name: "heat flux",
    range: "±50 W/m²",
    applies: ({ storm }) => storm.heat !== undefined,
    vary: (scenario, u) => warmed(scenario, between(-50, 50, u)),
  },
];

function withMethod(scenario: Scenario, change: Partial<NonNullable<Scenario["method"]>>): Scenario {
  return { ...scenario, method: { ...scenario.method, ...change } };
}

function withStorm(scenario: Scenario, change: Partial<Scenario["storm"]>): Scenario {
  return { ...scenario, storm: { ...scenario.storm, ...change } };
}

function stretched(scenario: Scenario, factor: number): Scenario {
  const { water } = scenario;
  if (!("cast" in water)) return { ...scenario, water: { ...water, layerDepth: water.layerDepth * factor } };
  const cast = water.cast.map((level) => ({ ...level, depth: level.depth * factor }));
  const layerDepth = water.layerDepth === undefined ? undefined : water.layerDepth * factor;
  return { ...scenario, water: { cast, ...(layerDepth !== undefined && { layerDepth }) } };
}

/** Moves the water below away from (or towards) the surface's temperature; salinity stays, so that the step keeps its sense. */
function steepened(scenario: Scenario, factor: number): Scenario {
  const { water } = scenario;
  const scaled = (surface: number, value: number) => Math.min(45, Math.max(-4, surface + (value - surface) * factor));
  if ("cast" in water) {
    const surface = water.cast[0].temperature;
    return {
      ...scenario,
      water: {
        ...water,
        cast: water.cast.map((level) => ({ ...level, temperature: scaled(surface, level.temperature) })),
      },
    };
  }
  if (!water.below) return scenario;
  return {
    ...scenario,
    water: { ...water, below: { ...water.below, temperature: scaled(water.temperature, water.below.temperature) } },
  };
}

function warmed(scenario: Scenario, offset: number): Scenario {
  const heat = { ...scenario.storm.heat };
  const added = (["net", "sensible", "longwave", "latent", "shortwave"] as const).find(
    (name) => heat[name] !== undefined,
  );
  if (!added) return scenario;
  // Added to a flux that neither evaporates water nor shines into it where there is one.
  const offsetSeries = (heat[added] ?? []).map((flux) => flux + offset);
  return withStorm(scenario, { heat: { ...heat, [added]: offsetSeries } });
}
