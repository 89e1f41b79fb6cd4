import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { authorBlocks, authorRuns } from "./author-text";
import { textOf } from "./document";

describe("authorBlocks", () => {
  it("parts paragraphs at blank lines and joins the lines of one", () => {
    expect(authorBlocks("one\ntwo\r\n\r\n \nthree")).toEqual([
      { kind: "paragraph", style: "body", runs: [{ text: "one" }, { text: " " }, { text: "two" }] },
      { kind: "paragraph", style: "body", runs: [{ text: "three" }] },
    ]);
  });

  it("makes lists of dashed lines, after a paragraph too", () => {
    expect(authorBlocks("Seen:\n- rain\n  in two spells\n- wind")).toEqual([
      { kind: "paragraph", style: "body", runs: [{ text: "Seen:" }] },
      { kind: "list", items: [[{ text: "rain" }, { text: " " }, { text: "in two spells" }], [{ text: "wind" }]] },
    ]);
  });

  it("has nothing to show for a blank text", () => {
    expect(authorBlocks(" \n\n\t\n")).toEqual([]);
  });
});

describe("authorRuns", () => {
  it("sets bold and italic", () => {
    expect(authorRuns("the **lid** of *S* held")).toEqual([
      { text: "the " },
      { text: "lid", bold: true },
      { text: " of " },
      { text: "S", italic: true },
      { text: " held" },
    ]);
  });

  it("keeps an asterisk without a partner, and a product", () => {
    expect(textOf(authorRuns("u* = 3 * 4"))).toBe("u* = 3 * 4");
  });

  it("loses no letter whatever is typed", () => {
    const letters = (text: string) => text.replace(/[*\s]/g, "");
    fc.assert(fc.property(fc.string(), (text) => letters(textOf(authorRuns(text))) === letters(text)));
  });
});
