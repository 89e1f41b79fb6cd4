import { describe, expect, it } from "vitest";
import { hours, makeNetcdf, type ClassicFile, type ClassicVariable } from "../../../tests/factories/make-netcdf";
import { readSeries } from "../read-series";
import type { ChannelName, ReadingAnswers, SeriesReading } from "../reading";

/**
 * One test a trap that NetCDF files set for their readers, named after what goes wrong. Expected values are worked out by
 * hand from the CF conventions 1.13 and the documentation of the named products, as the field guide to this job lists them.
 */

const read = (file: ClassicFile, answers: ReadingAnswers = {}): SeriesReading =>
  readSeries({ bytes: makeNetcdf(file), fileName: "storm.nc", answers });
const values = (reading: SeriesReading, channel: ChannelName): number[] =>
  [...(reading.channels[channel]?.values ?? [])].map((value) => Number(value.toPrecision(9)));
const codes = (reading: SeriesReading): string[] => reading.problems.map(({ code }) => code);
const asked = (reading: SeriesReading): string[] =>
  reading.questions.filter(({ needed }) => needed).map(({ key }) => key);
const taken = (reading: SeriesReading, what: string): string | undefined =>
  reading.understood.find((line) => line.what === what)?.taken;

const series = (
  name: string,
  numbers: number[],
  attributes: ClassicVariable["attributes"],
  type: ClassicVariable["type"] = "double",
): ClassicVariable => ({ name, type, dimensions: ["time"], values: numbers, attributes });
const station = (count: number, ...variables: ClassicVariable[]): ClassicFile => ({
  dimensions: { time: count },
  variables: [hours(count), ...variables],
});
const WIND = { standard_name: "wind_speed", units: "m s-1" };

describe("packed values", () => {
  const packed = (attributes: ClassicVariable["attributes"], numbers: number[], type: "byte" | "short" = "short") =>
    station(
      numbers.length,
      series("sst", numbers, { standard_name: "sea_surface_temperature", units: "K", ...attributes }, type),
    );

  it("the missing code is compared after unpacking, and stays as a temperature", () => {
    const fill = { type: "short" as const, values: [-32767] };
    const reading = read(packed({ scale_factor: 0.01, add_offset: 300, _FillValue: fill }, [-500, -32767, 0]));
    expect(values(reading, "seaTemperature")).toEqual([21.85, NaN, 26.85]);
    expect(reading.channels.seaTemperature?.missing).toBe(1);
  });

  it("missing_value beside _FillValue is not seen", () => {
    const short = (value: number) => ({ type: "short" as const, values: [value] });
    const file = packed(
      { scale_factor: 0.01, add_offset: 300, _FillValue: short(-1), missing_value: short(-2) },
      [-1, -2, 0],
    );
    expect(values(read(file), "seaTemperature")).toEqual([NaN, NaN, 26.85]);
  });

  it("the valid range of the packed values is held against the unpacked ones", () => {
    const range = { type: "short" as const, values: [-1000, 1000] };
    const reading = read(packed({ scale_factor: 0.01, add_offset: 300, valid_range: range }, [-1001, 1000, 0]));
    expect(values(reading, "seaTemperature")).toEqual([NaN, 36.85, 26.85]);
  });

  it("unsigned values stored with a sign come out at −50 °C", () => {
    const bytes = packed({ scale_factor: 0.5, add_offset: 223.15, _Unsigned: "true" }, [-56, 100], "byte");
    expect(values(read(bytes), "seaTemperature")).toEqual([50, 0]);
  });

  it("a missing code in double precision misses its single-precision values", () => {
    const file = station(2, series("w", [-9999.9, 5], { ...WIND, _FillValue: -9999.9 }, "float"));
    expect(values(read(file), "windSpeed")).toEqual([NaN, 5]);
  });

  it("what the library fills in where nothing was written counts as wind", () => {
    const file = station(2, series("w", [9.969209968386869e36, 5], WIND, "float"));
    expect(values(read(file), "windSpeed")).toEqual([NaN, 5]);
  });

  it("a short record is padded, and its padding is read as a value", () => {
    const file: ClassicFile = {
      dimensions: { time: null },
      records: 3,
      variables: [
        { ...hours(3) },
        series("w", [1, 2, 3], { ...WIND, scale_factor: 0.5 }, "short"),
        series("d", [10, 20, 30], { standard_name: "wind_from_direction", units: "degree" }, "short"),
      ],
    };
    expect(values(read(file), "windSpeed")).toEqual([0.5, 1, 1.5]);
    expect(values(read(file), "windFrom")).toEqual([10, 20, 30]);
  });

  it("negative rain of rounded packing is no rain, not an error", () => {
    const rain = series("pr", [-2.6e-10, 1 / 3600], { standard_name: "precipitation_flux", units: "kg m-2 s-1" });
    const reading = read(station(2, rain));
    expect(values(reading, "rain")).toEqual([0, 1]);
    expect(codes(reading)).not.toContain("negativeRain");
    expect(reading.steps.find(({ id }) => id === "noise")?.count).toBe(1);
  });
});

