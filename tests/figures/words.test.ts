/** What a figure says to those who cannot see it, and the numbers behind it. */
import { describe, expect, it } from "vitest";
import { driftTrack } from "~/figures/drift-track";
import { forcingStack, heldTotal } from "~/figures/forcing-stack";
import { hodograph } from "~/figures/hodograph";
import { layerStack } from "~/figures/layer-stack";
import { levelText } from "~/figures/levels";
import { seriesLine } from "~/figures/series-line";
import { bandMark, driftArrow, spark } from "~/figures/small-marks";
import { stressAndDrift } from "~/figures/stress-and-drift";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import * as storm from "./invented-storm";

const plain = (text: string) => text.replaceAll("\u00a0", " ");
/** Four hours from 2026-11-04 20:00 UTC. */
const time = [0, 1, 2, 3].map((hour) => Date.UTC(2026, 10, 4, 20 + hour) / 1000);
const context = storm.context();

describe("forcing stack", () => {
  const data = {
    time,
    windSpeed10: [10, 25.14, Number.NaN, 12],
    windFrom: [200, 231, Number.NaN, 270],
    rainRate: [0, 9.5, 2.5, 7],
    netHeat: [-100, -340, 80, 0],
  };
  const figure = forcingStack(data, context);

  it("says ranges, peaks, times with zone, direction and totals", () => {
    const alt = plain(figure.alt);
    expect(alt).toContain("2026-11-04 20:00 to 2026-11-04 23:00 UTC");
    expect(alt).toContain("Wind speed at 10 m 10.0 to 25.1 m/s, highest 25.1 m/s at 2026-11-04 21:00 UTC.");
    expect(alt).toContain("the wind came from 231°");
    expect(alt).toContain("Rain in all 12 mm.");
    expect(alt).toContain("Net heat into the sea −340 to 80 W/m², lowest −340 W/m² at 2026-11-04 21:00 UTC");
  });

  it("says in the caption what is missing, and which run it shows", () => {
    expect(plain(figure.caption)).toContain("Wind: 1 of 4 values missing.");
    expect(figure.caption).toMatch(/UTC\. Estimate 2617-07\.$/);
  });

  it("holds every number in its table, with units and ISO times", () => {
    expect(figure.table.columns).toEqual([
      { name: "time (UTC)", unit: "" },
      { name: "wind speed at 10 m", unit: "m/s", decimals: 2 },
      { name: "wind direction from", unit: "°", decimals: 1 },
      { name: "rain rate", unit: "mm/h", decimals: 2 },
      { name: "net heat into the sea", unit: "W/m²", decimals: 1 },
    ]);
    expect(figure.table.rows.slice(1, 3)).toEqual([
      ["2026-11-04T21:00:00Z", 25.14, 231, 9.5, -340],
      ["2026-11-04T22:00:00Z", null, null, 2.5, 80],
    ]);
  });

  it("leaves out panels without a series", () => {
    const bare = forcingStack({ time, windSpeed10: data.windSpeed10, windFrom: data.windFrom }, context);
    expect(bare.svg).not.toContain("rain");
    expect(bare.svg).not.toContain("net heat");
    expect(bare.height).toBeLessThan(figure.height);
    expect(bare.table.columns).toHaveLength(3);
  });

  it("shows figure, words and table in one zone and one set of units", () => {
    const local = forcingStack(data, storm.context({ zone: "Asia/Kolkata", units: { ...DEFAULT_UNITS, speed: "kn" } }));
    expect(plain(local.alt)).toContain("highest 48.9 kn at 2026-11-05 02:30 Asia/Kolkata");
    expect(local.svg).toContain("wind at 10 m (kn)");
    expect(local.table.columns[0]?.name).toBe("time (Asia/Kolkata)");
    expect(local.table.rows[0]?.[0]).toBe("2026-11-05T01:30:00+05:30");
    expect(local.table.rows[1]?.[1]).toBeCloseTo((25.14 * 3600) / 1852, 12);
  });

  it("sums rain as rates that hold until the next time", () => {
    expect(heldTotal([0, 3600, 5400], [2, 4, 100])).toBe(4);
    expect(heldTotal([0, 3600, 7200], [Number.NaN, 3, 0])).toBe(3);
    expect(heldTotal([0], [9])).toBe(0);
  });
});

