import { describe, expect, it } from "vitest";
import { readSeries } from "./read-series";
import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "./reading";

/** One test a trap that files set for their readers; the numbers are those of the project's catalogue of traps. */

const utf8 = (text: string): Uint8Array => new TextEncoder().encode(text);
const read = (text: string, answers: ReadingAnswers = {}): SeriesReading =>
  readSeries({ bytes: utf8(text), fileName: "station.csv", answers });
const codes = (reading: SeriesReading): string[] => reading.problems.map(({ code }) => code);
const isSettled = ({ problems, questions }: SeriesReading): boolean =>
  !problems.some(({ severity }) => severity === "error") && !questions.some(({ needed }) => needed);
const values = (reading: SeriesReading, channel: keyof SeriesReading["channels"]): number[] => [
  ...(reading.channels[channel]?.values ?? []),
];
const isoOf = (reading: SeriesReading): string[] =>
  [...reading.time].map((seconds) => new Date(seconds * 1000).toISOString().slice(0, 19));
const hourly = (header: string, cells: string[], start = 0): string =>
  [
    header,
    ...cells.map(
      (cell, hour) =>
        `2024-03-0${1 + Math.floor((hour + start) / 24)}T${String((hour + start) % 24).padStart(2, "0")}:00Z,${cell}`,
    ),
  ].join("\n");

describe("wind", () => {
  it("trap 1: direction towards is turned about, and the header decides", () => {
    const towards = read(hourly("time,wind speed (m/s),wind to direction (deg)", ["10,90", "10,270"]));
    expect(values(towards, "windFrom")).toEqual([270, 90]);
    expect(towards.columns[2]?.role).toBe("windTowards");
    const from = read(hourly("time,wind speed (m/s),wind from direction (deg)", ["10,90", "10,270"]));
    expect(values(from, "windFrom")).toEqual([90, 270]);
    const unsaid = hourly("time,wind speed (m/s),wind direction (deg)", ["10,90"]);
    expect(values(read(unsaid), "windFrom")).toEqual([90]);
    expect(values(read(unsaid, { directionSense: "towards" }), "windFrom")).toEqual([270]);
  });

  it("trap 1: components give speed and direction from: u = +10, v = 0 blows from 270°", () => {
    const reading = read(hourly("time,u10 (m/s),v10 (m/s)", ["10,0", "0,-10", "0,0"]));
    expect(values(reading, "windSpeed")).toEqual([10, 10, 0]);
    expect(values(reading, "windFrom")).toEqual([270, 0, NaN]);
    expect(reading.windHeight).toBe(10);
  });

  it("trap 2: directions from magnetic north are not passed off as true", () => {
    const magnetic = read(hourly("time,wind speed (m/s),wind direction magnetic (deg)", ["10,90"]));
    expect(codes(magnetic)).toContain("magneticDirection");
    expect(values(magnetic, "windFrom")).toEqual([90]);
    expect(codes(read(hourly("time,wind speed (m/s),wind direction true (deg)", ["10,90"])))).not.toContain(
      "magneticDirection",
    );
  });

  it("trap 3: compass words, with O told from its column, and tens of degrees", () => {
    const spanish = read(hourly("time,velocidad viento (m/s),dirección viento", ["5,NO", "5,E", "5,SSO"]));
    expect(values(spanish, "windFrom")).toEqual([315, 90, 202.5]);
    const german = read(hourly("time,Windgeschwindigkeit (m/s),Windrichtung", ["5,NO", "5,W", "5,SSO"]));
    expect(values(german, "windFrom")).toEqual([45, 270, 157.5]);
    const tens = read(hourly("time,wind speed (m/s),wind direction (tens of degrees)", ["5,27", "5,36"]));
    expect(values(tens, "windFrom")).toEqual([270, 0]);
  });

  it.each([
    ["kn", 5.144444],
    ["kt", 5.144444],
    ["mph", 4.4704],
    ["km/h", 2.777778],
    ["ft/s", 3.048],
    ["m s-1", 10],
    ["m·s⁻¹", 10],
  ])("trap 4: 10 %s is %f m/s", (unit, expected) => {
    expect(values(read(hourly(`time,wind speed (${unit})`, ["10"])), "windSpeed")[0]).toBeCloseTo(expected, 6);
  });

  it("trap 4: a wind without a unit is asked about, and the answer settles it", () => {
    const text = hourly("time,wind speed,wind direction", ["10,90", "12,90"]);
    const question = read(text).questions.find(({ key }) => key === "columns");
    expect(question).toMatchObject({ column: 1, needed: true, suggestion: "m/s" });
    const answered = read(text, { columns: { "1": { role: "windSpeed", unit: "kn" } } });
    expect(values(answered, "windSpeed")[0]).toBeCloseTo(5.144444, 6);
    expect(answered.questions.find(({ key }) => key === "columns")).toMatchObject({ needed: false, answer: "kn" });
  });

  it("trap 4: a unit that is stated but not known is never guessed past", () => {
    const reading = read(hourly("time,global radiation (furlongs)", ["3", "4"]));
    expect(codes(reading)).toContain("unknownUnit");
    expect(reading.questions).toContainEqual(expect.objectContaining({ key: "columns", column: 1, needed: true }));
  });

  it("trap 5: a gust is never taken for the mean", () => {
    const both = read(hourly("time,wind gust (m/s),wind speed (m/s)", ["14,10"]));
    expect(values(both, "windSpeed")).toEqual([10]);
    expect(values(both, "windGust")).toEqual([14]);
    const alone = read(hourly("time,wind gust (m/s)", ["14"]));
    expect(alone.channels.windSpeed).toBeUndefined();
    expect(alone.problems.find(({ code }) => code === "noWindColumn")?.message).toContain("gust cannot stand in");
  });

  it("trap 6: the averaging period is taken from the header, else asked", () => {
    expect(read(hourly("time,10-min mean wind speed (m/s)", ["10"])).averagingMinutes).toBe(10);
    const unsaid = read(hourly("time,wind speed (m/s)", ["10"]));
    expect(unsaid.averagingMinutes).toBeNull();
    expect(unsaid.questions.some(({ key }) => key === "averagingMinutes")).toBe(true);
  });

  it("trap 7: the height is taken from the header, else must be answered; of several the one nearest 10 m is used", () => {
    const reading = read(hourly("time,WS_12m (m/s),WS_60m (m/s),WD_58m (deg),WD_11m (deg)", ["7,9,100,110"]));
    expect(reading.windHeight).toBe(12);
    expect(values(reading, "windSpeed")).toEqual([7]);
    expect(values(reading, "windFrom")).toEqual([110]);
    expect(reading.columns.filter(({ role }) => role === "leftOut").map(({ name }) => name)).toEqual([
      "WS_60m",
      "WD_58m",
    ]);
    const unsaid = hourly("time,wind speed (m/s)", ["10"]);
    expect(read(unsaid).questions).toContainEqual(
      expect.objectContaining({ key: "windHeight", needed: true, suggestion: "10" }),
    );
    expect(read(unsaid, { windHeight: 4 })).toMatchObject({ windHeight: 4 });
  });

  it("trap 8: the mean of 350° and 10° is 0°, not 180°", () => {
    const from =
      read(hourly("time,wind speed (m/s),wind direction (deg)", ["10,350", "10,10"])).windVectorMean?.from ?? NaN;
    expect(Math.min(from, 360 - from)).toBeCloseTo(0, 9);
  });

  it("trap 9: 0 with speed 0 is a calm without direction; 360 is north", () => {
    const reading = read(hourly("time,wind speed (m/s),wind direction (deg)", ["0,0", "5,360", "5,0"]));
    expect(values(reading, "windSpeed")).toEqual([0, 5, 5]);
    expect(values(reading, "windFrom")).toEqual([NaN, 0, 0]);
  });

  it("trap 10: variable or blank direction with a wind keeps the speed", () => {
    const reading = read(hourly("time,wind speed (m/s),wind direction (deg)", ["2,VRB", "3,", "5,90"]));
    expect(values(reading, "windSpeed")).toEqual([2, 3, 5]);
    expect(values(reading, "windFrom")).toEqual([NaN, NaN, 90]);
    expect(codes(reading)).toEqual([]);
  });

  it("trap 12: a stress is not taken for a wind", () => {
    const reading = read(hourly("time,wind stress x (N/m2),rain (mm)", ["0.1,2", "0.2,3"]));
    expect(reading.columns[1]?.role).toBe("leftOut");
    expect(reading.channels.windSpeed).toBeUndefined();
  });
});