describe("time", () => {
  const timed = (units: string, numbers: number[], attributes: ClassicVariable["attributes"] = {}): ClassicFile => ({
    dimensions: { time: numbers.length },
    variables: [
      { name: "time", type: "double", dimensions: ["time"], values: numbers, attributes: { units, ...attributes } },
      series(
        "w",
        numbers.map(() => 5),
        WIND,
      ),
    ],
  });

  it.each([
    ["hours since 1900-01-01 00:00:00.0", [1060680], "2021-01-01T00:00:00Z"],
    ["days since 1950-01-01 00:00:00Z", [25341.04097222], "2019-05-20T00:59:00Z"],
    ["seconds since 1970-01-01", [1.5], "1970-01-01T00:00:01.500Z"],
    ["minutes since 2024-03-01T00:00:00", [90], "2024-03-01T01:30:00Z"],
    ["hours since 2024-03-01 00:00:00 +05:30", [6], "2024-03-01T00:30:00Z"],
    ["hours since 2024-03-01 00:00:00 -3:00", [0], "2024-03-01T03:00:00Z"],
    ["days since 2024-02-28", [2], "2024-03-01T00:00:00Z"],
  ])("%s is misread", (units, numbers, first) => {
    expect(read(timed(units, numbers)).first).toBe(first);
  });

  it("hours since the year 1 are two days off: the standard calendar was Julian then", () => {
    const day = (calendar: string) => read(timed("days since 0001-01-01", [738945], { calendar })).first;
    expect(day("proleptic_gregorian")).toBe("2024-03-01T00:00:00Z");
    expect(day("standard")).toBe("2024-02-28T00:00:00Z");
  });

  it.each(["noleap", "365_day", "360_day", "all_leap", "julian", "none"])(
    "days of the calendar %s are taken for dates",
    (calendar) => {
      expect(() => read(timed("days since 2024-01-01", [0], { calendar }))).toThrow(`“${calendar}”`);
    },
  );

  it.each(["months since 2024-01-01", "years since 2000-01-01"])("%s are taken for calendar months", (units) => {
    expect(() => read(timed(units, [1]))).toThrow("no fixed length");
  });

  it("a missing stamp becomes a date", () => {
    const reading = read(timed("hours since 2024-03-01", [0, -9999, 2], { _FillValue: -9999 }));
    expect(codes(reading)).toContain("unreadableTime");
    expect(reading.time.length).toBe(2);
  });

  it("times that run backwards are left so", () => {
    const reading = read(timed("hours since 2024-03-01", [2, 1, 0]));
    expect(reading.order).toBe("descending");
    expect(reading.first).toBe("2024-03-01T00:00:00Z");
  });

  it("a file without time says so", () => {
    const file: ClassicFile = { dimensions: { x: 1 }, variables: [{ ...series("w", [1], WIND), dimensions: ["x"] }] };
    expect(() => read(file)).toThrow("no coordinate of time");
  });

  it("the time of the forecast is taken for the time it is valid at", () => {
    const file = timed("hours since 2024-03-01", [5, 6], { standard_name: "time" });
    const reference = { standard_name: "forecast_reference_time", units: "hours since 2024-03-01" };
    file.variables.unshift(series("forecast_reference_time", [0, 0], reference));
    expect(read(file).first).toBe("2024-03-01T05:00:00Z");
  });

  it("of two axes of time one is taken without a word", () => {
    const file: ClassicFile = {
      dimensions: { time: 3, day: 2 },
      variables: [
        hours(3),
        {
          name: "day",
          type: "double",
          dimensions: ["day"],
          values: [0, 1],
          attributes: { units: "days since 2024-03-01" },
        },
        series("w", [1, 2, 3], WIND),
        { ...series("rain", [24, 48], { standard_name: "rainfall_rate", units: "mm day-1" }), dimensions: ["day"] },
      ],
    };
    const reading = read(file);
    expect(values(reading, "windSpeed")).toEqual([1, 2, 3]);
    expect(reading.questions.find(({ key }) => key === "timeAxis")?.options?.map(({ value }) => value)).toEqual([
      "time",
      "day",
    ]);
    expect(values(read(file, { timeAxis: "day" }), "rain")).toEqual([1, 2]);
  });
});

