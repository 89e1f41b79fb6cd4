import { describe, expect, it } from "vitest";
import { makeNetcdf4 } from "../../../tests/factories/make-netcdf4";
import { readSeries } from "../read-series";
import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "../reading";

const HOURS = Int32Array.of(0, 1, 2, 3);
const time = {
  name: "time",
  values: HOURS,
  dimensions: ["time"],
  shape: [4],
  attributes: { units: "hours since 2024-03-01", standard_name: "time" },
};
/** More than eight attributes, which HDF5 keeps in another way than few. */
const many = Object.fromEntries(Array.from({ length: 12 }, (_, index) => [`note_${index}`, `text ${index}`]));

function read(bytes: Uint8Array, answers: ReadingAnswers = {}): SeriesReading {
  return readSeries({ bytes, fileName: "storm.nc", answers });
}

describe("NetCDF-4", () => {
  it("reads chunked, deflated, packed values with many attributes", async () => {
    const bytes = await makeNetcdf4([
      time,
      {
        name: "w",
        values: Int16Array.of(100, 250, -32767, 400),
        dimensions: ["time"],
        shape: [4],
        attributes: { ...many, standard_name: "wind_speed", units: "m s-1", scale_factor: 0.1, _FillValue: -32767 },
      },
    ]);
    const reading = read(bytes);
    expect(reading.formatLabel).toBe("NetCDF-4, CF conventions");
    expect(reading.first).toBe("2024-03-01T00:00:00Z");
    expect([...(reading.channels.windSpeed?.values ?? [])]).toEqual([10, 25, NaN, 40]);
  });

  it("reads unsigned values, stations with names in UTF-8, and one of them at a time", async () => {
    const bytes = await makeNetcdf4([
      time,
      { name: "station", values: ["Montréal", "Halifax"], dimensions: ["station"], shape: [2] },
      {
        name: "lat",
        values: Float64Array.of(45.5, 44.5),
        dimensions: ["station"],
        shape: [2],
        attributes: { units: "degrees_north" },
      },
      {
        name: "lon",
        values: Float64Array.of(-73.4, -63.4),
        dimensions: ["station"],
        shape: [2],
        attributes: { units: "degrees_east" },
      },
      {
        name: "p",
        values: Uint16Array.of(65_000, 65_001, 65_002, 65_003, 65_004, 65_005, 65_006, 65_007),
        dimensions: ["station", "time"],
        shape: [2, 4],
        attributes: { standard_name: "air_pressure", units: "Pa", add_offset: 36_000, coordinates: "lat lon" },
      },
    ]);
    expect(read(bytes).questions.find(({ key }) => key === "place")?.options?.[0]?.label).toContain("Montréal");
    const reading = read(bytes, { place: "44.5,-63.4" });
    const pressures = [...(reading.channels.airPressure?.values ?? [])].map((value) => Number(value.toFixed(6)));
    expect(pressures).toEqual([1010.04, 1010.05, 1010.06, 1010.07]);
  });

  it("is no table of any other HDF5 file", async () => {
    const bytes = await makeNetcdf4([{ name: "x", values: HOURS, dimensions: [], shape: [4] }]);
    expect(() => read(bytes)).toThrow("no coordinate of time");
  });

  it("gives a reading or a refusal for a file with bytes changed or cut off", async () => {
    const bytes = await makeNetcdf4([
      time,
      {
        name: "w",
        values: Float32Array.of(1, 2, 3, 4),
        dimensions: ["time"],
        shape: [4],
        attributes: { standard_name: "wind_speed", units: "m s-1" },
      },
    ]);
    for (let change = 0; change < 60; change += 1) {
      const damaged = Uint8Array.from(change % 5 === 0 ? bytes.subarray(0, 40 + change * 60) : bytes);
      // Spread over the file by a step that shares no factor with its length.
      for (let flip = 0; flip < 3; flip += 1) {
        const at = (change * 3571 + flip * 1733 + 8) % damaged.length;
        damaged[at] = (damaged[at] ?? 0) ^ (1 << (change % 8));
      }
      try {
        expect(read(damaged).rows).toBeGreaterThan(0);
      } catch (error) {
        expect(error).toBeInstanceOf(UnreadableFile);
      }
    }
  }, 120_000);

  it("says that a file cut short is damaged", async () => {
    const bytes = await makeNetcdf4([time]);
    expect(() => read(bytes.subarray(0, bytes.length / 2))).toThrow("is damaged, or no NetCDF-4 file");
  });
});
