import { utils, write, type WorkSheet } from "@e965/xlsx";
import { zipSync } from "fflate";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readSeries } from "./read-series";
import { UnreadableFile, type ReadingAnswers } from "./reading";

type Cell = string | number | null | undefined;

function workbookOf(sheets: Record<string, WorkSheet>, date1904 = false): Uint8Array {
  const book = utils.book_new();
  for (const [name, sheet] of Object.entries(sheets)) utils.book_append_sheet(book, sheet, name);
  book.Workbook = { ...book.Workbook, WBProps: { date1904 } };
  return new Uint8Array(write(book, { type: "array", bookType: "xlsx", compression: true }) as ArrayBuffer);
}

/** Day numbers with a number format, as spreadsheets keep dates. */
function sheetOf(rows: Cell[][], formats: Record<number, string> = { 0: "dd/mm/yyyy hh:mm" }): WorkSheet {
  const sheet = utils.aoa_to_sheet(rows);
  rows.forEach((cells, row) =>
    cells.forEach((cell, column) => {
      const own = sheet[utils.encode_cell({ r: row, c: column })] as { z?: string } | undefined;
      if (own && typeof cell === "number" && formats[column] !== undefined) own.z = formats[column];
    }),
  );
  return sheet;
}

const read = (bytes: Uint8Array, answers: ReadingAnswers = { zone: "UTC", windHeight: 10 }) =>
  readSeries({ bytes, fileName: "record.xlsx", answers });

/** 2024-03-01 as a day number of the 1900 system. */
const MARCH = 45352;
const HEADER = ["time", "wind speed (m/s)", "wind from direction (deg)"];
const record = (start = MARCH): Cell[][] =>
  Array.from({ length: 30 }, (_, hour) => [start + hour / 24, 5.25 + hour / 10, (250 + hour) % 360]);

describe("workbooks", () => {
  it("trap 35: title, blank row, units row and dates come through, and rows are counted as the sheet counts them", () => {
    const rows = [
      ["Mast 3, hourly"],
      [],
      ["time", "wind speed", "wind from direction"],
      ["", "m/s", "deg"],
      ...record(),
    ];
    const reading = read(workbookOf({ Data: sheetOf(rows) }));
    expect(reading).toMatchObject({ format: "workbook", rows: 30, first: "2024-03-01T00:00:00Z" });
    expect(reading.last).toBe("2024-03-02T05:00:00Z");
    expect(reading.channels.windSpeed?.values[2]).toBe(5.45);
    expect(reading.firstRows[0]?.line).toBe(5);
  });

  it("trap 18: the 1904 system is read by what the workbook says of itself", () => {
    const reading = read(workbookOf({ Data: sheetOf([HEADER, ...record(MARCH - 1462)]) }, true));
    expect(reading.first).toBe("2024-03-01T00:00:00Z");
  });

  it("trap 18: parts of days do not lose a second, and a clock is not shifted by where this runs", () => {
    const minutes = Array.from({ length: 1440 }, (_, k): Cell[] => [MARCH + k / 1440, 5, 270]);
    const reading = read(workbookOf({ Data: sheetOf([HEADER, ...minutes]) }));
    expect(Array.from(reading.time, (seconds) => seconds % 60).every((rest) => rest === 0)).toBe(true);
    expect(reading.rows).toBe(1440);
    expect(reading.medianStepSeconds).toBe(60);
  });

  it("reads a date and a time of day in two columns", () => {
    const rows = record().map(([time, ...rest], hour): Cell[] => [Math.floor(Number(time)), (hour % 24) / 24, ...rest]);
    const sheet = sheetOf([["date", "hour", HEADER[1], HEADER[2]], ...rows], { 0: "yyyy-mm-dd", 1: "hh:mm" });
    expect(read(workbookOf({ Data: sheet }))).toMatchObject({
      first: "2024-03-01T00:00:00Z",
      last: "2024-03-02T05:00:00Z",
    });
  });

  it("trap 35: a formula counts by its saved value, an error cell as missing, a merged header spreads", () => {
    const sheet = sheetOf([["", "Wind", ""], ["time", "speed (m/s)", "direction (deg)"], ...record()]);
    sheet["!merges"] = [{ s: { r: 0, c: 1 }, e: { r: 0, c: 2 } }];
    sheet.B3 = { t: "n", v: 7.5, f: "B4*2" };
    sheet.B4 = { t: "e", v: 0x2a };
    const reading = read(workbookOf({ Data: sheet }));
    expect(Array.from(reading.channels.windSpeed?.values ?? []).slice(0, 2)).toEqual([7.5, NaN]);
    expect(reading.channels.windFrom?.count).toBe(30);
  });

  it("asks which of several sheets is meant, and takes the answer", () => {
    const other = sheetOf([HEADER, ...record(MARCH + 100).slice(0, 10)]);
    const bytes = workbookOf({
      Notes: utils.aoa_to_sheet([["Written by nobody"]]),
      One: sheetOf([HEADER, ...record()]),
      Two: other,
    });
    const open = read(bytes).questions.find(({ key }) => key === "sheet");
    expect(open).toMatchObject({ needed: true, suggestion: "One" });
    expect(open?.options?.map(({ value }) => value)).toEqual(["One", "Two"]);
    const answered = read(bytes, { zone: "UTC", windHeight: 10, sheet: "Two" });
    expect(answered.rows).toBe(10);
    expect(answered.questions.find(({ key }) => key === "sheet")?.needed).toBe(false);
  });

  it("refuses a workbook that says it unpacks beyond the limit, before it is unpacked", () => {
    const bytes = zipSync({
      "[Content_Types].xml": new Uint8Array(10),
      "xl/worksheets/sheet1.xml": new Uint8Array(10),
    });
    // The uncompressed size stands 24 bytes into each entry of the central directory.
    const view = new DataView(bytes.buffer, bytes.byteOffset);
    for (let at = 0; at + 4 < bytes.length; at += 1) {
      if (view.getUint32(at, true) === 0x02014b50) view.setUint32(at + 24, 0x7fffffff, true);
    }
    expect(() => read(bytes)).toThrow(/unpack to more than 512 MB/);
  });

  it("gives a reading or a refusal for a workbook with bytes changed", () => {
    const good = workbookOf({ Data: sheetOf([HEADER, ...record()]) });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.nat(good.length - 1), fc.nat(255)), { minLength: 1, maxLength: 6 }),
        (changes) => {
          const bytes = good.slice();
          for (const [at, byte] of changes) bytes[at] = byte;
          try {
            expect(read(bytes).kind).toBe("series");
          } catch (error) {
            expect(error).toBeInstanceOf(UnreadableFile);
          }
        },
      ),
      { seed: 4, numRuns: 150 },
    );
  });
});