describe("time", () => {
  const naive = "time,wind speed (m/s)\n2024-07-01 00:00,5\n2024-07-01 01:00,6\n";

  it("trap 13: an unstated zone is a question that must be answered", () => {
    const reading = read(naive, { windHeight: 10 });
    expect(reading.questions).toContainEqual(expect.objectContaining({ key: "zone", needed: true, suggestion: "UTC" }));
    expect(isSettled(reading)).toBe(false);
    const answered = read(naive, { windHeight: 10, zone: "Europe/Lisbon" });
    expect(answered.first).toBe("2024-06-30T23:00:00Z");
    expect(isSettled(answered)).toBe(true);
  });

  it("trap 13: the zone is taken from the header or the stamps where they state it", () => {
    expect(read(naive.replace("time", "time (UTC)"))).toMatchObject({ zone: "UTC", first: "2024-07-01T00:00:00Z" });
    expect(read(naive.replace("time", "Timestamp UTC+02:00")).first).toBe("2024-06-30T22:00:00Z");
    expect(read(naive.replaceAll(":00,", ":00+05:30,")).first).toBe("2024-06-30T18:30:00Z");
  });

  const autumn = (clocks: string[]): string =>
    ["time,wind speed (m/s)", ...clocks.map((clock, index) => `2024-11-03 ${clock},${index}`)].join("\n");

  it("trap 14: a repeated hour without its twin is refused, not guessed", () => {
    const reading = read(autumn(["00:30", "01:30", "02:30"]), { zone: "America/New_York", windHeight: 10 });
    expect(reading.problems).toContainEqual(
      expect.objectContaining({ severity: "error", code: "repeatedHour", row: 3 }),
    );
    expect(reading.time.length).toBe(2);
    expect(isSettled(reading)).toBe(false);
  });

  it("trap 14: both passes of the repeated hour are told apart by their order, and it is said (05:30 and 06:30 UTC)", () => {
    const reading = read(autumn(["00:30", "01:30", "01:30", "02:30"]), { zone: "America/New_York" });
    expect(isoOf(reading)).toEqual([
      "2024-11-03T04:30:00",
      "2024-11-03T05:30:00",
      "2024-11-03T06:30:00",
      "2024-11-03T07:30:00",
    ]);
    expect(reading.problems).toContainEqual(
      expect.objectContaining({ severity: "warning", code: "repeatedHour", count: 2 }),
    );
  });

  it("trap 14: an hour that the clock skipped is an error with its line", () => {
    const reading = read("time,wind speed (m/s)\n2024-03-10 01:30,5\n2024-03-10 02:30,6\n2024-03-10 03:30,6\n", {
      zone: "America/New_York",
    });
    expect(reading.problems).toContainEqual(
      expect.objectContaining({ severity: "error", code: "missingHour", row: 3 }),
    );
  });

  it("trap 15: EST is an abbreviation, so the person is asked", () => {
    const question = read(naive.replace("time", "time (EST)")).questions.find(({ key }) => key === "zone");
    expect(question).toMatchObject({ needed: true, suggestion: "-05:00" });
  });

  it.each([
    ["Asia/Kathmandu", "2024-06-30T18:15:00Z"],
    ["Asia/Kolkata", "2024-06-30T18:30:00Z"],
    ["Etc/GMT+5", "2024-07-01T05:00:00Z"],
    ["-03:30", "2024-07-01T03:30:00Z"],
  ])("trap 16: %s", (zone, first) => {
    expect(read(naive, { zone }).first).toBe(first);
  });

  it("trap 16: a zone that does not exist is an error", () => {
    expect(read(naive, { zone: "Mars/Olympus" }).problems).toContainEqual(
      expect.objectContaining({ severity: "error", code: "unknownZone" }),
    );
  });

  it("trap 17: amounts are said to cover the interval up to the stamp; the stamps stay", () => {
    const reading = read(hourly("time,rain (mm)", ["1", "2"]));
    expect(reading.first).toBe("2024-03-01T00:00:00Z");
    expect(reading.understood.some(({ taken }) => taken.includes("3600 s up to each stamp"))).toBe(true);
  });

  it("trap 18: 24:00 is the next day's midnight", () => {
    const reading = read("date,time (UTC),wind speed (m/s)\n2024-02-29,23:00,5\n2024-02-29,24:00,6\n");
    expect(reading.last).toBe("2024-03-01T00:00:00Z");
  });

  it("trap 18: two-digit years", () => {
    expect(read("date (UTC),wind speed (m/s)\n31/12/98 23:00,5\n").first).toBe("1998-12-31T23:00:00Z");
    expect(read("date (UTC),wind speed (m/s)\n31/12/24 23:00,5\n").first).toBe("2024-12-31T23:00:00Z");
  });

  it("trap 18: day and month are told apart by a number above 12, else asked with the shorter span suggested", () => {
    expect(read("date (UTC),wind speed (m/s)\n03/25/2024 00:00,5\n03/26/2024 00:00,5\n").first).toBe(
      "2024-03-25T00:00:00Z",
    );
    const text = "date (UTC),wind speed (m/s)\n09/01/2016 23:00,5\n10/01/2016 00:00,5\n";
    const unsure = read(text);
    expect(unsure.questions).toContainEqual(
      expect.objectContaining({ key: "dateOrder", needed: true, suggestion: "dmy" }),
    );
    expect(read(text, { dateOrder: "mdy" }).first).toBe("2016-09-01T23:00:00Z");
  });

  it("trap 18: spreadsheet day numbers, 1900 and 1904 systems 1462 days apart, seconds not lost to rounding", () => {
    const text = "time (UTC),wind speed (m/s)\n45352.0416666667,5\n45352.0833333333,6\n";
    const from1900 = read(text);
    expect(from1900.first).toBe("2024-03-01T01:00:00Z");
    const from1904 = read(text, { serialEpoch: "1904" });
    expect(((from1904.time[0] ?? 0) - (from1900.time[0] ?? 0)) / 86400).toBe(1462);
  });

  it("trap 18: seconds since 1970", () => {
    expect(read("epoch,wind speed (m/s)\n1709254800,5\n1709258400,6\n")).toMatchObject({
      first: "2024-03-01T01:00:00Z",
      zone: "UTC",
    });
  });

  it("trap 19: descending files are turned about and said so", () => {
    const reading = read("time (UTC),wind speed (m/s)\n2024-03-01 02:00,7\n2024-03-01 01:00,6\n2024-03-01 00:00,5\n");
    expect(reading.order).toBe("descending");
    expect(values(reading, "windSpeed")).toEqual([5, 6, 7]);
    expect(reading.steps.some(({ id }) => id === "reversed")).toBe(true);
  });

  it("trap 19: identical duplicates collapse, differing ones keep the first, both are counted; statistics keep all rows", () => {
    const reading = read(
      "time (UTC),wind speed (m/s)\n2024-03-01 00:00,5\n2024-03-01 00:00,5\n2024-03-01 01:00,6\n2024-03-01 01:00,8\n",
    );
    expect(reading).toMatchObject({ rows: 4, duplicates: 2 });
    expect(values(reading, "windSpeed")).toEqual([5, 6]);
    expect(reading.channels.windSpeed).toMatchObject({ count: 4, mean: 6 });
    expect(reading.problems).toContainEqual(
      expect.objectContaining({ code: "conflictingTime", severity: "warning", row: 5 }),
    );
    expect(reading.dropped).toEqual([
      { reason: "the same stamp and values as an earlier line", count: 1, firstRow: 3 },
      { reason: "the same stamp as an earlier line, other values", count: 1, firstRow: 5 },
    ]);
  });

  it("trap 19: times that go backwards are reported and sorted", () => {
    const reading = read("time (UTC),wind speed (m/s)\n2024-03-01 00:00,5\n2024-03-01 02:00,7\n2024-03-01 01:00,6\n");
    expect(reading.order).toBe("unsorted");
    expect(values(reading, "windSpeed")).toEqual([5, 6, 7]);
    expect(reading.problems).toContainEqual(expect.objectContaining({ code: "unsortedTime", row: 4 }));
  });

  it("trap 20: the step is the median, not the first step; gaps are reported", () => {
    const reading = read(
      [
        "time (UTC),rain (mm)",
        "2024-03-01 00:00,1",
        "2024-03-01 06:00,1",
        "2024-03-01 07:00,1",
        "2024-03-01 08:00,1",
      ].join("\n"),
    );
    expect(reading.medianStepSeconds).toBe(3600);
    expect(reading.problems).toContainEqual(expect.objectContaining({ code: "timeGap", row: 2 }));
  });
});

