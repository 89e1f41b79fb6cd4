import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { UnreadableFile } from "../reading";
import { readTrack } from "./read-track";
import type { TrackAnswers } from "./track-reading";

const read = (text: string, answers?: TrackAnswers) =>
  readTrack({ bytes: new TextEncoder().encode(text), fileName: "track.txt", ...(answers && { answers }) });

/** Invented storms in the forms' own writing. */
const DECK = [
  "AL, 97, 2031090100,   , BEST,   0, 172N,  370W,  30, 1006, TD,   0,    ,    0,    0,    0,    0, 1011,  250,  90,   0,   0,   L,   0,    , 274,  13,     INVEST,,,,,,,,",
  "AL, 97, 2031090106,   , BEST,   0, 175N,  399W,  65,    0, HU,  34, NEQ,  130,  110,    0,   75, 1011,  250,  20,  55,   0,   L,   0,    , 278,  14,     PELLAN,,,,,,,,",
  "AL, 97, 2031090106,   , BEST,   0, 175N,  399W,  65,  985, HU,  64, NEQ,   30,   25,   15,   20, 1011,  250,  20,  55,   0,   L,   0,    , 278,  14,     PELLAN,,,,,,,,",
  "AL, 97, 2031090107,   , BEST,   0, 176N,  400W,  70,  984, HU,  34, AAA,  120,    0,    0,    0, 1011,  250,   0,  55,   0,   L,   0,    , 278,  14,     PELLAN,,,,,,,,",
].join("\n");
const HEADED = [
  "AL972031,             PELLAN,      2,",
  "20310901, 0000,  , HU, 28.0N,  94.8W,  80, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999,",
  "20310901, 0430, L, HU, 28.2N, 181.0W,  80,  970,   60,   50,   40,    0, -999, -999, -999, -999, -999, -999, -999, -999,   25",
  "EP012031,               QUIL,      1,",
  "20310701, 1200,  , TS, 12.0S,  60.0E, -99, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999, -999,",
].join("\n");
const ARCHIVE = [
  "SID,SEASON,NAME,ISO_TIME,LAT,LON,WMO_WIND,WMO_PRES,USA_WIND,USA_PRES,USA_RMW,USA_R34_NE,USA_R34_SE,USA_R34_SW,USA_R34_NW,BOM_WIND,BOM_PRES",
  " ,Year, , ,degrees_north,degrees_east,kts,mb,kts,mb,nmile,nmile,nmile,nmile,nmile,kts,mb",
  "2031001S12345,2031,MERROW,2031-01-01 00:00:00,-12.0,179.5, , ,50,990,20,60, ,40,55,45,992",
  "2031001S12345,2031,MERROW,2031-01-01 06:00:00,-12.5,180.5, , ,55,985,20, , , , ,48,988",
].join("\n");

