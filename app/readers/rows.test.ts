import fc from "fast-check";
import Papa from "papaparse";
import { describe, expect, it } from "vitest";
import { chosenRows, columnOf, packedRows } from "./rows";

const text = fc
  .array(fc.constantFrom("", ",", ",", "\n", "\n", "7", "−3.5", "ä", "2024-03-01", " "), { maxLength: 80 })
  .map((parts) => parts.join(""));

describe("packed rows", () => {
  it("are the rows that papaparse makes of a text without quotation marks", () => {
    fc.assert(
      fc.property(text, (written) => {
        const rows = packedRows(written, ",");
        const expected = Papa.parse<string[]>(written, { delimiter: ",", newline: "\n" }).data;
        // Of an empty text papaparse makes no row; here it is one row with one blank cell, as of any other blank line.
        const wanted = written === "" ? [[""]] : expected;
        expect(Array.from({ length: rows.length }, (_, row) => rows.row(row))).toEqual(wanted);
        for (const [row, cells] of wanted.entries()) {
          expect(rows.width(row)).toBe(cells.length);
          expect(cells.map((_, column) => rows.cell(row, column))).toEqual(cells);
          expect([rows.cell(row, -1), rows.cell(row, cells.length)]).toEqual([undefined, undefined]);
        }
      }),
      { seed: 11, numRuns: 500 },
    );
  });

  it("can be chosen from, and have nothing beyond their ends", () => {
    const rows = packedRows("a,b\nc\nd,e,f", ",");
    const chosen = chosenRows(rows, [2, 0]);
    expect([chosen.row(0), chosen.row(1), chosen.row(2)]).toEqual([["d", "e", "f"], ["a", "b"], []]);
    expect([...columnOf(rows, 1)]).toEqual(["b", "", "e"]);
    expect([chosen.cell(2, 0), chosen.width(2), rows.width(-1), rows.cell(3, 0)]).toEqual([undefined, 0, 0, undefined]);
  });
});
