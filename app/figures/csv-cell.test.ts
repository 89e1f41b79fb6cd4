import { describe, expect, it } from "vitest";
import { csvCell } from "./csv-cell";

describe("a cell of CSV", () => {
  it("quotes what RFC 4180 wants quoted", () => {
    expect(csvCell('a "b", c')).toBe('"a ""b"", c"');
  });

  it.each(["=1+1", "+1", "-1", "@x", "\tx"])("makes text of %j, which a spreadsheet would reckon", (text) => {
    expect(csvCell(text).replace(/^"/, "").startsWith("'")).toBe(true);
  });
});
