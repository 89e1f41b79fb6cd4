import { drawTimeFigure } from "~/figures/draw-time-figure";
import { endsSentence, periodOf } from "~/figures/describe";
import type { Figure } from "~/figures/figure";
import { caption, type FigureContext } from "~/figures/figure-context";
import type { TimePanel } from "~/figures/time-panel";
import { timeTable, type TableChannel } from "~/figures/time-table";
import { formatQuantity } from "~/units/format-quantity";
import type { ChannelSeries } from "./channel-series";
import { unionOfTimes } from "./common-axis";
import { HEAT_PARTS } from "./heat-parts";
import { runningHeat, runningRain, totalAt, type RunningTotal } from "./running-totals";
import { withinWindow, type StormWindow } from "./storm-window";

interface Total {
  name: string;
  /** Beside the heading of its panel. */
  label: string;
  dash: string;
  quantity: "rainTotal" | "heatTotal";
  total: RunningTotal;
}

/** Rain and heat that a storm brought, as they added up over its window; null where neither is on record in it. */
export function totalsFigure(
  series: readonly ChannelSeries[],
  window: StormWindow,
  { mostTableRows }: { mostTableRows: number },
  context: FigureContext,
): Figure | null {
  const totals = totalsOf(series, window);
  if (totals.length === 0) return null;
  const time = unionOfTimes([
    { time: Float64Array.of(window.startsAt, window.endsAt) },
    ...totals.map(({ total }) => total),
  ]);
  const values = totals.map(({ total }) => totalAt(total, time));
  const panels = (["rainTotal", "heatTotal"] as const).flatMap((quantity) => panelOf(quantity, totals, values));
  const { svg, width, height } = drawTimeFigure("storm-totals", panels, time, context);
  const told = totals.map(({ name, quantity, total }) => {
    const end = formatQuantity(total.values.at(-1), quantity, context.units, { sign: quantity === "heatTotal" });
    return `${name} ${end.text}`;
  });
  const columns: TableChannel[] = totals.map(({ name, quantity }, index) => ({
    name,
    quantity,
    values: values[index],
  }));
  return {
    id: "storm-totals",
    title: "What the storm added up to",
    caption: caption(
      [
        `By the end of the window: ${told.join(", ")}.`,
        totals.some(({ quantity }) => quantity === "heatTotal") && "Heat is positive into the sea.",
        "Nothing is added across a gap in a record.",
      ],
      context,
    ),
    alt: [
      `Running totals, ${periodOf(time, context)}.`,
      ...totals.map(({ name, quantity }, index) => `${name}: ${endsSentence(quantity, values[index], context)}`),
    ].join(" "),
    width,
    height,
    svg,
    table: timeTable(time.length > mostTableRows ? [] : time, columns, context),
  };
}

function totalsOf(series: readonly ChannelSeries[], window: StormWindow): Total[] {
  const inside = series.map((entry) => withinWindow(entry, window)).filter(({ time }) => time.length > 0);
  const rain = inside.find(({ channel }) => channel === "rain");
  const heat = HEAT_PARTS.flatMap(({ channel, label, dash }) => {
    const found = inside.find((entry) => entry.channel === channel);
    if (!found) return [];
    return [{ name: `${label} heat`, label, dash, quantity: "heatTotal" as const, total: runningHeat(found) }];
  });
  const ofRain = rain && {
    name: "rain",
    label: "rain",
    dash: "",
    quantity: "rainTotal" as const,
    total: runningRain(rain, window),
  };
  return [...(ofRain ? [ofRain] : []), ...heat];
}

function panelOf(quantity: Total["quantity"], totals: readonly Total[], values: readonly Float64Array[]): TimePanel[] {
  const lines = totals.flatMap((total, index) =>
    total.quantity === quantity ? [{ values: values[index], label: total.label, dash: total.dash }] : [],
  );
  if (lines.length === 0) return [];
  const rain = quantity === "rainTotal";
  return [
    {
      quantity,
      heading: rain ? "rain since the start" : "heat into the sea since the start",
      colour: rain ? "rain" : "heat",
      lines,
      zero: true,
      height: 96,
    },
  ];
}
