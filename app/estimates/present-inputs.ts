/** The inputs of an estimate in rows that can be read and checked, in the organisation's units and the project's zone. */
import type { InputsRegister, RegisteredRecord } from "./inputs-register";
import { sheetLabel } from "./estimate-code";
import { formatPosition } from "~/area/format-coordinates";
import { measureBox } from "~/area/measure-box";
import type { TriggerLevel } from "~/ocean/scenario";
import { SALINITY_PER_PSS } from "~/ocean/constants";
import { formatBearing, formatQuantity, formatRange } from "~/units/format-quantity";
import { formatPeriod } from "~/units/format-time";
import { quantity } from "~/units/quantities";
import type { RegisteredQuality } from "~/quality/register-quality";
import { decisionLines, overrideLines, qualityLines } from "~/quality/registered-words";
import { CHANNELS } from "~/storms/channels";
import { trackRows } from "~/storms/track-rows";
import type { UnitChoices } from "~/units/unit-choices";

export interface Row {
  label: string;
  value: string;
}

export interface RecordView {
  name: string;
  sourceFileId: string | null;
  fileName: string | null;
  sha256: string | null;
  rows: Row[];
}

export interface InputsView {
  box: Row[];
  corners: string[];
  storm: Row[];
  records: RecordView[];
  water: Row[];
  /** The cast's original; null where two layers were typed. */
  castFile: { sourceFileId: string; fileName: string; sha256: string } | null;
}

function triggerRow({ quantity: id, side, value, hours }: TriggerLevel, units: UnitChoices): string {
  return `${quantity(id).name} ${side} ${formatQuantity(value, id, units).text} for ${hours}\u00a0h`;
}

function recordRows(
  { id, origin, provenance }: RegisteredRecord,
  quality: RegisteredQuality | undefined,
  zone: string,
  units: UnitChoices,
): Row[] {
  if (!provenance) return [{ label: "Origin", value: origin }];
  const { rows, first, last, windHeight, averagingMinutes, channels, steps, dropped } = provenance;
  const said = (label: string, values: (string | null)[]): Row[] => {
    const value = values.filter(Boolean).join("; ");
    return value === "" ? [] : [{ label, value }];
  };
  return [
    ...said("Format", [provenance.formatLabel]),
    ...said("Rows", [String(rows)]),
    ...said("Period", [formatPeriod(first, last, zone)]),
    ...said("Time zone of the file", [provenance.zone]),
    ...said("Wind height", [windHeight === null ? null : formatQuantity(windHeight, "depth", units).text]),
    ...said("Averaging", [averagingMinutes === null ? null : `${averagingMinutes}\u00a0min`]),
    ...said(
      "Channels",
      channels.map(
        ({ channel, unit, count, missing }) =>
          `${CHANNELS[channel].label} (${unit}): ${count} values, ${missing} missing`,
      ),
    ),
    ...said(
      "Steps",
      steps.map(({ label, count }) => `${label}, ${count} values`),
    ),
    ...said(
      "Left out",
      dropped.map(({ reason, count, firstRow }) => `${count} rows: ${reason} (first in row ${firstRow})`),
    ),
    ...said("Quality", quality && id ? qualityLines(quality, id) : []),
    ...said("Flags set by persons", quality && id ? overrideLines(quality, id, zone) : []),
  ];
}

/** Both scales where the numbers are practical, since the engine computes with the absolute one. */
function salinityText(value: number, { salinityScale }: InputsRegister["water"], units: UnitChoices): string {
  if (salinityScale === "absolute") return `${formatQuantity(value, "salinity", units, { decimals: 2 }).text}`;
  return `${value.toFixed(2)}\u00a0PSS-78 as given, about ${(value * SALINITY_PER_PSS).toFixed(2)}\u00a0g/kg`;
}

function castRows({ cast }: InputsRegister["water"], units: UnitChoices): Row[] {
  if (!cast) return [];
  const { formatLabel, rows, half, shallowest, deepest, layerDepth, leftOut } = cast.provenance;
  const range = formatRange(shallowest, deepest, "depth", units, { decimals: 1 });
  return [
    { label: "Cast", value: `${formatLabel}, ${rows} records; ${cast.levels} levels of the way ${half}, ${range}` },
    {
      label: "Depth of the layer",
      value:
        layerDepth === null
          ? "found by the method sheet's step of density; in the next row by 0.03\u00a0kg/m³"
          : `set by hand to ${formatQuantity(layerDepth, "layerDepth", units).text}`,
    },
    ...(leftOut.length > 0 ? [{ label: "Columns left out", value: leftOut.join(", ") }] : []),
  ];
}

export function presentInputs(register: InputsRegister, zone: string, units: UnitChoices): InputsView {
  const { box, storm, water, method } = register;
  const { areaKm2, centroid } = measureBox(box.polygon);
  const given = (value: number | null, id: "depth" | "distance") =>
    value === null ? "not given" : formatQuantity(value, id, units).text;
  const below = water.belowTemperature !== null && water.belowSalinity !== null;
  return {
    box: [
      { label: "Study box", value: box.name },
      { label: "Centre (WGS 84)", value: formatPosition(centroid) },
      { label: "Area", value: formatQuantity(areaKm2 * 1e6, "area", units).text },
      { label: "Water depth", value: given(box.waterDepth, "depth") },
      { label: "Distance to the shore", value: given(box.distanceToShore, "distance") },
      {
        label: "Shore normal, pointing offshore",
        value: box.shoreNormal === null ? "not given" : formatBearing(box.shoreNormal),
      },
      {
        label: "Trigger levels",
        value: box.triggerLevels.map((level) => triggerRow(level, units)).join("; ") || "none",
      },
    ],
    corners: box.polygon.map((corner) => formatPosition(corner, "decimal", 5)),
    storm: [
      { label: "Storm", value: storm.name },
      {
        label: "Window",
        value:
          storm.startsAt === null || storm.endsAt === null
            ? "not set"
            : formatPeriod(storm.startsAt, storm.endsAt, zone),
      },
      ...(storm.quality ? [{ label: "Quality", value: decisionLines(storm.quality).join(" ") }] : []),
      ...(storm.track ? trackRows(storm.track) : []),
    ],
    records: storm.records.map((record) => ({
      name: record.name,
      sourceFileId: record.sourceFileId,
      fileName: record.fileName,
      sha256: record.sha256,
      rows: recordRows(record, storm.quality, zone, units),
    })),
    castFile: water.cast ?? null,
    water: [
      { label: "Water column", value: water.name },
      { label: "Source of the numbers", value: water.source || "not given" },
      ...castRows(water, units),
      {
        label: water.cast ? "Layer of the cast" : "Layer",
        value: `${formatQuantity(water.temperature, "temperature", units, { decimals: 2 }).text}, ${salinityText(water.salinity, water, units)}, ${formatQuantity(water.layerDepth, "layerDepth", units).text} deep`,
      },
      {
        label: "Water below",
        value: below
          ? `${formatQuantity(water.belowTemperature, "temperature", units, { decimals: 2 }).text}, ${salinityText(water.belowSalinity ?? Number.NaN, water, units)}`
          : "not given",
      },
      { label: "Method sheet", value: sheetLabel(method) },
    ],
  };
}