describe("rain and heat", () => {
  it("trap 22: amounts per interval become rates, and the total stays the sum of the amounts", () => {
    const text = [
      "time (UTC),rain (mm)",
      ...["00:00,0.1", "00:10,0.2", "00:20,0.3"].map((cell) => `2024-03-01 ${cell}`),
    ].join("\n");
    const reading = read(text);
    expect(values(reading, "rain")[2]).toBeCloseTo(1.8, 12);
    expect(reading.channels.rain?.total).toBe(0.6);
    expect(values(read(text.replace("(mm)", "(mm/h)")), "rain")).toEqual([0.1, 0.2, 0.3]);
    expect(values(read(text.replace("(mm)", "(kg m-2 s-1)")), "rain")[0]).toBeCloseTo(360, 9);
    expect(read(text.replace("(mm)", "(in)")).channels.rain?.total).toBeCloseTo(15.24, 9);
  });

  it("trap 23: a counter's increments: 12.0, 12.4, 0.2, 0.6 mm give 0.4, 0, 0.4", () => {
    const reading = read(hourly("time,rain (mm)", ["12.0", "12.4", "0.2", "0.6"]), {
      columns: { "1": { role: "rain", unit: "mm counter" } },
    });
    const [first, ...rest] = values(reading, "rain");
    expect(first).toBeNaN();
    expect(rest.map((value) => Number(value.toFixed(9)))).toEqual([0.4, 0, 0.4]);
    expect(reading.problems).toContainEqual(expect.objectContaining({ code: "counterReset", row: 4 }));
  });

  it("trap 23: a running total is recognised and asked about", () => {
    const cells = Array.from({ length: 40 }, (_, hour) => `${(12 + Math.floor(hour / 4) * 0.4).toFixed(1)}`);
    const question = read(hourly("time,rain (mm)", cells)).questions.find(({ key }) => key === "columns");
    expect(question).toMatchObject({ needed: true, suggestion: "mm counter" });
  });

  it("trap 23: negative rain is an error with its line", () => {
    const reading = read(hourly("time,rain (mm)", ["1", "-0.4", "2"]));
    expect(reading.problems).toContainEqual(
      expect.objectContaining({ severity: "error", code: "negativeRain", row: 3, column: "rain" }),
    );
  });

  it("trap 24: a day's total repeated in every hour is pointed out, hours of equal drizzle within a day are not", () => {
    const totals = [0, 12.4, 3, 8.6, 0];
    const cells = Array.from({ length: 97 }, (_, hour) => `${totals[Math.ceil(hour / 24)]}`);
    expect(codes(read(hourly("time,rain (mm)", cells)))).toContain("dailyTotalRepeated");
    const drizzle = cells.map((_, hour) => (hour % 24 < 12 ? "0.2" : "0"));
    expect(codes(read(hourly("time,rain (mm)", drizzle)))).not.toContain("dailyTotalRepeated");
  });

  it("trap 25: whole tips of a bucket at short intervals are told, sums to a tenth are not", () => {
    const five = (amounts: number[]) =>
      [
        "time (UTC),rain (mm)",
        ...amounts.map((amount, k) => `2024-03-01T${new Date(k * 300_000).toISOString().slice(11, 16)}Z,${amount}`),
      ].join("\n");
    const tips: number[] = Array.from({ length: 60 }, (_, k) => (k % 7 === 0 ? 0.4 : k % 3 === 0 ? 0.2 : 0));
    const reading = read(five(tips));
    const [note] = reading.problems.filter(({ code }) => code === "tipResolution");
    expect(note.message).toContain("whole tips of 0.2 mm, so that one tip is a rate of 2.4 mm/h");
    expect(reading.channels.rain?.total).toBeCloseTo(
      tips.reduce((sum, amount) => sum + amount, 0),
      9,
    );
    const weighed = Array.from({ length: 60 }, (_, k) => Number((0.1 + (k % 9) / 10).toFixed(1)));
    expect(codes(read(five(weighed)))).not.toContain("tipResolution");
  });

  it("trap 27: one amount a day is told to end at its stamp, and the gauge's own day is asked to be checked", () => {
    const daily = ["time (UTC),rain (mm)", "2024-03-01,4", "2024-03-02,0", "2024-03-03,7"].join("\n");
    const reading = read(daily);
    expect(codes(reading)).toContain("rainDay");
    expect(reading.channels.rain?.total).toBe(11);
  });

  it("trap 28: snow is not rain, and rain in strong wind is a lower bound", () => {
    const snow = read(hourly("time,wind speed (m/s),snowfall (mm),rain (mm)", ["12,5,1", "14,3,2"]));
    expect(snow.columns[2]).toMatchObject({ role: "leftOut", note: expect.stringContaining("snow is not rain") });
    expect(codes(snow)).toContain("undercatch");
    expect(codes(read(hourly("time,wind speed (m/s),rain (mm)", ["4,1", "5,2"])))).not.toContain("undercatch");
  });

  it("trap 26: T is a trace of rain: 0, counted", () => {
    const reading = read(hourly("time,rain (in)", ["T", "0.01", "T"]));
    expect(values(reading, "rain")[0]).toBe(0);
    expect(reading.steps).toContainEqual(expect.objectContaining({ id: "trace", count: 2 }));
  });

  it("trap 29: 3.6 MJ/m² over an hour is 1000 W/m²", () => {
    expect(values(read(hourly("time,solar radiation (MJ/m2)", ["3.6", "1.8"])), "shortwave")).toEqual([1000, 500]);
    expect(values(read(hourly("time,solar radiation (kJ/m²)", ["3600", "0"])), "shortwave")).toEqual([1000, 0]);
    expect(values(read(hourly("time,solar radiation (J/m**2)", ["3600000", "0"])), "shortwave")).toEqual([1000, 0]);
  });

  it("trap 30: a flux counted upward is turned; where nothing says, the person is asked", () => {
    expect(values(read(hourly("time,upward latent heat (W/m2)", ["100"])), "latent")).toEqual([-100]);
    const unsaid = read(hourly("time,net heat flux (W/m2)", ["100"]));
    expect(unsaid.questions).toContainEqual(
      expect.objectContaining({ key: "columns", needed: true, suggestion: "W/m²" }),
    );
  });

  it("trap 31: radiation that comes in is not passed off as what the sea takes", () => {
    expect(codes(read(hourly("time,global radiation (W/m2)", ["300"])))).toContain("incomingShortwave");
    expect(codes(read(hourly("time,net shortwave (W/m2)", ["300"])))).not.toContain("incomingShortwave");
  });

  it("trap 33: langley, kWh/m² and MJ/m²/day", () => {
    const flux = (unit: string, value: string) =>
      values(read(hourly(`time,solar radiation (${unit})`, [value, value])), "shortwave")[0];
    // NIST SP 811: 1 langley = 41 840 J/m²; the others by the SI.
    expect(flux("Ly", "1")).toBeCloseTo(41_840 / 3600, 9);
    expect(flux("kWh/m2", "1")).toBeCloseTo(1000, 9);
    expect(flux("MJ/m2/day", "8.64")).toBeCloseTo(100, 9);
  });

  it("trap 32: °F and K by unit, and by their values where no unit is given", () => {
    expect(values(read(hourly("time,air temperature (°F)", ["50", "32"])), "airTemperature")).toEqual([10, 0]);
    expect(values(read(hourly("time,sst (K)", ["300.15"])), "seaTemperature")[0]).toBeCloseTo(27, 9);
    expect(values(read(hourly("time,sst", ["300.15"])), "seaTemperature")[0]).toBeCloseTo(27, 9);
  });
});

