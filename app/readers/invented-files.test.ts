import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { readSeries } from "./read-series";
import { summaryOfReading } from "./read-summary";
import { SAMPLE_HOURS, sampleStormFile, sampleStormHours } from "../../tests/factories/sample-storm";

describe("sampleStormFile", () => {
  it("is read without a problem, and back to the hours it was made from", () => {
    const { fileName, text } = sampleStormFile();
    const reading = readSeries({ bytes: new TextEncoder().encode(text), fileName });
    // Rain beside a gale is always a lower bound; nothing else is to be said.
    expect(reading.problems.map(({ code }) => code)).toEqual(["undercatch"]);
    expect(reading.questions.filter(({ needed }) => needed)).toEqual([]);
    const hours = sampleStormHours();
    for (const name of [
      "windSpeed",
      "windGust",
      "windFrom",
      "rain",
      "airPressure",
      "airTemperature",
      "dewPoint",
      "seaTemperature",
      "shortwave",
    ] as const) {
      expect([...(reading.channels[name]?.values ?? [])]).toEqual(hours.map((hour) => hour[name]));
    }
    expect([...reading.time]).toEqual(hours.map(({ time }) => time));
  });
});

describe("the invented buoy file", () => {
  const bytes = readFileSync(
    fileURLToPath(new URL("../../tests/factories/files/invented-storm-buoy.txt", import.meta.url)),
  );
  const reading = readSeries({ bytes, fileName: "invented-storm-buoy.txt" });

  it("has what its maker left out as missing, and nothing else", () => {
    expect(reading.rows).toBe(SAMPLE_HOURS - 3);
    const missing = Object.fromEntries(
      Object.entries(reading.channels).map(([name, channel]) => [name, channel.missing]),
    );
    expect(missing).toEqual({
      windSpeed: 3,
      windFrom: 4,
      windGust: 4,
      airPressure: 2,
      airTemperature: 0,
      seaTemperature: 1,
      dewPoint: 10,
    });
    expect(reading.problems.map(({ code }) => code)).toEqual(["timeGap"]);
    expect(reading.questions.filter(({ needed }) => needed).map(({ key }) => key)).toEqual(["windHeight"]);
  });

  it("is summed up in plain JSON", () => {
    const summary = summaryOfReading(reading);
    expect(JSON.parse(JSON.stringify(summary))).toEqual(summary);
    expect(Object.keys(summary)).toEqual([
      "kind",
      "format",
      "rows",
      "first",
      "last",
      "order",
      "duplicates",
      "channels",
      "windVectorMean",
      "understood",
      "questions",
      "problems",
    ]);
    expect(summary.channels.windSpeed).toMatchObject({ unit: "m/s", count: 162, missing: 3, max: 25.9 });
    expect(summary.understood).toContain("Left out: “WVHT” (wave height)");
  });
});
