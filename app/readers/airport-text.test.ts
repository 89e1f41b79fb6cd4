import { describe, expect, it } from "vitest";
import { readSeries } from "./read-series";
import type { ReadingAnswers } from "./reading";

const HEADER = "station,valid,tmpf,dwpf,relh,drct,sknt,gust,p01i,alti,mslp,metar";
const read = (lines: string[], answers: ReadingAnswers = { zone: "UTC" }) =>
  readSeries({ bytes: new TextEncoder().encode(lines.join("\n")), fileName: "airport.csv", answers });
const line = (time: string, cells: string) => `KXYZ,2024-03-01 ${time},${cells}`;

/** Routine reports at 53 past, specials between; rain counts from the report at 53. Invented. */
const STORM = [
  "#DEBUG: made for a test, with commas, in a remark",
  HEADER,
  line("00:53", "50.0,41.0,71.0,000,0,M,0.00,29.92,1013.2,KXYZ 010053Z 00000KT"),
  line("01:13", "50.0,41.0,71.0,VRB,4,M,0.10,29.92,1013.2,SPECI"),
  line("01:53", "50.0,41.0,71.0,360,10,,0.30,29.91,1012.9,METAR"),
  line("02:23", "50.0,41.0,71.0,270,20,31,0.05,29.90,M,SPECI"),
  line("02:53", "50.0,41.0,M,280,25,40,0.25,29.89,1012.1,METAR"),
  line("03:53", "50.0,41.0,71.0,290,22,M,T,29.90,1012.4,METAR"),
];

describe("airport observations", () => {
  it("are recognised, with knots, °F and inches by the names of their columns", () => {
    const reading = read(STORM);
    expect(reading.format).toBe("airportText");
    expect(reading.rows).toBe(6);
    expect(reading.channels.windSpeed?.max).toBeCloseTo(25 * (1852 / 3600), 6);
    expect(reading.channels.airTemperature?.values[0]).toBeCloseTo(10, 9);
    // The altimeter setting: 29.92 inHg, the first pressure in the file.
    expect(reading.channels.airPressure?.values[0]).toBeCloseTo(29.92 * 33.86389, 3);
  });

  it("trap 11: a station on land is not passed off as the sea", () => {
    expect(read(STORM).problems.map(({ code }) => code)).toContain("landStation");
  });

  it("trap: the hour's rain repeats in special reports and is not summed", () => {
    const reading = read(STORM);
    // 0.30 in, then 0.25 in, then a trace: 13.97 mm. The sum of the rows would be 17.78 mm.
    expect(reading.channels.rain?.total).toBeCloseTo(0.55 * 25.4, 9);
    const rates = reading.channels.rain?.values ?? new Float64Array();
    const hours = Array.from(rates, (_, k) => ((reading.time[k + 1] ?? NaN) - (reading.time[k] ?? NaN)) / 3600);
    // What holds until the next report keeps the sum: the first report has nothing before it.
    const held = Array.from(rates).reduce(
      (sum, rate, k) => (Number.isNaN(rate) ? sum : sum + rate * (hours[k] ?? 0)),
      0,
    );
    expect(held).toBeCloseTo(0.55 * 25.4, 9);
    expect(rates[0]).toBeCloseTo((0.1 * 25.4) / (20 / 60), 9);
  });

  it("trap: 000 with no wind is a calm, 360 is north, VRB has no direction", () => {
    const { channels } = read(STORM);
    expect(Array.from(channels.windFrom?.values ?? []).slice(0, 4)).toEqual([NaN, NaN, 0, 270]);
    expect(channels.windSpeed?.values[0]).toBe(0);
  });

  it("trap: a gust that was not reported is missing, not zero", () => {
    const { channels } = read(STORM);
    expect(channels.windGust?.count).toBe(2);
    expect(channels.windGust?.missing).toBe(4);
  });

  it("asks for the zone: UTC unless another was picked at the export", () => {
    const open = read(STORM, {}).questions.find(({ key }) => key === "zone");
    expect(open).toMatchObject({ needed: true });
  });
});
