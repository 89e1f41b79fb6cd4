import { describe, expect, it } from "vitest";
import { memoInput } from "../../tests/factories/memo-input";
import { sampleResponse } from "../../tests/factories/response";
import { CAUTION } from "~/ocean/caution";
import { methodSources } from "~/ocean/sources";
import { composeMemo } from "./compose";
import { type Block, textOf } from "./document";

type Of<Kind extends Block["kind"]> = Extract<Block, { kind: Kind }>;

function all<Kind extends Block["kind"]>(blocks: readonly Block[], kind: Kind): Of<Kind>[] {
  return blocks.filter((block): block is Of<Kind> => block.kind === kind);
}

const sections = (blocks: readonly Block[]) =>
  all(blocks, "heading")
    .filter(({ level }) => level === 1)
    .map(({ text }) => text);

describe("composeMemo", () => {
  const memo = composeMemo(memoInput());

  it("puts the answer first, then the six headline figures, then the caution", () => {
    expect(memo.blocks.slice(0, 4).map(({ kind }) => kind)).toEqual(["paragraph", "headlines", "caution", "figure"]);
    const [headlines] = all(memo.blocks, "headlines");
    expect(headlines!.rows.map(({ label }) => label)).toEqual([
      "Peak wind stress",
      "Peak drift",
      "Net displacement",
      "Transport across the shore",
      "Lowest surface salinity",
      "Surface temperature change",
    ]);
    expect(headlines!.rows.map(({ value, unit }) => `${value} ${unit}`)).toEqual([
      "0.61 N/m²",
      "0.42 m/s to 131°",
      "84 km to 128°",
      "124 million m³/km onshore",
      "31.9 g/kg",
      "−0.9 °C",
    ]);
    expect(memo.caution).toBe(CAUTION);
  });

  it("tells the transport's band by size where it lies on one side, as its value is told", () => {
    const row = all(memo.blocks, "headlines")[0]!.rows[3]!;
    expect(row.band.replaceAll("\u00a0", " ")).toBe("101 to 150 million m³/km");
    const { headline } = sampleResponse();
    const across = { value: -10_000, p10: -30_000, p90: 8_000 };
    const [estimate] = memoInput().estimates;
    const mixed = composeMemo(
      memoInput({
        estimates: [{ ...estimate!, response: sampleResponse({ headline: { ...headline, transportAcross: across } }) }],
      }),
    );
    expect(all(mixed.blocks, "headlines")[0]!.rows[3]!.band.replaceAll("\u00a0", " ")).toBe(
      "−30 to 8 million m³/km, positive offshore",
    );
  });

  it("has every section of a memo that can be retraced, in order", () => {
    expect(sections(memo.blocks)).toEqual([
      "Question",
      "Intended use",
      "Findings",
      "Results",
      "How sure this is",
      "Where the method holds here",
      "Study boxes",
      "Inputs register",
      "Method",
      "Checks",
      "Limits, and what was not done",
      "References",
      "Revision history",
      "Attachments",
    ]);
  });

  it("tells members, seed, failures and what each figure depends on, and says so where no ensemble ran", () => {
    const words = (blocks: readonly Block[]) =>
      all(blocks, "paragraph").map(({ runs }) => textOf(runs).replaceAll("\u00a0", " "));
    const told = words(memo.blocks).find((text) => text.startsWith("Estimate 2617-07. Range"));
    expect(told).toContain("200 members, seed 7: 10th to 90th percentile.");
    expect(told).toContain("3 of 203 members could not be computed and are left out");
    const tables = all(memo.blocks, "table");
    const depends = tables.find(({ caption }) => caption.startsWith("What the figures of estimate 2617-07"));
    expect(depends?.rows.map((row) => textOf(row[1]))).toEqual(["rain", "wind speed"]);
    expect(depends?.rows.map((row) => textOf(row[2]).replaceAll("\u00a0", " "))).toEqual([
      "31.5 to 32.3 g/kg",
      "70.0 to 99.0 km",
    ]);
    const varied = tables.find(({ caption }) => caption === "Inputs varied in estimate 2617-07.");
    expect(varied?.rows.map((row) => row.map(textOf).join(" | "))).toEqual([
      "rain | ±30 % | a convention of this engine",
      "wind speed | ±10 %. By itself it could not be computed at × 1.1. | a convention of this engine",
    ]);
    const [estimate] = memoInput().estimates;
    const plainMemo = composeMemo(
      memoInput({ estimates: [{ ...estimate, response: sampleResponse({ uncertainty: undefined }) }] }),
    );
    expect(words(plainMemo.blocks).join(" ")).toContain("Estimate 2617-07 was run without an ensemble");
  });

  it("registers each series with file, hash, rows, period, steps and gaps", () => {
    const facts = all(memo.blocks, "facts").map(({ rows }) =>
      Object.fromEntries(rows.map(({ label, value }) => [label, textOf(value)])),
    );
    expect(facts[0]).toMatchObject({
      File: "skarrow_buoy_2026-11_hourly_quality_controlled_second_delivery.csv",
      "SHA-256": "3b7e1f02c4a5968778695a4b3c2d1e0f00112233445566778899aabbccddeeff",
      Rows: "13\u00a0448",
      Period: "2026-11-03 00:00 to 2026-11-08 00:00 UTC",
      Missing: "1.2 %",
      "Steps applied": "knots to m/s (× 0.514444)\nvector mean over the hour",
    });
    expect(facts[1]).toMatchObject({ Source: "not known", Missing: "not known", "Gaps and repairs": "none" });
    expect(facts[1]).not.toHaveProperty("Wind height");
  });

  it("gives each equation the number of its reference", () => {
    const used = methodSources(sampleResponse());
    const equations = all(memo.blocks, "equation");
    const { items } = all(memo.blocks, "references")[0]!;
    expect(equations.map(({ name }) => name)).toEqual(used.map(({ title }) => title));
    equations.forEach(({ source }, index) => {
      const number = Number(/^Source: \[(\d+)\]/.exec(source)?.[1]);
      expect(items[number - 1]?.text).toBe(used[index]!.citation);
    });
  });

  it("leaves out the corner that closes a ring and names hemispheres", () => {
    const corners = all(memo.blocks, "table").find(({ caption }) => caption.startsWith("Corners"))!;
    expect(corners.rows.map((row) => row.map(textOf))).toEqual([
      ["Skarrow Bay intake", "1", "55.31000° N", "4.92000° W"],
      ["", "2", "55.31000° N", "4.88000° W"],
      ["", "3", "55.34000° N", "4.88000° W"],
      ["", "4", "55.34000° N", "4.92000° W"],
    ]);
  });

  it("puts a tall first figure after the question, so that the first sheet is not left half empty", () => {
    const [estimate] = memoInput().estimates;
    const tall = { ...estimate!.figures[0]!, height: 400 };
    const { blocks } = composeMemo(memoInput({ estimates: [{ ...estimate!, figures: [tall] }] }));
    const place = blocks.findIndex(({ kind }) => kind === "figure");
    expect(sections(blocks.slice(0, place))).toEqual(["Question", "Intended use"]);
    expect(all(blocks, "figure")).toHaveLength(1);
  });

  it("names a figure's estimate once", () => {
    const [estimate] = memoInput().estimates;
    const named = { ...estimate!.figures[0]!, caption: "Salinity. Estimate 2617-07." };
    const [first, second] = all(
      composeMemo(memoInput({ estimates: [{ ...estimate!, figures: [named, estimate!.figures[1]!] }] })).blocks,
      "figure",
    );
    expect([first!.source, second!.source]).toEqual(["", "Estimate 2617-07."]);
  });

  it("numbers figures in the order in which they stand", () => {
    expect(all(memo.blocks, "figure").map(({ number, figure }) => [number, figure.id])).toEqual([
      [1, "series-salinity"],
      [2, "drift-hodograph"],
    ]);
  });

  it("prints one parameter table for estimates that share their method, and one each for those that do not", () => {
    const [estimate] = memoInput().estimates;
    const tables = (codes: number) =>
      all(
        composeMemo(
          memoInput({
            estimates: [
              estimate!,
              { ...estimate!, code: "2617-08", response: sampleResponse(codes === 2 ? { method: {} } : {}) },
            ],
          }),
        ).blocks,
        "table",
      ).filter(({ caption }) => caption.startsWith("Laws and parameters"));
    expect(tables(1).map(({ caption }) => caption)).toEqual(["Laws and parameters of estimates 2617-07, 2617-08."]);
    expect(tables(2)).toHaveLength(2);
  });

  it("takes the author's answer before the drafted one, and drafts where that is blank", () => {
    const { facts } = memoInput();
    const first = (answer: string | null) => {
      const [block] = composeMemo(memoInput({ facts: { ...facts, answer } })).blocks;
      return block?.kind === "paragraph" ? textOf(block.runs) : "";
    };
    expect(first("It held. ")).toBe("It held.");
    expect(first("  ")).toContain("freshened from 33.6");
  });

  it("composes something to read from nearly nothing", () => {
    const { facts } = memoInput();
    const bare = composeMemo(
      memoInput({
        facts: { ...facts, title: " ", question: "", intendedUse: "", reviewBy: null, sections: [] },
        estimates: [],
        boxes: [],
        series: [],
        waters: [],
        assumptions: [],
        limits: [],
        independentCheck: null,
        revisions: [],
        distribution: [],
        attachments: [],
      }),
    );
    expect(bare.title).toBe("Untitled memo");
    expect(sections(bare.blocks)).toEqual([]);
    expect(bare.blocks.map(({ kind }) => kind)).toEqual(["paragraph", "caution"]);
  });

  it("is pure data that survives JSON, the same each time", () => {
    expect(JSON.parse(JSON.stringify(memo))).toEqual(memo);
    expect(composeMemo(memoInput())).toEqual(memo);
  });
});
