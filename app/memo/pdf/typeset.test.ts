import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { naturalWidth, type Typefaces, typeset } from "./typeset";

/** Every character half its size wide, all in one face. */
const faces: Typefaces = {
  split: (text) => (text === "" ? [] : [{ face: "plain", text }]),
  width: (text, _, size) => [...text].length * size * 0.5,
};
const style = { size: 10 };
/** Lines of a text set `letters` wide. */
const lines = (text: string, letters: number) =>
  typeset([{ text }], style, letters * 5, faces).lines.map((line) =>
    line.segments.map((segment) => segment.text).join(""),
  );

describe("typeset", () => {
  it("breaks at spaces, which stay unseen at the end of their line", () => {
    expect(lines("one two three", 8)).toEqual(["one two ", "three"]);
    expect(typeset([{ text: "one two three" }], style, 40, faces).lines[0]!.width).toBe(35);
  });

  it("starts a line at a line feed, one only where there are several", () => {
    expect(lines("a\nb\n\nc", 20)).toEqual(["a", "b", "c"]);
  });

  it("breaks after a hyphen between letters, never within a date or after a minus sign", () => {
    expect(lines("towards south-east", 15)).toEqual(["towards south-", "east"]);
    expect(lines("on the 2026-11-04", 12)).toEqual(["on the ", "2026-11-04"]);
    expect(lines("near aaa −0.9", 10)).toEqual(["near aaa ", "−0.9"]);
  });

  it("does not break at a no-break space", () => {
    expect(lines("depth 12\u00a0m deep", 8)).toEqual(["depth ", "12\u00a0m ", "deep"]);
  });

  it("breaks a word wider than the line after a separator where it has one, else anywhere", () => {
    expect(lines("skarrow_buoy_hourly.csv", 14)).toEqual(["skarrow_buoy_", "hourly.csv"]);
    expect(lines("abcdefghij", 4)).toEqual(["abcd", "efgh", "ij"]);
  });

  it("keeps words whole across a change of style", () => {
    const set = typeset([{ text: "per m" }, { text: "2", rise: "super" }, { text: "/s" }], style, 26, faces);
    expect(set.lines.map((line) => line.segments.map(({ text }) => text).join(""))).toEqual(["per ", "m2/s"]);
  });

  it("raises and lowers smaller figures, from superscript characters too", () => {
    const [line] = typeset([{ text: "m⁻² H₂O" }], style, 500, faces).lines;
    expect(line!.segments.map(({ text, rise, size }) => [text, Math.sign(rise), size < 10])).toEqual([
      ["m", 0, false],
      ["−2", 1, true],
      [" H", 0, false],
      ["2", -1, true],
      ["O", 0, false],
    ]);
  });

  it("never sets a line wider than it may be, and loses no letter", () => {
    const word = fc.string({
      unit: fc.constantFrom("a", "b", "-", "_", "é", "τ", "1", "."),
      minLength: 1,
      maxLength: 40,
    });
    fc.assert(
      fc.property(fc.array(word, { maxLength: 20 }), fc.integer({ min: 1, max: 60 }), (words, letters) => {
        const set = typeset([{ text: words.join(" ") }], style, letters * 5, faces);
        for (const line of set.lines) expect(line.width).toBeLessThanOrEqual(letters * 5 + 1e-9);
        const text = set.lines.flatMap((line) => line.segments.map((segment) => segment.text)).join("");
        expect(text.replace(/\s/g, "")).toBe(words.join(""));
      }),
    );
  });

  it("gives no line for nothing", () => {
    expect(typeset([], style, 100, faces).lines).toEqual([]);
    expect(typeset([{ text: "" }], style, 100, faces).lines).toEqual([]);
    expect(naturalWidth([], style, faces)).toBeLessThan(0.1);
  });
});
