import type { TriggerLevel } from "~/ocean/scenario";
import { QUANTITIES } from "~/units/quantities";
import { beyondSentence, endsSentence, missingSentence, periodOf, rangeSentence } from "./describe";
import { drawTimeFigure } from "./draw-time-figure";
import type { Figure } from "./figure";
import { caption, type FigureContext } from "./figure-context";
import { bandChannels, bandSentence, seriesPanel, type SeriesBand, type SeriesQuantity } from "./response-panels";
import { timeTable } from "./time-table";

export interface SeriesLineData {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** SI, one a time, NaN where missing. */
  values: ArrayLike<number>;
  /** Where an ensemble ran. */
  band?: SeriesBand;
  triggers?: readonly TriggerLevel[];
}

const FIGURE_IDS: Record<SeriesQuantity, string> = {
  stress: "series-stress",
  driftSpeed: "series-drift-speed",
  temperature: "series-temperature",
  salinity: "series-salinity",
  density: "series-density",
  layerDepth: "series-layer-depth",
};

/** One quantity of a response through time, with its band and the client's trigger levels. */
export function seriesLine(id: SeriesQuantity, data: SeriesLineData, context: FigureContext): Figure {
  const { time, values, band } = data;
  const name = sentenceCase(QUANTITIES[id].name);
  const panel = { ...seriesPanel(id, data, context.units), height: 130 };
  const drawn = drawTimeFigure(FIGURE_IDS[id], [panel], time, context);
  const levels = drawn.levelsShown.map((level) => level.label);
  return {
    id: FIGURE_IDS[id],
    title: name,
    caption: caption(
      [
        `${name}.`,
        bandSentence(band),
        beyondSentence(drawn.levelsBeyond),
        missingSentence(values, name),
        `${periodOf(time, context)}.`,
      ],
      context,
    ),
    alt: [
      `${name} through time, ${periodOf(time, context)}.`,
      rangeSentence(name, id, time, values, context, "both"),
      sentenceCase(endsSentence(id, values, context)),
      levels.length > 0 ? `Shown with ${levels.join(", ")}.` : "",
    ]
      .filter((sentence) => sentence !== "")
      .join(" "),
    width: drawn.width,
    height: drawn.height,
    svg: drawn.svg,
    table: timeTable(time, [{ name: QUANTITIES[id].name, quantity: id, values }, ...bandChannels(id, band)], context),
  };
}

function sentenceCase(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
