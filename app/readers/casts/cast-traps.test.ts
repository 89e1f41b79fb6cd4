import { describe, expect, it } from "vitest";
import type { CastAnswers, CastReading } from "./cast-reading";
import { readCast } from "./read-cast";

const read = (text: string, answers?: CastAnswers) =>
  readCast({ bytes: new TextEncoder().encode(text), fileName: "cast.csv", ...(answers && { answers }) });
const question = ({ questions }: CastReading, key: CastReading["questions"][number]["key"]) =>
  questions.find((one) => one.key === key);
const said = ({ understood }: CastReading, what: string) => understood.find((one) => one.what === what);
const codes = ({ problems }: CastReading) => problems.map(({ code }) => code);

const instrument = (names: string[], rows: string[], header: string[] = []) =>
  [
    "* An instrument's data file:",
    ...header,
    ...names.map((name, k) => `# name ${k} = ${name}`),
    "# bad_flag = -9.990e-29",
    "*END*",
    ...rows,
  ].join("\n");

const exchange = (station: string, rows: string[]) =>
  [
    "CTD,20310101INVENTED",
    `STNNBR = ${station}`,
    "CASTNO = 1",
    "CTDPRS,CTDTMP,CTDTMP_FLAG_W,CTDSAL",
    "DBAR,ITS-90,,PSS-78",
    ...rows,
    "END_DATA",
  ].join("\n");

