import type { ChannelName } from "./reading";

export type UnitQuantity =
  | "speed"
  | "angle"
  | "temperature"
  | "pressure"
  | "humidity"
  | "waterRate"
  | "waterAmount"
  | "waterCounter"
  | "waterSinceReset"
  | "heatFlux"
  | "energyPerInterval";

/**
 * A unit as met in files. Value in the channel's unit = (value − zero) × factor, and for amounts per interval, divided
 * by the interval: hours for water (→ mm/h), seconds for energy (→ W/m²). A counter is differenced first, an amount since
 * the hour's reset within its hour.
 */
export interface FileUnit {
  id: string;
  label: string;
  quantity: UnitQuantity;
  factor: number;
  zero: number;
  /** How it is written, normalised by `unitKey`. */
  written: readonly string[];
  source: string;
}

const SI = "SI Brochure, 9th edition (2019), tables 2, 4 and 8";
const NIST = "NIST SP 811 (2008), appendix B.8: exact";
const WATER = "1 kg of water on 1 m² is 1 mm at 1000 kg/m³ (CF standard-name table, lwe names)";

/** All units that can be read, with exact factors. */
export const FILE_UNITS: readonly FileUnit[] = [
  {
    id: "m/s",
    label: "m/s",
    quantity: "speed",
    factor: 1,
    zero: 0,
    written: [
      "m/s",
      "ms-1",
      "ms^-1",
      "m.s-1",
      "mps",
      "m/sec",
      "msec",
      "ms",
      "meterspersecond",
      "metrespersecond",
      "meters/second",
      "metres/second",
      "meter/second",
    ],
    source: SI,
  },
  {
    id: "kn",
    label: "knots",
    quantity: "speed",
    factor: 1852 / 3600,
    zero: 0,
    written: ["kn", "kt", "kts", "knot", "knots", "nmi/h", "nm/h", "noeud", "noeuds", "nudos", "nos", "knoten"],
    source: SI,
  },
  {
    id: "mph",
    label: "mph",
    quantity: "speed",
    factor: 0.44704,
    zero: 0,
    written: ["mph", "mi/h", "mile/h", "miles/h", "milesperhour"],
    source: NIST,
  },
  {
    id: "km/h",
    label: "km/h",
    quantity: "speed",
    factor: 1 / 3.6,
    zero: 0,
    written: ["km/h", "kmh", "kph", "kmh-1", "km/hr", "kmph"],
    source: SI,
  },
  {
    id: "ft/s",
    label: "ft/s",
    quantity: "speed",
    factor: 0.3048,
    zero: 0,
    written: ["ft/s", "fts-1", "fps"],
    source: NIST,
  },
  { id: "cm/s", label: "cm/s", quantity: "speed", factor: 0.01, zero: 0, written: ["cm/s", "cms-1"], source: SI },
  {
    id: "0.1 m/s",
    label: "tenths of m/s",
    quantity: "speed",
    factor: 0.1,
    zero: 0,
    written: ["0.1m/s", "dm/s"],
    source: SI,
  },

  {
    id: "deg",
    label: "degrees",
    quantity: "angle",
    factor: 1,
    zero: 0,
    written: [
      "deg",
      "degt",
      "degtrue",
      "degree",
      "degrees",
      "°",
      "°t",
      "°true",
      "gr",
      "grad",
      "grados",
      "graus",
      "degres",
      "°gr",
      "degfrom",
      "degto",
      "degn",
      "degmag",
      "°mag",
      "degtruenorth",
      "degreestrue",
      "degreestruenorth",
    ],
    source: SI,
  },
  {
    id: "10 deg",
    label: "tens of degrees",
    quantity: "angle",
    factor: 10,
    zero: 0,
    written: ["10deg", "tensofdegrees", "10°", "10degrees", "10sdeg", "decadegrees"],
    source: SI,
  },
  {
    id: "rad",
    label: "radians",
    quantity: "angle",
    factor: 180 / Math.PI,
    zero: 0,
    written: ["rad", "radian", "radians"],
    source: SI,
  },

  {
    id: "°C",
    label: "°C",
    quantity: "temperature",
    factor: 1,
    zero: 0,
    written: [
      "°c",
      "c",
      "degc",
      "deg.c",
      "celsius",
      "℃",
      "gradosc",
      "degreesc",
      "degreec",
      "degreecelsius",
      "degreescelsius",
    ],
    source: SI,
  },
  {
    id: "°F",
    label: "°F",
    quantity: "temperature",
    factor: 5 / 9,
    zero: 32,
    written: ["°f", "f", "degf", "fahrenheit", "℉", "degreesf", "degreesfahrenheit"],
    source: NIST,
  },
  {
    id: "K",
    label: "K",
    quantity: "temperature",
    factor: 1,
    zero: 273.15,
    written: ["k", "kelvin", "degk", "°k"],
    source: SI,
  },

  {
    id: "hPa",
    label: "hPa",
    quantity: "pressure",
    factor: 1,
    zero: 0,
    written: ["hpa", "mb", "mbar", "millibar", "millibars", "hectopascal", "hpasealevel"],
    source: SI,
  },
  {
    id: "Pa",
    label: "Pa",
    quantity: "pressure",
    factor: 0.01,
    zero: 0,
    written: ["pa", "pascal", "pascals"],
    source: SI,
  },
  { id: "kPa", label: "kPa", quantity: "pressure", factor: 10, zero: 0, written: ["kpa", "kilopascal"], source: SI },
  { id: "bar", label: "bar", quantity: "pressure", factor: 1000, zero: 0, written: ["bar"], source: SI },
  {
    id: "inHg",
    label: "inHg",
    quantity: "pressure",
    factor: 33.86389,
    zero: 0,
    written: ["inhg", "in.hg", "inchhg", "incheshg", '"hg'],
    source: "NIST SP 811 (2008), appendix B.8: conventional inch of mercury, 3.386389 kPa",
  },
  {
    id: "mmHg",
    label: "mmHg",
    quantity: "pressure",
    factor: 1.333224,
    zero: 0,
    written: ["mmhg", "torr"],
    source: "NIST SP 811 (2008), appendix B.8: conventional millimetre of mercury, 133.3224 Pa",
  },

  {
    id: "%",
    label: "%",
    quantity: "humidity",
    factor: 1,
    zero: 0,
    written: ["%", "percent", "pct", "%rh"],
    source: SI,
  },
  {
    id: "1",
    label: "fraction",
    quantity: "humidity",
    factor: 100,
    zero: 0,
    written: ["1", "fraction", "0-1", "-"],
    source: SI,
  },

  {
    id: "mm/h",
    label: "mm/h",
    quantity: "waterRate",
    factor: 1,
    zero: 0,
    written: ["mm/h", "mm/hr", "mmh-1", "mm/hour", "mmhr-1", "mmh"],
    source: SI,
  },
  {
    id: "in/h",
    label: "in/h",
    quantity: "waterRate",
    factor: 25.4,
    zero: 0,
    written: ["in/h", "in/hr", "inh-1", "inch/h", "inches/h", "inch/hr", "inches/hour"],
    source: NIST,
  },
  {
    id: "mm/day",
    label: "mm/day",
    quantity: "waterRate",
    factor: 1 / 24,
    zero: 0,
    written: ["mm/d", "mm/day", "mmd-1", "mmday-1"],
    source: SI,
  },
  {
    id: "mm/min",
    label: "mm/min",
    quantity: "waterRate",
    factor: 60,
    zero: 0,
    written: ["mm/min", "mmmin-1"],
    source: SI,
  },
  { id: "m/s of water", label: "m/s of water", quantity: "waterRate", factor: 3.6e6, zero: 0, written: [], source: SI },
  {
    id: "kg/m²/s",
    label: "kg/m²/s",
    quantity: "waterRate",
    factor: 3600,
    zero: 0,
    written: ["kg/m2/s", "kgm-2s-1", "kg/(m2s)", "kg/m2s"],
    source: WATER,
  },
  {
    id: "mm",
    label: "mm per interval",
    quantity: "waterAmount",
    factor: 1,
    zero: 0,
    written: ["mm", "millimeter", "millimetre", "millimeters", "millimetres", "l/m2", "lm-2"],
    source: SI,
  },
  {
    id: "0.1 mm",
    label: "tenths of mm per interval",
    quantity: "waterAmount",
    factor: 0.1,
    zero: 0,
    written: ["0.1mm", "1/10mm"],
    source: SI,
  },
  { id: "cm", label: "cm per interval", quantity: "waterAmount", factor: 10, zero: 0, written: ["cm"], source: SI },
  {
    id: "m",
    label: "m per interval",
    quantity: "waterAmount",
    factor: 1000,
    zero: 0,
    written: ["m", "mofwaterequivalent"],
    source: SI,
  },
  {
    id: "in",
    label: "in per interval",
    quantity: "waterAmount",
    factor: 25.4,
    zero: 0,
    written: ["in", "inch", "inches", '"', "in."],
    source: NIST,
  },
  {
    id: "kg/m²",
    label: "kg/m² per interval",
    quantity: "waterAmount",
    factor: 1,
    zero: 0,
    written: ["kg/m2", "kgm-2"],
    source: WATER,
  },
  {
    id: "mm counter",
    label: "mm, running total",
    quantity: "waterCounter",
    factor: 1,
    zero: 0,
    written: [],
    source: SI,
  },
  {
    id: "in counter",
    label: "in, running total",
    quantity: "waterCounter",
    factor: 25.4,
    zero: 0,
    written: [],
    source: NIST,
  },
  {
    id: "mm since reset",
    label: "mm since the hour's reset",
    quantity: "waterSinceReset",
    factor: 1,
    zero: 0,
    written: [],
    source: SI,
  },
  {
    id: "in since reset",
    label: "in since the hour's reset",
    quantity: "waterSinceReset",
    factor: 25.4,
    zero: 0,
    written: [],
    source: NIST,
  },
  {
    id: "0.1 °C",
    label: "tenths of °C",
    quantity: "temperature",
    factor: 0.1,
    zero: 0,
    written: [],
    source: SI,
  },
  {
    id: "0.1 hPa",
    label: "tenths of hPa",
    quantity: "pressure",
    factor: 0.1,
    zero: 0,
    written: [],
    source: SI,
  },

  {
    id: "W/m²",
    label: "W/m²",
    quantity: "heatFlux",
    factor: 1,
    zero: 0,
    written: ["w/m2", "wm-2", "watt/m2", "watts/m2", "w/sqm", "wattsm-2"],
    source: SI,
  },
  {
    id: "W/m² upward",
    label: "W/m², positive out of the sea",
    quantity: "heatFlux",
    factor: -1,
    zero: 0,
    written: [],
    source: SI,
  },
  { id: "kW/m²", label: "kW/m²", quantity: "heatFlux", factor: 1000, zero: 0, written: ["kw/m2", "kwm-2"], source: SI },
  {
    id: "J/m²",
    label: "J/m² per interval",
    quantity: "energyPerInterval",
    factor: 1,
    zero: 0,
    written: ["j/m2", "jm-2"],
    source: SI,
  },
  {
    id: "J/m² upward",
    label: "J/m² per interval, positive out of the sea",
    quantity: "energyPerInterval",
    factor: -1,
    zero: 0,
    written: [],
    source: SI,
  },
  {
    id: "J/cm²",
    label: "J/cm² per interval",
    quantity: "energyPerInterval",
    factor: 1e4,
    zero: 0,
    written: ["j/cm2", "jcm-2"],
    source: SI,
  },
  {
    id: "kJ/m²",
    label: "kJ/m² per interval",
    quantity: "energyPerInterval",
    factor: 1e3,
    zero: 0,
    written: ["kj/m2", "kjm-2"],
    source: SI,
  },
  {
    id: "MJ/m²",
    label: "MJ/m² per interval",
    quantity: "energyPerInterval",
    factor: 1e6,
    zero: 0,
    written: ["mj/m2", "mjm-2"],
    source: SI,
  },
  {
    id: "Wh/m²",
    label: "Wh/m² per interval",
    quantity: "energyPerInterval",
    factor: 3600,
    zero: 0,
    written: ["wh/m2", "whm-2"],
    source: SI,
  },
  {
    id: "kWh/m²",
    label: "kWh/m² per interval",
    quantity: "energyPerInterval",
    factor: 3.6e6,
    zero: 0,
    written: ["kwh/m2", "kwhm-2"],
    source: SI,
  },
  {
    id: "Ly",
    label: "langley per interval",
    quantity: "energyPerInterval",
    factor: 41840,
    zero: 0,
    written: ["ly", "langley", "langleys"],
    source: "NIST SP 811 (2008), appendix B.8: 1 langley = 4.184e4 J/m², exact",
  },
  {
    id: "MJ/m²/day",
    label: "MJ/m²/day",
    quantity: "heatFlux",
    factor: 1e6 / 86400,
    zero: 0,
    written: ["mj/m2/d", "mj/m2/day", "mjm-2d-1", "mjm-2day-1"],
    source: SI,
  },
];

