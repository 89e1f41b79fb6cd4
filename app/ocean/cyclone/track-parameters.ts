/** What turns a best track into wind, beside its fixes: each with its default, its range and where that comes from. */

export const CYCLONE_PROFILES = ["holland1980", "holland2010"] as const;
export type CycloneProfileId = (typeof CYCLONE_PROFILES)[number];

export const PROFILE_NAMES: Record<CycloneProfileId, string> = {
  holland1980: "Holland (1980), gradient wind brought to 10 m",
  holland2010: "Holland (2010), surface wind, shape by Holland (2008)",
};

export interface TrackParameters {
  profile: CycloneProfileId;
  /** Shape of the profile; null: from the track's wind and pressure. */
  B: number | null;
  /** m, for fixes between which the track tells none. */
  radiusOfMaximumWind: number;
  /** hPa, where the track tells none. */
  ambientPressure: number;
  /** Turns the track's maximum wind into a 10-minute mean. */
  averagingFactor: number;
  /** Wind at 10 m over gradient wind; of `holland1980` only. */
  reduction: number;
  /** degrees, in the outer vortex */
  inflowAngle: number;
  /** Share of the translation that is added to the wind. */
  asymmetry: number;
  /** kg/m³ */
  airDensity: number;
  /** Whether the climatological rain is taken. */
  rain: boolean;
}

export const DEFAULT_TRACK_PARAMETERS: TrackParameters = {
  profile: "holland1980",
  B: null,
  radiusOfMaximumWind: 40_000,
  ambientPressure: 1010,
  averagingFactor: 0.93,
  reduction: 0.9,
  inflowAngle: 25,
  asymmetry: 1,
  airDensity: 1.15,
  rain: true,
};

export type TrackNumber = Exclude<keyof TrackParameters, "profile" | "rain">;

export interface TrackNumberFacts {
  label: string;
  unit: string;
  /** SI of one of `unit`. */
  toSi: number;
  /** In `unit`. */
  min: number;
  max: number;
  source: string;
}

export const TRACK_NUMBERS: Record<TrackNumber, TrackNumberFacts> = {
  B: {
    label: "Shape B",
    unit: "1",
    toSi: 1,
    min: 0.5,
    max: 2.5,
    source: "empty: from the track's wind and pressure; held within 0.8…2.5 (Holland 1980), 0.5…2.5 (Holland 2008)",
  },
  radiusOfMaximumWind: {
    label: "Radius of maximum wind where the track has none",
    unit: "km",
    toSi: 1000,
    min: 5,
    max: 300,
    source: "common practice, no source",
  },
  ambientPressure: {
    label: "Ambient pressure where the track has none",
    unit: "hPa",
    toSi: 1,
    min: 980,
    max: 1040,
    source: "common practice, no source",
  },
  averagingFactor: {
    label: "Maximum wind to a 10-minute mean, times",
    unit: "1",
    toSi: 1,
    min: 0.7,
    max: 1.1,
    source: "0.93 from a 1-minute mean at sea: Harper, Kepert & Ginger (2010), from memory; 1 for a 10-minute mean",
  },
  reduction: {
    label: "Gradient wind to 10 m, times",
    unit: "1",
    toSi: 1,
    min: 0.6,
    max: 1,
    source: "0.90 over sea within 100 km: Knaff et al. (2011), as quoted; 0.80 further out: Franklin et al. (2003)",
  },
  inflowAngle: {
    label: "Inflow angle, outer vortex",
    unit: "°",
    toSi: 1,
    min: 0,
    max: 45,
    source: "Sobey-type, from memory",
  },
  asymmetry: {
    label: "Share of the translation added",
    unit: "1",
    toSi: 1,
    min: 0,
    max: 1.5,
    source: "Jelesnianski-type, from memory: half the translation at the radius of maximum wind",
  },
  airDensity: {
    label: "Density of the air",
    unit: "kg/m³",
    toSi: 1,
    min: 1,
    max: 1.3,
    source: "Holland (1980)",
  },
};
