import { formatPosition } from "~/area/format-coordinates";
import { CAST_CHANNEL_NAMES, type CastChannel, type CastReading } from "~/readers/casts/cast-reading";
import { formatNumber, formatQuantity, formatRange } from "~/units/format-quantity";
import { formatTime } from "~/units/format-time";
import type { UnitChoices } from "~/units/unit-choices";
import type { CastProvenance } from "./cast-provenance";
import type { CastDescription } from "./describe-cast";
import { presentColumn, type PresentedColumn } from "./present-column";
import { scaleUnit } from "./water-schema";

export interface CastRow {
  depth: string;
  pressure: string;
  temperature: string;
  salinity: string;
  sigma0: string;
}

export interface ChannelLine {
  channel: CastChannel;
  unit: string;
  from: string;
  count: number;
  missing: number;
  min: string;
  max: string;
}

/** What a cast's sheet shows of a reading: everything but the samples themselves. */
export interface PresentedCast {
  formatLabel: string;
  facts: { what: string; taken: string; confidence: string }[];
  channels: ChannelLine[];
  leftOut: string[];
  questions: CastReading["questions"];
  problems: CastReading["problems"];
  /** Three from the top and three from the end, as taken over. */
  first: CastRow[];
  last: CastRow[];
  salinityUnit: string;
  /** Null where fewer than two levels can be used. */
  column: PresentedColumn | null;
  /** In a sentence each. */
  layers: string[];
  inversion: string | null;
}

const ROWS_SHOWN = 3;
const HALVES = { down: "the way down", up: "the way up" };

/** @param description null where fewer than two levels can be used */
export function presentCast(
  reading: CastReading,
  description: CastDescription | null,
  zone: string,
  units: UnitChoices,
): PresentedCast {
  const { samples } = reading;
  const rows = samples.map((_, k) => k);
  const row = (k: number) => castRow(reading, description, k);
  return {
    formatLabel: reading.formatLabel,
    facts: [...countedFacts(reading, zone), ...reading.understood],
    channels: CAST_CHANNEL_NAMES.flatMap((channel) => {
      const read = reading.channels[channel];
      if (!read) return [];
      const text = (value: number | null) => (value === null ? "–" : formatNumber(value, 3));
      const { unit, from, count, missing, min, max } = read;
      return [{ channel, unit, from, count, missing, min: text(min), max: text(max) }];
    }),
    leftOut: reading.leftOut,
    questions: reading.questions,
    problems: reading.problems,
    first: rows.slice(0, ROWS_SHOWN).map(row),
    last: rows.slice(Math.max(ROWS_SHOWN, rows.length - ROWS_SHOWN)).map(row),
    salinityUnit: scaleUnit(reading.salinityScale),
    column: description && presentColumn(description.twoLayers, units),
    layers: (description?.layers ?? []).map((layer) => layerSentence(layer, units)),
    inversion: description && inversionSentence(description.inversion, units),
  };
}

/** `Cast of 489 levels, 0.0 to 968 m` */
export function castSentence(
  { length, provenance }: { length: number; provenance: CastProvenance | null },
  units: UnitChoices,
): string {
  const range = provenance && formatRange(provenance.shallowest, provenance.deepest, "depth", units, { decimals: 1 });
  return `Cast of ${length} levels${range ? `, ${range}` : ""}`;
}

function countedFacts({ rows, samples, half, time, latitude, longitude }: CastReading, zone: string) {
  const position = latitude === null || longitude === null ? null : formatPosition([longitude, latitude]);
  return [
    {
      what: "Records",
      taken: `${rows}, of which ${samples.length} are taken, on ${HALVES[half]}`,
      confidence: "counted",
    },
    {
      what: "Time",
      taken: time === null ? "not told" : formatTime(time, zone),
      confidence: time === null ? "–" : "stated in the file",
    },
    {
      what: "Position",
      taken: position ?? "not told",
      confidence: position === null ? "–" : "stated in the file",
    },
  ];
}

function castRow({ samples }: CastReading, description: CastDescription | null, k: number): CastRow {
  const { depth, pressure, temperature, salinity } = samples[k];
  const sigma0 = description?.sigma0[k];
  return {
    depth: formatNumber(depth, 2),
    pressure: formatNumber(pressure, 2),
    temperature: formatNumber(temperature, 4),
    salinity: formatNumber(salinity, 4),
    sigma0: sigma0 === undefined ? "–" : formatNumber(sigma0, 3),
  };
}

function layerSentence({ step, depth, reached }: CastDescription["layers"][number], units: UnitChoices): string {
  const text = formatQuantity(depth, "layerDepth", units, { decimals: 1 }).text;
  return reached
    ? `By a step of ${step} kg/m³ the layer is ${text} deep.`
    : `A step of ${step} kg/m³ is not reached: the cast ends at ${text}, all of it mixed.`;
}

function inversionSentence(inversion: CastDescription["inversion"], units: UnitChoices): string | null {
  if (!inversion) return null;
  const at = (metres: number) => formatQuantity(metres, "depth", units, { decimals: 1 }).text;
  return `Between ${at(inversion.above)} and ${at(inversion.below)} density falls by ${formatNumber(inversion.fall, 3)} kg/m³ with depth, which water at rest does not do: a spike of the instrument, or water that is overturning. Look at the figure before you confirm.`;
}
