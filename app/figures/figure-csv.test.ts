import Papa from "papaparse";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { figureCsv } from "./figure-csv";

describe("figureCsv", () => {
  it("writes units into the header, numbers unrounded, missing values empty (RFC 4180)", () => {
    const csv = figureCsv({
      columns: [
        { name: "time (UTC)", unit: "" },
        { name: "net heat, into the sea", unit: "W/m²" },
      ],
      rows: [
        ["2026-11-03T00:00:00Z", -120.123456789],
        ["2026-11-03T01:00:00Z", null],
      ],
    });
    expect(csv).toBe(
      'time (UTC),"net heat, into the sea (W/m²)"\r\n2026-11-03T00:00:00Z,-120.123456789\r\n2026-11-03T01:00:00Z,\r\n',
    );
  });

  it.each(["=1+1", "+1", "-1", "@SUM(A1)", "\tx", "\r=1"])("disarms the text %j, but not a negative number", (text) => {
    const csv = figureCsv({ columns: [{ name: text, unit: "" }], rows: [[text], [-1]] });
    const { data } = Papa.parse<string[]>(csv, { newline: "\r\n", skipEmptyLines: true });
    expect(data).toEqual([[`'${text}`], [`'${text}`], ["-1"]]);
  });

  it("comes back from a reader whole", () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.string({ minLength: 1 }), fc.double({ noNaN: true, noDefaultInfinity: true }))),
        (rows) => {
          const columns = [
            { name: "name", unit: "" },
            { name: "value", unit: "m" },
          ];
          const { data } = Papa.parse<string[]>(figureCsv({ columns, rows }), { delimiter: ",", newline: "\r\n" });
          expect(data.slice(1, -1)).toEqual(
            rows.map(([text, value]) => [/^[=+\-@\t\r]/.test(text) ? `'${text}` : text, String(value)]),
          );
        },
      ),
    );
  });
});
