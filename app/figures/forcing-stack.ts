import { formatQuantity } from "~/units/format-quantity";
import { QUANTITIES } from "~/units/quantities";
import { missingSentence, periodOf, rangeSentence } from "./describe";
import { drawTimeFigure } from "./draw-time-figure";
import { extremes } from "./extremes";
import type { Figure } from "./figure";
import { caption, type FigureContext } from "./figure-context";
import type { TimePanel } from "./time-panel";
import { timeTable, type TableChannel } from "./time-table";
import { windPanel } from "./wind-panel";

export interface ForcingData {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** m/s at 10 m */
  windSpeed10: ArrayLike<number>;
  /** degrees true, where the wind comes from */
  windFrom: ArrayLike<number>;
  /** m/s */
  windGust?: ArrayLike<number>;
  /** mm/h, holds until the next time */
  rainRate?: ArrayLike<number>;
  /** W/m², positive into the sea */
  netHeat?: ArrayLike<number>;
  /** A sentence, where the wind is not what was measured. */
  windOrigin?: string;
}

/** What drove the water: wind with its direction, rain, net heat, above one time axis; panels without a series are left out. */
export function forcingStack(data: ForcingData, context: FigureContext): Figure {
  const { time, windSpeed10, windFrom, windGust, rainRate, netHeat, windOrigin } = data;
  const panels: TimePanel[] = [
    windPanel({ quantity: "windSpeed10", heading: "wind at 10 m", speed: windSpeed10, from: windFrom, gust: windGust }),
  ];
  const channels: TableChannel[] = [
    { name: QUANTITIES.windSpeed10.name, quantity: "windSpeed10", values: windSpeed10 },
    { name: "wind direction from", quantity: "direction", values: windFrom },
  ];
  const alt = [`Forcing of the storm, ${periodOf(time, context)}.`, windSentence(time, windSpeed10, windFrom, context)];
  const shown = ["Wind at 10 m, with arrows that point where it blows to"];
  if (windGust) {
    channels.push({ name: QUANTITIES.windGust.name, quantity: "windGust", values: windGust });
    alt.push(rangeSentence("Gusts", "windGust", time, windGust, context));
  }
  if (rainRate) {
    panels.push({
      quantity: "rainRate",
      heading: "rain",
      colour: "rain",
      lines: [{ values: rainRate, shape: "hold" }],
      zero: true,
      marked: extremes(rainRate)?.maxAt,
      height: 72,
    });
    channels.push({ name: QUANTITIES.rainRate.name, quantity: "rainRate", values: rainRate });
    const total = formatQuantity(heldTotal(time, rainRate), "rainTotal", context.units).text;
    alt.push(`${rangeSentence("Rain", "rainRate", time, rainRate, context)} Rain in all ${total}.`);
    shown.push(`rain, ${total} in all`);
  }
  if (netHeat) {
    panels.push({
      quantity: "netHeat",
      heading: "net heat into the sea",
      colour: "heat",
      lines: [{ values: netHeat, openPauses: true }],
      zero: true,
      marked: farthestFromZero(netHeat),
      height: 72,
    });
    channels.push({ name: QUANTITIES.netHeat.name, quantity: "netHeat", values: netHeat });
    alt.push(rangeSentence("Net heat into the sea", "netHeat", time, netHeat, context, "both"));
    shown.push("net heat, positive into the sea");
  }
  const drawn = drawTimeFigure("forcing-stack", panels, time, context);
  return {
    id: "forcing-stack",
    title: "What drove it",
    caption: caption(
      [`${shown.join("; ")}.`, windOrigin, missingSentence(windSpeed10, "Wind"), `${periodOf(time, context)}.`],
      context,
    ),
    alt: alt.join(" "),
    width: drawn.width,
    height: drawn.height,
    svg: drawn.svg,
    table: timeTable(time, channels, context),
  };
}

/** mm: each rate holds until the next time. */
export function heldTotal(time: ArrayLike<number>, ratePerHour: ArrayLike<number>): number {
  let total = 0;
  for (let index = 0; index + 1 < time.length; index += 1) {
    const rate = ratePerHour[index] ?? Number.NaN;
    if (Number.isFinite(rate)) total += (rate * ((time[index + 1] ?? 0) - (time[index] ?? 0))) / 3600;
  }
  return total;
}

function farthestFromZero(values: ArrayLike<number>): number | null {
  const found = extremes(values);
  if (found === null) return null;
  return Math.abs(found.min) > Math.abs(found.max) ? found.minAt : found.maxAt;
}

function windSentence(
  time: ArrayLike<number>,
  speed: ArrayLike<number>,
  from: ArrayLike<number>,
  context: FigureContext,
): string {
  const peak = extremes(speed)?.maxAt;
  const bearing = peak === undefined ? Number.NaN : (from[peak] ?? Number.NaN);
  const sentence = rangeSentence("Wind speed at 10 m", "windSpeed10", time, speed, context);
  if (!Number.isFinite(bearing)) return sentence;
  return `${sentence} At its highest the wind came from ${formatQuantity(bearing, "direction", context.units).text}.`;
}
