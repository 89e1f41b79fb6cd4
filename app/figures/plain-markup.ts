/**
 * Turns what Observable Plot drew into markup that stands by itself: no style block, no classes, ids of its own,
 * coordinates rounded, halo text split in two. So it clashes with nothing on a page, is the same from a browser as
 * from the server, and svg-to-pdfkit, which knows neither `paint-order` nor `currentColor`, draws it alike.
 */
import { INK } from "./colours";

export const FONT_FAMILY = "Roboto Condensed";
export const FONT_SIZE = 11;

const GEOMETRY = new Set(
  "d transform points x y x1 y1 x2 y2 cx cy r rx ry width height dx dy stroke-width stroke-miterlimit".split(" "),
);
const DROPPED = /^(?:class|style|xmlns.*|viewBox|aria-.*|font-variant|paint-order)$/;
const NUMBER = /-?\d*\.?\d+(?:e[-+]?\d+)?/gi;

export function escapeXml(text: string): string {
  return text.replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;").replace(/"/g, "&quot;");
}

/** Two decimals: a fiftieth of a hairline. */
export function roundGeometry(text: string): string {
  return text.replace(NUMBER, (number) => {
    const rounded = Math.round(Number(number) * 100) / 100;
    return String(rounded === 0 ? 0 : rounded);
  });
}

/** A group at (x, y) that holds what the plot drew. `ids` keeps the ids of one figure apart. */
export function plainGroup(plot: Element, x: number, y: number, ids: IdKeeper): string {
  return `<g transform="translate(${roundGeometry(`${x},${y}`)})">${childrenOf(plot, ids)}</g>`;
}

/** Gives each id of a drawing a name of the figure's own, counted from 1. */
export class IdKeeper {
  private readonly names = new Map<string, string>();
  private count = 0;

  constructor(private readonly prefix: string) {}

  /** Plot counts its ids over the life of the process: the same name in two plots never means two things. */
  name(original: string): string {
    const known = this.names.get(original);
    if (known !== undefined) return known;
    this.count += 1;
    const name = `${this.prefix}-${this.count}`;
    this.names.set(original, name);
    return name;
  }
}

function childrenOf(parent: Element, ids: IdKeeper): string {
  let markup = "";
  for (const child of Array.from(parent.childNodes)) {
    if (child.nodeType === 3) markup += escapeXml(child.textContent ?? "");
    if (child.nodeType === 1) markup += elementMarkup(child as Element, ids);
  }
  return markup;
}

function elementMarkup(element: Element, ids: IdKeeper): string {
  const name = element.localName;
  if (name === "style") return "";
  const attributes = plainAttributes(element, ids);
  const children = childrenOf(element, ids);
  if (element.getAttribute("paint-order") !== "stroke") return tag(name, attributes, children);
  // A halo: the outline first, then the text again without it.
  const halo = withInherited(attributes, element);
  const bare = attributes.filter(([key]) => !key.startsWith("stroke"));
  return tag(name, halo, children) + tag(name, bare, children);
}

function withInherited(attributes: Attribute[], element: Element): Attribute[] {
  const stroke = element.getAttribute("stroke") ?? "none";
  return [...attributes.filter(([key]) => key !== "fill"), ["fill", stroke]];
}

type Attribute = [name: string, value: string];

function plainAttributes(element: Element, ids: IdKeeper): Attribute[] {
  const attributes: Attribute[] = [];
  for (const { name, value } of Array.from(element.attributes)) {
    if (DROPPED.test(name)) continue;
    if (name === "id") attributes.push([name, ids.name(value)]);
    else attributes.push([name, plainValue(name, value, ids)]);
  }
  return attributes;
}

function plainValue(name: string, value: string, ids: IdKeeper): string {
  if (value === "currentColor") return INK;
  const reference = /^url\(#([^)]+)\)$/.exec(value);
  if (reference?.[1] !== undefined) return `url(#${ids.name(reference[1])})`;
  return GEOMETRY.has(name) ? roundGeometry(value) : value;
}

function tag(name: string, attributes: Attribute[], children: string): string {
  const written = attributes.map(([key, value]) => ` ${key}="${escapeXml(value)}"`).join("");
  return children === "" ? `<${name}${written}/>` : `<${name}${written}>${children}</${name}>`;
}
