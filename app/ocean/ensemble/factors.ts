import { DRAG_LAWS, type DragLawId, type Scenario } from "../scenario";
import { dragLawName } from "../stress/drag-law-names";
import { heated, saltier, steepened, stretched, warmer, withMethod, withStorm } from "./change-scenario";
import type { Factor } from "./factor";

/** Laws that members draw from: every published one; the constant is an order of magnitude only. */
const LAWS: readonly DragLawId[] = DRAG_LAWS.filter((law) => law !== "constant");
/** From clear to turbid, in the order of the table of water types. */
const CLARITIES = ["I", "IA", "IB", "II", "III"] as const;
type Clarity = (typeof CLARITIES)[number];

const CONVENTION = "a convention of this engine";

const between = (low: number, high: number, u: number): number => low + (high - low) * u;
const chosen = <Choice>(choices: readonly Choice[], u: number): Choice =>
  choices[Math.min(choices.length - 1, Math.floor(u * choices.length))];
const signed = (value: number, unit: string) => `${value > 0 ? "+" : value < 0 ? "−" : ""}${Math.abs(value)} ${unit}`;
const percent = (factor: number) => signed(Math.round(100 * (factor - 1)), "%");

/** The type and its neighbours in the table. */
function neighbours(type: Clarity): Clarity[] {
  const at = CLARITIES.indexOf(type);
  return CLARITIES.slice(Math.max(0, at - 1), at + 2);
}

const thirdToThree = (u: number): number => Math.exp(between(-1, 1, u) * Math.log(3));

/** Something multiplied by a factor from low to high. */
function scaled(low: number, high: number, change: (scenario: Scenario, factor: number) => Scenario) {
  return {
    vary: (scenario: Scenario, u: number) => change(scenario, between(low, high, u)),
    setting: (u: number) => percent(between(low, high, u)),
  };
}

/** Something raised or lowered by up to `most`. */
function shifted(most: number, unit: string, change: (scenario: Scenario, by: number) => Scenario) {
  return {
    vary: (scenario: Scenario, u: number) => change(scenario, between(-most, most, u)),
    setting: (u: number) => signed(between(-most, most, u), unit),
  };
}

/**
 * What members vary, and how far. What a method can choose (drag law, damping, water type, eddy viscosity) is drawn only
 * where it was left to the engine: what was chosen is the user's own statement.
 */
export const FACTORS: readonly Factor[] = [
  {
    name: "drag law",
    range: LAWS.map(dragLawName).join(", "),
    basis: "the spread of published laws",
    when: "where the method leaves the law open",
    applies: ({ method }) => method?.dragLaw === undefined,
    vary: (scenario, u) => withMethod(scenario, { dragLaw: chosen(LAWS, u) }),
    setting: (u) => dragLawName(chosen(LAWS, u)),
    choices: () => LAWS.length,
  },
  {
    name: "wind speed",
    range: "±10 %",
    basis: CONVENTION,
    when: "always",
    applies: () => true,
    ...scaled(0.9, 1.1, (scenario, factor) =>
      withStorm(scenario, { windSpeed: scenario.storm.windSpeed.map((speed) => speed * factor) }),
    ),
  },
  {
    name: "wind direction",
    range: "±10°",
    basis: CONVENTION,
    when: "always",
    applies: () => true,
    ...shifted(10, "°", (scenario, turn) =>
      withStorm(scenario, { windFrom: scenario.storm.windFrom.map((from) => (from + turn + 360) % 360) }),
    ),
  },
  {
    name: "averaging of the wind",
    range: "85 to 100 % of a parametric wind",
    basis: "between the 10-minute and the 1-minute mean (WMO/TD-1555; from memory)",
    when: "where the wind is that of a parametric cyclone, which is given without an averaging period",
    // Measured wind comes with its averaging period, which its reading sheet has settled.
    applies: ({ storm }) => storm.cyclone?.parametricWind === true,
    ...scaled(0.85, 1, (scenario, factor) =>
      withStorm(scenario, { windSpeed: scenario.storm.windSpeed.map((speed) => speed * factor) }),
    ),
  },
  {
    name: "layer depth",
    range: "±20 %",
    basis: CONVENTION,
    when: "always",
    applies: () => true,
    ...scaled(0.8, 1.2, stretched),
  },
  {
    name: "step below the layer",
    range: "±30 % of the temperature step",
    basis: CONVENTION,
    when: "where the water below is known",
    applies: ({ water }) => "cast" in water || water.below !== undefined,
    ...scaled(0.7, 1.3, steepened),
  },
  {
    name: "start temperature",
    range: "±0.5 °C at every depth",
    basis: CONVENTION,
    when: "always",
    applies: () => true,
    ...shifted(0.5, "°C", warmer),
  },
  {
    name: "start salinity",
    range: "±0.2 g/kg at every depth",
    basis: CONVENTION,
    when: "always",
    applies: () => true,
    ...shifted(0.2, "g/kg", saltier),
  },
  {
    name: "rain",
    range: "±30 %",
    basis: CONVENTION,
    when: "where it rains",
    applies: ({ storm }) => storm.rain?.some((rate) => rate > 0) ?? false,
    ...scaled(0.7, 1.3, (scenario, factor) =>
      withStorm(scenario, { rain: scenario.storm.rain?.map((rate) => rate * factor) }),
    ),
  },
  {
    name: "heat flux",
    range: "±50 W/m²",
    basis: CONVENTION,
    when: "where heat is given",
    applies: ({ storm }) => storm.heat !== undefined,
    ...shifted(50, "W/m²", heated),
  },
  {
    name: "water clarity",
    range: "one water type clearer to one more turbid",
    basis: "Paulson & Simpson (1977), neighbouring rows of the table",
    when: "where shortwave reaches into the water and the method leaves the water type open",
    applies: ({ storm, method: choices }, { penetratingShortwave }) =>
      penetratingShortwave && storm.heat?.shortwave !== undefined && choices?.waterType === undefined,
    vary: (scenario, u, { waterType }) => withMethod(scenario, { waterType: chosen(neighbours(waterType), u) }),
    setting: (u, { waterType }) => `type ${chosen(neighbours(waterType), u)}`,
    choices: ({ waterType }) => neighbours(waterType).length,
  },
  {
    name: "damping",
    range: "1/2 to 1/10 per day",
    basis: CONVENTION,
    when: "in model slab, where the method leaves it open",
    applies: ({ method: choices }, { model }) => model === "slab" && choices?.dampingRate === undefined,
    vary: (scenario, u) => withMethod(scenario, { dampingRate: 1 / (86400 * between(2, 10, u)) }),
    setting: (u) => `1/${Number(between(2, 10, u).toPrecision(2))} per day`,
  },
  {
    name: "eddy viscosity",
    range: "a third to three times, evenly in its logarithm",
    basis: CONVENTION,
    when: "in model coastal and in model budget with the Ekman balance of finite depth, where the method leaves it open",
    applies: ({ method: choices }, { model, ekman }) =>
      (model === "coastal" || (model === "budget" && ekman === "finiteDepth")) && choices?.eddyViscosity === undefined,
    vary: (scenario, u, { eddyViscosity }) =>
      withMethod(scenario, { eddyViscosity: Math.min(10, eddyViscosity * thirdToThree(u)) }),
    setting: (u) => `× ${Number(thirdToThree(u).toPrecision(2))}`,
  },
];
