import { describe, expect, it } from "vitest";
import { longTable, sampleFigure, sampleMemo } from "../../tests/factories/memo-document";
import { memoInput } from "../../tests/factories/memo-input";
import { composeMemo } from "./compose";
import type { Block } from "./document";
import { drawnTexts } from "./drawn-texts";
import { shippedCoverage } from "./pdf/fonts.server";
import { undrawableWords } from "./undrawable-words";

const wordsOf = (blocks: Block[]) => undrawableWords(sampleMemo({ blocks }), shippedCoverage);
const composed = (facts: Partial<ReturnType<typeof memoInput>["facts"]>) => {
  const input = memoInput();
  return undrawableWords(composeMemo({ ...input, facts: { ...input.facts, ...facts } }), shippedCoverage);
};

describe("what the memo's fonts cannot draw", () => {
  it("is nothing in memos as they are written: Greek, Cyrillic, signs, accents, and a file's own replacement sign", () => {
    expect(undrawableWords(sampleMemo(), shippedCoverage)).toBeNull();
    expect(composed({ question: "σ₀ ≤ 24 kg/m³ at Żabno or Новый, as “Ångström” says → \uFFFD?" })).toBeNull();
  });

  it("is named with its place and its code, once for each place", () => {
    expect(composed({ title: "Gale at 港", question: "港 or 龍, and 港 again?" })).toBe(
      "The memo's fonts cannot draw “港” (U+6E2F) in the title; “港” (U+6E2F), “龍” (U+9F8D) in section “Question”. " +
        "Write this in other letters: the PDF would show a replacement sign.",
    );
    expect(composed({ answer: "No. 🌊" })).toContain("“🌊” (U+1F30A) in the bottom line");
    expect(composed({ originator: "港" })).toContain("in the title block");
  });

  it("is counted where there is much of it", () => {
    expect(composed({ question: "一二三四五六七八九" })).toContain("“六” (U+516D) and 3 more in section “Question”");
  });

  it("is found in a figure's own text, read as the drawing shows it", () => {
    const { figure, ...block } = sampleFigure();
    const drawn = { ...block, figure: { ...figure, svg: '<svg><text x="1">at <tspan>&#x6E2F;</tspan></text></svg>' } };
    expect(wordsOf([drawn])).toContain("“港” (U+6E2F) in figure 1");
  });

  it("is looked for in every text of every kind of block", () => {
    const list: Block = { kind: "list", items: [[{ text: "one" }], [{ text: "two" }]] };
    const facts: Block = { kind: "facts", rows: [{ label: "Zone", value: [{ text: "UTC" }] }] };
    for (const block of [...sampleMemo().blocks, list, facts, longTable(2)]) {
      if (block.kind === "figure") continue;
      const marked = JSON.stringify(block, (key, value) => (isText(key, value) ? `${value}${MARK}` : value));
      const memo = sampleMemo({ blocks: [JSON.parse(marked)] });
      const [found] = drawnTexts(memo).slice(-1);
      expect(found.text.split(MARK).length, block.kind).toBe(marked.split(MARK).length);
    }
  });
});

const MARK = "\u6E2F";
/** Members of blocks that are no text of their own, or are drawn as marks. */
const NO_TEXT = new Set(["kind", "style", "align", "colour", "rise", "link", "severity", "id", "svg", "alt"]);

function isText(key: string, value: unknown): value is string {
  return typeof value === "string" && !NO_TEXT.has(key);
}
