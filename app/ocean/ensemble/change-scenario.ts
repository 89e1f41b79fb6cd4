import type { Scenario } from "../scenario";

/** A scenario with some choices of its method replaced. */
export function withMethod(scenario: Scenario, change: Partial<NonNullable<Scenario["method"]>>): Scenario {
  return { ...scenario, method: { ...scenario.method, ...change } };
}

/** A scenario with some series of its storm replaced. */
export function withStorm(scenario: Scenario, change: Partial<Scenario["storm"]>): Scenario {
  return { ...scenario, storm: { ...scenario.storm, ...change } };
}

/** A deeper (factor > 1) or thinner layer; a cast is stretched as a whole. */
export function stretched(scenario: Scenario, factor: number): Scenario {
  const { water } = scenario;
  if (!("cast" in water)) return { ...scenario, water: { ...water, layerDepth: water.layerDepth * factor } };
  const cast = water.cast.map((level) => ({ ...level, depth: level.depth * factor }));
  const layerDepth = water.layerDepth === undefined ? undefined : water.layerDepth * factor;
  return { ...scenario, water: { cast, ...(layerDepth !== undefined && { layerDepth }) } };
}

/** Moves the water below away from (or towards) the surface's temperature; salinity stays, so that the step keeps its sense. */
export function steepened(scenario: Scenario, factor: number): Scenario {
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

/** Warmer water at every depth, °C. */
export function warmer(scenario: Scenario, by: number): Scenario {
  const { water } = scenario;
  if ("cast" in water) {
    const cast = water.cast.map((level) => ({ ...level, temperature: level.temperature + by }));
    return { ...scenario, water: { ...water, cast } };
  }
  const below = water.below && { ...water.below, temperature: water.below.temperature + by };
  return { ...scenario, water: { ...water, temperature: water.temperature + by, ...(below && { below }) } };
}

interface Salt {
  salinity?: number;
  practicalSalinity?: number;
}

/** Saltier water at every depth, on the scale that it was given in; never less than fresh. */
export function saltier(scenario: Scenario, by: number): Scenario {
  const salted = <Level extends Salt>(level: Level): Level => ({
    ...level,
    ...(level.salinity !== undefined && { salinity: Math.max(0, level.salinity + by) }),
    ...(level.practicalSalinity !== undefined && { practicalSalinity: Math.max(0, level.practicalSalinity + by) }),
  });
  const { water } = scenario;
  if ("cast" in water) return { ...scenario, water: { ...water, cast: water.cast.map(salted) } };
  return { ...scenario, water: { ...salted(water), ...(water.below && { below: salted(water.below) }) } };
}

/** More heat into the sea, W/m²: on the net flux, or on the one component that neither evaporates water nor shines into it. */
export function heated(scenario: Scenario, by: number): Scenario {
  const { time, heat = {} } = scenario.storm;
  const name = heat.net ? "net" : "sensible";
  const flux = heat[name] ?? time.map(() => 0);
  return withStorm(scenario, { heat: { ...heat, [name]: flux.map((value) => value + by) } });
}
