/** What an estimate says. Names, units and signs are fixed: they leave the house as JSON. */
import type { MethodChoices, ModelId, TriggerLevel } from "./scenario";

/** 10th, 50th and 90th percentile where an ensemble ran. */
export interface Band {
  p10?: number;
  p50?: number;
  p90?: number;
}

/** Where an ensemble ran: the band of `hoursBeyond`, and in how many members the limit was met. */
export interface TriggerOutcome extends TriggerLevel, Band {
  hoursBeyond: number;
  /** ISO 8601 UTC, or seconds where the storm was given in seconds; null if never. */
  firstAt: string | number | null;
  /** h */
  longestSpell: number;
  met: boolean;
  metInMembers?: number;
}

export interface Headline {
  /** N/m² */
  peakStress: { value: number; time: string | number } & Band;
  /** m/s; degrees true that the water goes to (null when still); share of the speed that is inertial, 0…1. */
  peakDrift: { value: number; towards: number | null; time: string | number; inertialShare: number } & Band;
  /** m; degrees true */
  netDisplacement: { value: number; towards: number | null } & Band;
  /** m³ per m of shore over the storm. With a shore: positive to the right when looking offshore; without: north. */
  transportAlong: { value: number } & Band;
  /** m³ per m of shore over the storm. With a shore: positive offshore; without: east. */
  transportAcross: { value: number } & Band;
  /** g/kg: the lowest, when, and its difference from the start; the difference has a band of its own. */
  surfaceSalinity: { value: number; time: string | number; change: number; changeBand?: Band } & Band;
  /** °C at the end, and its difference from the start; the difference has a band of its own. */
  surfaceTemperature: { value: number; change: number; changeBand?: Band } & Band;
  /** m at the end */
  layerDepth: { value: number } & Band;
  /** kg/m³ at the end, water below minus layer; null where nothing is known of the water below. */
  densityStep: { value: number | null } & Band;
  triggers: TriggerOutcome[];
}

/** The headline figures that are one number each. */
export const HEADLINE_FIGURES = [
  "peakStress",
  "peakDrift",
  "netDisplacement",
  "transportAlong",
  "transportAcross",
  "surfaceSalinity",
  "surfaceTemperature",
  "layerDepth",
  "densityStep",
] as const satisfies readonly (keyof Headline)[];
export type HeadlineFigureName = (typeof HEADLINE_FIGURES)[number];

/** What effects are told of: the headline figures, and the two changes from a start that is itself uncertain. */
export const EFFECT_FIGURES = [...HEADLINE_FIGURES, "salinityChange", "temperatureChange"] as const;
export type EffectFigureName = (typeof EFFECT_FIGURES)[number];

export function effectValue(headline: Headline, figure: EffectFigureName): number | null {
  if (figure === "salinityChange") return headline.surfaceSalinity.change;
  if (figure === "temperatureChange") return headline.surfaceTemperature.change;
  return headline[figure].value;
}

export const SERIES_UNITS = {
  stressX: "N/m²",
  stressY: "N/m²",
  driftEast: "m/s",
  driftNorth: "m/s",
  displacementEast: "m",
  displacementNorth: "m",
  transportAlong: "m²/s",
  transportAcross: "m²/s",
  temperature: "°C",
  salinity: "g/kg",
  density: "kg/m³",
  layerDepth: "m",
} as const;
export type SeriesName = keyof typeof SERIES_UNITS;
export const SERIES_NAMES = Object.keys(SERIES_UNITS) as SeriesName[];

/** What an ensemble has bands of: every series, and the sizes of the two vectors that figures show. */
export const BAND_UNITS = { ...SERIES_UNITS, stress: "N/m²", driftSpeed: "m/s" } as const;
export type BandName = keyof typeof BAND_UNITS;
export const BAND_NAMES = Object.keys(BAND_UNITS) as BandName[];

/** All of one length; plain arrays, so that they survive JSON. */
export type ResponseSeries = { time: (string | number)[] } & Record<SeriesName, number[]>;

/** Percentiles of every series over an ensemble; of a long storm at some of its samples. */
export interface SeriesBands {
  time: (string | number)[];
  series: Record<BandName, Record<keyof Band, number[]>>;
}

/** A factor's setting (`as given` for the scenario's own) and the headline figure that came of it, all else as in the scenario. */
export interface FactorTrial {
  setting: string;
  value: number;
}

export interface FirstOrderShare {
  factor: string;
  /** Share of the figure's variance that the factor alone explains, 0…1; null where nothing varies. */
  index: number | null;
  /** The share that a factor without effect reaches by chance, in so many members, about once in 25 times. */
  chance: number;
}

/** What one headline figure depends on. */
export interface FigureEffects {
  figure: EffectFigureName;
  /** The scenario's own value. */
  value: number;
  /** One factor at a time: the least and the greatest over the ends of its range and the scenario itself; the widest first. */
  bars: { factor: string; low: FactorTrial; high: FactorTrial }[];
  /** The greatest first; none under 64 members. */
  firstOrder: FirstOrderShare[];
}

/** What was varied, how far, and where that range comes from. */
export interface VariedFactor {
  name: string;
  range: string;
  basis: string;
  /** Settings that could not be computed by themselves; absent where all could. */
  failed?: string[];
}

/** Members that could not be computed for one reason. */
export interface MemberFailure {
  code: string;
  /** Of the first of them. */
  message: string;
  members: number;
}

export interface Uncertainty {
  /** Members asked for, and those that could be computed. */
  members: number;
  computed: number;
  /** Why the others could not; absent where all could. */
  failures?: MemberFailure[];
  seed: number;
  factors: VariedFactor[];
  effects: FigureEffects[];
}

/** What the members of an ensemble came to, of each headline figure: sorted, not to be read across figures. */
export type MemberFigures = Partial<Record<EffectFigureName, number[]>>;

export type FitSeverity = "ok" | "caution" | "doNotUse";

export interface FitNote {
  code: string;
  severity: FitSeverity;
  message: string;
  value: number;
  threshold: number;
  source: string;
}

export interface MethodEntry {
  value: number | string | boolean;
  unit: string;
  source: string;
  origin: "chosen" | "default";
}

/** Every law and parameter, whether it was chosen or not. */
export type MethodUsed = { [Key in keyof Required<MethodChoices>]?: MethodEntry };

export interface Budget {
  /** What the water's content changed by, what was put in, and the difference. */
  change: number;
  input: number;
  residual: number;
}

/** The column model's answer through time and depth: every quantity is an array by time of arrays by depth. */
export interface ResponseColumn {
  /** Cell centres, m, positive down. */
  depth: number[];
  time: (string | number)[];
  /** °C, in situ */
  temperature: number[][];
  /** g/kg */
  salinity: number[][];
  /** Potential density, kg/m³. */
  density: number[][];
  /** m/s */
  driftEast: number[][];
  driftNorth: number[][];
}

export interface Response {
  headline: Headline;
  series: ResponseSeries;
  /** Model `column` only. */
  column?: ResponseColumn;
  /** Where an ensemble ran: percentiles of the series, what the headline figures depend on, and how they are spread. */
  bands?: SeriesBands;
  uncertainty?: Uncertainty;
  memberFigures?: MemberFigures;
  fitNotes: FitNote[];
  recommendedModel: ModelId;
  /** Why that model, in a sentence. */
  recommendation: string;
  method: MethodUsed;
  /** heat J/m², salt kg/m², momentum kg/m/s (of the column per m², east and north together). */
  budgets: { heat: Budget; salt: Budget; momentum: Budget };
  /** SHA-256 of the canonical scenario. */
  inputs: string;
  engine: string;
  caution: string;
}
