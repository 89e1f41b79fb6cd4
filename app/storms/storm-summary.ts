import { unbridgedPauses, type Pause } from "~/quality/gap-rule";
import type { ChannelSeries } from "./channel-series";
import { runningRain } from "./running-totals";
import { withinWindow, type StormWindow } from "./storm-window";

export interface Peak {
  value: number;
  /** Seconds since 1970-01-01T00:00:00Z. */
  at: number;
}

export interface StormSummary {
  /** m/s, at the record's own height. */
  peakWind: Peak | null;
  peakGust: Peak | null;
  /** Wind at its peak came from, degrees true. */
  peakWindFrom: number | null;
  /** mm */
  rainTotal: number | null;
  /** W/m², mean over the window. */
  meanNetHeat: number | null;
  /** Gaps in the window that are too long to be bridged. */
  gaps: Pause[];
}

/** What a storm's series say inside its window. */
export function summariseStorm(series: readonly ChannelSeries[], window: StormWindow): StormSummary {
  const inside = series.map((entry) => withinWindow(entry, window));
  const channel = (name: ChannelSeries["channel"]) => inside.find((entry) => entry.channel === name);
  const wind = channel("windSpeed");
  const peakWind = peakOf(wind);
  const rain = channel("rain");
  const heat = channel("netHeat");
  return {
    peakWind,
    peakGust: peakOf(channel("windGust")),
    peakWindFrom: peakWind && valueAt(channel("windFrom"), peakWind.at),
    rainTotal: rain ? (runningRain(rain, window).values.at(-1) ?? 0) : null,
    meanNetHeat:
      heat && heat.values.length > 0 ? heat.values.reduce((sum, value) => sum + value, 0) / heat.values.length : null,
    gaps: unbridgedPauses(
      Object.fromEntries(series.map((entry) => [entry.channel, entry])),
      window.startsAt,
      window.endsAt,
    ),
  };
}

function peakOf(series: ChannelSeries | undefined): Peak | null {
  let peak: Peak | null = null;
  series?.values.forEach((value, index) => {
    if (!peak || value > peak.value) peak = { value, at: series.time[index] };
  });
  return peak;
}

function valueAt(series: ChannelSeries | undefined, seconds: number): number | null {
  const index = series?.time.indexOf(seconds) ?? -1;
  return series && index >= 0 ? series.values[index] : null;
}
