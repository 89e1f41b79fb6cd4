import { NAME_RULES, STAMP_WORDS, type NameRule } from "./column-vocabulary";
import { unitFromText, type FileUnit } from "./file-units";

/** Lower case, accents gone, words apart: `Spd40mNMax` → `spd 40 m n max`. */
export function spacedName(name: string): string {
  return name
    .normalize("NFKD")
    .replace(/[\u0300-\u036f]/g, "")
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .replace(/([A-Z])([A-Z][a-z])/g, "$1 $2")
    .replace(/([A-Za-z])(\d)/g, "$1 $2")
    .replace(/(\d)([A-Za-z])/g, "$1 $2")
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, " ")
    .trim();
}

/** Letters and digits only, lower case, accents gone. */
export function squashedName(name: string): string {
  return name
    .normalize("NFKD")
    .replace(/[\u0300-\u036f]/g, "")
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, "");
}

/** A header cell taken apart. */
export interface NameParts {
  /** Without comment mark and bracketed unit. */
  bare: string;
  /** Unit as written in the header, or null. */
  unitText: string | null;
  unit: FileUnit | null;
  /** Height above ground or sea in the name, m. */
  height: number | null;
}

const BRACKETS = /[([{]([^()[\]{}]*(?:\([^()]*\)[^()[\]{}]*)?)[)\]}]/g;
const HEIGHT = /(?:^|[^\d.,])(\d{1,3}(?:\.\d+)?)[ _-]?m(?=$|[^a-zA-Z0-9/²³]|[A-Z_])/;
const UNIT_TAIL =
  /[ _.-]+((?:m[ _/]?s(?:-1)?|mps|kno?t?s?|kts?|mph|km[ _/]?h|kph|deg[CFKT]?|hpa|mbar|mb|kpa|inhg|mm[ _/]?hr?|mm|in|inch|inches|w[ _/]?m2|wm-2|kj[ _/]?m2|mj[ _/]?m2|pct|percent|[cfk]))$/i;
/** Station-report names that carry their unit inside. Source: column notes of airport report archives. */
const UNIT_BY_NAME: Readonly<Record<string, string>> = {
  sknt: "kn",
  smph: "mph",
  p01i: "in",
  p01m: "mm",
  tmpf: "°F",
  dwpf: "°F",
  tmpc: "°C",
  dwpc: "°C",
  alti: "inHg",
  mslp: "hPa",
  drct: "deg",
  relh: "%",
};

/** What stands in brackets without being a unit: a statistic, a sense, a clock, a height. */
const NO_UNIT =
  /^(?:avg|average|mean|max\w*|min\w*|tot\w*|sum|inst\w*|raw|aut|auto|utc|gmt|local|lst|from|to|towards|true|mag\w*|\d+(?:\.\d+)? ?m(?:in\w*)?|hourly|daily)$/i;

/** Takes a header cell apart: bare name, unit in brackets or at the end of the name, height. */
export function nameParts(name: string): NameParts {
  const clean = name.replace(/^[\s#%;"']+/, "").trim();
  const groups = [...clean.matchAll(BRACKETS)].map((match) => (match[1] ?? "").trim());
  const bare = clean
    .replace(BRACKETS, " ")
    .replace(/[()[\]{}]/g, " ")
    .replace(/\s+/g, " ")
    .trim();
  let unitText: string | null = null;
  let unit: FileUnit | null = null;
  for (const group of groups.reverse()) {
    for (const piece of [group, ...group.split(/[,;]/)]) {
      const found = unitFromText(piece);
      if (found !== null && unit === null) {
        unit = found;
        unitText = piece.trim();
      }
    }
  }
  if (unit === null && clean.includes(",")) {
    const tail = clean.slice(clean.lastIndexOf(",") + 1).trim();
    unit = tail === "" ? null : unitFromText(tail);
    if (unit !== null) unitText = tail;
  }
  if (unit === null) {
    const tail = UNIT_TAIL.exec(bare)?.[1];
    const byName = UNIT_BY_NAME[squashedName(bare)];
    if (byName !== undefined) unit = unitFromText(byName);
    else if (tail !== undefined) unit = unitFromText(tail.replace("_", ""));
    if (unit !== null) unitText = byName ?? tail ?? null;
  }
  if (unit === null && groups.length > 0)
    unitText = groups.find((group) => /[a-z%°º/]/i.test(group) && !NO_UNIT.test(group)) ?? null;
  const height = HEIGHT.exec(bare)?.[1];
  return { bare: bare === "" ? clean : bare, unitText, unit, height: height === undefined ? null : Number(height) };
}

/** The first rule of the vocabulary that fits a name, or null. */
export function ruleForName(name: string): NameRule | null {
  const { bare } = nameParts(name);
  const spaced = spacedName(bare);
  const squashed = squashedName(bare);
  const withoutUnit = squashedName(bare.replace(UNIT_TAIL, ""));
  if (squashed === "") return null;
  for (const rule of NAME_RULES) {
    const whole = rule.whole?.some((word) => word === squashed || word === withoutUnit) ?? false;
    const words =
      rule.words !== undefined && rule.words.test(spaced) && (rule.also === undefined || rule.also.test(spaced));
    if ((whole || words) && !(rule.not?.test(spaced) ?? false)) return rule;
  }
  return null;
}

/** Whether a name tells of a date or a time. */
export function isStampName(name: string): boolean {
  return STAMP_WORDS.test(spacedName(name));
}

/** What a direction column's header says of its sense, or null. */
export function directionSenseOf(name: string): "from" | "towards" | null {
  const spaced = spacedName(name);
  if (/\b(?:to|toward|towards|going|hacia|vers|nach)\b/.test(spaced) && !/\bfrom\b/.test(spaced)) return "towards";
  return /\b(?:from|degt from|desde|aus|coming)\b/.test(spaced) ? "from" : null;
}
