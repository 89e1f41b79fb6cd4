import { bandMark } from "~/figures/small-marks";
import type { Block, MemoDocument, Run } from "~/memo/document";
import { CAUTION } from "~/ocean/caution";
import { DEFAULT_UNITS } from "~/units/unit-choices";

const cell = (text: string): Run[] => [{ text }];

export const SAMPLE_SVG = `<svg xmlns="http://www.w3.org/2000/svg" width="640" height="160" viewBox="0 0 640 160" font-family="Roboto Condensed" font-size="11">
<path d="M40,20L200,20L300,60L360,100L500,80L620,70" fill="none" stroke="var(--rain)" stroke-width="1.5"/>
<line x1="40" x2="620" y1="140" y2="140" stroke="var(--ink)"/><text x="40" y="14" fill="var(--ink)">surface salinity (g/kg), σ ≤ 1</text>
<text x="40" y="154" fill="var(--ink)" font-weight="bold">11-03</text></svg>`;

export function sampleFigure(id = "series-salinity"): Extract<Block, { kind: "figure" }> {
  return {
    kind: "figure",
    number: 1,
    source: "Estimate 2617-07.",
    figure: {
      id,
      title: "Surface salinity",
      caption: "Surface salinity with its band; times in UTC.",
      alt: "Surface salinity falls from 33.6 to 31.9 g/kg on 2026-11-05 and recovers to 32.7 g/kg.",
      width: 640,
      height: 160,
      svg: SAMPLE_SVG,
      table: { columns: [{ name: "time", unit: "" }], rows: [["2026-11-03T00:00:00Z"]] },
    },
  };
}

/** A table of `count` rows, each with its number in the first column. */
export function longTable(count: number): Extract<Block, { kind: "table" }> {
  return {
    kind: "table",
    caption: `Table of ${count} rows.`,
    columns: [
      { label: "Row number", unit: "", align: "left" },
      { label: "Wind speed", unit: "m/s", align: "right" },
      { label: "Remark", unit: "", align: "left" },
    ],
    rows: Array.from({ length: count }, (_, index) => [
      cell(`row ${index + 1}`),
      cell((index / 10).toFixed(1)),
      cell(
        index % 17 === 0
          ? "a remark that is long enough to need more than one line of the table that it stands in, twice over"
          : "",
      ),
    ]),
  };
}

export function sampleMemo(changes: Partial<MemoDocument> = {}): MemoDocument {
  return {
    schema: 1,
    pageSize: "A4",
    language: "en-GB",
    organisation: "Thornholm Coastal",
    title: "November gale: salinity at the Skarrow Bay intake",
    subtitle: "Memo 2617-M2 to Skarrow Water Works · issued for client decision · 2026-11-11",
    notice: "",
    titleBlock: {
      project: "Skarrow Bay intake, autumn storms",
      jobNumber: "2617",
      client: "Skarrow Water Works",
      memoNumber: "2617-M2",
      revision: "B",
      issuedFor: "issued for client decision",
      originator: "R. Ansel",
      checker: "M. Tolve",
      date: "2026-11-11",
      stamp: "GP-7K2M-41XQ",
    },
    caution: CAUTION,
    engine: "engine 1.0.0",
    blocks: [
      {
        kind: "paragraph",
        style: "lead",
        runs: [
          { text: "The surface layer at the intake freshened from 33.6 to " },
          { text: "31.9 g/kg", bold: true, colour: "rain" },
          { text: " (31.6 to 32.2) and stayed below your trigger level of 32.5 for about " },
          { text: "19 hours", bold: true },
          {
            text: ". The layer then moved some 84 km towards the south-east. The rain record drives the range; the drag law hardly matters.",
          },
        ],
      },
      {
        kind: "headlines",
        caption: "Headline figures",
        rows: [
          {
            label: "Lowest surface salinity",
            value: "31.9",
            unit: "g/kg",
            mark: bandMark(
              { value: 31.9, p10: 31.6, p90: 32.2, trigger: 32.5, from: 31, to: 34 },
              "salinity",
              DEFAULT_UNITS,
            ),
            band: "31.6 to 32.2 g/kg",
            remark: "19 h below 32.5 g/kg",
          },
          {
            label: "Net displacement",
            value: "84",
            unit: "km to 128°",
            mark: bandMark(
              { value: 84_000, p10: 70_000, p90: 98_000, from: 0, to: 120_000 },
              "displacement",
              DEFAULT_UNITS,
            ),
            band: "70 to 98 km",
            remark: "5 days",
          },
          { label: "Temperature change", value: "−0.9", unit: "°C", mark: null, band: "", remark: "" },
        ],
      },
      { kind: "caution", text: CAUTION },
      sampleFigure(),
      { kind: "heading", level: 1, text: "Method" },
      {
        kind: "paragraph",
        style: "body",
        runs: [
          { text: "Wind stress is taken from wind speed at 10 m; the layer is a slab of depth " },
          { text: "h", italic: true },
          {
            text: " with decay rate 10⁻⁵ s⁻¹ and density ρ. The temperature reads θ and σ₀ is potential density. Where √x ≤ 2 → ∂S/∂t ≈ 0.",
          },
        ],
      },
      {
        kind: "equation",
        number: 1,
        name: "Wind stress",
        runs: [
          { text: "τ", italic: true },
          { text: " = ρ" },
          { text: "a", rise: "sub" },
          { text: " C" },
          { text: "D", rise: "sub" },
          { text: " U" },
          { text: "10", rise: "sub" },
          { text: "2", rise: "super" },
        ],
        symbols: [
          { symbol: [{ text: "τ", italic: true }], meaning: "wind stress on the sea surface", unit: "N/m²" },
          { symbol: [{ text: "ρ" }, { text: "a", rise: "sub" }], meaning: "density of the air", unit: "kg/m³" },
        ],
        source: "Large and Pond 1981; valid from 4 to 25 m/s.",
      },
      { kind: "heading", level: 2, text: "Where this holds" },
      {
        kind: "fitNotes",
        notes: [
          {
            severity: "ok",
            message: "The storm lasts longer than the inertial period: 120 h, at least 14.2 h.",
            source: "Pollard and Millard 1970",
          },
          {
            severity: "caution",
            message: "The shore lies within one internal Rossby radius; rising or sinking along it is not carried.",
            source: "",
          },
        ],
      },
      { kind: "heading", level: 1, text: "References" },
      {
        kind: "references",
        items: [
          {
            id: "largePond1981",
            text: "Large, W. G. and Pond, S. 1981. Open ocean momentum flux measurements in moderate to strong winds. Journal of Physical Oceanography 11, 324–336.",
            link: "https://doi.org/10.1175/1520-0485(1981)011<0324:OOMFMI>2.0.CO;2",
          },
        ],
      },
    ],
    ...changes,
  };
}
