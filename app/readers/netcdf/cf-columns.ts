import { directionSenseOf, ruleForName } from "../column-names";
import { CHANNEL_QUANTITIES, unitById, type FileUnit } from "../file-units";
import { isValueRole, type ValueRole } from "../propose-columns";
import type { ColumnReading, Understood } from "../reading";
import { heightOf } from "./cf-heights";
import { cfUnit } from "./cf-units";
import { FORECAST_CENTRE_NAMES, STANDARD_NAMES, type Meaning } from "./cf-vocabulary";
import { textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";

/** What one variable was taken for by its attributes, before its values are looked at. */
export interface CfColumn {
  variable: NetcdfVariable;
  role: ColumnReading["role"];
  unit: FileUnit | null;
  /** As written; null where the variable states none. */
  unitText: string | null;
  confidence: Understood["confidence"];
  /** Where a flux's sense is known: what was understood of it. */
  sense: Understood | null;
  /** Whether values are turned about, for want of a unit that says so. */
  negated: boolean;
  balance: Meaning["balance"] | null;
  height: number | null;
  note: string | null;
  rank: number;
}

/** Takes every numeric variable for something, by its standard name, its forecast centre's name, or its words. */
export function columnsOf(file: NetcdfFile, variables: readonly NetcdfVariable[]): CfColumn[] {
  const columns = variables.map((variable) => columnOf(file, variable));
  const used = (role: ColumnReading["role"]) => columns.some((column) => column.role === role);
  const directed = used("windFrom") || used("windTowards");
  const components = used("windU") && used("windV");
  const net = columns.some(({ role, balance }) => role === "shortwave" && balance === "net");
  return columns.map((column) => {
    const { role, balance } = column;
    const rival = columns.some((other) => other !== column && other.role === role && !isDerived(other.variable));
    if (role === "longwave" && balance === "incoming")
      return leaveOut(column, "incoming only: what the sea sends back is not taken off");
    if (role === "shortwave" && balance === "incoming" && net) return leaveOut(column, "the net shortwave is taken");
    if (isValueRole(role) && rival && isDerived(column.variable))
      return leaveOut(column, "derived from what was measured");
    if (role === "windSpeed" && components && !directed)
      return leaveOut(column, "the wind is taken from its components");
    return column;
  });
}

function leaveOut(column: CfColumn, note: string): CfColumn {
  return { ...column, role: "leftOut", unit: null, sense: null, note };
}

function isDerived({ attributes }: NetcdfVariable): boolean {
  return /\b(?:neutral|calculated|equivalent)\b/i.test(textOf(attributes, "long_name"));
}

function columnOf(file: NetcdfFile, variable: NetcdfVariable): CfColumn {
  const unitText = textOf(variable.attributes, "units") || null;
  const column: CfColumn = {
    variable,
    role: "leftOut",
    unit: null,
    unitText,
    confidence: "by name",
    sense: null,
    negated: false,
    balance: null,
    height: null,
    note: null,
    rank: 0,
  };
  const found = meaningOf(file, variable);
  if ("unread" in found) return { ...column, note: found.unread };
  const { meaning, confidence, conflict, source } = found;
  const extreme = /\btime: (maximum|minimum|standard_deviation|variance|range)\b/.exec(cellMethods(variable))?.[1];
  if (extreme !== undefined && !(meaning.role === "windGust" && extreme === "maximum"))
    return { ...column, note: `a ${extreme.replace("_", " ")}, by its cell_methods` };
  const unit = unitText === null ? null : cfUnit(unitText, meaning.role);
  if (unit !== null && !CHANNEL_QUANTITIES[meaning.role].includes(unit.quantity))
    return { ...column, note: `its unit, ${unit.label}, does not suit what its name says` };
  const known = {
    ...column,
    role: meaning.role,
    unit,
    confidence,
    balance: meaning.balance ?? null,
    height: meaning.height ?? heightOf(file, variable, meaning.role),
    rank: meaning.rank ?? 0,
  };
  return meaning.sense === undefined || conflict ? known : turned(known, meaning.sense, source);
}

/** The sense settled: into the sea is positive here for heat, out of it for evaporation. */
function turned(column: CfColumn, sense: "up" | "down", source: string): CfColumn {
  const { role, unit, variable, confidence } = column;
  const wanted = role === "evaporation" ? "up" : "down";
  const upward = unit === null || role === "evaporation" ? null : unitById(`${unit.id} upward`);
  const words = sense === "up" ? "positive out of the sea" : "positive into the sea";
  return {
    ...column,
    unit: sense === wanted ? unit : (upward ?? unit),
    negated: sense !== wanted && upward === null,
    sense: {
      what: `Sense of “${variable.name}”`,
      taken: `${words} (${source})${sense === wanted ? "" : "; turned"}`,
      confidence,
    },
  };
}

interface Found {
  meaning: Meaning;
  confidence: Understood["confidence"];
  /** Whether what the file says of the sense contradicts itself: the person is asked. */
  conflict: boolean;
  /** Where the sense is from. */
  source: string;
}

/** Words of what is beside the quantity that their others name: a part of radiation, or where an instrument stood. */
const BESIDE =
  /clear.?sky|\bdirect\b|\bdiffuse\b|\bcloud|\b(?:measurement|sensor|instrument) (?:height|depth)\b|\b(?:height|depth) of\b/i;
/** Names of incoming radiation by the convention of climate archives, which some files give a standard name of the net. */
const INCOMING = new Set(["rlds", "rsds"]);

function meaningOf(file: NetcdfFile, variable: NetcdfVariable): Found | { unread: string } {
  const { attributes, name } = variable;
  const stated = textOf(attributes, "standard_name");
  const standardName = stated === "unknown" ? "" : stated;
  const longName = textOf(attributes, "long_name");
  const standard = STANDARD_NAMES.get(standardName);
  const centre = isFromForecastCentre(file, variable) ? FORECAST_CENTRE_NAMES.get(name.toLowerCase()) : undefined;
  const positive = senseAttribute(variable);
  if (centre !== undefined) {
    const conflict = standard?.sense !== undefined && standard.sense !== centre.sense;
    return { meaning: centre, confidence: "by the format", conflict, source: "the forecast centre’s convention" };
  }
  if (standard !== undefined) {
    const balance = INCOMING.has(name.toLowerCase()) ? "incoming" : standard.balance;
    const conflict = positive !== null && standard.sense !== undefined && positive !== standard.sense;
    const meaning = balance === undefined ? standard : { ...standard, balance };
    return { meaning, confidence: "stated in the file", conflict, source: standardName };
  }
  if (standardName !== "") return { unread: `“${standardName}” is not read` };
  const words = BESIDE.test(longName) ? null : (ruleForName(longName) ?? ruleForName(name));
  if (words === null || !isValueRole(words.role))
    return { unread: words?.note ?? (longName || "not needed, or not known") };
  return {
    meaning: byWords(words.role, longName || name, positive),
    confidence: "by name",
    conflict: false,
    source: "its attribute “positive”",
  };
}

function byWords(role: ValueRole, words: string, positive: "up" | "down" | null): Meaning {
  const towards = role === "windFrom" && directionSenseOf(words) === "towards";
  const radiation = role === "shortwave" || role === "longwave";
  const incoming = /\b(?:down\w*|incoming|global)\b/i.test(words) && !/\bnet\b/i.test(words);
  return {
    role: towards ? "windTowards" : role,
    ...(positive === null ? {} : { sense: positive }),
    ...(radiation ? { balance: incoming ? "incoming" : "net" } : {}),
  };
}

function senseAttribute({ attributes }: NetcdfVariable): "up" | "down" | null {
  const positive = textOf(attributes, "positive").toLowerCase();
  return /^up/.test(positive) ? "up" : /^down/.test(positive) ? "down" : null;
}

function isFromForecastCentre(file: NetcdfFile, variable: NetcdfVariable): boolean {
  const places = ["institution", "history", "source", "GRIB_centre"].map((name) => textOf(file.attributes, name));
  return variable.attributes.has("GRIB_paramId") || places.some((text) => /ecmwf|ecmf|grib_to_netcdf/i.test(text));
}

/** `time: mean (interval: 1 hour)`, in lower case; empty where the variable states none. */
export function cellMethods({ attributes }: NetcdfVariable): string {
  return textOf(attributes, "cell_methods").toLowerCase();
}
