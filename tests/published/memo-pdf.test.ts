/** A memo's PDF as other programs read it: poppler's tools and qpdf. Skipped with a notice where they are absent. */
import { spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { longTable, sampleFigure, sampleMemo } from "../factories/memo-document";
import { memoInput } from "../factories/memo-input";
import { composeMemo } from "~/memo/compose";
import type { Block, MemoDocument } from "~/memo/document";
import { type Attachment, renderPdf } from "~/memo/render-pdf.server";

const TOOLS = ["pdftotext", "pdfinfo", "pdffonts", "pdfdetach", "qpdf"];
const absent = TOOLS.filter((tool) => spawnSync(tool, ["--version"]).error !== undefined);
if (absent.length > 0) process.stdout.write(`memo PDF checks are skipped: ${absent.join(", ")} not found\n`);

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), "memo-pdf-"));
});
afterAll(() => rmSync(folder, { recursive: true }));

function run(tool: string, ...args: string[]): string {
  const { status, stdout, stderr } = spawnSync(tool, args, { encoding: "utf8", cwd: folder });
  if (status !== 0) throw new Error(`${tool} ${args.join(" ")}: ${stderr || stdout}`);
  return stdout;
}

function keep(pdf: Buffer): string {
  const file = path.join(folder, "memo.pdf");
  writeFileSync(file, pdf);
  return file;
}

async function textOf(memo: MemoDocument): Promise<string> {
  return run("pdftotext", "-layout", keep(await renderPdf(memo)), "-");
}

/** Each needle after the one before it. */
function expectInOrder(text: string, needles: string[]): void {
  let from = 0;
  for (const needle of needles) {
    const found = text.indexOf(needle, from);
    expect(
      found,
      `${needle} after ${needles.slice(0, needles.indexOf(needle)).at(-1) ?? "the start"}`,
    ).toBeGreaterThanOrEqual(0);
    from = found + needle.length;
  }
}

function xmpOf(pdf: Buffer): string {
  const text = pdf.toString("utf8");
  return text.slice(text.indexOf("<x:xmpmeta"), text.indexOf("</x:xmpmeta>") + "</x:xmpmeta>".length);
}

const paragraph = (text: string): Block => ({ kind: "paragraph", style: "body", runs: [{ text }] });
const only = (...blocks: Block[]) => sampleMemo({ blocks });

