import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { UnreadableFile } from "../reading";
import type { CastAnswers } from "./cast-reading";
import { readCast } from "./read-cast";

const read = (text: string, answers?: CastAnswers) =>
  readCast({ bytes: new TextEncoder().encode(text), fileName: "cast.csv", ...(answers && { answers }) });

const EXCHANGE = [
  "CTD,20310101INVENTED",
  "#made for a test",
  "NUMBER_HEADERS = 5",
  "DATE = 20310102",
  "TIME =  0309",
  "LATITUDE =   -33.5",
  "LONGITUDE =  151.2",
  "CTDPRS,CTDPRS_FLAG_W,CTDTMP,CTDTMP_FLAG_W,CTDSAL,CTDSAL_FLAG_W,",
  "DBAR,,ITS-90,,PSS-78,,",
  "  0.0,2, 20.10,2, 35.10,2",
  " 10.0,2, 20.00,2, 35.20,2",
  " 20.0,2, 19.00,4, 35.30,2",
  " 30.0,2, -999,9, 35.40,2",
  "100.0,2, 15.00,2, 35.50,2",
  "END_DATA",
  "this is no record",
].join("\n");

const instrument = (rows: string[]) =>
  [
    "* An instrument's data file:",
    "* NMEA Latitude = 02 00.60 S",
    "* NMEA Longitude = 038 30.00 W",
    "* NMEA UTC (Time) = Aug 24 2031  07:55:20",
    "# name 0 = prDM: Pressure, Digiquartz [db]",
    "# name 1 = t090C: Temperature [ITS-90, deg C]",
    "# name 2 = t190C: Temperature, 2 [ITS-90, deg C]",
    "# name 3 = c0S/m: Conductivity [S/m]",
    "# bad_flag = -9.990e-29",
    "*END*",
    ...rows,
  ].join("\n");

