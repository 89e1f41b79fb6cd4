import type { TriggerLevel } from "~/ocean/scenario";
import { QUANTITIES, type QuantityId } from "~/units/quantities";
import { beyondSentence, periodOf, rangeSentence } from "./describe";
import { drawTimeFigure } from "./draw-time-figure";
import type { Figure } from "./figure";
import { caption, type FigureContext } from "./figure-context";
import { bandChannels, bandSentence, seriesPanel, type SeriesBand } from "./response-panels";
import { timeTable } from "./time-table";

const LAYER_QUANTITIES = ["salinity", "temperature", "density", "layerDepth"] as const satisfies QuantityId[];
type LayerQuantity = (typeof LAYER_QUANTITIES)[number];

export interface LayerStackData {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: ArrayLike<number>;
  /** g/kg */
  salinity: ArrayLike<number>;
  /** °C */
  temperature: ArrayLike<number>;
  /** kg/m³, potential, at the surface */
  density: ArrayLike<number>;
  /** m; left out where absent, as for a layer of fixed depth */
  layerDepth?: ArrayLike<number>;
  bands?: Partial<Record<LayerQuantity, SeriesBand>>;
  triggers?: readonly TriggerLevel[];
}

/** What the layer did: salinity, temperature, density and, where it is given, depth above one time axis. */
export function layerStack(data: LayerStackData, context: FigureContext): Figure {
  const { time } = data;
  const shown = LAYER_QUANTITIES.flatMap((id) => {
    const values = data[id];
    return values ? [{ id, values }] : [];
  });
  const panels = shown.map(({ id, values }) =>
    seriesPanel(id, { values, band: data.bands?.[id], triggers: data.triggers }, context.units),
  );
  const drawn = drawTimeFigure("layer-stack", panels, time, context);
  const names = shown.map(({ id }) => QUANTITIES[id].name.replace("surface ", ""));
  const levels = drawn.levelsShown.map((level) => level.label);
  return {
    id: "layer-stack",
    title: "What the layer did",
    caption: caption(
      [
        `Surface layer: ${names.join(", ")}.`,
        bandSentence(data.bands?.salinity),
        beyondSentence(drawn.levelsBeyond),
        `${periodOf(time, context)}.`,
      ],
      context,
    ),
    alt: [
      `The surface layer through time, ${periodOf(time, context)}.`,
      ...shown.map(({ id, values }) => {
        const name = QUANTITIES[id].name;
        return rangeSentence(name.charAt(0).toUpperCase() + name.slice(1), id, time, values, context, "both");
      }),
      ...(levels.length > 0 ? [`Shown with ${levels.join(", ")}.`] : []),
    ].join(" "),
    width: drawn.width,
    height: drawn.height,
    svg: drawn.svg,
    table: timeTable(
      time,
      shown.flatMap(({ id, values }) => [
        { name: QUANTITIES[id].name, quantity: id, values },
        ...bandChannels(id, data.bands?.[id]),
      ]),
      context,
    ),
  };
}
