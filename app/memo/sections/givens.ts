/** What the estimates were given: study boxes, series and water columns. */
import type { Position } from "~/ocean/scenario";
import { formatBearing, formatNumber, formatQuantity } from "~/units/format-quantity";
import { formatPeriod } from "~/units/format-time";
import type { Block } from "../document";
import type { MemoBox, MemoInput, MemoSeries, MemoWater } from "../memo-input";
import { cell, column, factBlocks, NOT_KNOWN } from "./section";

export function boxBlocks({ boxes, units }: MemoInput): Block[] {
  if (boxes.length === 0) return [];
  const known = (value: number | null, id: "depth" | "distance") =>
    value === null ? NOT_KNOWN : formatQuantity(value, id, units).text;
  return [
    {
      kind: "table",
      caption: "Study boxes. The shore normal points offshore, in degrees true.",
      columns: [
        column("Box"),
        column("Area", "", "right"),
        column("Water depth", "", "right"),
        column("To the shore", "", "right"),
        column("Shore normal", "", "right"),
        column("Why chosen"),
      ],
      rows: boxes.map((box) => [
        cell(box.name),
        cell(formatQuantity(box.area, "area", units).text),
        cell(known(box.waterDepth, "depth")),
        cell(known(box.distanceToShore, "distance")),
        cell(box.shoreNormal === null ? NOT_KNOWN : formatBearing(box.shoreNormal)),
        cell(box.whyChosen),
      ]),
    },
    {
      kind: "table",
      caption: "Corners, WGS 84, decimal degrees.",
      columns: [column("Box"), column("Corner", "", "right"), column("Latitude"), column("Longitude")],
      rows: boxes.flatMap((box) =>
        openRing(box).map(([longitude, latitude], index) => [
          cell(index === 0 ? box.name : ""),
          cell(String(index + 1)),
          cell(degrees(latitude, "N", "S")),
          cell(degrees(longitude, "E", "W")),
        ]),
      ),
    },
  ];
}

/** Corners without the repeated first one that closes a ring. */
function openRing({ corners }: MemoBox): readonly Position[] {
  const first = corners[0];
  const last = corners.at(-1);
  const closed = corners.length > 1 && first && last && first[0] === last[0] && first[1] === last[1];
  return closed ? corners.slice(0, -1) : corners;
}

/** Five decimals are about a metre. */
function degrees(value: number, positive: string, negative: string): string {
  return `${formatNumber(Math.abs(value), 5)}° ${value < 0 ? negative : positive}`;
}

export function inputBlocks(input: MemoInput): Block[] {
  return [...input.series.flatMap((series) => seriesFacts(series, input)), ...input.waters.flatMap(waterFacts)];
}

function seriesFacts(series: MemoSeries, { project, units }: MemoInput): Block[] {
  const missing = series.missingShare;
  return factBlocks(`Series: ${series.name}`, [
    ["Source", series.source || NOT_KNOWN],
    ["File", series.fileName],
    ["SHA-256", series.sha256],
    ["Channels and native units", series.channels],
    ["Rows", formatNumber(series.rows, 0)],
    ["Period", formatPeriod(series.first, series.last, project.zone)],
    ["Times in the file", series.zone || NOT_KNOWN],
    ["Wind height", series.windHeight === null ? "" : formatQuantity(series.windHeight, "depth", units).text],
    ["Averaging period", series.averagingMinutes === null ? "" : `${formatNumber(series.averagingMinutes, 0)} min`],
    ["Missing", missing === null ? NOT_KNOWN : `${formatNumber(missing * 100, 1)} %`],
    ["Steps applied", series.steps.length > 0 ? series.steps.join("\n") : "none"],
    ["Quality", series.quality.join("\n")],
    ["Gaps and repairs", series.gaps.length > 0 ? series.gaps.join("\n") : "none"],
  ]);
}

function waterFacts({ name, kind, details, fileName, sha256 }: MemoWater): Block[] {
  return factBlocks(`Water column: ${name}`, [
    ["Kind", kind],
    ["File", fileName ?? ""],
    ["SHA-256", sha256 ?? ""],
    ...details.map(({ label, text }) => [label, text] as const),
  ]);
}