describe("series line", () => {
  const triggers = storm.triggerLevels;
  it("draws and names a trigger level with the client's own decimals", () => {
    const figure = seriesLine("salinity", { time, values: [33.6, 32.1, 31.94, 32.4], triggers }, context);
    expect(plain(figure.svg)).toContain("trigger level 32.5 g/kg");
    expect(figure.svg).toContain('stroke-dasharray="4,3"');
    expect(plain(figure.alt)).toContain("lowest 31.9 g/kg at 2026-11-04 22:00 UTC");
    expect(plain(figure.alt)).toContain("33.6 g/kg at the start, 32.4 g/kg at the end.");
    expect(plain(figure.alt)).toContain("Shown with trigger level 32.5 g/kg.");
    expect(plain(levelText(32.25, "salinity", DEFAULT_UNITS))).toBe("32.25 g/kg");
    expect(plain(levelText(28, "salinity", DEFAULT_UNITS))).toBe("28.0 g/kg");
  });
  it("does not flatten the line for a level far off, but says where it is", () => {
    const figure = seriesLine("temperature", { time, values: [12, 12, 11.9, 11.9], triggers }, context);
    expect(figure.svg).not.toContain("trigger level");
    expect(plain(figure.caption)).toContain("Off the axis: trigger level 4.0 °C.");
    expect(figure.alt).not.toContain("Shown with");
  });
  it("says of a flat series that it is flat, and marks no peak", () => {
    const figure = seriesLine("layerDepth", { time, values: [20, 20, 20, 20] }, context);
    expect(plain(figure.alt)).toContain("Layer depth 20.0 m throughout.");
    expect(figure.svg).not.toContain("<circle");
  });
  it("puts the band into the table", () => {
    const figure = seriesLine(
      "density",
      { time, values: [1, 2, 3, 4], band: { p10: [0, 1, 2, 3], p50: [1, 2, 3, 3.5], p90: [2, 3, 4, 5], members: 64 } },
      context,
    );
    expect(figure.table.columns.map((column) => column.name)).toEqual([
      "time (UTC)",
      "surface density",
      "surface density, 10th percentile",
      "surface density, median",
      "surface density, 90th percentile",
    ]);
    expect(figure.table.rows[1]?.slice(1)).toEqual([2, 1, 2, 3]);
    expect(plain(figure.caption)).toContain("Tinted: the 10th to the 90th percentile of 64 members.");
  });
});

describe("layer stack, stress and drift", () => {
  it("turns salinity to the practical scale where that was chosen", () => {
    const figure = layerStack(storm, storm.context({ units: { ...DEFAULT_UNITS, salinity: "PSS-78" } }));
    expect(figure.svg).toContain("surface salinity (PSS-78)");
    expect(figure.table.rows[0]?.[1]).toBeCloseTo(((storm.salinity[0] ?? 0) * 35) / 35.16504, 12);
  });
  it("leaves out a layer of fixed depth", () => {
    const { layerDepth, ...rest } = storm;
    expect(layerDepth).toHaveLength(storm.HOURS);
    expect(layerStack(rest, context).svg).not.toContain("layer depth");
  });
  it("says where the drift went at its highest", () => {
    const figure = stressAndDrift(
      { time, stressX: [0, 3, 0, 0], stressY: [0, 4, 0, 0], driftEast: [0, 0, 0.3, 0], driftNorth: [0, 0, -0.4, 0] },
      context,
    );
    expect(plain(figure.alt)).toContain("highest 5.00 N/m² at 2026-11-04 21:00 UTC");
    expect(plain(figure.alt)).toContain("highest 0.50 m/s at 2026-11-04 22:00 UTC");
    expect(figure.alt).toContain("towards 143°");
  });
});

describe("hodograph and track", () => {
  it("names the highest drift, its direction and the inertial circle", () => {
    const figure = hodograph({ ...storm, inertialAmplitude: 0.5 }, context);
    expect(plain(figure.svg)).toContain("1.34 m/s towards 123°");
    expect(plain(figure.caption)).toContain("Dashed circle: inertial speed 0.50 m/s.");
    for (const day of [1, 2, 3, 4, 5]) expect(figure.svg).toContain(`>${day} d<`);
  });
  it("says how far and where the layer went", () => {
    const figure = driftTrack(
      { time, displacementEast: [0, 3000, 9000, 6000], displacementNorth: [0, 0, 0, -8000] },
      context,
    );
    expect(plain(figure.caption)).toContain("net displacement 10.0 km towards 143° (south-east)");
    expect(plain(figure.alt)).toContain(
      "Farthest from the start 10.0 km towards 143° (south-east) at 2026-11-04 23:00 UTC.",
    );
    expect(figure.table.rows[1]).toEqual(["2026-11-04T21:00:00Z", 3, 0]);
  });
  it("copes with water that stayed", () => {
    const still = { time, displacementEast: [0, 0, 0, 0], displacementNorth: [0, 0, 0, 0] };
    expect(plain(driftTrack(still, context).caption)).toContain("net displacement 0.0 km.");
  });
});

describe("small marks", () => {
  it("say what they show", () => {
    expect(plain(spark([3, 25.1, 4], "windSpeed10", DEFAULT_UNITS).alt)).toBe("wind speed at 10 m 3.0 to 25.1 m/s");
    expect(plain(driftArrow({ distance: 84_000, towards: 128, fullCircle: 40_000 }, DEFAULT_UNITS).alt)).toBe(
      "net displacement 84.0 km towards 128°, south-east, longer than the circle",
    );
    const band = bandMark(
      { value: 31.9, p10: 31.6, p90: 32.2, trigger: 32.5, from: 31, to: 33 },
      "salinity",
      DEFAULT_UNITS,
    );
    expect(plain(band.alt)).toBe("31.9 g/kg, band 31.6 to 32.2 g/kg, trigger level 32.5 g/kg");
    expect(band.svg).toContain("<rect");
  });
  it("have only a tick where there is no band", () => {
    expect(bandMark({ value: 1, from: 0, to: 2 }, "stress", DEFAULT_UNITS).svg).not.toContain("<rect");
  });
});