describe("wind", () => {
  it("trap 1: a direction towards is taken for one from", () => {
    const direction = (standardName: string) => series("dir", [90], { standard_name: standardName, units: "degree" });
    expect(values(read(station(1, series("w", [5], WIND), direction("wind_to_direction"))), "windFrom")).toEqual([270]);
    expect(values(read(station(1, series("w", [5], WIND), direction("wind_from_direction"))), "windFrom")).toEqual([
      90,
    ]);
  });

  it("trap 1: components are turned about or mixed up: u = +10, v = 0 blows from 270°", () => {
    const u = series("u10", [10, 0], {
      standard_name: "eastward_wind",
      units: "m s**-1",
      long_name: "10 metre U wind component",
    });
    const v = series("v10", [0, -10], { standard_name: "northward_wind", units: "m s**-1" });
    const reading = read(station(2, u, v));
    expect(values(reading, "windFrom")).toEqual([270, 0]);
    expect(reading.windHeight).toBe(10);
  });

  it("trap 2: components along a rotated grid are taken for east and north", () => {
    const u = series("ugrd", [10], { standard_name: "x_wind", units: "m s-1" });
    const v = series("vgrd", [0], { standard_name: "y_wind", units: "m s-1" });
    expect(read(station(1, u, v)).channels.windFrom).toBeUndefined();
  });

  it("trap 5: the gust is taken for the mean, the maximum of a day for its wind", () => {
    const gust = series("fg", [20], {
      standard_name: "wind_speed_of_gust",
      units: "m s-1",
      cell_methods: "time: maximum",
    });
    const most = series("wmax", [15], { ...WIND, cell_methods: "time: maximum" });
    const reading = read(station(1, gust, most));
    expect(values(reading, "windGust")).toEqual([20]);
    expect(reading.channels.windSpeed).toBeUndefined();
  });

  it("trap 6: a mean over a day passes for a wind of minutes", () => {
    const reading = read(station(1, series("w", [5], { ...WIND, cell_methods: "time: mean within days" })));
    expect(reading.averagingMinutes).toBe(1440);
  });

  it.each([
    ["an attribute of the wind", {}, { sensor_height: 3.56 }],
    ["a scalar coordinate", { standard_name: "height", units: "m" }, { coordinates: "WIND_H" }],
    ["a variable of the instrument's height", { long_name: "wind measurement height above water", units: "meter" }, {}],
  ])("trap 7: the height in %s is not seen", (_, ofHeight, ofWind) => {
    const file = station(1, series("WSPD", [5], { ...WIND, ...ofWind }));
    if (Object.keys(ofHeight).length > 0)
      file.variables.push({ name: "WIND_H", dimensions: [], values: [3.56], attributes: ofHeight });
    expect(read(file).windHeight).toBe(3.56);
  });

  it("trap 7: a mast's uppermost wind is taken for the one near 10 m", () => {
    const file: ClassicFile = {
      dimensions: { time: 2, height: 2 },
      variables: [
        hours(2),
        { name: "height", dimensions: ["height"], values: [40, 12], attributes: { units: "m", positive: "up" } },
        { name: "w", dimensions: ["time", "height"], values: [9, 5, 8, 4], attributes: WIND },
      ],
    };
    const reading = read(file);
    expect(values(reading, "windSpeed")).toEqual([5, 4]);
    expect(reading.windHeight).toBe(12);
  });

  it("trap 7: a wind that was reckoned for 10 m is preferred to the measured one", () => {
    const measured = series("WSPD", [5], WIND);
    const reckoned = series("WSPD10M", [6], { ...WIND, long_name: "calculated neutral wind speed at 10 meters" });
    expect(values(read(station(1, measured, reckoned)), "windSpeed")).toEqual([5]);
  });

  it("trap 12: stress is taken for wind", () => {
    const stress = series("tau", [0.1], { standard_name: "surface_downward_eastward_stress", units: "Pa" });
    expect(read(station(1, stress)).channels).toEqual({});
  });
});

