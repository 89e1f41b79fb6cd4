import { describe, expect, it } from "vitest";
import { hours, makeNetcdf, type ClassicFile, type ClassicVariable } from "../../../tests/factories/make-netcdf";
import { readSeries } from "../read-series";
import type { ChannelName, ReadingAnswers, SeriesReading } from "../reading";
import { bilinearCells } from "./cf-cells";
import { distanceKm, eastwardBy } from "./position";

/** Where in a file of several places a record is taken from: one test a way to take the wrong one. */

const read = (file: ClassicFile, answers: ReadingAnswers = {}): SeriesReading =>
  readSeries({ bytes: makeNetcdf(file), fileName: "places.nc", answers });
const first = (reading: SeriesReading, channel: ChannelName): number | undefined =>
  reading.channels[channel]?.values[0];
const codes = (reading: SeriesReading): string[] => reading.problems.map(({ code }) => code);
const taken = (reading: SeriesReading): string => reading.understood.find(({ what }) => what === "Place")?.taken ?? "";

const axis = (name: "latitude" | "longitude", values: number[]): ClassicVariable => ({
  name,
  type: "double",
  dimensions: [name],
  values,
  attributes: { units: name === "latitude" ? "degrees_north" : "degrees_east", standard_name: name },
});

/** A wind whose value at each cell is its row times ten plus its column. */
function grid(latitudes: number[], longitudes: number[], more: ClassicVariable[] = []): ClassicFile {
  const cells = latitudes.flatMap((_, row) => longitudes.map((__, column) => 10 * row + column));
  return {
    dimensions: { time: 2, latitude: latitudes.length, longitude: longitudes.length },
    variables: [
      hours(2),
      axis("latitude", latitudes),
      axis("longitude", longitudes),
      {
        name: "si10",
        type: "double",
        dimensions: ["time", "latitude", "longitude"],
        values: [...cells, ...cells],
        attributes: { standard_name: "wind_speed", units: "m s-1" },
      },
      ...more,
    ],
  };
}

const stations = (withNames: boolean): ClassicFile => ({
  dimensions: { station: 2, time: 2, length: 7 },
  variables: [
    hours(2),
    {
      name: "lat",
      type: "double",
      dimensions: ["station"],
      values: [44.5, 45.5],
      attributes: { units: "degrees_north" },
    },
    {
      name: "lon",
      type: "double",
      dimensions: ["station"],
      values: [-63.4, -73.4],
      attributes: { units: "degrees_east" },
    },
    ...(withNames
      ? [{ name: "name", type: "char" as const, dimensions: ["station", "length"], values: "Halifax" + "Laval\0\0" }]
      : []),
    {
      name: "w",
      type: "double",
      dimensions: ["station", "time"],
      values: [1, 2, 3, 4],
      attributes: { standard_name: "wind_speed", units: "m s-1", coordinates: "lat lon name" },
    },
  ],
});

describe("stations", () => {
  it("the first of several is taken in silence", () => {
    const reading = read(stations(true));
    expect(reading.channels).toEqual({});
    expect(reading.rows).toBe(2);
    expect(reading.questions.find(({ key }) => key === "place")).toMatchObject({
      needed: true,
      options: [
        { value: "44.5,-63.4", label: "Halifax (44.500° N 63.400° W)" },
        { value: "45.5,-73.4", label: "Laval (45.500° N 73.400° W)" },
      ],
    });
  });

  it("the nearest is not found where longitudes are written the other way", () => {
    const reading = read(stations(true), { place: "45.6,286.5" });
    expect(first(reading, "windSpeed")).toBe(3);
    expect(taken(reading)).toMatch(/^Laval .*, 13\.6 km from where was asked$/);
  });

  it("a station far away stands for the place without a word", () => {
    expect(codes(read(stations(false), { place: "40,-60" }))).toContain("placeFar");
  });

  it("a station is not found by its name", () => {
    expect(first(read(stations(true), { place: "Laval" }), "windSpeed")).toBe(3);
  });

  it("what is no place is passed over", () => {
    const reading = read(stations(true), { place: "Atlantis" });
    expect(codes(reading)).toContain("unknownPlace");
    expect(reading.channels).toEqual({});
  });

  it("a platform that moves is taken for one place", () => {
    const file = stations(false);
    file.dimensions = { time: 2 };
    file.variables = [
      hours(2),
      { name: "lat", type: "double", dimensions: ["time"], values: [44, 45], attributes: { units: "degrees_north" } },
      { name: "lon", type: "double", dimensions: ["time"], values: [-63, -63], attributes: { units: "degrees_east" } },
      { name: "w", dimensions: ["time"], values: [1, 2], attributes: { standard_name: "wind_speed", units: "m s-1" } },
    ];
    expect(codes(read(file))).toContain("placeMoves");
  });

  it("ensemble members are taken for stations", () => {
    const file = stations(false);
    file.dimensions = { number: 2, time: 2 };
    file.variables = [
      hours(2),
      {
        name: "w",
        dimensions: ["number", "time"],
        values: [1, 2, 3, 4],
        attributes: { standard_name: "wind_speed", units: "m s-1" },
      },
    ];
    const reading = read(file);
    expect(reading.channels).toEqual({});
    expect(reading.columns.find(({ name }) => name === "w")?.note).toContain("“number”");
  });
});

