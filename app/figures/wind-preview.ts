import { formatQuantity } from "~/units/format-quantity";
import { formatPeriod } from "~/units/format-time";
import { QUANTITIES } from "~/units/quantities";
import { missingSentence, periodOf, rangeSentence } from "./describe";
import { drawTimeFigure } from "./draw-time-figure";
import type { Figure } from "./figure";
import { caption, type FigureContext } from "./figure-context";
import { timeTable } from "./time-table";
import { windPanel } from "./wind-panel";

export interface WindPreviewData {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** m/s at `windHeight` */
  windSpeed: ArrayLike<number>;
  /** degrees true, where the wind comes from */
  windFrom: ArrayLike<number>;
  /** m/s */
  windGust?: ArrayLike<number>;
  /** m above the sea; null while it is not known */
  windHeight: number | null;
  /** The storm's window, in seconds: on a tinted ground. */
  stormWindow?: { start: number; end: number };
}

/** A record of wind as it was read, before any correction; pauses stay open. */
export function windPreview(data: WindPreviewData, context: FigureContext): Figure {
  const { time, windSpeed, windFrom, windGust, windHeight, stormWindow } = data;
  const height = windHeight === null ? "at the station's height" : `at ${lengthText(windHeight, context)}`;
  const panel = windPanel({
    quantity: "windSpeed",
    heading: windHeight === null ? "wind as recorded" : `wind ${height}`,
    speed: windSpeed,
    from: windFrom,
    gust: windGust,
  });
  const drawn = drawTimeFigure("wind-preview", [{ ...panel, window: stormWindow }], time, context);
  const shaded = stormWindow
    ? `The storm's window is shaded: ${formatPeriod(stormWindow.start, stormWindow.end, context.zone)}.`
    : null;
  return {
    id: "wind-preview",
    title: "Wind as read",
    caption: caption(
      [
        `Wind ${height} as recorded, with arrows that point where it blows to.`,
        missingSentence(windSpeed, "Wind speed"),
        shaded,
        `Record: ${periodOf(time, context)}.`,
      ],
      context,
    ),
    alt: [
      `Recorded wind, ${periodOf(time, context)}.`,
      rangeSentence(`Wind speed ${height}`, "windSpeed", time, windSpeed, context),
      ...(windGust ? [rangeSentence("Gusts", "windGust", time, windGust, context)] : []),
      ...(shaded ? [shaded] : []),
    ].join(" "),
    width: drawn.width,
    height: drawn.height,
    svg: drawn.svg,
    table: timeTable(
      time,
      [
        { name: QUANTITIES.windSpeed.name, quantity: "windSpeed", values: windSpeed },
        { name: "wind direction from", quantity: "direction", values: windFrom },
        ...(windGust ? [{ name: QUANTITIES.windGust.name, quantity: "windGust" as const, values: windGust }] : []),
      ],
      context,
    ),
  };
}

function lengthText(metres: number, context: FigureContext): string {
  return formatQuantity(metres, "depth", context.units, { decimals: Number.isInteger(metres) ? 0 : 1 }).text;
}