describe("rain", () => {
  it.each([
    ["kg m-2 s-1", "precipitation_flux", 1 / 3600],
    ["m s-1", "lwe_precipitation_rate", 1e-3 / 3600],
    ["millimeters hour-1", "rainfall_rate", 1],
    ["mm day-1", "lwe_precipitation_rate", 24],
  ])("rain in %s is off by its factor", (units, standardName, value) => {
    expect(values(read(station(1, series("r", [value], { standard_name: standardName, units }))), "rain")).toEqual([1]);
  });

  const total = (numbers: number[], attributes: ClassicVariable["attributes"] = {}) =>
    station(numbers.length, series("tp", numbers, { units: "m", long_name: "Total precipitation", ...attributes }));

  it("trap 22: metres over an hour are taken for a rate: 0.0042 m in an hour is 4.2 mm/h", () => {
    const reading = read(total([0, 0.0042, 0]), { accumulation: "step" });
    expect(values(reading, "rain")).toEqual([0, 4.2, 0]);
    expect(reading.channels.rain?.total).toBe(4.2);
  });

  it("trap 22: over which time amounts add up is guessed, where the file has no bounds", () => {
    const reading = read(total([0, 0.001, 0, 0.002]));
    expect(asked(reading)).toContain("accumulation");
    expect(asked(read(total([0, 0.001, 0, 0.002]), { accumulation: "step" }))).toEqual([]);
  });

  it("trap 22: amounts since 00 UTC are summed up again each hour", () => {
    // 1 mm in each hour but the sixth of each day; the stamp 00 UTC closes the day before.
    const fallen = Array.from({ length: 48 }, (_, index): number => (index % 24 === 5 ? 0 : 1));
    const sums = fallen.map((_, index) => {
      const start = index - (index % 24);
      return fallen.slice(start, index + 1).reduce((sum, value) => sum + value / 1000, 0);
    });
    const file = total(sums);
    file.variables[0] = hours(48, { units: "hours since 2024-03-01 01:00:00" });
    const reading = read(file);
    const question = reading.questions.find(({ key }) => key === "accumulation");
    expect(question).toMatchObject({ needed: true, suggestion: "day" });
    const answered = read(file, { accumulation: "day" });
    expect(values(answered, "rain").map((value) => Number(value.toFixed(6)))).toEqual(fallen);
    expect(answered.channels.rain?.total).toBeCloseTo(46, 6);
  });

  it("trap 22: amounts since the start of the forecast are summed up again", () => {
    const reading = read(total([0.001, 0.003, 0.003, 0.0045]), { accumulation: "start" });
    expect(values(reading, "rain")).toEqual([NaN, 2, 0, 1.5]);
  });

  it("trap 17: the file's own intervals are not used: six-hour sums at three-hour steps", () => {
    const file: ClassicFile = {
      dimensions: { time: 2, bnds: 2 },
      variables: [
        { ...hours(2, { bounds: "time_bnds" }), values: [6, 9] },
        { name: "time_bnds", type: "double", dimensions: ["time", "bnds"], values: [0, 6, 3, 9] },
        series("r", [6, 12], { standard_name: "precipitation_amount", units: "kg m-2", cell_methods: "time: sum" }),
      ],
    };
    const reading = read(file);
    expect(values(reading, "rain")).toEqual([1, 2]);
    expect(asked(reading)).not.toContain("accumulation");
    expect(taken(reading, "Stamps")).toContain("its interval’s end");
  });

  it("bounds that all begin with the forecast are divided by their whole length", () => {
    const file: ClassicFile = {
      dimensions: { time: 2, bnds: 2 },
      variables: [
        { ...hours(2, { bounds: "time_bnds" }), values: [3, 6] },
        { name: "time_bnds", type: "double", dimensions: ["time", "bnds"], values: [0, 3, 0, 6] },
        series("ssr", [3 * 3600 * 100, 3 * 3600 * 300], {
          standard_name: "surface_net_downward_shortwave_flux",
          units: "J m-2",
        }),
      ],
    };
    expect(values(read(file), "shortwave")).toEqual([100, 200]);
  });

  it("snow is taken for rain", () => {
    const snow = series("prsn", [1], { standard_name: "solid_precipitation_flux", units: "kg m-2 s-1" });
    expect(read(station(1, snow)).channels.rain).toBeUndefined();
  });
});