/** What a channel's column may be measured in. */
export const CHANNEL_QUANTITIES: Readonly<
  Record<ChannelName | "windU" | "windV" | "windTowards", readonly UnitQuantity[]>
> = {
  windSpeed: ["speed"],
  windGust: ["speed"],
  windU: ["speed"],
  windV: ["speed"],
  windFrom: ["angle"],
  windTowards: ["angle"],
  rain: ["waterRate", "waterAmount", "waterCounter", "waterSinceReset"],
  evaporation: ["waterRate", "waterAmount"],
  airTemperature: ["temperature"],
  dewPoint: ["temperature"],
  seaTemperature: ["temperature"],
  airPressure: ["pressure"],
  relativeHumidity: ["humidity"],
  shortwave: ["heatFlux", "energyPerInterval"],
  longwave: ["heatFlux", "energyPerInterval"],
  sensible: ["heatFlux", "energyPerInterval"],
  latent: ["heatFlux", "energyPerInterval"],
  netHeat: ["heatFlux", "energyPerInterval"],
};

const BY_ID = new Map(FILE_UNITS.map((unit) => [unit.id, unit]));
const BY_WRITING = new Map(FILE_UNITS.flatMap((unit) => unit.written.map((written) => [written, unit] as const)));

/** The unit with this id, or null. */
export function unitById(id: string): FileUnit | null {
  return BY_ID.get(id) ?? null;
}

