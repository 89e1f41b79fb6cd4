/** Temperature, salinity and density down the water: three panels that share the axis of depth, which grows downwards. */
import * as Plot from "@observablehq/plot";
import { formatNumber, formatQuantity, formatRange, toDisplay } from "~/units/format-quantity";
import { displayUnit, quantity, type QuantityId } from "~/units/quantities";
import { HAIRLINE, INK, markColour } from "./colours";
import { extremes } from "./extremes";
import type { Figure } from "./figure";
import { caption, figureWidth, idPrefix, type FigureContext } from "./figure-context";
import { niceAxis } from "./nice-ticks";
import { escapeXml, FONT_SIZE, IdKeeper, plainGroup } from "./plain-markup";
import { axisHeading, HEADING_HEIGHT, svgSheet } from "./sheet";
import { textWidth } from "./text-size";
import { keepExtremes } from "./thin-line";

export interface CastProfileData {
  /** m, positive down, ascending */
  depth: ArrayLike<number>;
  /** In situ, °C. */
  temperature: ArrayLike<number>;
  /** g/kg */
  salinity: ArrayLike<number>;
  /** Potential, referred to the surface, kg/m³. */
  density: ArrayLike<number>;
  /** Depth of the layer (m) by each threshold (kg/m³). */
  layers: readonly { step: number; depth: number; reached: boolean }[];
}

const PANELS = [
  { key: "temperature", name: "Temperature" },
  { key: "salinity", name: "Salinity" },
  { key: "density", name: "Density" },
] as const satisfies { key: QuantityId & keyof CastProfileData; name: string }[];

const DASHES = ["6,3", "1.5,3"];
const MARGIN_LEFT = 46;
const MARGIN_RIGHT = 12;
const GAP = 14;
const TICK_ROOM = 20;
const KEY_HEIGHT = 16;

interface Axis {
  domain: [number, number];
  ticks: number[];
  decimals: number;
}

interface Frame {
  width: number;
  height: number;
  depths: Axis;
  context: FigureContext;
}

export function castProfile(data: CastProfileData, context: FigureContext): Figure {
  const { units } = context;
  const width = figureWidth(context);
  const panelWidth = (width - MARGIN_LEFT - MARGIN_RIGHT - (PANELS.length - 1) * GAP) / PANELS.length;
  const deepest = toDisplay(extremes(data.depth)?.max ?? 1, "depth", units);
  const plotHeight = width < 500 ? 280 : 340;
  const frame: Frame = { width: panelWidth, height: plotHeight, depths: depthAxis(deepest, plotHeight), context };
  const ids = new IdKeeper(idPrefix("cast-profile", context));
  let markup = axisHeading(`Depth (${displayUnit("depth", units).unit})`, 0, { grows: "down" });
  PANELS.forEach(({ key, name }, index) => {
    const x = MARGIN_LEFT + index * (panelWidth + GAP);
    const unit = displayUnit(key, units).unit;
    const middle = Math.round(x + panelWidth / 2);
    markup += `<text x="${middle}" y="${HEADING_HEIGHT + 12}">${escapeXml(`${name} (${unit})`)}</text>`;
    const plot = drawPanel(data, key, index === 0, frame);
    markup += plainGroup(plot, x - (index === 0 ? MARGIN_LEFT : 0), 2 * HEADING_HEIGHT, ids);
  });
  const top = 2 * HEADING_HEIGHT + TICK_ROOM + plotHeight + 6;
  const keys = data.layers.map((layer, index) =>
    layerKey(layer, DASHES[index] ?? "", top + index * KEY_HEIGHT, context),
  );
  const height = Math.ceil(top + data.layers.length * KEY_HEIGHT + 4);
  return {
    id: "cast-profile",
    title: "The cast",
    caption: caption(
      [
        "In-situ temperature, salinity and potential density referred to the surface (TEOS-10) against depth.",
        "Across: the base of the mixed layer, where density first exceeds its surface value by the threshold.",
      ],
      context,
    ),
    alt: describe(data, context),
    width,
    height,
    svg: svgSheet(width, height, markup + keys.join("")),
    table: {
      columns: [
        { name: "depth", unit: displayUnit("depth", units).unit, decimals: 2 },
        ...PANELS.map(({ key, name }) => {
          const { unit, decimals } = displayUnit(key, units);
          return { name: name.toLowerCase(), unit, decimals: decimals + 2 };
        }),
      ],
      rows: Array.from(data.depth, (metres, k) => [
        finite(toDisplay(metres, "depth", units)),
        ...PANELS.map(({ key }) => finite(toDisplay(data[key][k] ?? Number.NaN, key, units))),
      ]),
    },
  };
}

function finite(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}

