/**
 * What the engine is asked: one box, one water column, one storm, one choice of method.
 * SI units, camelCase, as JSON. Directions in degrees true; `windFrom` is where the wind comes from;
 * heat is positive into the sea; rain and evaporation in mm/h hold until the next time.
 */

/** [longitude, latitude] in degrees, WGS 84. */
export type Position = [longitude: number, latitude: number];

export interface ScenarioBox {
  name?: string;
  /** Outer ring; may be closed or open. Give this, or `latitude` and `longitude`. */
  polygon?: Position[];
  latitude?: number;
  longitude?: number;
  /** Water depth, m. */
  waterDepth?: number;
  /** Direction of the shore normal, degrees true, pointing offshore. */
  shoreNormal?: number;
  /** Distance to the nearest shore, m. */
  distanceToShore?: number;
}

export interface CastLevel {
  /** m, positive down. */
  depth: number;
  /** In-situ temperature, °C (ITS-90). */
  temperature: number;
  /** Absolute Salinity, g/kg. Give this or `practicalSalinity`. */
  salinity?: number;
  practicalSalinity?: number;
}

/** A column as two layers: the layer the storm works on, and, where known, what lies below. */
export interface TwoLayerWater {
  /** In-situ temperature of the layer, °C. */
  temperature: number;
  /** Absolute Salinity, g/kg. Give this or `practicalSalinity`. */
  salinity?: number;
  practicalSalinity?: number;
  /** m */
  layerDepth: number;
  /** Water below the layer: needed for the density step. */
  below?: { temperature: number; salinity?: number; practicalSalinity?: number };
}

export interface CastWater {
  cast: CastLevel[];
  /** m; where absent, the depth at which σ0 exceeds its surface value by 0.03 kg/m³. */
  layerDepth?: number;
}

export type ScenarioWater = TwoLayerWater | CastWater;

export interface HeatSeries {
  /** W/m², positive into the sea. Either `net`, or components that are summed. */
  net?: number[];
  shortwave?: number[];
  longwave?: number[];
  sensible?: number[];
  latent?: number[];
}

/** Of a tropical cyclone that passes: for the fit notes, and for what an ensemble varies. No value of the response looks at it. */
export interface ScenarioCyclone {
  /** Distance from the centre to the strongest wind, m. */
  radiusOfMaximumWind: number;
  /** Speed at which the centre moves over the sea, m/s. */
  translationSpeed: number;
  /** Whether the wind was computed from the cyclone's track rather than measured: its averaging period is then uncertain. */
  parametricWind?: boolean;
}

export interface ScenarioStorm {
  /** ISO 8601 UTC strings, or seconds from any origin; strictly increasing, steps may differ. */
  time: (string | number)[];
  /** m/s at `windHeight`. */
  windSpeed: number[];
  /** degrees true, where the wind comes from. */
  windFrom: number[];
  /** m above the sea; default 10. */
  windHeight?: number;
  /** mm/h */
  rain?: number[];
  /** mm/h */
  evaporation?: number[];
  heat?: HeatSeries;
  /** Where the storm is a tropical cyclone. */
  cyclone?: ScenarioCyclone;
}

export type ModelId = "budget" | "slab" | "column" | "coastal";

export const DRAG_LAWS = [
  "constant",
  "largePond1981",
  "trenberth1990",
  "smith1980",
  "garratt1977",
  "wu1982",
  "wu1982floor",
  "zijlema2012",
  "largeYeager2009",
  "coare35",
] as const;
export type DragLawId = (typeof DRAG_LAWS)[number];

export interface MethodChoices {
  model?: ModelId;
  dragLaw?: DragLawId;
  /** For law `constant`. */
  dragCoefficient?: number;
  /** m/s: the drag coefficient is held at its value here above this speed. */
  highWindCap?: number;
  /** kg/m³ */
  airDensity?: number;
  /** kg/m³ */
  waterDensity?: number;
  /** J/kg/K */
  heatCapacity?: number;
  /** m/s² */
  gravity?: number;
  /** s */
  timeStep?: number;
  /** 1/s */
  dampingRate?: number;
  ekman?: "deep" | "finiteDepth";
  /** m²/s */
  eddyViscosity?: number;
  penetratingShortwave?: boolean;
  waterType?: "I" | "IA" | "IB" | "II" | "III";
  heatInterpolation?: "linear" | "hold";
  rainHeat?: boolean;
  /** m */
  cellSize?: number;
  /** m */
  maxDepth?: number;
  bottomDrag?: number;
  gradientMixing?: boolean;
  bulkRichardson?: number;
  gradientRichardson?: number;
  /** kg/m³ */
  layerDensityStep?: number;
}

export const TRIGGER_QUANTITIES = ["salinity", "temperature", "driftSpeed", "stress", "layerDepth", "density"] as const;
export type TriggerQuantity = (typeof TRIGGER_QUANTITIES)[number];

export interface TriggerLevel {
  quantity: TriggerQuantity;
  side: "below" | "above";
  value: number;
  /** Hours beyond the value after which the client's limit counts as met. */
  hours: number;
}

/** Members of a Latin hypercube over what is uncertain; the same seed draws the same members. */
export interface Ensemble {
  members: number;
  seed: number;
}

export interface Scenario {
  box: ScenarioBox;
  water: ScenarioWater;
  storm: ScenarioStorm;
  method?: MethodChoices;
  triggerLevels?: TriggerLevel[];
  ensemble?: Ensemble;
}

export interface ScenarioProblem {
  /** Where in the scenario, as `storm.windSpeed[3]`. */
  path: string;
  code: string;
  message: string;
}