/**
 * One spelling for what files write in many: lower case, no spaces, `m s**-1`, `m·s⁻¹` and `m s-1` alike.
 * `MJ` and `mJ`, `hPa` and `HPA` fall together, which does no harm among the units above.
 */
export function unitKey(written: string): string {
  // The masculine ordinal is often written for the degree sign, and would be taken apart into an o.
  return written
    .replaceAll("º", "°")
    .normalize("NFKD")
    .replace(/[\u0300-\u036f]/g, "")
    .toLowerCase()
    .replace(/[\u2212\u2013]/g, "-")
    .replace(/⁻/g, "-")
    .replace(/\*\*|\^/g, "")
    .replace(/[\s·∙⋅_*\u00a0]/g, "")
    .replace(/^["'[(]+|[\])]+$/g, (edge) => (edge === '"' ? edge : ""))
    .replace(/[()]/g, "");
}

/**
 * The unit meant by a text of a file, among those that suit a channel where one is given (`m/s` of rain is water).
 * @returns null where the text is no known unit
 */
export function unitFromText(written: string, role?: keyof typeof CHANNEL_QUANTITIES): FileUnit | null {
  const key = unitKey(written);
  if (role !== undefined && CHANNEL_QUANTITIES[role].includes("waterRate")) {
    if (["m/s", "ms-1", "mps"].includes(key)) return unitById("m/s of water");
  }
  if (role === "relativeHumidity" && key === "") return null;
  return BY_WRITING.get(key) ?? null;
}

/**
 * Units a column of this role may be read in.
 */
export function unitsFor(role: keyof typeof CHANNEL_QUANTITIES): FileUnit[] {
  return FILE_UNITS.filter((unit) => CHANNEL_QUANTITIES[role].includes(unit.quantity));
}

/** Whether a unit tells an amount of water since some moment, not its rate. */
export function isWaterAmount({ quantity }: FileUnit): boolean {
  return quantity === "waterAmount" || quantity === "waterCounter" || quantity === "waterSinceReset";
}

/** Whether values of a unit have to be divided by the time over which they were added up. */
export function isPerInterval(unit: FileUnit): boolean {
  return isWaterAmount(unit) || unit.quantity === "energyPerInterval";
}

/** How a conversion reads in the list of steps: `knots to m/s (× 0.514444)`. Empty where nothing changes. */
export function conversionLabel(unit: FileUnit, target: string): string {
  const parts: string[] = [];
  if (unit.quantity === "waterCounter") parts.push("increments of the counter");
  if (unit.quantity === "waterSinceReset") parts.push("increments within each hour, put where they fell");
  if (unit.zero !== 0) parts.push(`− ${unit.zero}`);
  if (unit.factor !== 1) parts.push(`× ${Number(unit.factor.toPrecision(6))}`);
  if (isPerInterval(unit))
    parts.push(unit.quantity === "energyPerInterval" ? "÷ interval in seconds" : "÷ interval in hours");
  return parts.length === 0 ? "" : `${unit.label} to ${target} (${parts.join(", ")})`;
}