describe("casts", () => {
  it("exchange file: position, time, flags and END_DATA are obeyed, depth follows from pressure", () => {
    const cast = read(EXCHANGE);
    expect(cast).toMatchObject({
      format: "castExchange",
      rows: 5,
      time: "2031-01-02T03:09:00Z",
      latitude: -33.5,
      longitude: 151.2,
    });
    expect(cast.channels.temperature).toMatchObject({ count: 3, missing: 2 });
    expect(cast.samples.map(({ pressure }) => pressure)).toEqual([0, 10, 100]);
    // 100 dbar at 33.5°: between 99.2 and 99.3 m (Saunders 1981 gives 99.26 m).
    expect(cast.samples[2].depth).toBeCloseTo(99.26, 1);
    expect(cast.problems.find(({ code }) => code === "flaggedBad")?.row).toBe(12);
    expect(cast.leftOut).toContain("CTDPRS_FLAG_W");
  });

  it("trap: dbar are not metres, and latitude is asked for where the file has none", () => {
    const cast = read("pressure (dbar),temperature (°C),salinity\n0,20,35\n100,15,35\n");
    expect(cast.samples[1].depth).toBeCloseTo(99.2, 0);
    expect(cast.questions.find(({ key }) => key === "latitude")?.needed).toBe(false);
    const pole = read("pressure (dbar),temperature (°C),salinity\n0,20,35\n1000,15,35\n", { latitude: 90 });
    const equator = read("pressure (dbar),temperature (°C),salinity\n0,20,35\n1000,15,35\n", { latitude: 0 });
    expect(equator.samples[1].depth - pole.samples[1].depth).toBeGreaterThan(4);
  });

  it("trap: a file with conductivity alone has its salinity by PSS-78, the second sensor left out, −9.99e-29 missing", () => {
    const cast = read(instrument([" 1.0  15.0  15.0  4.2914", " 2.0  14.9  14.9  4.28", " 3.0  -9.990e-29 14 4.27"]));
    expect(cast.samples).toHaveLength(2);
    expect(cast.samples[0].salinity).toBeCloseTo(35, 2);
    expect(cast.latitude).toBeCloseTo(-2.01, 9);
    expect(cast.longitude).toBeCloseTo(-38.5, 9);
    expect(cast.channels.temperature?.missing).toBe(1);
    expect(cast.leftOut).toEqual(["t190C"]);
  });

  it("trap: way down and way up are parted, the way down is taken, the other can be", () => {
    const down = Array.from({ length: 20 }, (_, k) => ` ${k}.5 ${20 - k / 4} 20 4.5`);
    const up = Array.from({ length: 19 }, (_, k) => ` ${18 - k}.2 ${15 + k / 5} 20 4.5`);
    const both = instrument([...down, ...up]);
    const cast = read(both);
    expect(cast.questions.find(({ key }) => key === "half")?.options).toHaveLength(2);
    expect(cast.samples).toHaveLength(20);
    const upward = read(both, { half: "up" });
    expect(upward.samples[0].pressure).toBe(0.2);
    expect(upward.samples.every(({ depth }, k) => k === 0 || depth > upward.samples[k - 1].depth)).toBe(true);
  });

  it("trap: a soak at the surface and reversals in a swell are passed over", () => {
    const soak = [" 0.8 20 20 4.5", " 1.5 20 20 4.5", " 0.9 20.1 20 4.5", " 0.7 20.1 20 4.5"];
    const lowering = [" 2 20 20 4.5", " 4 19 20 4.5", " 3.5 19.2 20 4.5", " 30 12 20 4.2"];
    const cast = read(instrument([...soak, ...lowering]));
    expect(cast.samples.map(({ pressure }) => pressure)).toEqual([0.7, 2, 4, 30]);
    expect(cast.understood.some(({ what }) => what === "Soak at the surface")).toBe(true);
  });

  it("plain text: remarks, a row of units, feet, Fahrenheit, decimal names in other languages", () => {
    const cast = read(
      "% Start latitude,50.5\nProfundidad,Temperature,Salinidad,Note\nft,deg F,psu,\n0,68,35,a\n100,50,35.2,b\n",
    );
    expect(cast.latitude).toBe(50.5);
    expect(cast.samples[1].depth).toBeCloseTo(30.48, 9);
    expect(cast.samples[1].temperature).toBeCloseTo(10, 9);
    expect(cast.leftOut).toEqual(["Note"]);
  });

  it("says which salinity it took, and takes another answer", () => {
    expect(read("depth (m),temperature (°C),Absolute Salinity (g/kg)\n0,20,35\n5,20,35\n").salinityScale).toBe(
      "absolute",
    );
    const plain = "depth (m),temperature (°C),salinity\n0,20,35\n5,20,35\n";
    expect(read(plain).salinityScale).toBe("practical");
    expect(read(plain, { salinityScale: "absolute" }).salinityScale).toBe("absolute");
    expect(read(plain, { temperatureScale: "IPTS-68" }).samples[0].temperature).toBeCloseTo(20 / 1.00024, 12);
  });

  it("refuses what is no cast, and says what is missing", () => {
    expect(() => read("time,wind\n2031-01-01,5\n")).toThrow(/no line of column names/);
    const salty = read("depth (m),temperature (°C)\n0,20\n5,20\n");
    expect(salty.problems.find(({ code }) => code === "noSalinity")?.severity).toBe("error");
    expect(read("depth (m),temperature (°C),salinity\n0,20,35\n5,warm,35\n").problems[0]).toMatchObject({
      code: "unreadableNumber",
      row: 3,
      column: "temperature",
    });
  });

  it("gives a sound cast or a refusal for files with bytes changed", () => {
    for (const text of [EXCHANGE, instrument([" 1 15 15 4.3", " 2 14 14 4.2", " 9 13 13 4.1"])]) {
      const good = new TextEncoder().encode(text);
      fc.assert(
        fc.property(
          fc.array(fc.tuple(fc.nat(good.length - 1), fc.nat(255)), { minLength: 1, maxLength: 8 }),
          (changes) => {
            const bytes = good.slice();
            for (const [at, byte] of changes) bytes[at] = byte;
            try {
              const { samples } = readCast({ bytes, fileName: "cast.csv" });
              expect(samples.every((sample) => Object.values(sample).every(Number.isFinite))).toBe(true);
            } catch (error) {
              expect(error).toBeInstanceOf(UnreadableFile);
            }
          },
        ),
        { seed: 8, numRuns: 200 },
      );
    }
  });
});
