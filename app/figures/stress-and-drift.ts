import type { TriggerLevel } from "~/ocean/scenario";
import { formatBearing } from "~/units/format-quantity";
import { bearingOf } from "~/units/compass";
import { QUANTITIES } from "~/units/quantities";
import { beyondSentence, periodOf, rangeSentence } from "./describe";
import { drawTimeFigure } from "./draw-time-figure";
import { extremes } from "./extremes";
import type { Figure } from "./figure";
import { caption, type FigureContext } from "./figure-context";
import { bandChannels, bandSentence, magnitude, seriesPanel, type SeriesBand } from "./response-panels";
import { timeTable } from "./time-table";

export interface StressAndDriftData {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** N/m², towards east and north */
  stressX: ArrayLike<number>;
  stressY: ArrayLike<number>;
  /** m/s, towards east and north */
  driftEast: ArrayLike<number>;
  driftNorth: ArrayLike<number>;
  triggers?: readonly TriggerLevel[];
  /** Of the sizes of both, where an ensemble ran. */
  bands?: { stress: SeriesBand; driftSpeed: SeriesBand };
}

/** Wind stress above the drift of the layer, the drift as speed and as its two components. */
export function stressAndDrift(data: StressAndDriftData, context: FigureContext): Figure {
  const { time, stressX, stressY, driftEast, driftNorth, triggers, bands } = data;
  const stress = magnitude(stressX, stressY);
  const speed = magnitude(driftEast, driftNorth);
  const panels = [
    seriesPanel("stress", { values: stress, triggers, band: bands?.stress }, context.units),
    {
      ...seriesPanel(
        "driftSpeed",
        {
          values: speed,
          label: "speed",
          band: bands?.driftSpeed,
          more: [
            { values: driftEast, label: "east", dash: "6,2" },
            { values: driftNorth, label: "north", dash: "2,3" },
          ],
          triggers,
        },
        context.units,
      ),
      heading: "drift",
      height: 130,
    },
  ];
  const drawn = drawTimeFigure("stress-and-drift", panels, time, context);
  const peak = extremes(speed)?.maxAt ?? 0;
  const towards = formatBearing(bearingOf(driftEast[peak] ?? Number.NaN, driftNorth[peak] ?? Number.NaN));
  return {
    id: "stress-and-drift",
    title: "Stress and drift",
    caption: caption(
      [
        "Wind stress; drift of the layer as speed and as its components towards east and north.",
        bandSentence(bands?.stress, "of stress and speed"),
        beyondSentence(drawn.levelsBeyond),
        `${periodOf(time, context)}.`,
      ],
      context,
    ),
    alt: [
      `Wind stress and drift of the layer, ${periodOf(time, context)}.`,
      rangeSentence("Wind stress", "stress", time, stress, context),
      rangeSentence("Drift speed", "driftSpeed", time, speed, context),
      `At its highest the drift went towards ${towards}.`,
    ].join(" "),
    width: drawn.width,
    height: drawn.height,
    svg: drawn.svg,
    table: timeTable(
      time,
      [
        { name: QUANTITIES.stress.name, quantity: "stress", values: stress },
        ...bandChannels("stress", bands?.stress),
        { name: "wind stress, east", quantity: "stress", values: stressX },
        { name: "wind stress, north", quantity: "stress", values: stressY },
        { name: QUANTITIES.driftSpeed.name, quantity: "driftSpeed", values: speed },
        ...bandChannels("driftSpeed", bands?.driftSpeed),
        { name: "drift, east", quantity: "driftSpeed", values: driftEast },
        { name: "drift, north", quantity: "driftSpeed", values: driftNorth },
      ],
      context,
    ),
  };
}
