import { CHANNEL_NAMES, type ChannelName } from "~/readers/reading";
import type { QuantityId } from "~/units/quantities";

/** How a channel is named on screen, and the quantity whose unit and colour it is shown in. */
interface ChannelFacts {
  label: string;
  quantity: QuantityId;
  /** `hold`: the value stands until the next time, as an interval mean does. `turn`: a direction. */
  between: "linear" | "hold" | "turn";
}

export const CHANNELS: Record<ChannelName, ChannelFacts> = {
  windSpeed: { label: "wind speed", quantity: "windSpeed", between: "linear" },
  windGust: { label: "wind gust", quantity: "windGust", between: "linear" },
  windFrom: { label: "wind direction, from", quantity: "direction", between: "turn" },
  rain: { label: "rain rate", quantity: "rainRate", between: "hold" },
  airTemperature: { label: "air temperature", quantity: "airTemperature", between: "linear" },
  dewPoint: { label: "dew point", quantity: "airTemperature", between: "linear" },
  seaTemperature: { label: "sea temperature", quantity: "temperature", between: "linear" },
  airPressure: { label: "air pressure", quantity: "airPressure", between: "linear" },
  relativeHumidity: { label: "relative humidity", quantity: "relativeHumidity", between: "linear" },
  shortwave: { label: "shortwave heat into the sea", quantity: "netHeat", between: "linear" },
  longwave: { label: "longwave heat into the sea", quantity: "netHeat", between: "linear" },
  sensible: { label: "sensible heat into the sea", quantity: "netHeat", between: "linear" },
  latent: { label: "latent heat into the sea", quantity: "netHeat", between: "linear" },
  netHeat: { label: "net heat into the sea", quantity: "netHeat", between: "linear" },
  evaporation: { label: "evaporation", quantity: "evaporation", between: "hold" },
};

/** Channels that only make sense from one instrument: they come and go together. */
export const WIND_CHANNELS: readonly ChannelName[] = ["windSpeed", "windGust", "windFrom"];

/** What is replaced or kept as one: `wind`, or a channel by itself. */
export type ChannelGroup = "wind" | ChannelName;

export function groupOf(channel: ChannelName): ChannelGroup {
  return WIND_CHANNELS.includes(channel) ? "wind" : channel;
}

export function groupLabel(group: ChannelGroup): string {
  return group === "wind" ? "wind" : CHANNELS[group].label;
}

/** The channels of a group, in the order they are listed everywhere. */
export function channelsOf(group: ChannelGroup): ChannelName[] {
  return CHANNEL_NAMES.filter((channel) => groupOf(channel) === group);
}