describe("numbers and text", () => {
  it("trap 34: nines are missing only where the column could not hold them: 99 is a direction, 999 is not", () => {
    const reading = read(
      hourly("time,wind speed (m/s),wind direction (deg),air temperature (°C)", [
        "5,99,-9",
        "6,999,-999",
        "999,120,-99.9",
      ]),
    );
    expect(values(reading, "windFrom")).toEqual([99, NaN, 120]);
    expect(values(reading, "windSpeed")).toEqual([5, 6, NaN]);
    expect(values(reading, "airTemperature")).toEqual([-9, NaN, NaN]);
  });

  it("trap 34: 99 alone far above all winds is taken for a code, said, and can be kept by an answer", () => {
    const text = hourly("time,wind speed (m/s)", ["5", "99", "12"]);
    const reading = read(text);
    expect(values(reading, "windSpeed")).toEqual([5, NaN, 12]);
    expect(reading.problems).toContainEqual(expect.objectContaining({ code: "doubtfulCode", row: 3 }));
    expect(values(read(text, { missingCodes: { "1": [] } }), "windSpeed")).toEqual([5, 99, 12]);
  });

  it("trap 34: 99 kt among winds of 80 kt is a wind", () => {
    expect(values(read(hourly("time,wind speed (kt)", ["80", "99", "85"])), "windSpeed")[1]).toBeCloseTo(50.93, 2);
  });

  it("trap 34: buoy text: 99.0 is missing in WSPD, 99 is a direction in WDIR", () => {
    const reading = read(
      "#YY  MM DD hh mm WDIR WSPD GST\n#yr  mo dy hr mn degT m/s  m/s\n2024 03 01 00 50  99 99.0 5.0\n2024 03 01 01 50 999  4.0 99.0\n",
    );
    expect(reading.format).toBe("buoyText");
    expect(values(reading, "windFrom")).toEqual([99, NaN]);
    expect(values(reading, "windSpeed")).toEqual([NaN, 4]);
    expect(values(reading, "windGust")).toEqual([5, NaN]);
  });

  it("trap 34: words for missing", () => {
    const cells = ["NaN", "M", "MM", "///", "#N/A", "", "-", "null", "7"];
    expect(read(hourly("time,wind speed (m/s)", cells)).channels.windSpeed).toMatchObject({ count: 1, missing: 8 });
  });

  const rows =
    "time (UTC);wind speed (m/s);air temperature (°C)\n2024-03-01 00:00;5,5;,8\n2024-03-01 01:00;6,5;\u22121,2\n";
  const taken = [
    [5.5, 6.5],
    [0.8, -1.2],
  ];
  const both = (bytes: Uint8Array): number[][] => {
    const reading = readSeries({ bytes, fileName: "x.csv" });
    return [values(reading, "windSpeed"), values(reading, "airTemperature")];
  };
  const utf16 = (text: string, little: boolean, mark: boolean): Uint8Array => {
    const marked = mark ? `\ufeff${text}` : text;
    const view = new DataView(new ArrayBuffer(marked.length * 2));
    for (let index = 0; index < marked.length; index += 1) view.setUint16(index * 2, marked.charCodeAt(index), little);
    return new Uint8Array(view.buffer);
  };

  it.each([
    ["plain", utf8(rows)],
    ["byte order mark", utf8(`\ufeff${rows}`)],
    ["UTF-16 LE", utf16(rows, true, true)],
    ["UTF-16 BE", utf16(rows, false, true)],
    ["UTF-16 LE without mark", utf16(rows.replace("\u2212", "-"), true, false)],
    ["Latin-1", Uint8Array.from(rows.replace("\u2212", "-"), (character) => character.charCodeAt(0))],
    ["CRLF", utf8(rows.replaceAll("\n", "\r\n"))],
    ["CR", utf8(rows.replaceAll("\n", "\r"))],
    ["tabs", utf8(rows.replaceAll(";", "\t"))],
    ["bars", utf8(rows.replaceAll(";", "|"))],
    ["trailing delimiter", utf8(rows.replaceAll("\n", ";\n"))],
    ["no-break spaces", utf8(rows.replace("5,5", "\u00a05,5\u202f"))],
    ["quotes", utf8(rows.replace("5,5", '"5,5"').replace("wind speed (m/s)", '"wind speed (m/s)"'))],
    ["preamble and notes", utf8(`Station: Invented Head\nHeight 3 m; owner\n\n${rows}\nMean;6,0;\nEnd of export\n`)],
    ["units row", utf8(rows.replace("wind speed (m/s);air temperature (°C)", "wind speed;air temperature\n;m/s;°C"))],
    [
      "merged header",
      utf8(
        rows
          .replace(/^.*\n/, ";Wind;;Air\nTime (UTC);Speed;Temperature\n")
          .replace(";Wind;;Air", ";Wind;Air")
          .replace("Speed", "Speed (m/s)"),
      ),
    ],
    ["scientific notation", utf8(rows.replace("5,5", "5,5E0"))],
  ])("trap 35: %s", (_, bytes) => {
    expect(both(bytes)).toEqual(taken);
  });

  it("trap 35: thousands separators with both signs", () => {
    const point = read('time (UTC),air pressure (hPa)\n2024-03-01 00:00,"1,013.2"\n2024-03-01 01:00,"1,012.9"\n');
    expect(values(point, "airPressure")).toEqual([1013.2, 1012.9]);
    const comma = read("time (UTC);air pressure (hPa)\n2024-03-01 00:00;1.013,2\n2024-03-01 01:00;1 012,9\n");
    expect(values(comma, "airPressure")).toEqual([1013.2, 1012.9]);
  });

  it("trap 35: formula cells and other words are errors with line and column", () => {
    const reading = read(hourly("time,wind speed (m/s)", ["5", "=A1*2", "6"]));
    expect(reading.problems).toContainEqual(
      expect.objectContaining({ severity: "error", code: "unreadableNumber", row: 3, column: "wind speed" }),
    );
  });

  it("trap 35: spaces part the fields, split date and time", () => {
    const reading = read("date       time  ws   wd\n2024-03-01 00:00 5.5  90\n2024-03-01 01:00 6.5 100\n");
    expect(values(reading, "windSpeed")).toEqual([5.5, 6.5]);
    expect(values(reading, "windFrom")).toEqual([90, 100]);
  });
});