describe("traps of casts", () => {
  it("a temperature on the scale of 1968 is turned, and said so; one that states nothing is asked about", () => {
    const old = read(
      instrument(
        ["prDM: Pressure [db]", "t068C: Temperature [IPTS-68, deg C]", "sal00: Salinity [PSU]"],
        ["1 20 35", "5 18 35"],
      ),
    );
    // t90 = t68 / 1.00024: 20 °C of 1968 are 19.9952 °C of 1990.
    expect(old.samples[0].temperature).toBeCloseTo(19.9952, 4);
    expect(said(old, "Temperature scale")).toMatchObject({ confidence: "stated in the file" });
    const silent = read("depth (m),temperature (°C),salinity\n0,20,35\n5,18,35\n");
    expect(said(silent, "Temperature scale")).toEqual({
      what: "Temperature scale",
      taken: "ITS-90",
      confidence: "assumed",
    });
    expect(question(silent, "temperatureScale")).toMatchObject({ needed: false, suggestion: "ITS-90" });
  });

  it.each([
    ["45.03", "mS/cm"],
    ["45030", "µS/cm"],
    ["4.503", "S/m"],
  ])(
    "a conductivity of %s without a unit is taken for %s and asked about, since the salt depends on it",
    (written, unit) => {
      const cast = read(`pressure (dbar),temperature (°C),conductivity\n0,16.4,${written}\n5,16.4,${written}\n`);
      expect(question(cast, "unit-conductivity")).toMatchObject({ needed: true, suggestion: unit });
      // 4.503 S/m at 16.4 °C is water of about 35.6.
      expect(cast.samples[0].salinity).toBeCloseTo(35.6, 0);
      const answered = read(`pressure (dbar),temperature (°C),conductivity\n0,16.4,${written}\n5,16.4,${written}\n`, {
        units: { conductivity: unit },
      });
      expect(question(answered, "unit-conductivity")).toMatchObject({ needed: false, answer: unit });
    },
  );

  it("temperatures of a sea in Fahrenheit or Kelvin are known by their size where no unit stands", () => {
    const warm = (t: number) => read(`depth (m),temperature,salinity\n0,${t},35\n5,${t},35\n`);
    expect(warm(68).samples[0].temperature).toBeCloseTo(20, 9);
    expect(warm(293.15).samples[0].temperature).toBeCloseTo(20, 9);
    expect(question(warm(68), "unit-temperature")).toMatchObject({ suggestion: "°F" });
    const feet = read("depth,temperature (°C),salinity\n0,20,35\n100,18,35\n", { units: { depth: "ft" } });
    expect(feet.samples[1].depth).toBeCloseTo(30.48, 9);
  });

  it("a table without names is read by its values, and every column is asked for", () => {
    const bare = "0 20.1 35.2\n5 20.0 35.2\n10 19.0 35.3\n20 15.0 35.4\n30 12.0 35.5\n";
    const cast = read(bare);
    expect(cast.samples.map(({ depth, temperature, salinity }) => [depth, temperature, salinity])[3]).toEqual([
      20, 15, 35.4,
    ]);
    expect(cast.questions.filter(({ needed }) => needed).map(({ key }) => key)).toEqual([
      "column-depth",
      "column-temperature",
      "column-salinity",
    ]);
    const turned = read(bare, { columns: { depth: 0, temperature: 2, salinity: 1 } });
    expect(turned.samples[0]).toMatchObject({ temperature: 35.2, salinity: 20.1 });
    expect(turned.questions.some(({ needed }) => needed)).toBe(false);
  });

  it("a column that no name tells is asked for, with the columns to choose from", () => {
    const cast = read("depth (m),temperature (°C),Saltiness of old\n0,20,x\n5,18,y\n");
    expect(codes(cast)).toContain("noSalinity");
    expect(question(cast, "column-salinity")?.options?.map(({ label }) => label)).toEqual([
      "depth, as 0",
      "temperature, as 20",
      "Saltiness of old, as x",
    ]);
  });

  it("of two sensors the first is taken, the other can be", () => {
    const text = "depth (m),Temp1 (°C),Temp2 (°C),salinity\n0,20,21,35\n5,18,19,35\n";
    const cast = read(text);
    expect(cast.samples[0].temperature).toBe(20);
    expect(question(cast, "column-temperature")?.needed).toBe(false);
    expect(cast.leftOut).toEqual(["Temp2"]);
    expect(read(text, { columns: { temperature: 2 } }).samples[0].temperature).toBe(21);
  });

  it("several casts in one file: one is asked for, by its station", () => {
    const table =
      "Station;depth (m);temperature (°C);salinity\nA1;0;20,5;35,1\nA1;10;19,5;35,1\nB2;0;18,5;34,1\nB2;20;17,5;34,2\n";
    const first = read(table);
    expect(first.rows).toBe(2);
    expect(question(first, "cast")).toMatchObject({ needed: true, suggestion: "Station A1" });
    const other = read(table, { cast: "Station B2" });
    expect(other.samples.map(({ temperature }) => temperature)).toEqual([18.5, 17.5]);
    expect(question(other, "cast")?.needed).toBe(false);
    const joined = [exchange("7", ["0,20,2,35", "9,19,2,35"]), exchange("8", ["0,15,2,34", "9,14,2,34"])].join("\n");
    expect(question(read(joined), "cast")?.options).toHaveLength(2);
    expect(read(joined, { cast: "station 8, cast 1" }).samples[0].temperature).toBe(15);
  });

  it("depths written negative downwards are turned", () => {
    const cast = read("z (m),temperature (°C),salinity\n0,20,35\n-5,19,35\n-10,18,35\n");
    expect(cast.samples.map(({ depth }) => depth)).toEqual([0, 5, 10]);
    expect(said(cast, "Depth")?.taken).toContain("turned");
  });

  it("a file that begins at the bottom has the way up alone, which is taken", () => {
    const rows = Array.from({ length: 12 }, (_, k) => `${60 - 5 * k},${12 + k / 2},35`);
    const cast = read(["depth (m),temperature (°C),salinity", ...rows].join("\n"));
    expect([cast.half, cast.samples.length, cast.samples[0].depth]).toEqual(["up", 12, 5]);
  });

  it("records in the air, where the cell reads next to nothing, are left out and counted", () => {
    const rows = ["0 20 20 0.001", "0.2 20 20 0.002", "1 20 20 4.7", "3 20 20 4.7", "30 15 15 4.3"];
    const names = [
      "prDM: Pressure [db]",
      "t090C: Temperature [ITS-90, deg C]",
      "t190C: Temperature, 2 [ITS-90, deg C]",
      "c0S/m: Conductivity [S/m]",
    ];
    const cast = read(instrument(names, rows));
    expect(cast.samples.map(({ pressure }) => pressure)).toEqual([1, 3, 30]);
    expect(said(cast, "In the air")?.taken).toMatch(/^2 records/);
  });

  it("values that no sea has, codes for missing among them, are left out with a warning, by line", () => {
    const cast = read("depth (m),temperature (°C),salinity\n0,20,35\n5,99.99,35\n10,18,350\n15,-999.9,35\n20,17,35\n");
    expect(cast.samples.map(({ depth }) => depth)).toEqual([0, 20]);
    expect(
      cast.problems.filter(({ code }) => code === "beyondSea").map(({ row, severity }) => [row, severity]),
    ).toEqual([
      [3, "warning"],
      [4, "warning"],
    ]);
  });

  it("a record that the instrument marks as bad is left out, one flagged doubtful is kept and told of", () => {
    const names = [
      "depSM: Depth [salt water, m]",
      "t090C: Temperature [ITS-90, deg C]",
      "sal00: Salinity [PSU]",
      "flag: flag",
    ];
    const marked = read(instrument(names, ["1 20 35 0.0e+00", "2 19 35 -9.990e-29", "5 18 35 0.0e+00"]));
    expect(marked.samples.map(({ depth }) => depth)).toEqual([1, 5]);
    const doubtful = read(exchange("1", ["0,20,2,35", "5,19,3,35", "9,18,4,35"]));
    expect(doubtful.samples).toHaveLength(2);
    expect(codes(doubtful)).toEqual(expect.arrayContaining(["flaggedBad", "flaggedDoubtful"]));
  });

  it("a time by the computer's clock is not one that the file states", () => {
    const names = ["depSM: Depth [salt water, m]", "t090C: Temperature [ITS-90, deg C]", "sal00: Salinity [PSU]"];
    const clock = instrument(
      names,
      ["1 20 35", "5 18 35"],
      ["# start_time = Aug 24 2031 07:55:20 [System UpLoad Time]"],
    );
    expect(read(clock).time).toBe("2031-08-24T07:55:20Z");
    expect(said(read(clock), "Clock")?.confidence).toBe("assumed");
  });

  it("the kind of salinity is taken from name or unit where they say it", () => {
    const kind = (head: string) => read(`depth (m),temperature (°C),${head}\n0,20,35\n5,20,35\n`);
    expect(kind("SA (g/kg)").salinityScale).toBe("absolute");
    expect(said(kind("salinity (PSU)"), "Kind of salinity")?.confidence).toBe("stated in the file");
    expect(said(kind("salinity"), "Kind of salinity")?.confidence).toBe("assumed");
  });

  it("derived columns are not taken for what they are derived from", () => {
    const cast = read(
      "depth (m),potential temperature (°C),temperature (°C),specific conductance (µS/cm),conductivity (µS/cm)\n0,19,20,50000,47000\n5,18,19,50000,46000\n",
    );
    expect(cast.samples[0].temperature).toBe(20);
    expect(cast.leftOut).toEqual(["potential temperature", "specific conductance"]);
  });

  it("a cast at full rate is averaged in narrow bins, said so, and does not choke", () => {
    const rows = Array.from(
      { length: 150_000 },
      (_, k) => `${(k / 300).toFixed(3)},${(20 - k / 15_000).toFixed(4)},35`,
    );
    const cast = read(["depth (m),temperature (°C),salinity", ...rows].join("\n"));
    expect(cast.samples.length).toBeLessThanOrEqual(5000);
    expect(said(cast, "Levels")?.taken).toMatch(/averaged in bins of 0\.1 m/);
    expect(cast.samples.every(({ depth }, k) => k === 0 || depth > cast.samples[k - 1].depth)).toBe(true);
    // The profile is a straight line, which bins of any width keep.
    const { depth, temperature } = cast.samples[2500];
    expect(temperature).toBeCloseTo(20 - depth / 50, 3);
  });
});
