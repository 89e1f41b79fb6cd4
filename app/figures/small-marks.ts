/** Marks so small that they stand in a line of text or a table cell: no axes, no caption, but an alternative text. */
import { compassWord } from "~/units/compass";
import { formatBearing, formatQuantity, formatRange, fromDisplay } from "~/units/format-quantity";
import { displayUnit, QUANTITIES, quantity, type ColourToken, type QuantityId } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import { HAIRLINE, INK, markColour } from "./colours";
import { extremes } from "./extremes";
import { roundGeometry } from "./plain-markup";
import { keepExtremes } from "./thin-line";

export interface SmallMark {
  /** Markup of one `<svg>` with its own width and height. */
  svg: string;
  alt: string;
  width: number;
  height: number;
}

function mark(width: number, height: number, markup: string, alt: string): SmallMark {
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height}" width="${width}" height="${height}">${markup}</svg>`;
  return { svg, alt, width, height };
}

/**
 * The shape of a series as a line without axes.
 * @param values SI, evenly spaced, NaN where missing
 */
export function spark(values: ArrayLike<number>, id: QuantityId, units: UnitChoices, colour?: ColourToken): SmallMark {
  const [width, height] = [102, 18];
  const name = QUANTITIES[id].name;
  const found = extremes(values);
  if (found === null) return mark(width, height, "", `${name}: no values`);
  const span = found.max - found.min;
  const last = Math.max(1, values.length - 1);
  let pen = "M";
  let path = "";
  for (const index of keepExtremes(values, 3 * width)) {
    const value = values[index] ?? Number.NaN;
    if (!Number.isFinite(value)) {
      pen = "M";
      continue;
    }
    const share = span > 0 ? (value - found.min) / span : 0;
    path += `${pen}${1 + (index / last) * (width - 2)},${height - 2 - share * (height - 4)}`;
    pen = "L";
  }
  const stroke = markColour(colour ?? quantity(id).colour);
  const line = `<path d="${roundGeometry(path)}" fill="none" stroke="${stroke}" stroke-width="1.25" stroke-linejoin="round" stroke-linecap="round"/>`;
  return mark(width, height, line, `${name} ${formatRange(found.min, found.max, id, units)}`);
}

export interface DriftArrowData {
  /** m */
  distance: number;
  /** degrees true; null for a layer that stayed */
  towards: number | null;
  /** m: a displacement of this length crosses the circle from side to side */
  fullCircle: number;
}

/** A circle, north up, with an arrow through its middle as long as the displacement; longer ones stop at the circle. */
export function driftArrow({ distance, towards, fullCircle }: DriftArrowData, units: UnitChoices): SmallMark {
  const [size, middle, radius] = [42, 21, 20];
  const ring = `<circle cx="${middle}" cy="${middle}" r="${radius}" fill="none" stroke="${HAIRLINE}"/>`;
  const text = formatQuantity(distance, "displacement", units).text;
  if (towards === null || !(distance > 0) || !(fullCircle > 0)) {
    const dot = `<circle cx="${middle}" cy="${middle}" r="1.75" fill="${INK}"/>`;
    return mark(size, size, ring + dot, distance > 0 ? `net displacement ${text}` : "no net displacement");
  }
  const half = Math.max(2, Math.min(1, distance / fullCircle) * radius);
  const head = Math.min(4, half);
  const shaft = `M0,${half}V${-half + head * 1.2}`;
  const tip = `M0,${-half}l${head * 0.65},${head * 1.6}h${-head * 1.3}z`;
  const arrow =
    `<g transform="translate(${middle},${middle}) rotate(${roundGeometry(String(towards))})">` +
    `<path d="${roundGeometry(shaft)}" fill="none" stroke="${markColour("drift")}" stroke-width="1.75"/>` +
    `<path d="${roundGeometry(tip)}" fill="${markColour("drift")}"/></g>`;
  const alt = `net displacement ${text} towards ${formatBearing(towards)}, ${compassWord(towards)}`;
  return mark(size, size, ring + arrow, distance > fullCircle ? `${alt}, longer than the circle` : alt);
}

export interface BandMarkData {
  /** SI, as all here. */
  value: number;
  p10?: number;
  p90?: number;
  /** The client's limit. */
  trigger?: number;
  /** Ends of the line; what lies beyond stops there. */
  from: number;
  to: number;
}

/** A line from `from` to `to`: the band as a bar, the value as a tick, the trigger level dashed. */
export function bandMark(data: BandMarkData, id: QuantityId, units: UnitChoices, width = 188): SmallMark {
  const height = 22;
  const at = (value: number) => {
    const share = data.to === data.from ? 0.5 : (value - data.from) / (data.to - data.from);
    return roundGeometry(String(1 + Math.min(1, Math.max(0, share)) * (width - 2)));
  };
  const colour = markColour(quantity(id).colour);
  let markup = `<path d="M1,11H${width - 1}" stroke="${HAIRLINE}" fill="none" stroke-width="1.5"/>`;
  const alt = [formatQuantity(data.value, id, units).text];
  if (isNumber(data.p10) && isNumber(data.p90)) {
    const [left, right] = [Number(at(data.p10)), Number(at(data.p90))].sort((a, b) => a - b) as [number, number];
    markup += `<rect x="${left}" y="7" width="${roundGeometry(String(Math.max(1, right - left)))}" height="8" fill="${colour}" fill-opacity="0.4"/>`;
    alt.push(`band ${formatRange(data.p10, data.p90, id, units)}`);
  }
  if (isNumber(data.trigger)) {
    markup += `<path d="M${at(data.trigger)},3V19" stroke="${INK}" fill="none" stroke-width="1.25" stroke-dasharray="2.5,2"/>`;
    alt.push(`trigger level ${formatQuantity(data.trigger, id, units).text}`);
  }
  if (isNumber(data.value)) {
    markup += `<path d="M${at(data.value)},4V18" stroke="${colour}" fill="none" stroke-width="2"/>`;
  }
  return mark(width, height, markup, alt.join(", "));
}

function isNumber(value: number | undefined): value is number {
  return value !== undefined && Number.isFinite(value);
}

/** Ends for the band marks of one quantity side by side: they hold every number given, with a little air. */
export function bandEnds(
  values: readonly (number | null | undefined)[],
  id: QuantityId,
  units: UnitChoices,
): { from: number; to: number } {
  const found = extremes(values.map((value) => value ?? Number.NaN));
  if (found === null) return { from: 0, to: 1 };
  const least = fromDisplay(10 ** (1 - displayUnit(id, units).decimals), id, units);
  const air = Math.max((found.max - found.min) * 0.6, least);
  return { from: found.min - air, to: found.max + air };
}
