import {
  ABSOLUTE_TO_PRACTICAL_SALINITY,
  FRACTION_TO_PERCENT,
  JOULES_TO_MEGAJOULES,
  METRES_PER_SECOND_TO_KNOTS,
  METRES_TO_FEET,
  METRES_TO_KILOMETRES,
  METRES_TO_NAUTICAL_MILES,
  MILLIMETRES_TO_INCHES,
  PER_METRE_TO_MILLION_PER_KILOMETRE,
  SAME,
  SECONDS_TO_HOURS,
  SQUARE_METRES_TO_SQUARE_KILOMETRES,
  SQUARE_METRES_TO_SQUARE_NAUTICAL_MILES,
  type Ratio,
} from "./conversions";
import type { UnitChoices } from "./unit-choices";

/** Colour tokens of the data; `ink` is for what owns none. */
export type ColourToken = "wind" | "rain" | "heat" | "density" | "drift" | "shore" | "ink";

/** A unit that a quantity is shown in. */
export interface DisplayUnit {
  unit: string;
  /** From SI to this unit. */
  ratio: Ratio;
  /** Decimals that the methods support. */
  decimals: number;
}

export interface Quantity {
  /** As in a sentence: `wind speed at 10 m`. */
  name: string;
  /** As in an equation. */
  symbol: string;
  /** Unit inside the product. */
  si: string;
  /** Which of the organisation's choices rules it, and the unit for each; `fixed` where there is no choice. */
  shown: { choice: "fixed"; unit: DisplayUnit } | { [Key in keyof UnitChoices]: Choice<Key> }[keyof UnitChoices];
  colour: ColourToken;
  /** SVG dash pattern that tells it from others of the same colour; empty for a solid line. */
  dash: string;
  /** What a form or a file may hold, in SI; beyond is an error of input, not a storm. */
  limits: { min: number; max: number };
}

interface Choice<Key extends keyof UnitChoices> {
  choice: Key;
  units: { [Unit in UnitChoices[Key]]: DisplayUnit };
}

const fixed = (unit: string, decimals: number, ratio: Ratio = SAME) =>
  ({ choice: "fixed", unit: { unit, ratio, decimals } }) as const;

const speed = (metresPerSecond: number, knots: number) =>
  ({
    choice: "speed",
    units: {
      "m/s": { unit: "m/s", ratio: SAME, decimals: metresPerSecond },
      kn: { unit: "kn", ratio: METRES_PER_SECOND_TO_KNOTS, decimals: knots },
    },
  }) as const;

const rate = {
  choice: "rain",
  units: {
    "mm/h": { unit: "mm/h", ratio: SAME, decimals: 1 },
    "in/h": { unit: "in/h", ratio: MILLIMETRES_TO_INCHES, decimals: 2 },
  },
} as const;

const amount = {
  choice: "rain",
  units: {
    "mm/h": { unit: "mm", ratio: SAME, decimals: 0 },
    "in/h": { unit: "in", ratio: MILLIMETRES_TO_INCHES, decimals: 1 },
  },
} as const;

const length = {
  choice: "length",
  units: {
    m: { unit: "m", ratio: SAME, decimals: 1 },
    ft: { unit: "ft", ratio: METRES_TO_FEET, decimals: 0 },
  },
} as const;

const distance = {
  choice: "distance",
  units: {
    km: { unit: "km", ratio: METRES_TO_KILOMETRES, decimals: 1 },
    nm: { unit: "nm", ratio: METRES_TO_NAUTICAL_MILES, decimals: 1 },
  },
} as const;

const area = {
  choice: "distance",
  units: {
    km: { unit: "km²", ratio: SQUARE_METRES_TO_SQUARE_KILOMETRES, decimals: 1 },
    nm: { unit: "nm²", ratio: SQUARE_METRES_TO_SQUARE_NAUTICAL_MILES, decimals: 1 },
  },
} as const;

