import { drawTimeFigure } from "~/figures/draw-time-figure";
import { extremes } from "~/figures/extremes";
import type { Figure } from "~/figures/figure";
import { flagKey } from "~/figures/flag-marks";
import { caption, type FigureContext } from "~/figures/figure-context";
import { periodOf, rangeSentence } from "~/figures/describe";
import type { FlagMark, TimePanel } from "~/figures/time-panel";
import { timeTable } from "~/figures/time-table";
import { windPanel } from "~/figures/wind-panel";
import type { ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { CHANNELS } from "./channels";
import { onCommonAxis } from "./common-axis";
import { HEAT_PARTS } from "./heat-parts";
import type { StormWindow } from "./storm-window";

interface StormFigureOptions {
  id: string;
  title: string;
  /** m; null where it is not known. */
  windHeight: number | null;
  /** Where the series are not what was recorded: `as changed for the scenario`. */
  told?: string;
  /** Flags of quality by channel; without them none is drawn. */
  marks?: ReadonlyMap<ChannelName, readonly FlagMark[]>;
  /** Shown on a tinted ground. */
  window?: StormWindow | null;
  /** A longer table is left out: it would weigh more than the rest of the page. */
  mostTableRows: number;
}

const DRAWN: readonly ChannelName[] = [
  "windSpeed",
  "windGust",
  "windFrom",
  "rain",
  ...HEAT_PARTS.map(({ channel }) => channel),
];

/** Wind at its own height, rain and heat as recorded, above one time axis; null where there is none of the three. */
export function stormFigure(
  series: readonly ChannelSeries[],
  { id, title, windHeight, window, mostTableRows, marks = new Map(), told = "as recorded" }: StormFigureOptions,
  context: FigureContext,
): Figure | null {
  const drawn = series.filter(({ channel }) => DRAWN.includes(channel));
  const { time, values } = onCommonAxis(drawn);
  const of = (channel: ChannelName) => {
    const index = drawn.findIndex((entry) => entry.channel === channel);
    return index < 0 ? undefined : values[index];
  };
  // The arrows of the direction have no room for marks: those stand on the quality page.
  const marksOf = (...channels: ChannelName[]) => channels.flatMap((channel) => marks.get(channel) ?? []);
  const drawnMarks = [
    marksOf("windSpeed", "windGust"),
    marksOf("rain"),
    marksOf(...HEAT_PARTS.map(({ channel }) => channel)),
  ];
  const panels = [windOf(of, windHeight), rainOf(of("rain")), heatOf(of)]
    .map((panel, index) => panel && { ...panel, flagMarks: drawnMarks[index] })
    .filter((panel) => panel !== null);
  if (panels.length === 0 || time.length === 0) return null;
  if (window) for (const panel of panels) panel.window = { start: window.startsAt, end: window.endsAt };
  const { svg, width, height } = drawTimeFigure(id, panels, time, context);
  const sentences = drawn
    .filter(({ channel }) => channel !== "windFrom")
    .map(({ channel }) => {
      const { label, quantity } = CHANNELS[channel];
      return rangeSentence(label[0].toUpperCase() + label.slice(1), quantity, time, of(channel) ?? [], context);
    });
  const shown = panels.map(({ heading }) => heading).join("; ");
  return {
    id,
    title,
    caption: caption(
      [
        `${shown[0].toUpperCase()}${shown.slice(1)}, ${told}.`,
        of("windFrom") && "Arrows point where the wind blows to.",
        window && "The storm's window is tinted.",
        flagKey(drawnMarks.flat()),
        `${periodOf(time, context)}.`,
      ],
      context,
    ),
    alt: [`${title}, ${periodOf(time, context)}.`, ...sentences].join(" "),
    width,
    height,
    svg,
    table: timeTable(
      time.length > mostTableRows ? [] : time,
      drawn.map(({ channel }, index) => ({
        name: CHANNELS[channel].label,
        quantity: CHANNELS[channel].quantity,
        values: values[index],
      })),
      context,
    ),
  };
}

type ValuesOf = (channel: ChannelName) => Float64Array | undefined;

function windOf(of: ValuesOf, height: number | null): TimePanel | null {
  const speed = of("windSpeed");
  if (!speed) return null;
  const from = of("windFrom");
  const heading = height === null ? "wind" : `wind at ${height} m`;
  const panel = windPanel({ quantity: "windSpeed", heading, speed, from: from ?? [], gust: of("windGust") });
  return from ? panel : { ...panel, arrows: undefined };
}

function rainOf(rain: Float64Array | undefined): TimePanel | null {
  if (!rain) return null;
  return {
    quantity: "rainRate",
    heading: "rain",
    colour: "rain",
    lines: [{ values: rain, shape: "hold" }],
    zero: true,
    marked: extremes(rain)?.maxAt,
    height: 72,
  };
}

function heatOf(of: ValuesOf): TimePanel | null {
  const lines = HEAT_PARTS.flatMap(({ channel, label, dash }) => {
    const values = of(channel);
    return values ? [{ values, label, dash, openPauses: true }] : [];
  });
  if (lines.length === 0) return null;
  return {
    quantity: "netHeat",
    heading: of("netHeat") ? "net heat into the sea" : "heat into the sea",
    colour: "heat",
    lines,
    zero: true,
    height: 72,
  };
}
