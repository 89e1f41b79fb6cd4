/** Puts strips, the horizontal slices that blocks are cut into, on sheets one below the other. */
import { asFurniture, type Geometry, type Item, type Sheet, shift } from "./sheet";

/** A slice that is never cut; y of its items runs from its top. */
export interface Strip {
  height: number;
  /** Left out at the top of a sheet. */
  spaceBefore: number;
  items: Item[];
  /** Stays on one sheet with the strip that follows. */
  keepWithNext?: boolean;
  /** Head of the table that this strip is a row of: set again above it at the top of a sheet. */
  head?: Strip;
  /** Starts a sheet. */
  breakBefore?: boolean;
}

/**
 * Strips on sheets. A chain of strips that keep with the next moves to a new sheet as a whole, unless it is taller
 * than a sheet. A strip taller than a sheet gets one of its own.
 */
export function paginate(strips: readonly Strip[], geometry: Geometry): Sheet[] {
  const sheets: Sheet[] = [{ items: [] }];
  let y = geometry.firstTop;
  let fresh = true;

  const turn = () => {
    sheets.push({ items: [] });
    y = geometry.top;
    fresh = true;
  };
  const put = (strip: Strip, items: readonly Item[]) => {
    y += fresh ? 0 : strip.spaceBefore;
    for (const item of items) sheets.at(-1)!.items.push(shift(item, y));
    y += strip.height;
    fresh = false;
  };

  strips.forEach((strip, index) => {
    if (strip.breakBefore && !fresh) turn();
    const startsChain = index === 0 || !strips[index - 1]!.keepWithNext;
    const needed = startsChain ? chainHeight(strips, index) : strip.height + (fresh ? 0 : strip.spaceBefore);
    const sheetHeight = geometry.bottom - geometry.top - (strip.head?.height ?? 0);
    const wanted = needed <= sheetHeight ? needed : strip.height + strip.spaceBefore;
    if (!fresh && y + wanted > geometry.bottom) turn();
    if (fresh && strip.head && sheets.length > 1) put(strip.head, asFurniture(strip.head.items));
    put(strip, strip.items);
  });
  return sheets;
}

function chainHeight(strips: readonly Strip[], start: number): number {
  let height = 0;
  for (let index = start; index < strips.length; index++) {
    const strip = strips[index]!;
    if (index > start && strip.breakBefore) break;
    height += strip.spaceBefore + strip.height;
    if (!strip.keepWithNext) break;
  }
  return height;
}