describe("heat", () => {
  const flux = (name: string, numbers: number[], attributes: ClassicVariable["attributes"]) =>
    station(numbers.length, series(name, numbers, { units: "W m-2", ...attributes }));

  it("trap 29: joules over an hour are taken for watts: 3.6 MJ/m² in an hour is 1000 W/m²", () => {
    const energy = { units: "J m**-2", standard_name: "surface_net_downward_shortwave_flux" };
    expect(values(read(flux("ssr", [3.6e6, 0], energy), { accumulation: "step" }), "shortwave")).toEqual([1000, 0]);
    const integral = { ...energy, units: "W s m-2" };
    expect(values(read(flux("ssr", [3.6e6, 0], integral), { accumulation: "step" }), "shortwave")).toEqual([1000, 0]);
  });

  it("trap 30: neighbours count in opposite senses, by their names", () => {
    const sensible = read(flux("hfss", [10], { standard_name: "surface_downward_sensible_heat_flux" }));
    const latent = read(flux("hfls", [100], { standard_name: "surface_upward_latent_heat_flux" }));
    expect(values(sensible, "sensible")).toEqual([10]);
    expect(values(latent, "latent")).toEqual([-100]);
    expect(taken(latent, "Sense of “hfls”")).toContain("turned");
    expect(asked(latent)).toEqual([]);
  });

  it("trap 30: the attribute `positive` is not seen", () => {
    const up = read(flux("lh", [100], { long_name: "latent heat flux", positive: "up" }));
    const down = read(flux("lh", [-100], { long_name: "latent heat flux", positive: "down" }));
    expect(values(up, "latent")).toEqual([-100]);
    expect(values(down, "latent")).toEqual([-100]);
    expect([...asked(up), ...asked(down)]).toEqual([]);
  });

  it("trap 30: a sense that nothing states is guessed in silence", () => {
    const reading = read(flux("qs", [10], { long_name: "sensible heat flux" }));
    expect(asked(reading)).toEqual(["columns"]);
    const index = String(reading.questions.find(({ needed }) => needed)?.column);
    const answers: ReadingAnswers = { columns: { [index]: { role: "sensible", unit: "W/m² upward" } } };
    expect(values(read(flux("qs", [10], { long_name: "sensible heat flux" }), answers), "sensible")).toEqual([-10]);
  });

  it("trap 30: a reanalysis' standard name says upward of fluxes that its centre counts downward", () => {
    const file = flux("slhf", [-3.6e5, -3.6e5], { units: "J m**-2", standard_name: "surface_upward_latent_heat_flux" });
    file.attributes = { institution: "European Centre for Medium-Range Weather Forecasts (ECMWF)" };
    expect(asked(read(file, { accumulation: "step" }))).toEqual(["columns"]);
  });

  it("trap 30: evaporation that a reanalysis counts downward comes out negative", () => {
    const file = flux("e", [-0.001, -0.002], { units: "m" });
    file.attributes = { institution: "ECMWF" };
    expect(values(read(file, { accumulation: "step" }), "evaporation")).toEqual([1, 2]);
  });

  it("trap 31: incoming longwave is taken for the sea's balance", () => {
    const incoming = read(flux("rlds", [350], { standard_name: "surface_downwelling_longwave_flux_in_air" }));
    expect(incoming.channels.longwave).toBeUndefined();
    const mislabelled = read(flux("rlds", [350], { standard_name: "surface_net_downward_longwave_flux" }));
    expect(mislabelled.channels.longwave).toBeUndefined();
  });

  it("trap 31: incoming shortwave goes before the net one", () => {
    const file = flux("rsds", [200], { standard_name: "surface_downwelling_shortwave_flux_in_air" });
    expect(values(read(file), "shortwave")).toEqual([200]);
    file.variables.push(
      series("rsns", [190], { standard_name: "surface_net_downward_shortwave_flux", units: "W m-2" }),
    );
    expect(values(read(file), "shortwave")).toEqual([190]);
  });

  it("trap 31: radiation of a clear sky, or its direct part, is taken for all", () => {
    const clear = flux("swc", [200], { long_name: "Mean surface downward short-wave radiation flux, clear sky" });
    const direct = flux("swd", [200], { long_name: "Mean surface direct short-wave radiation flux" });
    expect(read(clear).channels).toEqual({});
    expect(read(direct).channels).toEqual({});
  });
});

describe("quality flags", () => {
  const flagged = station(
    3,
    series("w", [5, 50, 6], { ...WIND, ancillary_variables: "w_qc" }),
    series(
      "w_qc",
      [1, 4, 3],
      {
        standard_name: "wind_speed status_flag",
        flag_values: { type: "byte", values: [1, 3, 4] },
        flag_meanings: "good suspect bad",
      },
      "byte",
    ),
  );

  it("what the file itself calls bad is used", () => {
    const reading = read(flagged);
    expect(values(reading, "windSpeed")).toEqual([5, NaN, 6]);
    expect(reading.steps.find(({ id }) => id === "flagged")?.count).toBe(1);
    expect(taken(reading, "Flags of “w”")).toContain("4 (bad): 1 left out");
  });

  it("what is flagged cannot be kept", () => {
    expect(values(read(flagged, { flagged: "keep" }), "windSpeed")).toEqual([5, 50, 6]);
  });
});
