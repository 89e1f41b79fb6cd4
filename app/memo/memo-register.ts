/** The memo's register of what was put in: boxes, series, water and assumptions, each once. */
import { measureBox } from "~/area/measure-box";
import type { InputsRegister, RegisteredRecord } from "~/estimates/inputs-register";
import { decisionLines, overrideLines, qualityLines } from "~/quality/registered-words";
import type { StormTrack } from "~/storms/storm-track";
import { trackRows } from "~/storms/track-rows";
import { TRACK_WIND_HEIGHT } from "~/storms/track-series";
import { formatQuantity, formatRange } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";
import type { MemoAssumption, MemoBox, MemoSeries, MemoWater } from "./memo-input";

function unique<T>(entries: T[], key: (entry: T) => string): T[] {
  return [...new Map(entries.map((entry) => [key(entry), entry])).values()];
}

export function registerBoxes(registers: InputsRegister[]): MemoBox[] {
  return unique(
    registers.map(({ box }) => box),
    ({ name }) => name,
  ).map(({ name, polygon, waterDepth, distanceToShore, shoreNormal }) => ({
    name,
    corners: polygon,
    area: measureBox(polygon).areaKm2 * 1e6,
    waterDepth,
    distanceToShore,
    shoreNormal,
    whyChosen: "",
  }));
}

function missingShare({ channels }: NonNullable<RegisteredRecord["provenance"]>): number | null {
  const present = channels.reduce((sum, { count }) => sum + count, 0);
  const missing = channels.reduce((sum, channel) => sum + channel.missing, 0);
  return present + missing === 0 ? null : missing / (present + missing);
}

const ORIGINS: Record<RegisteredRecord["origin"], string> = {
  file: "file handed over, kept byte for byte",
  pasted: "pasted from a spreadsheet, kept as pasted",
  constant: "a constant over the storm's window",
};

function memoSeries({ name: stormName, quality }: InputsRegister["storm"], record: RegisteredRecord): MemoSeries[] {
  const { provenance } = record;
  if (!provenance) return [];
  return [
    {
      name: `${record.name}, for ${stormName}`,
      fileName: record.fileName ?? "none",
      sha256: record.sha256 ?? "none",
      rows: provenance.rows,
      first: provenance.first,
      last: provenance.last,
      channels: provenance.channels
        .map(({ channel, unit, fromColumns }) =>
          fromColumns.length > 0 ? `${channel} (${unit}) from ${fromColumns.join(", ")}` : `${channel} (${unit})`,
        )
        .join("; "),
      source: `${provenance.formatLabel}; ${ORIGINS[record.origin]}`,
      zone: provenance.zone,
      windHeight: provenance.windHeight,
      averagingMinutes: provenance.averagingMinutes,
      missingShare: missingShare(provenance),
      steps: provenance.steps.map(({ label, count }) => `${label} (${count} values)`),
      quality:
        quality && record.id
          ? [
              ...qualityLines(quality, record.id),
              ...overrideLines(quality, record.id, "UTC"),
              ...decisionLines(quality),
            ]
          : [],
      gaps: provenance.dropped.map(({ reason, count, firstRow }) => `${reason}: ${count}, first in row ${firstRow}`),
    },
  ];
}

/** A track stands among the series, for it takes the place of one. */
function memoTrack(stormName: string, track: StormTrack): MemoSeries {
  const { fixes, source, averagingMinutes } = track;
  const iso = (seconds: number) => new Date(seconds * 1000).toISOString();
  return {
    name: `Cyclone track, for ${stormName}`,
    fileName: source?.fileName ?? "none",
    sha256: source?.sha256 ?? "none",
    rows: fixes.length,
    first: iso(fixes[0].time),
    last: iso(fixes[fixes.length - 1].time),
    channels: "position, central pressure, maximum wind and its radius, where told",
    source: source?.formatLabel ?? "typed",
    zone: "UTC",
    windHeight: TRACK_WIND_HEIGHT,
    averagingMinutes,
    missingShare: null,
    steps: trackRows(track).flatMap(({ label, value }) => (label === "Track" ? [] : [`${label}: ${value}`])),
    quality: [],
    gaps: [],
  };
}

export function registerSeries(registers: InputsRegister[]): MemoSeries[] {
  return unique(
    registers.flatMap(({ storm }) => [
      ...(storm.track ? [memoTrack(storm.name, storm.track)] : []),
      ...storm.records.flatMap((record) => memoSeries(storm, record)),
    ]),
    ({ name, sha256 }) => `${name} ${sha256}`,
  );
}

function castDetails({ cast }: InputsRegister["water"], units: UnitChoices): MemoWater["details"] {
  if (!cast) return [];
  const { formatLabel, half, shallowest, deepest, layerDepth } = cast.provenance;
  const range = formatRange(shallowest, deepest, "depth", units, { decimals: 1 });
  return [
    { label: "Cast", text: `${formatLabel}; the way ${half}, ${range}` },
    {
      label: "Layer by",
      text: layerDepth === null ? "the method sheet's step of density; here by 0.03 kg/m³" : "judgement",
    },
  ];
}

export function registerWaters(registers: InputsRegister[], units: UnitChoices): MemoWater[] {
  return unique(
    registers.map(({ water }) => water),
    ({ name }) => name,
  ).map((water) => {
    const salinity = (value: number) =>
      water.salinityScale === "absolute"
        ? formatQuantity(value, "salinity", units, { decimals: 2 }).text
        : `${value} (PSS-78)`;
    const temperature = (value: number) => formatQuantity(value, "temperature", units, { decimals: 2 }).text;
    const below =
      water.belowTemperature === null || water.belowSalinity === null
        ? "not known"
        : `${temperature(water.belowTemperature)}, ${salinity(water.belowSalinity)}`;
    return {
      name: water.name,
      kind: water.cast ? `cast of ${water.cast.levels} levels` : "two layers",
      details: [
        { label: "Source", text: water.source },
        ...castDetails(water, units),
        { label: "Layer", text: `${temperature(water.temperature)}, ${salinity(water.salinity)}` },
        { label: "Layer depth", text: formatQuantity(water.layerDepth, "layerDepth", units).text },
        { label: "Water below", text: below },
      ],
      fileName: water.cast?.fileName ?? null,
      sha256: water.cast?.sha256 ?? null,
    };
  });
}

export function registerAssumptions(assumptions: string[]): MemoAssumption[] {
  return [...new Set(assumptions)].map((statement) => ({
    statement,
    basis: "taken by the method where the records say nothing",
    effect: "not tested",
  }));
}
