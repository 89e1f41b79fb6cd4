import type { Figure, FigureTable } from "~/figures/figure";
import type { FigureContext } from "~/figures/figure-context";
import { windRose } from "~/figures/wind-rose";
import { formatPeriod } from "~/units/format-time";
import { toDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import type { ChannelSeries } from "./channel-series";
import type { StormWindow } from "./storm-window";
import { windClasses } from "./wind-classes";
import { CALM_BELOW, windShares, type WindShares } from "./wind-shares";

/** Wind of a window as its rose and its exceedances. */
export interface PresentedWind {
  /** Null where no direction is on record. */
  rose: Figure | null;
  exceedance: FigureTable;
  /** Hours of the window that no wind record tells of. */
  hoursMissing: number;
}

/** Null where no wind is on record in the window. */
export function presentWind(
  series: readonly ChannelSeries[],
  window: StormWindow,
  { peak, windHeight }: { peak: number; windHeight: number | null },
  context: FigureContext,
): PresentedWind | null {
  const shares = windShares(series, window, windClasses(peak, context.units));
  if (!shares || shares.total === 0) return null;
  const directed = shares.sectors.some((times) => times.some((time) => time > 0));
  return {
    rose: directed
      ? windRose(
          {
            ...shares,
            calmBelow: CALM_BELOW,
            wind: windHeight === null ? "wind" : `wind at ${windHeight} m`,
            period: formatPeriod(window.startsAt, window.endsAt, context.zone),
          },
          context,
        )
      : null,
    exceedance: exceedanceTable(shares, context.units),
    hoursMissing: (window.endsAt - window.startsAt - shares.total) / 3600,
  };
}

function exceedanceTable({ exceedance, total }: WindShares, units: UnitChoices): FigureTable {
  const { unit } = displayUnit("windSpeed", units);
  return {
    columns: [
      { name: "wind at least", unit, decimals: 1 },
      { name: "time", unit: "h", decimals: 1 },
      { name: "share of the time", unit: "%", decimals: 1 },
      { name: "longest on end", unit: "h", decimals: 1 },
    ],
    rows: exceedance.map(({ threshold, time, longest }) => [
      Number(toDisplay(threshold, "windSpeed", units).toFixed(6)),
      toDisplay(time, "duration", units),
      (100 * time) / total,
      toDisplay(longest, "duration", units),
    ]),
  };
}