describe("best tracks", () => {
  it("deck text: positions in tenths, knots, nautical miles; lines of one time are joined, hours off the synoptic kept", () => {
    const track = read(DECK);
    expect(track).toMatchObject({ kind: "track", format: "trackDeck", rows: 4, duplicates: 1, averagingMinutes: 1 });
    expect(track.storm).toMatchObject({ id: "AL972031", name: "PELLAN", fixes: 3 });
    const [first, second, third] = track.fixes;
    expect(first).toMatchObject({
      latitude: 17.2,
      longitude: -37,
      centralPressure: 1006,
      ambientPressure: 1011,
      radii: [],
    });
    expect(second.maxWind).toBeCloseTo(65 * 0.514444, 3);
    expect(second.radiusOfMaximumWind).toBe(20 * 1852);
    expect(second.radii.map(({ wind }) => Math.round(wind / 0.514444))).toEqual([34, 64]);
    expect(second.radii[0].quadrants).toEqual([130 * 1852, 110 * 1852, null, 75 * 1852]);
    expect(third.radii[0].quadrants).toEqual(new Array(4).fill(120 * 1852));
    expect(third.radiusOfMaximumWind).toBeNull();
  });

  it("trap: a pressure of 0 in a deck is missing, and told by a later line of that time", () => {
    expect(read(DECK).fixes[1].centralPressure).toBe(985);
  });

  it("trap: several storms in a file are asked about, never silently the first", () => {
    const open = read(HEADED);
    expect(open.questions[0]).toMatchObject({ key: "storm", needed: true, suggestion: "AL972031" });
    expect(open.questions[0].options.map(({ value }) => value)).toEqual(["AL972031", "EP012031"]);
    const answered = read(HEADED, { storm: "EP012031" });
    expect(answered.fixes).toHaveLength(1);
    expect(answered.fixes[0]).toMatchObject({ latitude: -12, longitude: 60, maxWind: null, centralPressure: null });
    expect(answered.questions[0].needed).toBe(false);
  });

  it("headed text: landfall rows between the hours, −999 and −99 missing, longitudes past 180° wrapped", () => {
    const [, landfall] = read(HEADED).fixes;
    expect(new Date(landfall.time * 1000).toISOString()).toBe("2031-09-01T04:30:00.000Z");
    expect(landfall.longitude).toBeCloseTo(179, 9);
    expect(landfall).toMatchObject({ centralPressure: 970, radiusOfMaximumWind: 25 * 1852 });
    expect(landfall.radii).toHaveLength(1);
  });

  it("headed text: a header that promises more lines than follow is pointed out", () => {
    const cut = HEADED.split("\n").slice(0, 2).join("\n");
    expect(read(cut).problems.find(({ code }) => code === "lineCount")?.row).toBe(1);
  });

  it("archive CSV: the row of units is no fix, and whose wind is taken is asked with its averaging", () => {
    const open = read(ARCHIVE);
    expect(open).toMatchObject({ format: "trackArchive", rows: 2, averagingMinutes: 1 });
    expect(open.questions.find(({ key }) => key === "agency")?.options.map(({ value }) => value)).toEqual([
      "USA",
      "BOM",
    ]);
    expect(open.fixes[1].longitude).toBeCloseTo(-179.5, 9);
    expect(open.fixes[0].radii[0].quadrants).toEqual([60 * 1852, null, 40 * 1852, 55 * 1852]);
    const australian = read(ARCHIVE, { agency: "BOM" });
    expect(australian.averagingMinutes).toBe(10);
    expect(australian.fixes[0].maxWind).toBeCloseTo(45 * 0.514444, 3);
  });

  it("says which line is torn, and refuses what is no track", () => {
    const torn = read(DECK.replace("175N,  399W,  65,    0", "xxx,  399W,  65,    0"));
    expect(torn.problems.find(({ code }) => code === "unreadableFix")).toMatchObject({ row: 2, severity: "error" });
    expect(() => read("time,wind\n2024-03-01,5")).toThrow(/no best track/);
    expect(() => read("AL972031,             PELLAN,      0,")).toThrow(/has no fixes/);
  });

  it("gives a sound track or a refusal for files with bytes changed", () => {
    for (const text of [DECK, HEADED, ARCHIVE]) {
      const good = new TextEncoder().encode(text);
      fc.assert(
        fc.property(
          fc.array(fc.tuple(fc.nat(good.length - 1), fc.nat(255)), { minLength: 1, maxLength: 8 }),
          (changes) => {
            const bytes = good.slice();
            for (const [at, byte] of changes) bytes[at] = byte;
            try {
              const { fixes } = readTrack({ bytes, fileName: "track.txt" });
              expect(
                fixes.every(
                  ({ time, latitude }, k) => Math.abs(latitude) <= 90 && (k === 0 || time > fixes[k - 1].time),
                ),
              ).toBe(true);
            } catch (error) {
              expect(error).toBeInstanceOf(UnreadableFile);
            }
          },
        ),
        { seed: 6, numRuns: 150 },
      );
    }
  });
});
