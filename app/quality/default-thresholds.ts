/** What a project begins with, and where each number comes from. QARTOD asks to choose thresholds for the place. */
import { CHANNEL_NAMES, type ChannelName } from "~/readers/reading";
import type {
  ChannelField,
  ChannelThresholds,
  ChosenThresholds,
  RelationThresholds,
  TestName,
  Thresholds,
} from "./thresholds";

const QARTOD_WIND = "QARTOD wind manual, examples";
const PRACTICE = "common practice, no source";
const GLOBAL_PROGRAMMES =
  "ranges and spikes after GTSPP and EuroGOOS; spans and tolerances from memory of QARTOD's examples";
const SCREENING = "US EPA, EPA-454/R-99-005, screening criteria for meteorological monitoring";

const NONE: ChannelThresholds = {
  failLow: null,
  failHigh: null,
  suspectLow: null,
  suspectHigh: null,
  spikeLow: null,
  spikeHigh: null,
  rateDeviations: null,
  rateHours: null,
  rateLeast: null,
  rateSteepest: null,
  flatSuspectCount: null,
  flatFailCount: null,
  flatHours: null,
  flatTolerance: null,
  flatFineTolerance: null,
  attenuatedHours: null,
  attenuatedSuspect: null,
  attenuatedFail: null,
  spikeMethod: "differential",
  seasons: [],
};

interface Default {
  values: Partial<Record<ChannelField, number>>;
  /** Of each test that has thresholds. */
  sources: Partial<Record<TestName, string>>;
}

const THREE_DEVIATIONS = { rateDeviations: 3, rateHours: 8 };
const THREE_OR_FIVE = { flatSuspectCount: 3, flatFailCount: 5 };

/** Parts of the heat without a threshold of their own are held to what the net is. */
const HEAT: Default = {
  values: {
    failLow: -1500,
    failHigh: 1300,
    suspectLow: -900,
    suspectHigh: 1000,
    spikeLow: 600,
    spikeHigh: 1200,
    flatSuspectCount: 5,
    flatTolerance: 0,
  },
  sources: { "gross range": PRACTICE, spike: PRACTICE, "flat line": PRACTICE },
};

