/** Whatever the series, a figure is markup that can be shown. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { printColours } from "~/figures/colours";
import type { Figure } from "~/figures/figure";
import { fileSvg, pageSvg } from "~/figures/present-svg";
import { MAX_POINTS } from "~/figures/thin-line";
import { bandEnds, bandMark, driftArrow, spark } from "~/figures/small-marks";
import { DEFAULT_UNITS, type UnitChoices } from "~/units/unit-choices";
import { everyFigure, type EverySeries } from "./every-figure";
import * as storm from "./invented-storm";

const seaUnits: UnitChoices = {
  speed: "kn",
  rain: "in/h",
  length: "ft",
  distance: "nm",
  salinity: "PSS-78",
  temperature: "°C",
};

function expectSound(svg: string): void {
  expect(svg).not.toMatch(/NaN|Infinity|undefined|null|\[object|class=|<style|currentColor|paint-order/);
  expect(svg).not.toMatch(/[←-⇿]/);
  expectBalanced(svg);
  const ids = [...svg.matchAll(/ id="([^"]+)"/g)].map((match) => match[1]);
  expect(new Set(ids).size).toBe(ids.length);
  for (const [, reference] of svg.matchAll(/url\(#([^)]+)\)/g)) expect(ids).toContain(reference);
  expect(printColours(svg)).not.toContain("var(");
}

/** Every tag is closed by its own name. */
function expectBalanced(svg: string): void {
  const open: string[] = [];
  for (const [, close, name, , selfClosed] of svg.matchAll(/<(\/?)([A-Za-z]+)((?:\s+[\w:-]+="[^"<]*")*)\s*(\/?)>/g)) {
    if (close === "/") expect(open.pop()).toBe(name);
    else if (selfClosed !== "/") open.push(name ?? "");
  }
  expect(open).toEqual([]);
  expect(svg.replace(/<\/?[A-Za-z]+(?:\s+[\w:-]+="[^"<]*")*\s*\/?>/g, "")).not.toMatch(/[<>]/);
}

function expectComplete(figure: Figure, samples: number): void {
  expectSound(figure.svg);
  expect(figure.svg).toContain(`viewBox="0 0 ${figure.width} ${figure.height}"`);
  for (const text of [figure.title, figure.caption, figure.alt]) {
    expect(text).not.toMatch(/NaN|undefined|Infinity|null| {2}/);
    expect(text.length).toBeGreaterThan(5);
  }
  expect(figure.table.rows).toHaveLength(samples);
  for (const row of figure.table.rows) {
    expect(row).toHaveLength(figure.table.columns.length);
    for (const cell of row) if (typeof cell === "number") expect(Number.isFinite(cell)).toBe(true);
  }
}

const gappy = (min: number, max: number) =>
  fc.oneof(
    { weight: 8, arbitrary: fc.double({ min, max, noNaN: true }) },
    { weight: 1, arbitrary: fc.constant(Number.NaN) },
  );
const constantOrNot = (min: number, max: number, length: number) =>
  fc.oneof(
    fc.array(gappy(min, max), { minLength: length, maxLength: length }),
    fc.double({ min, max, noNaN: true }).map((value) => Array.from({ length }, () => value)),
    fc.constant(Array.from({ length }, () => Number.NaN)),
  );

const anySeries: fc.Arbitrary<EverySeries> = fc
  .array(fc.integer({ min: 60, max: 200_000 }), { minLength: 0, maxLength: 40 })
  .chain((steps) => {
    const time = steps.map((_, index) => 1.7e9 + steps.slice(0, index).reduce((sum, step) => sum + step, 0));
    const series = (min: number, max: number) => constantOrNot(min, max, time.length);
    return fc.record({
      time: fc.constant(time),
      windSpeed10: series(0, 80),
      windFrom: series(0, 360),
      windGust: series(0, 100),
      rainRate: series(0, 200),
      netHeat: series(-1500, 1200),
      stressX: series(-15, 15),
      stressY: series(-15, 15),
      driftEast: series(-4, 4),
      driftNorth: series(-4, 4),
      displacementEast: series(-1e6, 1e6),
      displacementNorth: series(-1e6, 1e6),
      salinity: series(0, 42),
      temperature: series(-2, 35),
      density: series(995, 1040),
      layerDepth: series(0, 500),
      triggerLevels: fc.constant(storm.triggerLevels),
      boxOutline: fc.constant(storm.boxOutline),
      coast: fc.constant(storm.coast),
    });
  });

describe("figures", () => {
  it("are sound for any series: constant, gappy, empty, one sample, uneven steps", () => {
    fc.assert(
      fc.property(
        anySeries,
        fc.constantFrom(340, 640, 960),
        fc.constantFrom("UTC", "Asia/Kathmandu", "America/St_Johns"),
        fc.constantFrom(DEFAULT_UNITS, seaUnits),
        (series, width, zone, units) => {
          for (const figure of everyFigure(series, storm.context({ width, zone, units }))) {
            expectComplete(figure, series.time.length);
          }
        },
      ),
      { numRuns: 12 },
    );
  });

  it("stay light, however long the record", () => {
    const time = Array.from({ length: 20_000 }, (_, index) => 1.7e9 + index * 600);
    const values = time.map((_, index) => 30 + 4 * Math.sin(index / 50) + (index === 11_234 ? 20 : 0));
    const series = Object.fromEntries(
      Object.keys(storm).map((name) => [name, name === "time" ? time : values]),
    ) as unknown as EverySeries;
    for (const figure of everyFigure(
      { ...series, triggerLevels: [], boxOutline: undefined, coast: [] },
      storm.context(),
    )) {
      for (const [, path] of figure.svg.matchAll(/ d="([^"]+)"/g)) {
        // A tinted ground of steps has two corners a sample, above and below.
        expect((path?.match(/[ML]/g) ?? []).length).toBeLessThanOrEqual(4 * MAX_POINTS);
      }
      expect(figure.svg.length).toBeLessThan(120_000);
    }
  });

  it("have ids of their own for each estimate and width", () => {
    const ids = [storm.context(), storm.context({ width: 340 }), storm.context({ estimateCode: "2617-08" })].flatMap(
      (context) =>
        everyFigure(storm, context).flatMap((figure) => [...figure.svg.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id)),
    );
    expect(new Set(ids).size).toBe(ids.length);
  });

  it("are the same drawn twice", () => {
    expect(everyFigure(storm, storm.context())).toEqual(everyFigure(storm, storm.context()));
  });

  it("are shown on a page by name, and saved as a file by themselves", () => {
    for (const figure of everyFigure(storm, storm.context())) {
      const page = pageSvg(figure);
      expect(page).toContain(`role="img"`);
      expect(page).toContain(`width="${figure.width}"`);
      expectBalanced(page);
      const file = fileSvg(figure);
      expect(file).toContain(`<title>${figure.title}</title>`);
      expect(file).not.toContain("var(");
      expectBalanced(file.replace(/^<\?xml.*\?>\n/, ""));
    }
  });
});

describe("small marks", () => {
  it("are sound for any numbers", () => {
    const number = fc.oneof(fc.double({ min: -1e6, max: 1e6, noNaN: true }), fc.constant(Number.NaN));
    fc.assert(
      fc.property(fc.array(number), number, number, fc.option(number, { nil: undefined }), (values, a, b, c) => {
        const ends = bandEnds([a, b, c], "salinity", DEFAULT_UNITS);
        for (const { svg, alt } of [
          spark(values, "windSpeed10", DEFAULT_UNITS),
          driftArrow({ distance: Math.abs(a), towards: Number.isNaN(b) ? null : b, fullCircle: 40_000 }, DEFAULT_UNITS),
          bandMark({ value: a, p10: b, p90: c, trigger: c, ...ends }, "salinity", DEFAULT_UNITS),
        ]) {
          expectSound(svg);
          expect(alt).not.toMatch(/NaN|undefined|Infinity/);
        }
      }),
    );
  });
});
