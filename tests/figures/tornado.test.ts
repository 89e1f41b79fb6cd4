import { describe, expect, it } from "vitest";
import { FIGURE_WIDTHS } from "~/figures/figure-context";
import { tornado, type TornadoData } from "~/figures/tornado";
import * as storm from "./invented-storm";

const DATA: TornadoData = {
  id: "surfaceTemperature",
  name: "Surface temperature, change",
  quantity: "temperatureChange",
  value: -0.9,
  bars: [
    { factor: "layer depth", low: { setting: "−20 %", value: -1.25 }, high: { setting: "+20 %", value: -0.7 } },
    { factor: "heat flux", low: { setting: "−50 W/m²", value: -1.1 }, high: { setting: "+50 W/m²", value: -0.7 } },
    {
      factor: "drag law",
      low: { setting: "Smith (1980)", value: -0.92 },
      high: { setting: "Zijlema et al. (2012)", value: -0.88 },
    },
    { factor: "wind direction", low: { setting: "−10°", value: -0.9 }, high: { setting: "−10°", value: -0.9 } },
  ],
};
const readable = (svg: string) => `${svg.replaceAll("><", ">\n<")}\n`;

describe("tornado", () => {
  it.each(Object.entries(FIGURE_WIDTHS))("is drawn the same at %s width, %d px", async (name, width) => {
    const figure = tornado(DATA, storm.context({ width }));
    await expect(readable(figure.svg)).toMatchFileSnapshot(`snapshots/tornado-${name}.svg`);
  });

  it("tells in words and in its table what it draws, and what does not move only in the table", () => {
    const { alt, table, svg } = tornado(DATA, storm.context());
    expect(alt).toMatch(/layer depth from −1\.[23]\s°C to −0\.7\s°C; heat flux/);
    expect(alt).not.toContain("wind direction");
    expect(svg).not.toContain("wind direction");
    expect(table.rows).toHaveLength(4);
    expect(table.rows[0]).toEqual(["layer depth", "−20 %", -1.25, "+20 %", -0.7]);
  });

  it("says so where nothing moves", () => {
    const still = tornado({ ...DATA, bars: DATA.bars.slice(3) }, storm.context());
    expect(still.alt).toContain("does not move with any");
    expect(still.svg).not.toContain("NaN");
  });
});
