import { describe, expect, it } from "vitest";
import { seriesCsv } from "./series-csv";

describe("series as CSV", () => {
  it("has a line for every time of any channel, units in the header, empty cells where a channel has no sample", () => {
    const text = seriesCsv([
      { channel: "windSpeed", unit: "m/s", time: Float64Array.of(0, 3600), values: Float64Array.of(5.25, 7) },
      { channel: "netHeat", unit: "W/m²", time: Float64Array.of(1800, 3600), values: Float64Array.of(-120, 0) },
    ]);
    expect(text).toBe(
      [
        "time (UTC),wind speed (m/s),net heat into the sea (W/m²)",
        "1970-01-01T00:00:00.000Z,5.25,",
        "1970-01-01T00:30:00.000Z,,-120",
        "1970-01-01T01:00:00.000Z,7,0",
        "",
      ].join("\r\n"),
    );
  });
});
