import * as Plot from "@observablehq/plot";
import { describe, expect, it } from "vitest";
import { IdKeeper, plainGroup, roundGeometry } from "./plain-markup";
import { serverPlotDocument } from "./plot-document.server";

function draw(marks: Plot.Markish[]): string {
  const plot = Plot.plot({ document: serverPlotDocument(), width: 200, height: 100, marks });
  return plainGroup(plot, 0, 12.3456, new IdKeeper("some-figure"));
}

describe("plainGroup", () => {
  it("leaves nothing that could clash on a page", () => {
    const markup = draw([Plot.lineY([1, 2, 3], { clip: true }), Plot.text(["a & <b>"], { frameAnchor: "middle" })]);
    expect(markup).not.toMatch(/<style|class=|currentColor|aria-/);
    expect(markup).toContain("a &amp; &lt;b&gt;");
    expect(markup).toMatch(/^<g transform="translate\(0,12\.35\)">/);
  });

  it("gives ids the figure's own names, the same each time it is drawn", () => {
    const marks = () => [Plot.lineY([1, 2, 3], { clip: true }), Plot.lineY([3, 2, 1], { clip: true })];
    const markup = draw(marks());
    expect(draw(marks())).toBe(markup);
    const ids = [...markup.matchAll(/ id="([^"]+)"/g)].map((match) => match[1]);
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids[0]).toBe("some-figure-1");
    expect(markup).toContain('clip-path="url(#some-figure-1)"');
  });

  it("splits halo text: the outline first, then the text", () => {
    const markup = draw([Plot.text(["label"], { frameAnchor: "middle", fill: "var(--ink)", stroke: "var(--paper)" })]);
    const outlined = markup.indexOf('stroke="var(--paper)"');
    expect(outlined).toBeGreaterThan(0);
    expect(markup.match(/label/g)).toHaveLength(2);
    expect(markup).not.toContain("paint-order");
  });
});

describe("roundGeometry", () => {
  it.each([
    ["M1.23456,-0.001L1e-7,3", "M1.23,0L0,3"],
    ["translate(0.5,10)", "translate(0.5,10)"],
    ["0.32em", "0.32em"],
    ["M0,0L10,-5Z", "M0,0L10,-5Z"],
  ])("%s becomes %s", (given, expected) => {
    expect(roundGeometry(given)).toBe(expected);
  });
});
