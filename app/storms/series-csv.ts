import { csvCell } from "~/figures/csv-cell";
import { unionOfTimes } from "./common-axis";
import type { ChannelSeries } from "./channel-series";
import { CHANNELS } from "./channels";

const LINE_END = "\r\n";

/**
 * A storm's channels as CSV: a line for every time of any channel, ISO UTC, SI units in the header, an empty cell where a
 * channel has no sample. Nothing is interpolated.
 */
export function seriesCsv(series: readonly ChannelSeries[]): string {
  const time = unionOfTimes(series);
  const next = series.map(() => 0);
  const header = ["time (UTC)", ...series.map(({ channel, unit }) => `${CHANNELS[channel].label} (${unit})`)];
  const lines = [header.map(csvCell).join(",")];
  for (const seconds of time) {
    const cells = series.map((entry, column) => {
      if (entry.time[next[column]] !== seconds) return "";
      return String(entry.values[next[column]++]);
    });
    lines.push([new Date(seconds * 1000).toISOString(), ...cells].join(","));
  }
  return lines.join(LINE_END) + LINE_END;
}
