import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readPastedGrid } from "./paste-grid";
import { readSeries } from "./read-series";
import { UnreadableFile, type SeriesReading } from "./reading";
import { hours, makeNetcdf } from "../../tests/factories/make-netcdf";
import { sampleStormFile } from "../../tests/factories/sample-storm";

const read = (bytes: Uint8Array): SeriesReading | UnreadableFile => {
  try {
    return readSeries({ bytes, fileName: "any.csv" });
  } catch (error) {
    if (error instanceof UnreadableFile) return error;
    throw error;
  }
};

/** What holds for every outcome: a refusal says why; a reading has an ascending axis and channels of its length. */
function expectSound(outcome: SeriesReading | UnreadableFile): void {
  expect(outcome.problems.every(({ message }) => message.length > 10)).toBe(true);
  if (outcome instanceof UnreadableFile) {
    expect(outcome.problems.some(({ severity }) => severity === "error")).toBe(true);
    return;
  }
  for (let index = 1; index < outcome.time.length; index += 1) {
    expect(outcome.time[index]).toBeGreaterThan(outcome.time[index - 1] ?? Infinity);
  }
  for (const channel of Object.values(outcome.channels)) {
    expect(channel.values.length).toBe(outcome.time.length);
    expect(channel.count).toBeLessThanOrEqual(outcome.rows);
  }
}

const SAMPLE = new TextEncoder().encode(sampleStormFile().text.split("\n").slice(0, 40).join("\n"));

const WIND = { standard_name: "wind_speed", units: "m s-1", scale_factor: 0.1 };
const NETCDF = makeNetcdf({
  dimensions: { time: null },
  records: 24,
  variables: [
    hours(24),
    {
      name: "w",
      type: "short",
      dimensions: ["time"],
      values: Array.from({ length: 24 }, (_, hour) => 40 + hour),
      attributes: WIND,
    },
  ],
});

