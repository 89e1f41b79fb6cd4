import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { paginate, type Strip } from "./paginate";
import type { Geometry, Item, StructNode } from "./sheet";

const geometry: Geometry = { width: 200, height: 200, left: 0, right: 200, firstTop: 50, top: 20, bottom: 120 };
const node: StructNode = { type: "P", parent: null };

/** A strip whose one item bears its name. */
function strip(name: string, height: number, more: Partial<Strip> = {}): Strip {
  const item: Item = {
    kind: "text",
    node,
    x: 0,
    baseline: 0,
    segments: [{ text: name, face: "plain", size: 10, colour: "ink", x: 0, width: 10, rise: 0 }],
  };
  return { height, spaceBefore: 0, items: [item], ...more };
}

const told = (strips: Strip[]) =>
  paginate(strips, geometry).map(({ items }) =>
    items.map((item) => (item.kind === "text" ? `${item.segments[0]!.text}@${item.baseline}` : item.kind)),
  );

describe("paginate", () => {
  it("fills the first sheet from its own top, later ones from theirs, without space at a sheet's top", () => {
    expect(told([strip("a", 40), strip("b", 30, { spaceBefore: 10 }), strip("c", 60, { spaceBefore: 10 })])).toEqual([
      ["a@50"],
      ["b@20", "c@60"],
    ]);
  });

  it("keeps a heading with what follows it", () => {
    expect(told([strip("text", 40), strip("heading", 20, { keepWithNext: true }), strip("line", 20)])).toEqual([
      ["text@50"],
      ["heading@20", "line@40"],
    ]);
  });

  it("does not keep together what is taller than a sheet", () => {
    const long = Array.from({ length: 8 }, (_, index) => strip(`k${index}`, 20, { keepWithNext: true }));
    expect(told(long)).toEqual([
      ["k0@50", "k1@70", "k2@90"],
      ["k3@20", "k4@40", "k5@60", "k6@80", "k7@100"],
    ]);
  });

  it("sets a table's head again at the top of each sheet, as furniture", () => {
    const head = strip("head", 10);
    const rows = [1, 2, 3, 4, 5, 6].map((row) => strip(`row${row}`, 25, { head }));
    const sheets = paginate([{ ...head, keepWithNext: true }, ...rows], geometry);
    expect(told([{ ...head, keepWithNext: true }, ...rows])).toEqual([
      ["head@50", "row1@60", "row2@85"],
      ["head@20", "row3@30", "row4@55", "row5@80"],
      ["head@20", "row6@30"],
    ]);
    const nodes = sheets.map(({ items }) => (items[0]!.kind === "text" ? items[0]!.node : undefined));
    expect(nodes).toEqual([node, null, null]);
  });

  it("starts a sheet where it is told to, but never leaves an empty one", () => {
    expect(told([strip("a", 10, { breakBefore: true }), strip("b", 10, { breakBefore: true })])).toEqual([
      ["a@50"],
      ["b@20"],
    ]);
  });

  it("puts every strip on a sheet once, in order, and none below the bottom unless it is taller than a sheet", () => {
    const any = fc.record({
      height: fc.integer({ min: 1, max: 99 }),
      spaceBefore: fc.integer({ min: 0, max: 30 }),
      keepWithNext: fc.boolean(),
      breakBefore: fc.boolean(),
    });
    fc.assert(
      fc.property(fc.array(any, { minLength: 1, maxLength: 40 }), (shapes) => {
        const strips = shapes.map((shape, index) => strip(String(index), shape.height, shape));
        const sheets = paginate(strips, geometry);
        const placed = sheets.flatMap(({ items }) =>
          items.map((item) =>
            item.kind === "text" ? { name: Number(item.segments[0]!.text), y: item.baseline } : null,
          ),
        );
        expect(placed.map((entry) => entry?.name)).toEqual(strips.map((_, index) => index));
        for (const { items } of sheets.slice(1)) expect(items.length).toBeGreaterThan(0);
        for (const entry of placed.slice(1))
          expect(entry!.y + shapes[entry!.name]!.height).toBeLessThanOrEqual(geometry.bottom);
      }),
    );
  });
});