const salinity = (decimals: number) =>
  ({
    choice: "salinity",
    units: {
      "g/kg": { unit: "g/kg", ratio: SAME, decimals },
      "PSS-78": { unit: "PSS-78", ratio: ABSOLUTE_TO_PRACTICAL_SALINITY, decimals },
    },
  }) as const;

const temperature = (decimals: number) =>
  ({ choice: "temperature", units: { "°C": { unit: "°C", ratio: SAME, decimals } } }) as const;

/** Limits are common practice, no source, save where the note says so. */
export const QUANTITIES = {
  windSpeed: {
    name: "wind speed",
    symbol: "U",
    si: "m/s",
    shown: speed(1, 1),
    colour: "wind",
    dash: "",
    limits: { min: 0, max: 120 },
  },
  windSpeed10: {
    name: "wind speed at 10 m",
    symbol: "U10",
    si: "m/s",
    shown: speed(1, 1),
    colour: "wind",
    dash: "",
    limits: { min: 0, max: 120 },
  },
  windGust: {
    name: "wind gust",
    symbol: "Ug",
    si: "m/s",
    shown: speed(1, 1),
    colour: "wind",
    dash: "2,3",
    limits: { min: 0, max: 150 },
  },
  direction: {
    name: "direction",
    symbol: "dir",
    si: "°",
    shown: fixed("°", 0),
    colour: "ink",
    dash: "",
    limits: { min: 0, max: 360 },
  },
  rainRate: {
    name: "rain rate",
    symbol: "R",
    si: "mm/h",
    shown: rate,
    colour: "rain",
    dash: "",
    limits: { min: 0, max: 500 },
  },
  rainTotal: {
    name: "rain",
    symbol: "ΣR",
    si: "mm",
    shown: amount,
    colour: "rain",
    dash: "",
    limits: { min: 0, max: 10_000 },
  },
  evaporation: {
    name: "evaporation",
    symbol: "E",
    si: "mm/h",
    shown: rate,
    colour: "rain",
    dash: "2,3",
    limits: { min: -5, max: 20 },
  },
  netHeat: {
    name: "net heat into the sea",
    symbol: "Qnet",
    si: "W/m²",
    shown: fixed("W/m²", 0),
    colour: "heat",
    dash: "",
    limits: { min: -5000, max: 1500 },
  },
  heatTotal: {
    name: "heat into the sea",
    symbol: "ΣQ",
    si: "J/m²",
    shown: fixed("MJ/m²", 1, JOULES_TO_MEGAJOULES),
    colour: "heat",
    dash: "",
    limits: { min: -1e11, max: 1e11 },
  },
  airTemperature: {
    name: "air temperature",
    symbol: "Ta",
    si: "°C",
    shown: temperature(1),
    colour: "heat",
    dash: "2,3",
    limits: { min: -90, max: 60 },
  },
  airPressure: {
    name: "air pressure",
    symbol: "p",
    si: "hPa",
    shown: fixed("hPa", 1),
    colour: "ink",
    dash: "",
    limits: { min: 850, max: 1090 },
  },
  relativeHumidity: {
    name: "relative humidity",
    symbol: "RH",
    si: "%",
    shown: fixed("%", 0),
    colour: "rain",
    dash: "",
    limits: { min: 0, max: 105 },
  },
  stress: {
    name: "wind stress",
    symbol: "τ",
    si: "N/m²",
    shown: fixed("N/m²", 2),
    colour: "wind",
    dash: "6,2",
    limits: { min: 0, max: 20 },
  },
  driftSpeed: {
    name: "drift speed",
    symbol: "u",
    si: "m/s",
    shown: speed(2, 2),
    colour: "drift",
    dash: "",
    limits: { min: 0, max: 10 },
  },
  displacement: {
    name: "displacement of the layer",
    symbol: "X",
    si: "m",
    shown: distance,
    colour: "drift",
    dash: "",
    limits: { min: 0, max: 5_000_000 },
  },
  transport: {
    name: "Ekman transport",
    symbol: "M",
    si: "m²/s",
    shown: fixed("m²/s", 2),
    colour: "shore",
    dash: "",
    limits: { min: -1000, max: 1000 },
  },
  transportTotal: {
    name: "Ekman transport over the storm",
    symbol: "ΣM",
    si: "m³/m",
    shown: fixed("million m³/km", 0, PER_METRE_TO_MILLION_PER_KILOMETRE),
    colour: "shore",
    dash: "",
    limits: { min: -1e9, max: 1e9 },
  },
  salinity: {
    name: "surface salinity",
    symbol: "S",
    si: "g/kg",
    shown: salinity(1),
    colour: "rain",
    dash: "",
    limits: { min: 0, max: 42 },
  },
  salinityChange: {
    name: "change of surface salinity",
    symbol: "ΔS",
    si: "g/kg",
    shown: salinity(2),
    colour: "rain",
    dash: "",
    limits: { min: -42, max: 42 },
  },
  temperature: {
    name: "surface temperature",
    symbol: "T",
    si: "°C",
    shown: temperature(1),
    colour: "heat",
    dash: "",
    limits: { min: -2.5, max: 40 },
  },
  temperatureChange: {
    name: "change of surface temperature",
    symbol: "ΔT",
    si: "°C",
    shown: temperature(1),
    colour: "heat",
    dash: "",
    limits: { min: -45, max: 45 },
  },
  density: {
    name: "surface density",
    symbol: "ρ",
    si: "kg/m³",
    shown: fixed("kg/m³", 2),
    colour: "density",
    dash: "",
    limits: { min: 990, max: 1050 },
  },
  densityStep: {
    name: "density step below the layer",
    symbol: "Δρ",
    si: "kg/m³",
    shown: fixed("kg/m³", 2),
    colour: "density",
    dash: "",
    limits: { min: -60, max: 60 },
  },
  layerDepth: {
    name: "layer depth",
    symbol: "h",
    si: "m",
    shown: length,
    colour: "density",
    dash: "6,2",
    limits: { min: 0, max: 1000 },
  },
  depth: {
    name: "depth",
    symbol: "z",
    si: "m",
    shown: length,
    colour: "ink",
    dash: "",
    limits: { min: 0, max: 11_000 },
  },
  distance: {
    name: "distance",
    symbol: "d",
    si: "m",
    shown: distance,
    colour: "ink",
    dash: "",
    limits: { min: 0, max: 20_037_508 },
  },
  area: {
    name: "area",
    symbol: "A",
    si: "m²",
    shown: area,
    colour: "ink",
    dash: "",
    limits: { min: 0, max: 5.1e14 },
  },
  duration: {
    name: "duration",
    symbol: "t",
    si: "s",
    shown: fixed("h", 1, SECONDS_TO_HOURS),
    colour: "ink",
    dash: "",
    limits: { min: 0, max: 3.2e8 },
  },
  share: {
    name: "share",
    symbol: "share",
    si: "1",
    shown: fixed("%", 0, FRACTION_TO_PERCENT),
    colour: "ink",
    dash: "",
    limits: { min: 0, max: 1 },
  },
} as const satisfies Record<string, Quantity>;

export type QuantityId = keyof typeof QUANTITIES;

/** The quantity as plain data, without its literal types. */
export function quantity(id: QuantityId): Quantity {
  return QUANTITIES[id];
}

/** The unit that a quantity is shown in under an organisation's choices. */
export function displayUnit(id: QuantityId, choices: UnitChoices): DisplayUnit {
  const { shown } = quantity(id);
  switch (shown.choice) {
    case "fixed":
      return shown.unit;
    case "speed":
      return shown.units[choices.speed];
    case "rain":
      return shown.units[choices.rain];
    case "length":
      return shown.units[choices.length];
    case "distance":
      return shown.units[choices.distance];
    case "salinity":
      return shown.units[choices.salinity];
    case "temperature":
      return shown.units[choices.temperature];
  }
}
