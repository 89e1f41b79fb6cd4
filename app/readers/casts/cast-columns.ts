import type { CastChannel } from "./cast-reading";

interface ColumnRule {
  channel: CastChannel;
  /** Tried on the name in lower case. */
  names: RegExp;
  /** Units by their spelling in lower case, with the factor and zero of value = (file − zero) × factor. */
  units: readonly { written: RegExp; factor: number; zero?: number; id: string }[];
  /** Taken where no unit is told. */
  assumed: string;
}

/** Vendor short names come first, then words; second sensors of a kind are left out. */
const RULES: readonly ColumnRule[] = [
  {
    channel: "pressure",
    names: /^(?:pr(?:dm|sm|m|de)?|ctdprs|prs|pres(?:s(?:ure)?)?|sea[_ ]pressure|p)$|^pressure\b/,
    units: [
      { written: /^(?:db(?:ar)?|decibars?)$/, factor: 1, id: "dbar" },
      { written: /^bar$/, factor: 10, id: "bar" },
      { written: /^kpa$/, factor: 0.1, id: "kPa" },
      { written: /^mpa$/, factor: 100, id: "MPa" },
    ],
    assumed: "dbar",
  },
  {
    channel: "depth",
    names: /^(?:dep(?:sm|fm|th)?|depth|ctddep|z|tiefe|profundidade|profundidad|profondeur)\b/,
    units: [
      { written: /^(?:m|met(?:er|re)s?|salt water, m|fresh water, m)$/, factor: 1, id: "m" },
      { written: /^(?:ft|feet)$/, factor: 0.3048, id: "ft" },
    ],
    assumed: "m",
  },
  {
    channel: "temperature",
    names: /^(?:t0?90c|t090|tv290c|ctdtmp|temp(?:erature)?|t|t068c?|t0?68c)\b(?!.*(?:2|second))/,
    units: [
      {
        written: /^(?:°?c|deg ?c|celsius|degrees? celsius|its-?90(?:, ?deg ?c)?|ipts-?68(?:, ?deg ?c)?|its-90 deg c)$/,
        factor: 1,
        id: "°C",
      },
      { written: /^(?:°?f|deg ?f|fahrenheit)$/, factor: 5 / 9, zero: 32, id: "°F" },
      { written: /^k(?:elvin)?$/, factor: 1, zero: 273.15, id: "K" },
    ],
    assumed: "°C",
  },
  {
    channel: "salinity",
    names:
      /^(?:sal(?:00|inity)?|ctdsal|psal|sp|sa|practical salinity|absolute salinity|salinidade|salinidad|salinité|salzgehalt)\b/,
    units: [{ written: /^(?:psu|pss-?78|practical salinity scale|1|ppt|‰|g\/kg|practical)$/, factor: 1, id: "1" }],
    assumed: "1",
  },
  {
    channel: "conductivity",
    names: /^(?:c0(?:s\/m|ms\/cm|us\/cm)|cond(?:uctivity)?|ctdcond|cnd)\b(?!.*(?:2|second|spec))/,
    units: [
      { written: /^s\/m$/, factor: 1, id: "S/m" },
      { written: /^(?:ms\/cm|millisiemens per centimeter)$/, factor: 0.1, id: "mS/cm" },
      { written: /^(?:[uµμ]s\/cm|microsiemens per centimeter)$/, factor: 1e-4, id: "µS/cm" },
    ],
    assumed: "S/m",
  },
];

export interface CastColumn {
  channel: CastChannel;
  index: number;
  name: string;
  factor: number;
  zero: number;
  unit: string;
  /** Whether the file states the unit. */
  stated: boolean;
}

/**
 * Finds the column of each channel by its name; of several, the first.
 * @param names without units @param units as written, or null
 */
export function castColumns(names: readonly string[], units: readonly (string | null)[]): CastColumn[] {
  const found: CastColumn[] = [];
  for (const [index, name] of names.entries()) {
    const key = name.trim().toLowerCase();
    const rule = RULES.find(({ names: pattern }) => pattern.test(key));
    if (!rule || found.some(({ channel }) => channel === rule.channel)) continue;
    const written = units[index]?.trim().toLowerCase() ?? "";
    const unit = rule.units.find((candidate) => candidate.written.test(written));
    const assumed = rule.units.find(({ id }) => id === rule.assumed);
    const taken = unit ?? assumed;
    if (!taken) continue;
    found.push({
      channel: rule.channel,
      index,
      name: name.trim(),
      factor: taken.factor,
      zero: taken.zero ?? 0,
      unit: taken.id,
      stated: unit !== undefined,
    });
  }
  return found;
}