describe("tables as instruments and services write them", () => {
  it("reads a logger's table: station line, names, units, kind of statistic", () => {
    const text = [
      '"TOA5","Invented","1234"',
      '"TIMESTAMP","RECORD","WS_ms_Avg","WindDir","AirTC_Avg","Rain_mm_Tot","BattV_Min","SlrW_Avg"',
      '"TS","RN","meters/second","Deg","Deg C","mm","Volts","W/m^2"',
      '"","","Avg","Smp","Avg","Tot","Min","Avg"',
      '"2024-03-01 00:00:00",1,5.1,270,12.1,0,12.6,0',
      '"2024-03-01 00:10:00",2,5.4,"NAN",12.2,0.2,12.6,410',
    ].join("\n");
    const reading = read(text);
    expect(codes(reading)).toEqual([]);
    expect(Object.keys(reading.channels).sort()).toEqual([
      "airTemperature",
      "rain",
      "shortwave",
      "windFrom",
      "windSpeed",
    ]);
    expect(values(reading, "windSpeed")).toEqual([5.1, 5.4]);
    expect(reading.questions.some(({ key }) => key === "columns")).toBe(false);
  });

  it.each([
    [
      "German",
      "Datum (UTC);Windgeschwindigkeit [km/h];Windböen [km/h];Windrichtung [°];Niederschlag [mm];Lufttemperatur [°C];Taupunkt [°C];Luftdruck [hPa];rel. Feuchte [%];Globalstrahlung [J/cm²];Wassertemperatur [°C]",
    ],
    [
      "Spanish",
      "Fecha (UTC);Velocidad del viento (km/h);Ráfaga (km/h);Dirección del viento;Precipitación (mm);Temperatura del aire (°C);Punto de rocío (°C);Presión atmosférica (hPa);Humedad relativa (%);Radiación solar (J/cm²);Temperatura del agua (°C)",
    ],
    [
      "French",
      "Date (UTC);Vitesse du vent (km/h);Rafale (km/h);Direction du vent (°);Précipitations (mm);Température de l'air (°C);Point de rosée (°C);Pression mer (hPa);Humidité (%);Rayonnement global (J/cm²);Température de l'eau (°C)",
    ],
    [
      "Portuguese",
      "Data (UTC);Vento velocidade (km/h);Vento rajada (km/h);Vento direção (°);Chuva (mm);Temperatura do ar (°C);Ponto de orvalho (°C);Pressão (hPa);Umidade (%);Radiação global (J/cm²);Temperatura da água (°C)",
    ],
    [
      "English",
      "Date (UTC);Wind speed (km/h);Wind gust (km/h);Wind direction (°);Rain (mm);Air temperature (°C);Dew point (°C);Pressure (hPa);Humidity (%);Solar radiation (J/cm²);Water temperature (°C)",
    ],
  ])("reads %s names", (_, header) => {
    const reading = read(
      `${header}\n01.03.2024 00:00;36,0;54,0;270;0,2;8,1;4,0;1.013,2;88;36;7,5\n01.03.2024 01:00;36,0;54,0;270;0,2;8,1;4,0;1.013,2;88;36;7,5\n`,
    );
    const taken = Object.fromEntries(
      Object.entries(reading.channels).map(([name, channel]) => [name, channel.values[0]]),
    );
    expect(taken).toEqual({
      windSpeed: 10,
      windGust: 15,
      windFrom: 270,
      rain: 0.2,
      airTemperature: 8.1,
      dewPoint: 4,
      airPressure: 1013.2,
      relativeHumidity: 88,
      shortwave: 100,
      seaTemperature: 7.5,
    });
    expect(reading.questions.filter(({ needed }) => needed).map(({ key }) => key)).toEqual(["windHeight"]);
  });
});

