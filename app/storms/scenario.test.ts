import { describe, expect, it } from "vitest";
import type { RecordProvenance } from "./provenance";
import { changeRecord, changeSeries, scenarioWords } from "./scenario";

const changes = { windFactor: 1.2, rainFactor: 2, shiftHours: -6 };
const plainText = (text: string) => text.replaceAll("\u00a0", " ");

const provenance: RecordProvenance = {
  formatLabel: "delimited text",
  rows: 3,
  first: "2026-11-04T00:00:00.000Z",
  last: "2026-11-04T02:00:00.000Z",
  zone: "UTC",
  windHeight: 10,
  averagingMinutes: 10,
  medianStepSeconds: 3600,
  understood: [],
  steps: [{ id: "unit", label: "knots to m/s (× 0.514444)", channel: "windSpeed", count: 3 }],
  dropped: [],
  channels: [
    { channel: "windSpeed", unit: "m/s", count: 3, missing: 0, fromColumns: ["wind"] },
    { channel: "windFrom", unit: "deg", count: 3, missing: 0, fromColumns: ["from"] },
  ],
  confirmedBy: "u",
  confirmedAt: "2026-11-05T00:00:00.000Z",
};

describe("what a scenario changes", () => {
  it("is told in words, and only what is changed", () => {
    expect(plainText(scenarioWords(changes))).toBe("wind × 1.2, rain × 2, 6 h earlier");
    expect(plainText(scenarioWords({ windFactor: 1, rainFactor: 0, shiftHours: 1.5 }))).toBe("rain × 0, 1.5 h later");
    expect(scenarioWords({ windFactor: 1, rainFactor: 1, shiftHours: 0 })).toBe("unchanged");
  });

  it("scales wind and rain, and moves every channel in time", () => {
    const series = (channel: "windSpeed" | "windFrom" | "rain" | "netHeat") =>
      changeSeries({ channel, unit: "", time: Float64Array.of(36_000), values: Float64Array.of(10) }, changes);
    expect(series("windSpeed").values[0]).toBe(12);
    expect(series("rain").values[0]).toBe(20);
    expect(series("windFrom").values[0]).toBe(10);
    expect(series("netHeat").values[0]).toBe(10);
    for (const channel of ["windSpeed", "windFrom", "rain", "netHeat"] as const) {
      expect(series(channel).time[0]).toBe(14_400);
    }
  });

  it("is a step of each record that it touches, after those of its reading", () => {
    const scenario = { ...changes, of: "All Souls gale" };
    const changed = changeRecord({ name: "wind.csv", provenance }, scenario);
    expect(changed.name).toBe("wind.csv");
    expect(changed.provenance.steps.map(({ label, channel, count }) => [plainText(label), channel, count])).toEqual([
      ["knots to m/s (× 0.514444)", "windSpeed", 3],
      ["wind speed × 1.2 for the scenario", "windSpeed", 3],
      ["6 h earlier for the scenario", "time", 3],
    ]);
    expect(changed.provenance.first).toBe("2026-11-03T18:00:00.000Z");
    expect(changed.provenance.scenario).toEqual(scenario);
    expect(provenance.steps).toHaveLength(1);
  });

  it("scales a constant as it was written, name and all", () => {
    const rain: RecordProvenance = {
      ...provenance,
      steps: [],
      channels: [{ channel: "rain", unit: "mm/h", count: 3, missing: 0, fromColumns: [] }],
      constant: { channel: "rain", value: 25.4, asWritten: { value: 1, unit: "in/h" } },
    };
    const changed = changeRecord(
      { name: "constant rain 1 in/h", provenance: rain },
      { ...changes, shiftHours: 0, of: "Gale" },
    );
    expect(changed.provenance.constant).toEqual({
      channel: "rain",
      value: 50.8,
      asWritten: { value: 2, unit: "in/h" },
    });
    expect(plainText(changed.name)).toMatch(/^constant rain 2(\.\d+)? in\/h$/);
  });
});
