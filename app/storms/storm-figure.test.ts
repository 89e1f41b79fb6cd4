import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import type { ChannelSeries } from "./channel-series";
import { stormFigure } from "./storm-figure";

const context = { document: serverPlotDocument(), zone: "UTC", units: DEFAULT_UNITS, width: 640 };
const options = { id: "storm-series", title: "Gale", windHeight: 4, mostTableRows: 100 };

function series(channel: ChannelSeries["channel"], unit: string, values: number[], offset = 0): ChannelSeries {
  return {
    channel,
    unit,
    time: Float64Array.from(values, (_, hour) => hour * 3600 + offset),
    values: Float64Array.from(values),
  };
}

describe("a storm's figure", () => {
  it("stacks wind at its own height, rain and heat, and leaves out what there is none of", () => {
    const all = [
      series("windSpeed", "m/s", [4, 9, 6]),
      series("windFrom", "deg", [200, 220, 240]),
      series("rain", "mm/h", [0, 2, 1], 600),
      series("latent", "W/m²", [-80, -120, -60]),
    ];
    const figure = stormFigure(all, options, context);
    expect(figure?.caption).toContain("Wind at 4 m; rain; heat into the sea");
    expect(figure?.alt).toContain("highest 9.0\u00a0m/s at 1970-01-01 01:00 UTC");
    expect(stormFigure(all.slice(0, 2), options, context)?.caption).not.toContain("rain");
    expect(stormFigure([series("airPressure", "hPa", [1000, 990])], options, context)).toBeNull();
  });

  it("leaves a table out that is longer than asked", () => {
    const long = [
      series(
        "windSpeed",
        "m/s",
        Array.from({ length: 101 }, () => 5),
      ),
    ];
    expect(stormFigure(long, options, context)?.table.rows).toHaveLength(0);
    expect(stormFigure(long, { ...options, mostTableRows: 101 }, context)?.table.rows).toHaveLength(101);
  });

  it("never writes NaN into its drawing", () => {
    const values = fc.array(fc.double({ min: 0, max: 60, noNaN: true }), { minLength: 1, maxLength: 30 });
    fc.assert(
      fc.property(values, values, fc.integer({ min: 0, max: 3599 }), (wind, rain, offset) => {
        const figure = stormFigure(
          [series("windSpeed", "m/s", wind), series("rain", "mm/h", rain, offset)],
          options,
          context,
        );
        expect(figure?.svg).not.toMatch(/NaN|undefined|Infinity/);
      }),
      { numRuns: 25 },
    );
  });
});