describe.skipIf(absent.length > 0)("a memo's PDF", () => {
  it("reads in the order of a defensible memo, sheets numbered, title block and caution on each", async () => {
    const text = await textOf(composeMemo(memoInput()));
    expectInOrder(text, [
      "Thornholm Coastal",
      "November gale: salinity at the Skarrow Bay intake",
      "freshened from 33.6 to 31.9 g/kg",
      "Peak wind stress",
      "Caution.",
      "Figure 1.",
      "GP-7K2M-41XQ",
      "Question",
      "Results",
      "Where the method holds here",
      "Study boxes",
      "Inputs register",
      "Method",
      "References",
      "Revision history",
    ]);
    const sheets = text.split("\f").filter((sheet) => sheet.trim() !== "");
    expect(sheets.length).toBeGreaterThan(3);
    sheets.forEach((sheet, index) => {
      expect(sheet).toContain(`${index + 1} of ${sheets.length}`);
      expect(sheet).toContain("GP-7K2M-41XQ");
      expect(sheet).toContain("Not for navigation, search and rescue");
    });
    expect(run("qpdf", "--check", "memo.pdf")).toContain("No syntax or stream encoding errors");
  });

  it("embeds every font it uses, a subset of each, with a map back to text", async () => {
    keep(await renderPdf(composeMemo(memoInput())));
    const fonts = run("pdffonts", "memo.pdf").trim().split("\n").slice(2);
    expect(fonts.length).toBeGreaterThan(2);
    for (const font of fonts)
      expect(font).toMatch(/(?:RobotoCondensed|NotoSansMath)\S* +CID TrueType +Identity-H +yes yes yes/);
  });

  it("is tagged, titled, in a language, with bookmarks and table heads that say what they head", async () => {
    keep(await renderPdf(composeMemo(memoInput())));
    const info = run("pdfinfo", "memo.pdf");
    expect(info).toMatch(/Title: +November gale: salinity at the Skarrow Bay intake/);
    expect(info).toMatch(/Tagged: +yes/);
    expect(info).toMatch(/CreationDate: +.*2026/);
    const structure = run("pdfinfo", "-struct", "memo.pdf");
    expect(structure).toMatch(/^ {2}H1/m);
    expect(structure).toMatch(/TH:\s+\/Scope \/Column/);
    expect(structure).toMatch(/TH:\s+\/Scope \/Row/);
    expectInOrder(structure, ["H1", "Table", "Figure", "H2", "Formula", "LBody", "Link"]);
    const plain = run("qpdf", "--qdf", "--object-streams=disable", "memo.pdf", "-");
    expect(plain).toContain("/Lang (en-GB)");
    expect(plain).toContain("/DisplayDocTitle true");
    expect(plain).toContain("/Title (Study boxes)");
    expect(plain).toContain("/Alt (Surface salinity falls from 33.6 to 31.9 g/kg");
  });

  it("leaves no marked content open or without a place in the structure", async () => {
    keep(await renderPdf(composeMemo(memoInput())));
    const plain = run("qpdf", "--qdf", "--object-streams=disable", "memo.pdf", "-");
    const count = (pattern: RegExp) => (plain.match(pattern) ?? []).length;
    expect(count(/ (?:BDC|BMC)$/gm)).toBe(count(/^EMC$/gm));
    expect(count(/\/MCID \d+/g)).toBeGreaterThan(50);
    // An entry of null in the parent tree is content that a screen reader cannot reach.
    expect(plain).not.toMatch(/\/Nums \[[^\]]*null/);
  });

  it("is the same file each time", async () => {
    const attachments = [attachment("a.csv")];
    const [first, second] = await Promise.all([
      renderPdf(composeMemo(memoInput()), { attachments }),
      renderPdf(composeMemo(memoInput()), { attachments }),
    ]);
    expect(first.equals(second)).toBe(true);
    const { facts } = memoInput();
    const other = await renderPdf(composeMemo(memoInput({ facts: { ...facts, revision: "C" } })), { attachments });
    expect(other.equals(first)).toBe(false);
  });

  it.each([
    ["A4", "595.28 x 841.89 pts (A4)"],
    ["Letter", "612 x 792 pts (letter)"],
  ] as const)("comes on %s", async (pageSize, told) => {
    keep(await renderPdf(composeMemo(memoInput({ pageSize }))));
    expect(run("pdfinfo", "memo.pdf")).toContain(told);
  });

  it("keeps its properties readable whatever is in the title", async () => {
    const title = 'Smith & Sons <north> "1" \u0001end';
    const pdf = await renderPdf(sampleMemo({ title }));
    const xmp = xmpOf(pdf);
    expect(xmp).toContain("Smith &amp; Sons &lt;north&gt;");
    expect(() => wellFormed(xmp)).not.toThrow();
    keep(pdf);
    expect(run("pdfinfo", "memo.pdf")).toContain("Smith & Sons <north>");
    expect(xmp).toContain("<pdfaid:part>3</pdfaid:part>");
    expect(xmp).toContain("<pdfaid:conformance>B</pdfaid:conformance>");
  });

  it("sets the head of a long table on each of its sheets and keeps all of its rows in order", async () => {
    const text = await textOf(only(longTable(121)));
    const sheets = text.split("\f").filter((sheet) => sheet.includes("row "));
    expect(sheets.length).toBeGreaterThanOrEqual(4);
    for (const sheet of sheets) expect(sheet).toContain("Wind speed (m/s)");
    expect([...text.matchAll(/^\s*row (\d+)/gm)].map((match) => Number(match[1]))).toEqual(
      Array.from({ length: 121 }, (_, index) => index + 1),
    );
    // Only the first head is one to a screen reader.
    expect(run("pdfinfo", "-struct", "memo.pdf").match(/\bTH\b/g)).toHaveLength(3);
  });

  it("prints Greek, signs and raised figures as text", async () => {
    const text = await textOf(only(paragraph("σθ, τ and Δρ; √x ≤ 2 → ∂S; 10⁻⁵ s⁻¹, CO₂, −0.9 °C, Łódź, Жуков")));
    for (const part of ["σθ, τ and Δρ", "≤ 2 →", "∂S", "−0.9 °C", "Łódź", "Жуков"]) expect(text).toContain(part);
    expect(text.replace(/\s/g, "")).toMatch(/10−5s−1/);
    expect(text).not.toContain("\uFFFD");
  });

  it("leaves no heading alone at the foot of a sheet", async () => {
    const places = new Set<number>();
    for (let lines = 25; lines < 32; lines += 1) {
      const blocks = [
        ...Array.from({ length: lines }, (_, index) => paragraph(`line ${index}`)),
        { kind: "heading", level: 1, text: "The heading" } as const,
        paragraph("what follows it"),
      ];
      const sheets = (await textOf(only(...blocks))).split("\f");
      const place = sheets.findIndex((sheet) => sheet.includes("The heading"));
      expect(sheets[place]).toContain("what follows it");
      places.add(place);
    }
    // The heading moved on while the lines grew, so the foot of the first sheet was among them.
    expect([...places]).toEqual([0, 1]);
  });

  it("holds its data as attached files", async () => {
    const bytes = new TextEncoder().encode("time,windSpeed (m/s)\r\n2026-11-03T00:00:00Z,12.1\r\n");
    keep(
      await renderPdf(sampleMemo(), {
        attachments: [{ ...attachment("wind & rain.csv"), bytes }, attachment("manifest.json")],
      }),
    );
    expect(run("pdfdetach", "-list", "memo.pdf")).toMatch(
      /2 embedded files[\s\S]*manifest\.json[\s\S]*wind & rain\.csv/,
    );
    run("pdfdetach", "-saveall", "-o", folder, "memo.pdf");
    expect(new Uint8Array(readFileSync(path.join(folder, "wind & rain.csv")))).toEqual(bytes);
    const plain = run("qpdf", "--qdf", "--object-streams=disable", "memo.pdf", "-");
    expect(plain.match(/\/AFRelationship \/Data/g)).toHaveLength(2);
  });

  it("refuses two attachments of one name, and a memo without a date, in words", async () => {
    await expect(renderPdf(sampleMemo(), { attachments: [attachment("a.csv"), attachment("a.csv")] })).rejects.toThrow(
      'Two attachments of a memo are named "a.csv".',
    );
    const { titleBlock } = sampleMemo();
    await expect(renderPdf(sampleMemo({ titleBlock: { ...titleBlock, date: "soon" } }))).rejects.toThrow(
      /ISO date.*"soon"/,
    );
  });

  it("prints a memo that is nearly empty, and one of very long words", async () => {
    const titleBlock = {
      ...sampleMemo().titleBlock,
      project: "",
      jobNumber: "",
      originator: "",
      checker: "",
      stamp: "",
    };
    const empty = sampleMemo({ organisation: "", title: "", subtitle: "", titleBlock, blocks: [] });
    expect(await textOf(empty)).toContain("1 of 1");

    const long = "unbroken".repeat(200);
    const figure = sampleFigure();
    const text = await textOf(
      sampleMemo({
        title: long,
        organisation: long,
        titleBlock: { ...sampleMemo().titleBlock, project: long, checker: long },
        blocks: [
          paragraph(long),
          { kind: "list", items: [[{ text: long }], []] },
          {
            kind: "facts",
            rows: [
              { label: long, value: [] },
              { label: "", value: [{ text: long }] },
            ],
          },
          {
            kind: "table",
            caption: "",
            columns: [
              { label: "", unit: "", align: "left" },
              { label: long, unit: "m", align: "right" },
            ],
            rows: [[[{ text: long.repeat(8) }]], []],
          },
          { kind: "table", caption: "none", columns: [], rows: [] },
          {
            kind: "headlines",
            caption: "",
            rows: [{ label: long, value: "", unit: "", mark: null, band: "", remark: long }],
          },
          { kind: "fitNotes", notes: [] },
          { kind: "equation", number: 1, name: "", runs: [{ text: long }], symbols: [], source: "" },
          { kind: "references", items: [{ id: "a", text: "", link: `https://example.org/${long}` }] },
          { kind: "pageBreak" },
          { kind: "pageBreak" },
          { ...figure, figure: { ...figure.figure, height: 2000 } },
          { kind: "pageBreak" },
        ],
      }),
    );
    expect(text.replace(/\s/g, "")).toContain("unbroken".repeat(20));
    expect(run("qpdf", "--check", "memo.pdf")).toContain("No syntax or stream encoding errors");
  });

  it("says on each sheet that it has been superseded", async () => {
    const text = await textOf(
      sampleMemo({ notice: "Superseded by revision C", blocks: [...sampleMemo().blocks, longTable(40)] }),
    );
    const sheets = text.split("\f").filter((sheet) => sheet.trim() !== "");
    expect(sheets.length).toBeGreaterThan(1);
    for (const sheet of sheets) expect(sheet).toContain("Superseded by revision C.");
  });
});

