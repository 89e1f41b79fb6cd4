import type { Figure } from "~/figures/figure";
import type { FigureContext } from "~/figures/figure-context";
import { castProfile } from "~/figures/cast-profile";
import { driftTrack } from "~/figures/drift-track";
import { flaggedSeries } from "~/figures/flagged-series";
import { forcingStack } from "~/figures/forcing-stack";
import { hodograph } from "~/figures/hodograph";
import { layerStack } from "~/figures/layer-stack";
import { seriesLine } from "~/figures/series-line";
import type { FlagMarkKind } from "~/figures/time-panel";
import { stressAndDrift } from "~/figures/stress-and-drift";
import type { TriggerLevel } from "~/ocean/scenario";
import type { LocalPosition } from "~/figures/drift-track";

/** One storm and what it left: all that the figures can be given. */
export interface EverySeries {
  time: number[];
  windSpeed10: number[];
  windFrom: number[];
  windGust: number[];
  rainRate: number[];
  netHeat: number[];
  stressX: number[];
  stressY: number[];
  driftEast: number[];
  driftNorth: number[];
  displacementEast: number[];
  displacementNorth: number[];
  salinity: number[];
  temperature: number[];
  density: number[];
  layerDepth: number[];
  triggerLevels?: readonly TriggerLevel[];
  boxOutline?: readonly LocalPosition[];
  coast?: readonly (readonly LocalPosition[])[];
}

const CAST_LAYERS = [
  { step: 0.03, depth: 14, reached: true },
  { step: 0.125, depth: 60, reached: false },
];

const bandAround = (values: number[]) => ({
  p10: values.map((value) => 0.8 * Math.abs(value)),
  p50: values.map(Math.abs),
  p90: values.map((value) => 1.2 * Math.abs(value)),
  members: 200,
});

const MARK_KINDS: readonly FlagMarkKind[] = ["suspect", "bad", "missing", "set"];

/** Every flag, one sample after another. */
const marked = (time: number[], values: number[]) =>
  time.map((seconds, k) => ({
    kind: MARK_KINDS[k % MARK_KINDS.length],
    seconds,
    value: Number.isFinite(values[k]) ? values[k] : 0,
  }));

/** Every figure there is, of one set of series. */
export function everyFigure(series: EverySeries, context: FigureContext): Figure[] {
  const { time, triggerLevels: triggers } = series;
  return [
    forcingStack(series, context),
    seriesLine("stress", { time, values: series.stressX }, context),
    seriesLine("driftSpeed", { time, values: series.driftEast }, context),
    seriesLine("temperature", { time, values: series.temperature, triggers }, context),
    seriesLine(
      "salinity",
      {
        time,
        values: series.salinity,
        triggers,
        band: {
          p10: series.salinity.map((value) => value - 0.3),
          p50: series.salinity,
          p90: series.salinity.map((value) => value + 0.2),
          members: 64,
        },
      },
      context,
    ),
    seriesLine("density", { time, values: series.density }, context),
    seriesLine("layerDepth", { time, values: series.layerDepth }, context),
    layerStack({ ...series, triggers }, context),
    stressAndDrift(
      { ...series, bands: { stress: bandAround(series.stressX), driftSpeed: bandAround(series.driftEast) } },
      context,
    ),
    hodograph({ ...series, inertialAmplitude: 0.5 }, context),
    driftTrack({ ...series, box: series.boxOutline, land: series.coast }, context),
    flaggedSeries(
      {
        id: "quality-windFrom",
        label: "wind direction, from",
        quantity: "direction",
        between: "turn",
        time,
        values: series.windFrom,
        marks: marked(time, series.windFrom),
        mostTableRows: time.length,
      },
      context,
    ),
    castProfile({ ...series, depth: time.map((_, level) => 0.75 * level), layers: CAST_LAYERS }, context),
  ];
}
