import { compassLetters } from "~/units/compass";
import { formatNumber, formatQuantity, toDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import { HAIRLINE, markColour, PAPER } from "./colours";
import type { Figure, FigureTable } from "./figure";
import { caption, figureWidth, type FigureContext } from "./figure-context";
import { niceAxis } from "./nice-ticks";
import { escapeXml, FONT_SIZE, roundGeometry } from "./plain-markup";
import { svgSheet } from "./sheet";
import { textWidth } from "./text-size";

export interface WindRoseData {
  /** m/s, from which each class of speed begins; the first is 0. */
  classes: readonly number[];
  /** One row for each direction that the wind came from, evenly round from north clockwise; in it seconds a class. */
  sectors: readonly (readonly number[])[];
  /** Seconds. */
  calm: number;
  directionless: number;
  total: number;
  /** m/s, below which the wind counts as calm. */
  calmBelow: number;
  /** As `wind at 4 m`. */
  wind: string;
  /** As `2026-11-03 00:00 to 2026-11-08 00:00 UTC`. */
  period: string;
}

const LABEL_ROOM = 22;
const GREATEST_SIDE = 420;
const KEY_ROW = 18;
const KEY_SWATCH = 12;
/** Of a sector: the rest is left open, so that neighbours are told apart. */
const FILLED = 0.8;
const LIGHTEST = 0.22;

/** Where the wind came from, how often and how hard: a bar a direction, as long as its share of the time. */
export function windRose(data: WindRoseData, context: FigureContext): Figure {
  const width = figureWidth(context);
  const side = Math.min(width, GREATEST_SIDE);
  const radius = side / 2 - LABEL_ROOM;
  const centre = { x: width / 2, y: side / 2 };
  const shares = data.sectors.map((times) => times.map((time) => (100 * time) / data.total));
  const sums = shares.map((parts) => parts.reduce((sum, part) => sum + part, 0));
  const axis = niceAxis(0, Math.max(...sums, 1), 3);
  const scale = radius / axis.domain[1];
  const turn = 360 / data.sectors.length;
  const bars = shares.flatMap((parts, sector) => {
    let from = 0;
    return parts.map((part, index) => {
      const inner = from;
      from += part;
      if (part <= 0) return "";
      const path = ringPart(centre, [inner * scale, from * scale], sector * turn, (FILLED * turn) / 2);
      return `<path d="${path}" ${classFill(index, parts.length)} stroke="${PAPER}" stroke-width="0.5"/>`;
    });
  });
  const names = classNames(data.classes, context);
  const key = keyMarkup(names, width, side);
  const height = side + key.height;
  const rings = axis.ticks.filter((tick) => tick > 0);
  const emptiest = sums.indexOf(Math.min(...sums)) * turn;
  return {
    id: "wind-rose",
    title: "Where the wind came from",
    caption: captionOf(data, rings, axis.decimals, context),
    alt: altText(data, sums, turn, context),
    width,
    height,
    svg: svgSheet(
      width,
      height,
      ringsMarkup(centre, rings, scale) +
        compassMarkup(centre, radius) +
        bars.join("") +
        ringLabels(centre, rings, scale, axis.decimals, emptiest) +
        key.markup,
    ),
    table: roseTable(shares, sums, names, turn),
  };
}

interface Point {
  x: number;
  y: number;
}

function pointAt(centre: Point, distance: number, bearing: number): Point {
  const angle = (bearing * Math.PI) / 180;
  return { x: centre.x + distance * Math.sin(angle), y: centre.y - distance * Math.cos(angle) };
}

function ringPart(centre: Point, [inner, outer]: [number, number], bearing: number, half: number): string {
  const [a, b] = [pointAt(centre, outer, bearing - half), pointAt(centre, outer, bearing + half)];
  const [c, d] = [pointAt(centre, inner, bearing + half), pointAt(centre, inner, bearing - half)];
  return roundGeometry(
    `M${a.x},${a.y}A${outer},${outer} 0 0 1 ${b.x},${b.y}L${c.x},${c.y}A${inner},${inner} 0 0 0 ${d.x},${d.y}Z`,
  );
}

/** One colour, the wind's: from light for the weakest to full for the strongest. */
function classFill(index: number, count: number): string {
  const opacity = count === 1 ? 1 : LIGHTEST + ((1 - LIGHTEST) * index) / (count - 1);
  return `fill="${markColour("wind")}" fill-opacity="${opacity.toFixed(2)}"`;
}

function ringsMarkup({ x, y }: Point, rings: readonly number[], scale: number): string {
  return rings
    .map(
      (ring) =>
        `<circle cx="${x}" cy="${y}" r="${roundGeometry(String(ring * scale))}" fill="none" stroke="${HAIRLINE}" stroke-width="0.75"/>`,
    )
    .join("");
}

function ringLabels(centre: Point, rings: readonly number[], scale: number, decimals: number, bearing: number): string {
  return rings
    .map((ring) => {
      const { x, y } = pointAt(centre, ring * scale, bearing);
      const at = roundGeometry(`x="${x}" y="${y + 4}"`);
      const text = `${formatNumber(ring, decimals)}\u00a0%`;
      return `<text ${at} fill="${PAPER}" stroke="${PAPER}" stroke-width="3">${text}</text><text ${at}>${text}</text>`;
    })
    .join("");
}

function compassMarkup(centre: Point, radius: number): string {
  return [0, 45, 90, 135, 180, 225, 270, 315]
    .map((bearing) => {
      const [edge, label] = [pointAt(centre, radius, bearing), pointAt(centre, radius + 12, bearing)];
      const line = roundGeometry(`M${centre.x},${centre.y}L${edge.x},${edge.y}`);
      return (
        `<path d="${line}" fill="none" stroke="${HAIRLINE}" stroke-width="0.5"/>` +
        `<text ${roundGeometry(`x="${label.x}" y="${label.y + 4}"`)}>${compassLetters(bearing)}</text>`
      );
    })
    .join("");
}

/** `below 5`, `5 to 10`, `10 and more`, the unit with the last. */
function classNames(classes: readonly number[], { units }: FigureContext): string[] {
  const { unit } = displayUnit("windSpeed", units);
  const bounds = classes.map((lower) => String(Number(toDisplay(lower, "windSpeed", units).toFixed(6))));
  return bounds.map((lower, index) => {
    const upper = bounds[index + 1];
    if (upper === undefined) return `${lower}\u00a0${unit} and more`;
    return index === 0 ? `below ${upper}\u00a0${unit}` : `${lower} to ${upper}\u00a0${unit}`;
  });
}

function keyMarkup(names: readonly string[], width: number, top: number): { markup: string; height: number } {
  let [x, row] = [8, 0];
  const entries = names.map((name, index) => {
    const needed = KEY_SWATCH + 5 + textWidth(name) + 14;
    if (x + needed > width && x > 8) [x, row] = [8, row + 1];
    const y = top + row * KEY_ROW + 4;
    const left = roundGeometry(String(x));
    const text = roundGeometry(String(x + KEY_SWATCH + 5));
    x += needed;
    return (
      `<rect x="${left}" y="${y}" width="${KEY_SWATCH}" height="${KEY_SWATCH}" ${classFill(index, names.length)}/>` +
      `<text x="${text}" y="${y + FONT_SIZE - 1}" text-anchor="start">${escapeXml(name)}</text>`
    );
  });
  return { markup: entries.join(""), height: (row + 1) * KEY_ROW + 4 };
}

const percent = (share: number) => `${formatNumber(share, 0)}\u00a0%`;

function captionOf(data: WindRoseData, rings: readonly number[], decimals: number, context: FigureContext): string {
  const { calm, directionless, total, calmBelow, wind, period } = data;
  const ringText = rings.map((ring) => formatNumber(ring, decimals)).join(", ");
  return caption(
    [
      `${wind[0].toUpperCase()}${wind.slice(1)}: each bar points to where the wind came from and is as long as its share of the time, darker the stronger.`,
      `Rings at ${ringText}\u00a0%.`,
      `Calm (below ${formatQuantity(calmBelow, "windSpeed", context.units).text}) ${percent((100 * calm) / total)}.`,
      directionless > 0 && `Without a direction on record ${percent((100 * directionless) / total)}.`,
      `${period}.`,
    ],
    context,
  );
}

function altText(data: WindRoseData, sums: readonly number[], turn: number, { units }: FigureContext): string {
  const order = sums.map((sum, sector) => ({ sum, sector })).filter(({ sum }) => sum > 0);
  order.sort((a, b) => b.sum - a.sum);
  const told = order.slice(0, 3).map(({ sum, sector }) => `${compassLetters(sector * turn)} ${percent(sum)}`);
  const strongest = data.classes.findLastIndex((_, index) => data.sectors.some((times) => times[index] > 0));
  const strongFrom = data.sectors.flatMap((times, sector) =>
    times[strongest] > 0 ? [compassLetters(sector * turn)] : [],
  );
  const sentences =
    told.length === 0
      ? ["No wind with a direction."]
      : [
          `Most often from ${told.join(", ")} of the time.`,
          strongest > 0 &&
            `${formatQuantity(data.classes[strongest], "windSpeed", units).text} and more from ${strongFrom.join(", ")}.`,
        ];
  return [`Wind rose, ${data.period}.`, ...sentences].filter((text) => typeof text === "string").join(" ");
}

function roseTable(
  shares: readonly (readonly number[])[],
  sums: readonly number[],
  names: readonly string[],
  turn: number,
): FigureTable {
  return {
    columns: [
      { name: "wind from", unit: "" },
      { name: "bearing", unit: "°", decimals: 1 },
      ...names.map((name) => ({ name, unit: "%", decimals: 1 })),
      { name: "all", unit: "%", decimals: 1 },
    ],
    rows: shares.map((parts, sector) => [compassLetters(sector * turn), sector * turn, ...parts, sums[sector]]),
  };
}