function attachment(name: string): Attachment {
  return {
    name,
    type: "text/csv",
    description: `Contents of ${name}`,
    bytes: new TextEncoder().encode(`name\r\n${name}\r\n`),
  };
}

/** Every tag closed in turn, no bare ampersand: what a reader of XML 1.0 asks before anything else. */
function wellFormed(xml: string): void {
  const open: string[] = [];
  for (const [, closing, name, attributes, alone] of xml.matchAll(
    /<(\/)?([\w:]+)((?:\s+[\w:]+\s*=\s*"[^"<&]*")*)\s*(\/)?>/g,
  )) {
    if (closing) {
      if (open.pop() !== name) throw new Error(`</${name}> closes nothing`);
    } else if (!alone && attributes !== undefined) open.push(name!);
  }
  if (open.length > 0) throw new Error(`<${open.at(-1)}> is never closed`);
  const text = xml.replace(/<\/?[\w:]+(?:\s+[\w:]+\s*=\s*"[^"<&]*")*\s*\/?>/g, "");
  const stray = /[<>]|&(?!(?:amp|lt|gt|quot|apos|#\d+);)/.exec(text);
  if (stray) throw new Error(`stray ${stray[0]}`);
  if (/[^\P{Cc}\t\n\r]/u.test(xml)) throw new Error("a control character");
}
