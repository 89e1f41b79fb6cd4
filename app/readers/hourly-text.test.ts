import { describe, expect, it } from "vitest";
import { readSeries } from "./read-series";

const read = (lines: string[]) =>
  readSeries({ bytes: new TextEncoder().encode(lines.join("\n")), fileName: "station-2024" });

/** Invented records in the form of the format document. */
const RECORDS = [
  "2024 03 01 00   105    52 10132   270    51     8     0 -9999",
  "2024 03 01 01   -12   -34 10129     0     0 -9999    -1 -9999",
  "2024 03 01 02 -9999 -9999 -9999 -9999 -9999 -9999    23    60",
];

describe("fixed-width hourly records", () => {
  it("are read in tenths, in UTC", () => {
    const reading = read(RECORDS);
    expect(reading).toMatchObject({ format: "hourlyText", zone: "UTC", rows: 3, first: "2024-03-01T00:00:00Z" });
    expect(Array.from(reading.channels.airTemperature?.values ?? [])).toEqual([10.5, expect.closeTo(-1.2, 12), NaN]);
    expect(reading.channels.airPressure?.values[0]).toBeCloseTo(1013.2, 9);
    expect(reading.channels.windSpeed?.values[0]).toBeCloseTo(5.1, 12);
  });

  it("trap 26: −1 is a trace of rain and −9999 is missing", () => {
    const { channels, understood } = read(RECORDS);
    expect(Array.from(channels.rain?.values ?? [])).toEqual([0, 0, expect.closeTo(2.3, 12)]);
    expect(channels.rain?.total).toBeCloseTo(2.3, 12);
    expect(understood.find(({ what }) => what.startsWith("Trace"))?.taken).toBe("1 read as 0");
    expect(channels.windSpeed?.missing).toBe(1);
  });

  it("a calm of direction 0 has no direction; the six-hour sum is left out", () => {
    const { channels, columns } = read(RECORDS);
    expect(Array.from(channels.windFrom?.values ?? [])).toEqual([270, NaN, NaN]);
    expect(columns.find(({ name }) => name === "precipitation, 6 h")?.role).toBe("leftOut");
  });

  it("are not taken for a buoy's text or a plain table, and a torn line is a problem with its row", () => {
    const torn = read([
      ...RECORDS,
      ...RECORDS.map((record) => record.replace("2024 03 01", "2024 03 02")),
      "2024 03 03",
    ]);
    expect(torn.format).toBe("hourlyText");
    expect(torn.problems.find(({ code }) => code === "fieldCount")?.row).toBe(7);
  });
});
