import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { printColours } from "~/figures/colours";
import { FIGURE_WIDTHS } from "~/figures/figure-context";
import { windRose, type WindRoseData } from "~/figures/wind-rose";
import * as storm from "./invented-storm";

const HOUR = 3600;
const still = () => Array.from({ length: 16 }, () => [0, 0, 0, 0]);

function rose(hours: Record<number, number[]>, rest: Partial<WindRoseData> = {}): WindRoseData {
  const sectors = still();
  for (const [sector, times] of Object.entries(hours)) sectors[Number(sector)] = times.map((time) => time * HOUR);
  return {
    classes: [0, 5, 10, 20],
    sectors,
    calm: 5 * HOUR,
    directionless: 0,
    total: 100 * HOUR,
    calmBelow: 0.5,
    wind: "wind at 4 m",
    period: "2026-11-03 00:00 to 2026-11-07 04:00 UTC",
    ...rest,
  };
}

const GALE = rose({
  7: [2, 3, 0, 0],
  8: [4, 8, 6, 0],
  9: [3, 9, 10, 7],
  10: [2, 6, 5, 2],
  12: [1, 7, 9, 0],
  13: [1, 6, 4, 0],
});
const readable = (svg: string) => `${svg.replaceAll("><", ">\n<")}\n`;

describe("wind rose", () => {
  it.each(Object.entries(FIGURE_WIDTHS))("is drawn the same at %s width, %d px", async (name, width) => {
    const figure = windRose(GALE, storm.context({ width }));
    await expect(readable(figure.svg)).toMatchFileSnapshot(`snapshots/wind-rose-${name}.svg`);
  });

  it("points each bar to where the wind came from", () => {
    const { svg, width } = windRose(rose({ 4: [0, 95, 0, 0] }), storm.context());
    const [, x, y] = /<path d="M([\d.]+),([\d.]+)A/.exec(svg)!.map(Number);
    // From the east: right of the middle, beginning a little north of it.
    expect(x).toBeGreaterThan(width / 2);
    expect(y).toBeLessThan(210);
    expect(y).toBeGreaterThan(140);
  });

  it("tells in words what it draws: where from most often, and where the strongest came from", () => {
    const { alt, caption, table } = windRose(GALE, storm.context());
    expect(alt).toMatch(
      /Most often from SSW 29\s%, S 18\s%, W 17\s% of the time\. 20\.0\s.*m\/s and more from SSW, SW\./,
    );
    expect(caption).toMatch(/Rings at 10, 20, 30\s%\. Calm \(below 0\.5\sm\/s\) 5\s%\./);
    expect(caption).not.toContain("Without a direction");
    expect(table.columns.map(({ name }) => name.replaceAll("\u00a0", " "))).toEqual([
      "wind from",
      "bearing",
      "below 5 m/s",
      "5 to 10 m/s",
      "10 to 20 m/s",
      "20 m/s and more",
      "all",
    ]);
    expect(table.rows[9]).toEqual(["SSW", 202.5, 3, 9, 10, 7, 29]);
  });

  it("names the time without a direction", () => {
    const { caption } = windRose(rose({ 0: [10, 0, 0, 0] }, { directionless: 85 * HOUR }), storm.context());
    expect(caption).toMatch(/Without a direction on record 85\s%\./);
  });

  it("is markup that prints, whatever the wind", () => {
    const times = fc.array(fc.double({ min: 0, max: 1e6, noNaN: true }), { minLength: 4, maxLength: 4 });
    fc.assert(
      fc.property(fc.array(times, { minLength: 16, maxLength: 16 }), (sectors) => {
        const total = Math.max(
          1,
          sectors.flat().reduce((sum, time) => sum + time, 0),
        );
        const { svg, alt } = windRose({ ...GALE, sectors, calm: 0, total }, storm.context());
        expect(svg).not.toMatch(/NaN|Infinity|undefined/);
        expect(alt).not.toMatch(/NaN|Infinity|undefined/);
        expect(printColours(svg)).not.toContain("var(");
      }),
      { numRuns: 50 },
    );
  });
});
