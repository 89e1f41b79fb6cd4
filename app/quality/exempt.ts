import type { ChannelName } from "~/readers/reading";
import type { FilledSeries } from "./fill-gaps";
import { valuesAt, type FilledChannels } from "./filled-channels";

/** m/s; up to this the air is calm, and a calm may last. */
const CALM = 0.5;
/** m/s; up to this a vane may rest. */
const VANE_RESTS = 2;

/** Which values may stay as they are without a sensor being stuck: a calm, a resting vane, no rain, no light, no flux. */
export function exemptFrom(channel: ChannelName, own: FilledSeries, filled: FilledChannels): (k: number) => boolean {
  switch (channel) {
    case "windSpeed":
    case "windGust":
      return (k) => own.values[k] <= CALM;
    case "windFrom": {
      const speed = valuesAt(own.time, filled.get("windSpeed"));
      return (k) => !(speed[k] > VANE_RESTS);
    }
    case "shortwave":
      return (k) => own.values[k] <= 0;
    case "rain":
    case "evaporation":
    case "longwave":
    case "sensible":
    case "latent":
    case "netHeat":
      return (k) => own.values[k] === 0;
    default:
      return () => false;
  }
}
