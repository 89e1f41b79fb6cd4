import { directionSenseOf, nameParts, ruleForName, spacedName } from "./column-names";
import { CHANNEL_QUANTITIES, unitById, unitFromText, type FileUnit } from "./file-units";
import type { ColumnReading, ReadingAnswers, Understood } from "./reading";
import type { FormatKnowledge, TextTable } from "./text-table";

export type ValueRole = keyof typeof CHANNEL_QUANTITIES;

/** What a column is taken for before its values are looked at. */
export interface ColumnProposal {
  index: number;
  name: string;
  role: ColumnReading["role"];
  statedUnit: string | null;
  /** Unit settled by the file, the format or an answer; null where only the values can tell. */
  unit: FileUnit | null;
  /** Codes fixed by the format or an answer; null where the values must tell. */
  missingCodes: string[] | null;
  /** Codes for rain too little to measure that the format fixes. */
  traceCodes: string[];
  confidence: Understood["confidence"];
  note: string | null;
  height: number | null;
  averagingMinutes: number | null;
  /** Whether the format settles which way a direction or a heat flux counts. */
  senseKnown: boolean;
  /** Shortwave: whether it is net of reflection. */
  net: boolean;
}

/** Whether a role is a channel or a wind component. */
export function isValueRole(role: ColumnReading["role"]): role is ValueRole {
  return role !== "time" && role !== "leftOut";
}

/** Takes each column for something: by an answer, by the format, or by its name and stated unit. */
export function proposeColumns(
  table: TextTable,
  stampColumns: readonly number[],
  knowledge: FormatKnowledge,
  answers: ReadingAnswers,
): ColumnProposal[] {
  return table.names.map((name, index) => {
    const parts = nameParts(name);
    const unitText = table.unitTexts[index] ?? parts.unitText;
    const known = knowledge.columnByName(name);
    const base = {
      index,
      name: parts.bare === "" ? `column ${index + 1}` : parts.bare,
      statedUnit: unitText,
      missingCodes: answers.missingCodes?.[String(index)] ?? null,
      traceCodes: known?.traceCodes ?? [],
      note: null,
      height: known?.height ?? parts.height ?? (/^[uv]10/i.test(parts.bare) ? 10 : null),
      averagingMinutes: known?.averagingMinutes ?? minutesIn(parts.bare),
      senseKnown: known !== null && known.senseKnown !== false,
      net: known?.net ?? /\bnet\b/i.test(parts.bare),
    };
    const answer = answers.columns?.[String(index)];
    if (answer !== undefined) {
      const role = answer.role;
      const unit = answer.unit ?? null;
      const settled = unit !== null ? unitById(unit) : isValueRole(role) ? statedUnit(table, index, name, role) : null;
      return { ...base, role, unit: settled, senseKnown: false, confidence: "answered" as const };
    }
    if (stampColumns.includes(index))
      return { ...base, role: "time" as const, unit: null, confidence: "by content" as const };
    if (known !== null) {
      return {
        ...base,
        role: known.role,
        unit: known.unit === null ? null : unitById(known.unit),
        missingCodes: base.missingCodes ?? known.missingCodes,
        confidence: known.confidence ?? ("by the format" as const),
        note: known.note ?? null,
      };
    }
    return { ...base, ...byName(table, index, name) };
  });
}

/** `wind 10-min` → 10. */
function minutesIn(name: string): number | null {
  const minutes = /(\d{1,2})[ _-]?min/i.exec(name)?.[1];
  return minutes === undefined ? null : Number(minutes);
}

function byName(
  table: TextTable,
  index: number,
  name: string,
): Pick<ColumnProposal, "role" | "unit" | "confidence" | "note"> {
  const rule = table.named ? ruleForName(name) : null;
  if (rule === null || !isValueRole(rule.role)) {
    return { role: "leftOut", unit: null, confidence: "by name", note: rule?.note ?? "not needed, or not known" };
  }
  let role: ValueRole = rule.role;
  if (role === "windFrom" && directionSenseOf(name) === "towards") role = "windTowards";
  const anyUnit = statedUnit(table, index, name, role);
  if (role === "windSpeed" && anyUnit?.quantity === "angle") role = "windFrom";
  if (anyUnit !== null && !CHANNEL_QUANTITIES[role].includes(anyUnit.quantity)) {
    return {
      role: "leftOut",
      unit: null,
      confidence: "by name",
      note: `its unit, ${anyUnit.label}, does not suit what its name says`,
    };
  }
  return {
    role,
    unit: signedUnit(role, name, anyUnit),
    confidence: anyUnit === null ? "by name" : "stated in the file",
    note: rule.note ?? null,
  };
}

/** The unit of the units row, else of the header. */
function statedUnit(table: TextTable, index: number, name: string, role: ValueRole): FileUnit | null {
  const written = table.unitTexts[index];
  const parts = nameParts(name);
  const fromRow = written === null || written === undefined ? null : unitFromText(written, role);
  if (fromRow !== null) return fromRow;
  return parts.unitText === null ? null : (unitFromText(parts.unitText, role) ?? parts.unit);
}

const HEAT_ROLES: readonly ValueRole[] = ["longwave", "sensible", "latent", "netHeat"];
const UPWARD = /\b(?:up|upward|upwards|upwelling|loss|out of|from ocean|from sea|outgoing|to air)\b/;

/** A heat flux whose name says that it is counted upward is turned by its unit. */
function signedUnit(role: ValueRole, name: string, unit: FileUnit | null): FileUnit | null {
  if (!HEAT_ROLES.includes(role) || unit === null || !UPWARD.test(spacedName(name))) return unit;
  return unitById(`${unit.id} upward`) ?? unit;
}

/** Whether a heat flux's name states which way it counts. */
export function statesHeatSense(name: string): boolean {
  return (
    UPWARD.test(spacedName(name)) ||
    /\b(?:down|downward|downwards|into|gain|net downward|in sea water|to ocean|to sea)\b/.test(spacedName(name))
  );
}

/** Whether a role is a heat flux that files count in either direction. */
export function hasHeatSense(role: ColumnReading["role"]): boolean {
  return isValueRole(role) && HEAT_ROLES.includes(role);
}
