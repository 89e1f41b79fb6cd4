import type { CastChannel, SalinityKind, TemperatureScale } from "./cast-reading";

/** value in the channel's unit = (as written − zero) × factor */
export interface CastUnit {
  id: string;
  /** Tried on the unit in lower case. */
  written: RegExp;
  factor: number;
  zero?: number;
}

interface ChannelRule {
  /** Tried on the name in lower case. */
  names: RegExp;
  /** The first is taken where nothing tells. */
  units: readonly [CastUnit, ...CastUnit[]];
  /** In the channel's unit: beyond is no sea. Common practice, no source. */
  limits: { min: number; max: number };
  /** Picks the unit from the median as written where the file states none; null where any will do. */
  unitByContent?: (median: number) => string;
}

/** Vendor short names come first, then words; second sensors of a kind follow the first. */
export const CHANNEL_RULES: Record<CastChannel, ChannelRule> = {
  pressure: {
    names:
      /^(?:pr(?:dm|sm|m|de)?|ctdprs|prs|pres(?:s(?:ure)?)?|sea[_ ]pressure|p|druck|presi[oó]n|press[aã]o|pression)$|^(?:sea[_ ])?pressure\b/,
    units: [
      { id: "dbar", written: /^(?:db(?:ar)?s?|decibars?)$/, factor: 1 },
      { id: "bar", written: /^bars?$/, factor: 10 },
      { id: "kPa", written: /^kpa$/, factor: 0.1 },
      { id: "MPa", written: /^mpa$/, factor: 100 },
    ],
    limits: { min: -5, max: 11_500 },
  },
  depth: {
    names: /^(?:dep(?:sm|sf|fm|ff|th)?|ctddep|z|tiefe|profundidade?|profondeur)(?![a-z])/,
    units: [
      { id: "m", written: /^(?:m|met(?:er|re)s?|(?:salt|fresh) water, m)$/, factor: 1 },
      { id: "ft", written: /^(?:ft|feet|foot|(?:salt|fresh) water, ft)$/, factor: 0.3048 },
      { id: "fathom", written: /^(?:fathoms?|fm|ftm)$/, factor: 1.8288 },
    ],
    limits: { min: -11_000, max: 11_000 },
  },
  temperature: {
    names:
      /^(?:t[01]?(?:90|68)c?|tv[0-9](?:90|68)c|ctdtmp|temp(?:erature)?\d?|temperatura|température|temperatur|water temp(?:erature)?|t)(?![a-z])/,
    units: [
      {
        id: "°C",
        written: /^(?:°?c|deg(?:rees?)? ?c(?:elsius)?|celsius|(?:its|ipts)-?(?:90|68)(?:[, ]+(?:deg )?c)?)$/,
        factor: 1,
      },
      {
        id: "°F",
        written: /^(?:°?f|deg(?:rees?)? ?f(?:ahrenheit)?|fahrenheit|its-90, deg f)$/,
        factor: 5 / 9,
        zero: 32,
      },
      { id: "K", written: /^k(?:elvin)?$/, factor: 1, zero: 273.15 },
    ],
    limits: { min: -2.5, max: 40 },
    unitByContent: (median) => (median > 200 ? "K" : median > 40 ? "°F" : "°C"),
  },
  salinity: {
    names:
      /^(?:s|sal(?:00|11)?|ctdsal|psal|sp|sa|(?:practical |absolute )?salinity|salinidade?|salinité|salzgehalt)(?![a-z])/,
    units: [
      { id: "as written", written: /^(?:psu|pss(?:-?78)?|practical(?: salinity scale)?|1|ppt|‰|g\/kg)$/, factor: 1 },
    ],
    limits: { min: 0, max: 42 },
  },
  conductivity: {
    names:
      /^(?:c[01](?:s\/m|ms\/cm|[uµμ]s\/cm)|cond(?:uctivity)?|ctdcond|cnd|condutividade|conductividad|conductivité|leitfähigkeit)(?![a-z])/,
    units: [
      { id: "S/m", written: /^(?:s\/m|siemens per met(?:er|re))$/, factor: 1 },
      { id: "mS/cm", written: /^(?:ms\/cm|mmho\/cm|millisiemens per centimet(?:er|re))$/, factor: 0.1 },
      { id: "µS/cm", written: /^(?:[uµμ]s\/cm|microsiemens per centimet(?:er|re))$/, factor: 1e-4 },
    ],
    limits: { min: -0.01, max: 8 },
    unitByContent: (median) => (median > 100 ? "µS/cm" : median > 8 ? "mS/cm" : "S/m"),
  },
};

/** The temperature scale that a name or a unit states; null where neither does. */
export function statedTemperatureScale(name: string, unit: string | null): TemperatureScale | null {
  const said = `${name} ${unit ?? ""}`;
  if (/its-?90|^t[v\d]*90c?\b/i.test(said)) return "ITS-90";
  return /ipts-?68|^t[v\d]*68c?\b/i.test(said) ? "IPTS-68" : null;
}

/** The kind of salinity that a name or a unit states; null where neither does. */
export function statedSalinityKind(name: string, unit: string | null): SalinityKind | null {
  if (/absolute|^sa\b/i.test(name) || /^g\/kg$/i.test(unit ?? "")) return "absolute";
  return /practical|^(?:sp|sal00|sal11|ctdsal|psal)\b/i.test(name) || /psu|pss|practical/i.test(unit ?? "")
    ? "practical"
    : null;
}