function drawPanel(
  data: CastProfileData,
  key: (typeof PANELS)[number]["key"],
  withDepths: boolean,
  { width, height, depths, context }: Frame,
): Element {
  const { units } = context;
  const axis = valuesAxis(data[key], key, width, context);
  const marginLeft = withDepths ? MARGIN_LEFT : 0;
  const points = keepExtremes(data[key]).map((k) => ({
    x: toDisplay(data[key][k] ?? Number.NaN, key, units),
    y: toDisplay(data.depth[k] ?? Number.NaN, "depth", units),
  }));
  const label = ({ decimals }: Axis) => ({
    label: null,
    tickSize: 4,
    tickPadding: 4,
    fontSize: FONT_SIZE,
    color: INK,
    tickFormat: (value: number) => formatNumber(value, decimals),
  });
  return Plot.plot({
    document: context.document,
    width: marginLeft + width,
    height: TICK_ROOM + height + 2,
    marginTop: TICK_ROOM,
    marginBottom: 2,
    marginLeft,
    marginRight: 0,
    x: { type: "linear", domain: axis.domain, axis: null },
    y: { type: "linear", domain: depths.domain, axis: null, reverse: true },
    marks: [
      Plot.frame({ stroke: HAIRLINE, strokeWidth: 0.5 }),
      Plot.ruleX(axis.ticks, { stroke: HAIRLINE, strokeWidth: 0.5 }),
      Plot.ruleY(depths.ticks, { stroke: HAIRLINE, strokeWidth: 0.5 }),
      Plot.axisX(axis.ticks, { ...label(axis), anchor: "top" }),
      ...(withDepths ? [Plot.axisY(depths.ticks, label(depths))] : []),
      ...data.layers.map(({ depth }, index) =>
        Plot.ruleY([toDisplay(depth, "depth", units)], {
          stroke: INK,
          strokeWidth: 1.25,
          strokeDasharray: DASHES[index],
        }),
      ),
      Plot.line(points, {
        x: "x",
        y: "y",
        stroke: markColour(quantity(key).colour),
        strokeWidth: 1.5,
        strokeDasharray: quantity(key).dash || undefined,
      }),
    ],
  });
}

/** From the surface to a little below the deepest level. */
function depthAxis(deepest: number, height: number): Axis {
  const end = deepest > 0 ? deepest * 1.03 : 1;
  const { ticks, decimals } = niceAxis(0, end, Math.floor(height / 44));
  return { domain: [0, end], ticks: ticks.filter((tick) => tick <= end), decimals };
}

/** A flat profile is given ten of its last decimals, so that noise stays noise. Ticks stand where their labels have room. */
function valuesAxis(values: ArrayLike<number>, key: QuantityId, width: number, { units }: FigureContext): Axis {
  const found = extremes(values);
  const [low, high] = found ? [toDisplay(found.min, key, units), toDisplay(found.max, key, units)] : [0, 0];
  const least = 10 ** (1 - displayUnit(key, units).decimals);
  const spare = Math.max(0.06 * (high - low), (least - (high - low)) / 2);
  const domain: [number, number] = [low - spare, high + spare];
  const [from, to] = domain;
  const fitting = [6, 5, 4, 3, 2, 1].map((count) => {
    const { ticks, decimals } = niceAxis(from, to, count);
    const room = (tick: number) => textWidth(formatNumber(tick, decimals)) / 2 - GAP / 2;
    const x = (tick: number) => ((tick - from) / (to - from)) * width;
    const inside = ticks.filter(
      (tick) => x(tick) >= Math.max(0, room(tick)) && x(tick) <= width - Math.max(0, room(tick)),
    );
    const needed = inside.reduce((sum, tick) => sum + textWidth(formatNumber(tick, decimals)) + 8, 0);
    return { domain, ticks: inside, decimals, fits: inside.length > 0 && needed <= width + GAP };
  });
  return fitting.find(({ fits }) => fits) ?? { domain, ticks: [], decimals: 0 };
}

type Layer = CastProfileData["layers"][number];

function layerText({ step, depth, reached }: Layer, context: FigureContext): string {
  const text = formatQuantity(depth, "layerDepth", context.units, { decimals: 1 }).text;
  return reached ? `${step} kg/m³: layer of ${text}` : `${step} kg/m³: not reached; the cast ends at ${text}`;
}

function layerKey(layer: Layer, dash: string, top: number, context: FigureContext): string {
  const baseline = top + 12;
  return (
    `<path d="M${MARGIN_LEFT},${baseline - 4}h28" fill="none" stroke="${INK}" stroke-width="1.25" stroke-dasharray="${dash}"/>` +
    `<text x="${MARGIN_LEFT + 35}" y="${baseline}" text-anchor="start">${escapeXml(layerText(layer, context))}</text>`
  );
}

function describe(data: CastProfileData, context: FigureContext): string {
  const depth = extremes(data.depth);
  if (!depth) return "A cast without levels.";
  const ranges = PANELS.map(({ key, name }) => {
    const found = extremes(data[key]);
    return `${name} ${found ? formatRange(found.min, found.max, key, context.units) : "without values"}.`;
  });
  const layers = data.layers.map((layer) => `Threshold ${layerText(layer, context)}.`);
  return [
    `A cast from ${formatRange(depth.min, depth.max, "depth", context.units, { decimals: 1 })} of depth.`,
    ...ranges,
    ...layers,
  ].join(" ");
}
