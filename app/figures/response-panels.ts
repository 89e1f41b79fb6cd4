/** The panels that a response's series are drawn in, each by itself or stacked. */
import type { TriggerLevel, TriggerQuantity } from "~/ocean/scenario";
import { QUANTITIES, quantity } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import { extremes, farthestFromStart } from "./extremes";
import { triggerLevels } from "./levels";
import type { PanelLine, TimePanel } from "./time-panel";
import type { TableChannel } from "./time-table";

export type SeriesQuantity = TriggerQuantity;

/** Percentiles of an ensemble through time, SI. */
export interface SeriesBand {
  p10: ArrayLike<number>;
  p50: ArrayLike<number>;
  p90: ArrayLike<number>;
  /** How many members they are of. */
  members: number;
}

export interface SeriesPanelData {
  /** SI, one a time, NaN where missing. */
  values: ArrayLike<number>;
  band?: SeriesBand;
  triggers?: readonly TriggerLevel[];
  /** More lines of the same quantity, as components. */
  more?: PanelLine[];
  /** Names the first line where there are more. */
  label?: string;
}

/** A panel for one quantity of a response, with the client's trigger levels and its farthest sample marked. */
export function seriesPanel(id: SeriesQuantity, data: SeriesPanelData, units: UnitChoices): TimePanel {
  const fromZero = id === "stress" || id === "driftSpeed";
  return {
    quantity: id,
    heading: QUANTITIES[id].name,
    colour: quantity(id).colour,
    lines: [{ values: data.values, label: data.label, dash: quantity(id).dash }, ...(data.more ?? [])],
    band: data.band ? { low: data.band.p10, high: data.band.p90 } : undefined,
    levels: triggerLevels(data.triggers, id, units),
    zero: fromZero,
    downwards: id === "layerDepth",
    marked: fromZero ? extremes(data.values)?.maxAt : farthestFromStart(data.values),
  };
}

/** A band as columns of a figure's table, after those of the quantity itself. */
export function bandChannels(id: SeriesQuantity, band: SeriesBand | undefined): TableChannel[] {
  if (!band) return [];
  const channel = (percentile: string, values: ArrayLike<number>): TableChannel => ({
    name: `${QUANTITIES[id].name}, ${percentile}`,
    quantity: id,
    values,
  });
  return [channel("10th percentile", band.p10), channel("median", band.p50), channel("90th percentile", band.p90)];
}

/** What the tint means; null where there is none. @param whose `of stress and speed`, where not all lines have one */
export function bandSentence(band: SeriesBand | undefined, whose = ""): string | null {
  return band ? `Tinted${whose && ` ${whose}`}: the 10th to the 90th percentile of ${band.members} members.` : null;
}

/** The lengths of vectors given by their components. */
export function magnitude(east: ArrayLike<number>, north: ArrayLike<number>): number[] {
  return Array.from(east, (value, index) => Math.hypot(value, north[index] ?? Number.NaN));
}