const DEFAULTS: Record<ChannelName, Default> = {
  windSpeed: {
    values: {
      failLow: 0,
      failHigh: 100,
      suspectHigh: 75,
      spikeLow: 20,
      spikeHigh: 40,
      ...THREE_DEVIATIONS,
      rateLeast: 0.3,
      ...THREE_OR_FIVE,
      flatTolerance: 0.5,
      flatFineTolerance: 0,
      attenuatedHours: 12,
      attenuatedSuspect: 0.5,
    },
    sources: {
      "gross range": QARTOD_WIND,
      spike: QARTOD_WIND,
      "rate of change": `${QARTOD_WIND}; least deviation: ${PRACTICE}`,
      "flat line": `${QARTOD_WIND}; 0 for records reported to 0.1: ${PRACTICE}`,
      "attenuated signal": SCREENING,
    },
  },
  windGust: {
    values: {
      failLow: 0,
      failHigh: 120,
      suspectHigh: 90,
      spikeLow: 25,
      spikeHigh: 50,
      ...THREE_DEVIATIONS,
      rateLeast: 0.3,
      ...THREE_OR_FIVE,
      flatTolerance: 0.5,
      flatFineTolerance: 0,
    },
    sources: { "gross range": PRACTICE, spike: PRACTICE, "rate of change": PRACTICE, "flat line": PRACTICE },
  },
  windFrom: {
    values: {
      failLow: 0,
      failHigh: 360,
      spikeLow: 20,
      spikeHigh: 40,
      ...THREE_DEVIATIONS,
      rateLeast: 0.3,
      ...THREE_OR_FIVE,
      flatTolerance: 1,
      flatFineTolerance: 0,
      attenuatedHours: 18,
      attenuatedSuspect: 10,
    },
    sources: {
      "gross range": QARTOD_WIND,
      spike: `${QARTOD_WIND}, on the components in m/s`,
      "rate of change": `${QARTOD_WIND}, on the components in m/s; least deviation: ${PRACTICE}`,
      "flat line": PRACTICE,
      "attenuated signal": SCREENING,
    },
  },
  rain: {
    values: { failLow: 0, failHigh: 400, suspectHigh: 100, flatSuspectCount: 3, flatHours: 6, flatTolerance: 0 },
    sources: { "gross range": PRACTICE, "flat line": PRACTICE },
  },
  airTemperature: { values: { failLow: -95, failHigh: 65 }, sources: { "gross range": PRACTICE } },
  dewPoint: { values: { failLow: -110, failHigh: 50 }, sources: { "gross range": PRACTICE } },
  seaTemperature: {
    values: {
      failLow: -2.5,
      failHigh: 40,
      spikeLow: 3,
      spikeHigh: 8,
      rateDeviations: 3,
      rateHours: 25,
      rateLeast: 0.05,
      ...THREE_OR_FIVE,
      flatTolerance: 0.05,
    },
    sources: {
      "gross range": GLOBAL_PROGRAMMES,
      spike: GLOBAL_PROGRAMMES,
      "rate of change": GLOBAL_PROGRAMMES,
      "flat line": GLOBAL_PROGRAMMES,
    },
  },
  airPressure: {
    values: {
      failLow: 850,
      failHigh: 1090,
      suspectLow: 900,
      suspectHigh: 1060,
      spikeLow: 8,
      spikeHigh: 15,
      ...THREE_DEVIATIONS,
      rateLeast: 0.3,
      ...THREE_OR_FIVE,
      flatTolerance: 0.05,
    },
    sources: { "gross range": PRACTICE, spike: PRACTICE, "rate of change": PRACTICE, "flat line": PRACTICE },
  },
  relativeHumidity: { values: { failLow: 0, failHigh: 115 }, sources: { "gross range": PRACTICE } },
  shortwave: {
    values: {
      failLow: -5,
      failHigh: 1300,
      suspectHigh: 1100,
      spikeLow: 700,
      spikeHigh: 1200,
      flatSuspectCount: 5,
      flatTolerance: 0,
    },
    sources: { "gross range": PRACTICE, spike: PRACTICE, "flat line": PRACTICE },
  },
  longwave: HEAT,
  sensible: HEAT,
  latent: HEAT,
  netHeat: HEAT,
  evaporation: { values: { failLow: -10, failHigh: 50 }, sources: { "gross range": PRACTICE } },
};

const RELATIONS: RelationThresholds = {
  gustRatio: 2.5,
  gustAbove: 5,
  directionAbove: 1,
  nightLight: 20,
  nightElevation: -6,
  jumpDeviations: null,
  jumpHours: 8,
};

export const RELATION_SOURCES: Partial<Record<TestName, string>> = {
  "gust and mean": PRACTICE,
  "direction missing": PRACTICE,
  "light at night": PRACTICE,
  "wind and pressure": `${QARTOD_WIND}: two deviations. Left open here, since one jump in twenty of any gusty wind would be suspect`,
};

export function defaultChannelThresholds(channel: ChannelName): ChannelThresholds {
  return { ...NONE, ...DEFAULTS[channel].values };
}

/** Where the defaults of a channel's tests come from. */
export function defaultSources(channel: ChannelName): Partial<Record<TestName, string>> {
  return DEFAULTS[channel].sources;
}

export function defaultRelations(): RelationThresholds {
  return { ...RELATIONS };
}

/** The thresholds in force: what the project chose, else the defaults. */
export function thresholdsInForce(chosen: ChosenThresholds | null): Thresholds {
  const channels = Object.fromEntries(
    CHANNEL_NAMES.map((channel) => [channel, chosen?.channels[channel] ?? defaultChannelThresholds(channel)]),
  ) as Record<ChannelName, ChannelThresholds>;
  return { channels, relations: chosen?.relations ?? defaultRelations() };
}
