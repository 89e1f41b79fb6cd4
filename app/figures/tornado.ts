import { formatQuantity, toDisplay } from "~/units/format-quantity";
import { displayUnit, quantity, type QuantityId } from "~/units/quantities";
import { HAIRLINE, INK, markColour } from "./colours";
import type { Figure } from "./figure";
import { caption, figureWidth, type FigureContext } from "./figure-context";
import { niceAxis } from "./nice-ticks";
import { escapeXml, FONT_SIZE, roundGeometry } from "./plain-markup";
import { acrossHeading, svgSheet } from "./sheet";
import { textWidth } from "./text-size";

/** A factor by itself, at the two of its settings where the figure is least and greatest; SI. */
export interface TornadoBar {
  factor: string;
  low: { setting: string; value: number };
  high: { setting: string; value: number };
}

export interface TornadoData {
  /** Short and stable, of the headline figure. */
  id: string;
  /** As `Surface temperature change`. */
  name: string;
  quantity: QuantityId;
  /** SI, of the estimate itself. */
  value: number;
  /** The widest first. */
  bars: readonly TornadoBar[];
}

const ROW = 30;
const BAR = 9;
const AXIS = 34;
const TOP = 6;
const INSET = 16;

/** How far one figure moves when each uncertain input alone goes through its range: the widest at the top. */
export function tornado(data: TornadoData, context: FigureContext): Figure {
  const { units } = context;
  const show = (value: number) => toDisplay(value, data.quantity, units);
  const moving = data.bars.filter(({ low, high }) => high.value > low.value);
  const width = figureWidth(context);
  const ends = [show(data.value), ...moving.flatMap(({ low, high }) => [show(low.value), show(high.value)])];
  const [from, to] = [Math.min(...ends), Math.max(...ends)];
  const span = to > from ? to - from : 1;
  const [left, right] = [8, width - 8];
  // Half a number's width inside, so that the axis can name its own ends.
  const [start, end] = [left + INSET, right - INSET];
  const at = (value: number) => start + ((show(value) - from) / span) * (end - start);
  const height = TOP + moving.length * ROW + AXIS;
  const colour = markColour(quantity(data.quantity).colour);
  const foot = TOP + moving.length * ROW;
  const rows = moving.map((bar, k) => rowMarkup(bar, TOP + k * ROW, { at, base: at(data.value), colour, left, right }));
  const { unit } = displayUnit(data.quantity, units);
  const axis = axisMarkup(from, to, { start, end, foot }) + acrossHeading(axisName(data.name, unit), right, height - 4);
  return {
    id: `tornado-${data.id}`,
    title: `What ${data.name.toLowerCase()} depends on`,
    caption: caption(
      [
        `${data.name}: each bar is one input alone through its range, all else as in the estimate.`,
        `The upright line is the estimate, ${formatQuantity(data.value, data.quantity, units).text}.`,
      ],
      context,
    ),
    alt: altText(data, moving, context),
    width,
    height,
    svg: svgSheet(width, height, rows.join("") + axis),
    table: {
      columns: [
        { name: "input", unit: "" },
        { name: "setting of the least", unit: "" },
        { name: `least ${data.name.toLowerCase()}`, unit },
        { name: "setting of the greatest", unit: "" },
        { name: `greatest ${data.name.toLowerCase()}`, unit },
      ],
      rows: data.bars.map(({ factor, low, high }) => [
        factor,
        low.setting,
        show(low.value),
        high.setting,
        show(high.value),
      ]),
    },
  };
}

interface RowFrame {
  at: (value: number) => number;
  /** Where the estimate itself stands. */
  base: number;
  colour: string;
  left: number;
  right: number;
}

/** Name and settings above the bar, so that no label is squeezed beside it on a narrow screen. */
function rowMarkup(
  { factor, low, high }: TornadoBar,
  top: number,
  { at, base, colour, left, right }: RowFrame,
): string {
  const [x, end] = [at(low.value), at(high.value)];
  const settings = `${low.setting} to ${high.setting}`;
  const room = right - left - textWidth(factor) - 24;
  const shown = textWidth(settings) <= room ? settings : "";
  return (
    `<text x="${left}" y="${top + FONT_SIZE}" text-anchor="start">${escapeXml(factor)}</text>` +
    (shown === "" ? "" : `<text x="${right}" y="${top + FONT_SIZE}" text-anchor="end">${escapeXml(shown)}</text>`) +
    `<path d="${roundGeometry(`M${left},${top + 16 + BAR / 2}H${right}`)}" fill="none" stroke="${HAIRLINE}" stroke-width="1"/>` +
    `<rect x="${roundGeometry(String(x))}" y="${top + 16}" width="${roundGeometry(String(Math.max(1, end - x)))}" height="${BAR}" fill="${colour}"/>` +
    `<path d="${roundGeometry(`M${base},${top + 14}v${BAR + 4}`)}" fill="none" stroke="${INK}" stroke-width="1.5"/>`
  );
}

function axisMarkup(
  from: number,
  to: number,
  { start, end, foot }: { start: number; end: number; foot: number },
): string {
  const span = to > from ? to - from : 1;
  const { ticks, decimals } = niceAxis(from, to, Math.max(2, Math.floor((end - start) / 90)));
  const marks = ticks
    .filter((tick) => tick >= from && tick <= to)
    .map((tick) => {
      const x = roundGeometry(String(start + ((tick - from) / span) * (end - start)));
      return (
        `<path d="M${x},${foot}v4" fill="none" stroke="${INK}" stroke-width="0.9"/>` +
        `<text x="${x}" y="${foot + 15}">${escapeXml(tick.toFixed(decimals).replace("-", "−"))}</text>`
      );
    });
  return `<path d="M${start},${foot}H${end}" fill="none" stroke="${INK}" stroke-width="0.9"/>${marks.join("")}`;
}

function axisName(name: string, unit: string): string {
  return unit === "" ? name.toLowerCase() : `${name.toLowerCase()} (${unit})`;
}

function altText(data: TornadoData, moving: readonly TornadoBar[], { units }: FigureContext): string {
  const text = (value: number) => formatQuantity(value, data.quantity, units).text;
  if (moving.length === 0) return `${data.name} does not move with any of the uncertain inputs.`;
  const told = moving
    .slice(0, 3)
    .map(({ factor, low, high }) => `${factor} from ${text(low.value)} to ${text(high.value)}`);
  const rest = moving.length > 3 ? `, and ${moving.length - 3} more by less` : "";
  return `${data.name} as each input alone goes through its range: ${told.join("; ")}${rest}.`;
}