describe("bad input", () => {
  const refusal = (bytes: Uint8Array, fileName = "station.csv"): UnreadableFile => {
    try {
      readSeries({ bytes, fileName });
    } catch (error) {
      if (error instanceof UnreadableFile) return error;
      throw error;
    }
    throw new Error("was read");
  };

  it.each([
    ["nothing", new Uint8Array(), "emptyFile", "empty"],
    ["blank lines", utf8("\n \n\n"), "emptyFile", "no text"],
    ["only a header", utf8("time,wind speed (m/s)\n"), "onlyHeader", "no records"],
    ["only a buoy header", utf8("#YY  MM DD hh mm WDIR WSPD GST\n"), "onlyHeader", "no records"],
    ["a picture", Uint8Array.of(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0), "notText", "PNG image"],
    ["a zip", Uint8Array.of(0x50, 0x4b, 3, 4, 20, 0), "notText", "zip archive"],
    ["a torn workbook", utf8("PK\u0003\u0004 [Content_Types].xml xl/workbook.xml"), "tooLarge", "unpack"],
    ["a PDF", utf8("%PDF-1.7\n"), "notText", "PDF document"],
    ["noise", Uint8Array.of(1, 0, 0, 7, 200, 0, 3, 0, 9), "notText", "binary"],
    ["prose", utf8("Dear colleague,\nplease find 3 records below.\nYours\n"), "noTable", "no table"],
  ])("refuses %s and says what it is", (_, bytes, code, word) => {
    const [problem] = refusal(bytes).problems;
    expect(problem).toMatchObject({ severity: "error", code });
    expect(problem?.message).toContain(word);
  });

  it("refuses a file above the limit before it looks inside", () => {
    expect(refusal(new Uint8Array(64 * 1024 * 1024 + 1)).problems[0]).toMatchObject({ code: "tooLarge" });
  });

  it.each([
    ["one endless line", "a".repeat(2_000_000)],
    ["one line of commas", ",".repeat(2_000_000)],
    ["quotation marks alone", '"'.repeat(1_000_000)],
    ["an open quotation mark before many lines", `time,wind\n"${"2024-03-01 00:00,5\n".repeat(50_000)}`],
    ["brackets alone", `time (UTC),${"(".repeat(200_000)}\n2024-03-01 00:00,5\n`],
    ["two million empty lines", `${"\n".repeat(2_000_001)}`],
    ["a cell of a million digits", `time (UTC),wind speed (m/s)\n2024-03-01 00:00,${"1".repeat(1_000_000)}\n`],
  ])("comes to an end with %s", (_, text) => {
    const outcome = ((): SeriesReading | UnreadableFile => {
      try {
        return read(text);
      } catch (error) {
        if (error instanceof UnreadableFile) return error;
        throw error;
      }
    })();
    expect(outcome.problems.length).toBeGreaterThan(0);
    expect(outcome.problems.every(({ message }) => message.length < 2000)).toBe(true);
  });

  it("says which columns were seen where none is a time or a quantity", () => {
    const reading = read("alpha,beta\n1,2\n3,4\n");
    expect(reading.problems.find(({ code }) => code === "noTimeColumn")?.message).toContain("“alpha”, “beta”");
    expect(codes(reading)).toContain("noChannel");
    expect(isSettled(reading)).toBe(false);
  });

  it("lists winds beyond any measured, directions beyond 360 and unreadable times, and leaves them out when told", () => {
    const text = hourly("time,wind speed (m/s),wind direction (deg)", ["5,90", "400,90", "6,361", "7,100"]).replace(
      "2024-03-01T03:00Z",
      "yesterday",
    );
    const reading = read(text, { windHeight: 10, zone: "UTC" });
    expect(reading.problems.filter(({ severity }) => severity === "error").map(({ code, row }) => [code, row])).toEqual(
      [
        ["unreadableTime", 5],
        ["outOfRange", 3],
        ["outOfRange", 4],
      ],
    );
    expect(isSettled(reading)).toBe(false);
    const left = read(text, { windHeight: 10, zone: "UTC", leaveOutBadRows: true });
    expect(isSettled(left)).toBe(true);
    expect(values(left, "windSpeed")).toEqual([5]);
    expect(left.rows).toBe(4);
    expect(left.dropped.reduce((sum, { count }) => sum + count, 0)).toBe(3);
  });

  it("counts and names the lines of a problem met often", () => {
    const reading = read(hourly("time,wind speed (m/s)", ["5", "400", "400", "400", "6", "400", "400", "400", "400"]));
    const problem = reading.problems.find(({ code }) => code === "outOfRange");
    expect(problem).toMatchObject({ row: 3, count: 7 });
    expect(problem?.message).toContain("(7 lines: 3, 4, 5, 7, 8 and 2 more)");
  });

  it("reports ragged lines and a column without any value", () => {
    const reading = read(
      "time (UTC),wind speed (m/s),rain (mm)\n2024-03-01 00:00,5,\n2024-03-01 01:00,6\n2024-03-01 02:00,6,\n2024-03-01 03:00,7,\n",
    );
    expect(reading.problems).toContainEqual(expect.objectContaining({ severity: "error", code: "fieldCount", row: 3 }));
    expect(reading.problems).toContainEqual(
      expect.objectContaining({ severity: "warning", code: "allMissing", column: "rain" }),
    );
  });

  it("survives a quotation mark that is never closed", () => {
    const reading = read('time (UTC),wind speed (m/s),note\n2024-03-01 00:00,5,"calm\n2024-03-01 01:00,6,x\n');
    expect(values(reading, "windSpeed")).toEqual([5, 6]);
    expect(codes(reading)).toContain("openQuote");
  });
});