describe("readSeries", () => {
  it("gives a sound reading or a refusal for any bytes", () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 600 }), (bytes) => expectSound(read(bytes))),
      { seed: 1, numRuns: 300 },
    );
  });

  it("gives a sound reading or a refusal for any text made of a table's signs", () => {
    const signs = fc.constantFrom(
      ..."0123456789.,;:\t|\"' -/TZ\n\n\n",
      "time",
      "wind speed",
      "(m/s)",
      "2024-03-01 00:00",
      "NaN",
      "#",
      "360",
      "\r",
      "−",
      "é",
    );
    fc.assert(
      fc.property(fc.array(signs, { maxLength: 200 }), (parts) =>
        expectSound(read(new TextEncoder().encode(parts.join("")))),
      ),
      { seed: 2, numRuns: 250 },
    );
  });

  it.each([
    ["a table of text", SAMPLE],
    ["a NetCDF file", NETCDF],
  ])("gives a sound reading or a refusal for %s with bytes changed, lost or repeated", (_, good) => {
    const change = fc.record({
      at: fc.nat(good.length - 1),
      byte: fc.nat(255),
      kind: fc.constantFrom("set", "cut", "repeat"),
    });
    fc.assert(
      fc.property(fc.array(change, { minLength: 1, maxLength: 12 }), (changes) => {
        let bytes = good;
        for (const { at, byte, kind } of changes) {
          if (kind === "set") {
            bytes = bytes.slice();
            bytes[at % bytes.length] = byte;
          } else if (kind === "cut")
            bytes = Uint8Array.from([...bytes.subarray(0, at), ...bytes.subarray(at + 1 + (byte % 20))]);
          else bytes = Uint8Array.from([...bytes.subarray(0, at), ...bytes.subarray(Math.max(0, at - byte))]);
        }
        expectSound(read(bytes));
      }),
      { seed: 3, numRuns: 100 },
    );
  });

  it("reads the same wind whatever the delimiter, decimal sign, line end and unit", () => {
    const FACTORS = { "m/s": 1, kn: 1852 / 3600, "km/h": 1 / 3.6, mph: 0.44704, "ft/s": 0.3048 };
    const dialect = fc.record({
      delimiter: fc.constantFrom(",", ";", "\t", "|"),
      comma: fc.boolean(),
      lineEnd: fc.constantFrom("\n", "\r\n", "\r"),
      unit: fc.constantFrom(...(Object.keys(FACTORS) as (keyof typeof FACTORS)[])),
      speeds: fc.array(fc.integer({ min: 0, max: 9000 }), { minLength: 2, maxLength: 30 }),
    });
    fc.assert(
      fc.property(dialect, ({ delimiter, comma, lineEnd, unit, speeds }) => {
        const decimal = comma && delimiter !== "," ? "," : ".";
        const written = speeds.map((speed) => (speed / 100).toFixed(2));
        const lines = written.map((speed, hour) => {
          const stamp = new Date(Date.UTC(2024, 2, 1, hour)).toISOString().slice(0, 16);
          return [stamp, speed.replace(".", decimal), "90"].join(delimiter);
        });
        const text = [["time (UTC)", `wind speed (${unit})`, "wind direction (deg)"].join(delimiter), ...lines].join(
          lineEnd,
        );
        const outcome = read(new TextEncoder().encode(text));
        if (outcome instanceof UnreadableFile) throw outcome;
        const values = [...(outcome.channels.windSpeed?.values ?? [])];
        expect(values.length).toBe(speeds.length);
        for (const [index, value] of values.entries())
          expect(value).toBeCloseTo(Number(written[index]) * FACTORS[unit], 9);
      }),
      { seed: 4, numRuns: 100 },
    );
  });

  it("gives the same reading for the same bytes and answers", () => {
    const once = readSeries({ bytes: SAMPLE, fileName: "a.csv", answers: { windHeight: 8 } });
    expect(readSeries({ bytes: SAMPLE, fileName: "a.csv", answers: { windHeight: 8 } })).toEqual(once);
  });

  it("reads rows in any order, with repeats, into the same series", () => {
    const [header, ...rows] = new TextDecoder().decode(SAMPLE).split("\n");
    const wanted = readSeries({ bytes: SAMPLE, fileName: "a.csv" });
    fc.assert(
      fc.property(fc.shuffledSubarray(rows, { minLength: rows.length }), fc.subarray(rows), (shuffled, repeated) => {
        const text = [header, ...shuffled, ...repeated].join("\n");
        const reading = readSeries({ bytes: new TextEncoder().encode(text), fileName: "a.csv" });
        expect(reading.time).toEqual(wanted.time);
        expect(reading.channels.windSpeed?.values).toEqual(wanted.channels.windSpeed?.values);
        expect(reading.duplicates).toBe(repeated.length);
      }),
      { seed: 5, numRuns: 25 },
    );
  });
});

describe("readPastedGrid", () => {
  it("reads tab-separated cells with a header", () => {
    const reading = readPastedGrid({
      text: "Time (UTC)\tWind (kn)\tDirection\n2024-03-01 00:00\t10\t270\n2024-03-01 01:00\t12\t280\n",
    });
    expect(reading.channels.windSpeed?.values[0]).toBeCloseTo(5.144444, 6);
    expect([...(reading.channels.windFrom?.values ?? [])]).toEqual([270, 280]);
  });

  it("reads cells without a header once the columns are named", () => {
    const text = "2024-03-01 00:00\t10\t270\n2024-03-01 01:00\t12\t280\n";
    expect(readPastedGrid({ text }).problems.map(({ code }) => code)).toContain("noHeader");
    const answers = {
      zone: "UTC",
      columns: { "1": { role: "windSpeed" as const, unit: "m/s" }, "2": { role: "windFrom" as const } },
    };
    const reading = readPastedGrid({ text, answers });
    expect([...(reading.channels.windSpeed?.values ?? [])]).toEqual([10, 12]);
    expect(reading.first).toBe("2024-03-01T00:00:00Z");
  });

  it("says that nothing was pasted", () => {
    expect(() => readPastedGrid({ text: "  \n" })).toThrow("Nothing was pasted");
  });
});
