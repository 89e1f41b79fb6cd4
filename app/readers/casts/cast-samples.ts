import type { Understood } from "../reading";
import { monotone } from "./cast-halves";
import type { CastSample } from "./cast-reading";

export interface CastProfiles {
  pressure: Float64Array;
  depth: Float64Array;
  temperature: Float64Array;
  /** Null where the file has none. */
  salinity: Float64Array | null;
}

/** More levels than this are averaged in bins: no estimate gains by them. */
const MOST_LEVELS = 5000;
const NARROWEST_BIN = 0.05;
/** dbar */
const NEAR_SURFACE = 2;
const FRESH_IN_SALT = 0.1;

/**
 * One half of a cast from the surface down: reversals passed over, records in the air and without a value left out.
 * @param order records from the surface down
 */
export function castSamples(order: readonly number[], profiles: CastProfiles, notes: Understood[]): CastSample[] {
  const { pressure, depth, temperature, salinity } = profiles;
  const inAir = airRecords(order, profiles);
  const wet = order.filter((k) => !inAir.has(k));
  const downward = monotone(wet, pressure);
  const known = wet.filter((k) => !Number.isNaN(pressure[k])).length;
  tell(notes, "In the air", inAir.size, "records near the surface whose water is all but fresh are left out");
  tell(notes, "Reversals", known - downward.length, "records no deeper than one before them are left out");
  const samples = downward.flatMap((k) => {
    const sample = {
      depth: Math.max(0, depth[k]),
      pressure: Math.max(0, pressure[k]),
      temperature: temperature[k],
      salinity: salinity?.[k] ?? NaN,
    };
    return Object.values(sample).every(Number.isFinite) ? [sample] : [];
  });
  return binned(distinct(samples), notes);
}

function tell(notes: Understood[], what: string, count: number, words: string): void {
  if (count > 0) notes.push({ what, taken: `${count} ${words}`, confidence: "by content" });
}

/** A conductivity cell above the water reads next to nothing. */
function airRecords(order: readonly number[], { pressure, salinity }: CastProfiles): Set<number> {
  if (!salinity) return new Set();
  const present = order.map((k) => salinity[k]).filter((value) => !Number.isNaN(value));
  const median = present.sort((a, b) => a - b)[present.length >> 1] ?? 0;
  return new Set(order.filter((k) => pressure[k] < NEAR_SURFACE && salinity[k] < FRESH_IN_SALT * median));
}

/** Each depth once and deeper than the one before it: of several records at the surface, the last stands for them. */
function distinct(samples: readonly CastSample[]): CastSample[] {
  const kept: CastSample[] = [];
  let beneath = Infinity;
  for (let k = samples.length - 1; k >= 0; k -= 1) {
    if (!(samples[k].depth < beneath)) continue;
    beneath = samples[k].depth;
    kept.push(samples[k]);
  }
  return kept.reverse();
}

function binned(samples: CastSample[], notes: Understood[]): CastSample[] {
  if (samples.length <= MOST_LEVELS) return samples;
  const deepest = samples[samples.length - 1].depth;
  let width = NARROWEST_BIN;
  while (deepest / width > MOST_LEVELS) width *= 2;
  const bins = new Map<number, CastSample[]>();
  for (const sample of samples) {
    const bin = Math.floor(sample.depth / width);
    const members = bins.get(bin);
    if (members) members.push(sample);
    else bins.set(bin, [sample]);
  }
  tell(notes, "Levels", samples.length, `are averaged in bins of ${width} m`);
  const mean = (members: readonly CastSample[], key: keyof CastSample) =>
    members.reduce((sum, sample) => sum + sample[key], 0) / members.length;
  return [...bins.values()].map((members) => ({
    depth: mean(members, "depth"),
    pressure: mean(members, "pressure"),
    temperature: mean(members, "temperature"),
    salinity: mean(members, "salinity"),
  }));
}
