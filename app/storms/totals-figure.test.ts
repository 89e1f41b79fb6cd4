import { describe, expect, it } from "vitest";
import { serverPlotDocument } from "~/figures/plot-document.server";
import type { ChannelName } from "~/readers/reading";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import type { ChannelSeries } from "./channel-series";
import { totalsFigure } from "./totals-figure";

const HOUR = 3600;
const context = { document: serverPlotDocument(), zone: "UTC", units: DEFAULT_UNITS, width: 640 };
const window = { startsAt: 0, endsAt: 10 * HOUR };
const options = { mostTableRows: 100 };

function hourly(channel: ChannelName, values: number[]): ChannelSeries {
  return {
    channel,
    unit: "",
    time: Float64Array.from(values, (_, hour) => hour * HOUR),
    values: Float64Array.from(values),
  };
}

describe("what a storm added up to", () => {
  it("tells rain and each part of the heat at the end of the window", () => {
    const series = [
      hourly("windSpeed", [9, 9, 9]),
      hourly("rain", [4, 6, 2]),
      hourly("netHeat", [-500, -500, -500]),
      hourly("shortwave", [0, 250, 0]),
    ];
    const figure = totalsFigure(series, window, options, context);
    expect(figure?.caption).toMatch(/rain 12\smm, net heat −3\.6\sMJ\/m², shortwave heat \+0\.9\sMJ\/m²\./);
    expect(figure?.caption).toContain("Heat is positive into the sea.");
    expect(figure?.table.rows.at(-1)?.slice(1)).toEqual([12, -3.6, 0.9]);
    expect(figure?.svg).not.toMatch(/NaN|undefined/);
  });

  it("draws rain alone, and nothing where there is neither", () => {
    const rain = totalsFigure([hourly("rain", [1, 1])], window, options, context);
    expect(rain?.caption).not.toContain("Heat");
    expect(totalsFigure([hourly("windSpeed", [9, 9])], window, options, context)).toBeNull();
    expect(
      totalsFigure([hourly("rain", [1, 1])], { startsAt: 20 * HOUR, endsAt: 30 * HOUR }, options, context),
    ).toBeNull();
  });

  it("leaves a table out that is longer than asked", () => {
    const figure = totalsFigure([hourly("rain", [1, 1, 1, 1])], window, { mostTableRows: 3 }, context);
    expect(figure?.table.rows).toEqual([]);
  });
});