describe("grids", () => {
  it("a corner is taken where no place is given", () => {
    const reading = read(grid([50, 49], [-10, -9]));
    expect(reading.channels).toEqual({});
    expect(reading.questions.find(({ key }) => key === "place")).toMatchObject({ needed: true });
    expect(codes(reading)).not.toContain("noChannel");
  });

  it("trap 38: longitudes 0 to 360 and −180 to 180 do not meet", () => {
    expect(first(read(grid([50, 49], [350, 351]), { place: "49,-9" }), "windSpeed")).toBe(11);
    expect(first(read(grid([50, 49], [-10, -9]), { place: "49,351" }), "windSpeed")).toBe(11);
  });

  it("descending latitudes are read upside down", () => {
    expect(first(read(grid([51, 50, 49], [0, 1]), { place: "51,0" }), "windSpeed")).toBe(0);
    expect(first(read(grid([49, 50, 51], [0, 1]), { place: "51,0" }), "windSpeed")).toBe(20);
  });

  it("trap 39: a place at the seam of a grid around the Earth has no neighbour", () => {
    const around = Array.from({ length: 36 }, (_, index) => index * 10);
    expect(first(read(grid([10, 0], around), { place: "0,-1" }), "windSpeed")).toBe(10);
    const reading = read(grid([10, 0], around), { place: "0,-5", gridMethod: "bilinear" });
    expect(first(reading, "windSpeed")).toBeCloseTo((45 + 10) / 2, 9);
  });

  it("a place outside the grid is given its edge", () => {
    const reading = read(grid([50, 49], [-10, -9]), { place: "55,-10" });
    expect(codes(reading)).toContain("placeOutsideGrid");
    expect(reading.channels).toEqual({});
  });

  it("a cell of land is taken for the sea, by the mask", () => {
    const mask: ClassicVariable = {
      name: "lsm",
      dimensions: ["latitude", "longitude"],
      values: [0, 0, 0, 1],
      attributes: { standard_name: "land_binary_mask", units: "1" },
    };
    const reading = read(grid([50, 49], [-10, -9], [mask]), { place: "49.1,-9.1" });
    expect(first(reading, "windSpeed")).toBe(10);
    expect(taken(reading)).toContain("1 nearer of land passed over, by the land mask “lsm”");
  });

  it("a cell of land is taken for the sea, where the sea's temperature is filled in", () => {
    const sst: ClassicVariable = {
      name: "sst",
      type: "double",
      dimensions: ["time", "latitude", "longitude"],
      values: [290, 290, 290, -1, 290, 290, 290, -1],
      attributes: { standard_name: "sea_surface_temperature", units: "K", _FillValue: -1 },
    };
    const reading = read(grid([50, 49], [-10, -9], [sst]), { place: "49.1,-9.1" });
    expect(first(reading, "windSpeed")).toBe(10);
    expect(first(reading, "seaTemperature")).toBeCloseTo(16.85, 9);
  });

  it("between four cells the nearest is taken, though asked to interpolate", () => {
    const file = grid([50, 49], [-10, -9]);
    const reading = read(file, { place: "49.25,-9.5", gridMethod: "bilinear" });
    expect(first(reading, "windSpeed")).toBeCloseTo(0.25 * 0.5 + 0.75 * 10.5, 9);
    expect(first(read(file, { place: "49.25,-9.6" }), "windSpeed")).toBe(10);
  });

  it("land is interpolated into the sea", () => {
    const mask: ClassicVariable = { name: "lsm", dimensions: ["latitude", "longitude"], values: [0, 0, 0, 1] };
    const reading = read(grid([50, 49], [-10, -9], [mask]), { place: "49.4,-9.6", gridMethod: "bilinear" });
    expect(codes(reading)).toContain("notBilinear");
    expect(first(reading, "windSpeed")).toBe(10);
  });

  it("a curvilinear grid is searched along its indices", () => {
    const file: ClassicFile = {
      dimensions: { time: 1, y: 2, x: 2 },
      variables: [
        hours(1),
        {
          name: "nav_lat",
          type: "double",
          dimensions: ["y", "x"],
          values: [50, 50.2, 49, 49.2],
          attributes: { units: "degrees_north" },
        },
        {
          name: "nav_lon",
          type: "double",
          dimensions: ["y", "x"],
          values: [-10, -9, -10.2, -9.2],
          attributes: { units: "degrees_east" },
        },
        {
          name: "w",
          dimensions: ["time", "y", "x"],
          values: [0, 1, 10, 11],
          attributes: { standard_name: "wind_speed", units: "m s-1", coordinates: "nav_lat nav_lon" },
        },
      ],
    };
    expect(first(read(file, { place: "49.2,-9.3" }), "windSpeed")).toBe(11);
  });

  it("the last months of a reanalysis, in a version of their own, are missing", () => {
    const file = grid([50], [-10]);
    file.dimensions = { ...file.dimensions, expver: 2 };
    file.variables[3] = {
      name: "si10",
      type: "double",
      dimensions: ["time", "expver", "latitude", "longitude"],
      values: [5, -1, -1, 6],
      attributes: { standard_name: "wind_speed", units: "m s-1", _FillValue: -1 },
    };
    expect([...(read(file).channels.windSpeed?.values ?? [])]).toEqual([5, 6]);
  });

  it("winds on grids of their own are read at one index", () => {
    const file: ClassicFile = {
      dimensions: { time: 1, lat_u: 2, lat_v: 2, lon: 1 },
      variables: [
        hours(1),
        ...["lat_u", "lat_v"].map((name): ClassicVariable => ({
          name,
          type: "double",
          dimensions: [name],
          values: name === "lat_u" ? [50, 49] : [48.6, 49.6],
          attributes: { units: "degrees_north" },
        })),
        { name: "lon", type: "double", dimensions: ["lon"], values: [-10], attributes: { units: "degrees_east" } },
        {
          name: "u",
          dimensions: ["time", "lat_u", "lon"],
          values: [1, 2],
          attributes: { standard_name: "eastward_wind", units: "m/s" },
        },
        {
          name: "v",
          dimensions: ["time", "lat_v", "lon"],
          values: [3, 4],
          attributes: { standard_name: "northward_wind", units: "m/s" },
        },
      ],
    };
    expect(first(read(file, { place: "49,-10" }), "windSpeed")).toBeCloseTo(Math.hypot(2, 3), 9);
  });
});

describe("positions", () => {
  // Independent: a degree of a great circle is π/180 of the radius, 111.195 km.
  it("lie as far apart as great circles say", () => {
    expect(distanceKm({ latitude: 0, longitude: 179.5 }, { latitude: 0, longitude: -179.5 })).toBeCloseTo(111.195, 2);
    expect(distanceKm({ latitude: 60, longitude: 0 }, { latitude: 61, longitude: 360 })).toBeCloseTo(111.195, 2);
    expect(eastwardBy(350, 10)).toBe(20);
    expect(eastwardBy(10, 350)).toBe(-20);
  });

  it("on a grid line have two cells, on a node one", () => {
    const space = {
      kind: "grid" as const,
      rows: "y",
      columns: "x",
      latitudes: Float64Array.of(50, 49),
      longitudes: Float64Array.of(0, 1),
    };
    expect(bilinearCells(space, { latitude: 49, longitude: 1 })?.map(({ weight }) => weight)).toEqual([1]);
    expect(bilinearCells(space, { latitude: 49, longitude: 0.25 })?.map(({ weight }) => weight)).toEqual([0.75, 0.25]);
    expect(bilinearCells(space, { latitude: 48, longitude: 0.25 })).toBeNull();
  });
});
