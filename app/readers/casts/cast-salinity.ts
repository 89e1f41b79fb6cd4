import { salinityFromConductivity } from "~/ocean/seawater/practical-salinity";
import type { Understood } from "../reading";
import type { CastColumn } from "./cast-columns";
import type { CastAnswers, CastChannel, CastQuestion, SalinityKind } from "./cast-reading";
import { statedSalinityKind } from "./cast-vocabulary";

export interface CastSalinity {
  /** One a record; null where the file has neither salinity nor conductivity. */
  values: Float64Array | null;
  scale: SalinityKind;
  /** Where the salinity is derived: from what. */
  derivedFrom: string | null;
  note: Understood | null;
  question: CastQuestion | null;
}

const KINDS: Record<SalinityKind, string> = {
  practical: "Practical Salinity (PSS-78)",
  absolute: "Absolute Salinity (g/kg)",
};

/**
 * The salinity of each record: as the file has it, else from conductivity, temperature (°C, ITS-90) and pressure (dbar).
 * @param unitText unit of the salinity as written, or null
 */
export function castSalinity(
  values: ReadonlyMap<CastChannel, Float64Array>,
  temperature: Float64Array,
  pressure: Float64Array,
  column: CastColumn | undefined,
  unitText: string | null,
  answers: CastAnswers,
): CastSalinity {
  const given = values.get("salinity");
  if (given && column) return { values: given, derivedFrom: null, ...kindOf(column.name, unitText, answers) };
  const conductivity = values.get("conductivity");
  if (!conductivity) return { values: null, scale: "practical", derivedFrom: null, note: null, question: null };
  return {
    values: conductivity.map((C, k) =>
      C > 0 && Number.isFinite(temperature[k]) && Number.isFinite(pressure[k])
        ? salinityFromConductivity(C, temperature[k], Math.max(0, pressure[k]))
        : NaN,
    ),
    scale: "practical",
    derivedFrom: "conductivity, by PSS-78",
    note: {
      what: "salinity",
      taken: "from conductivity, by the Practical Salinity Scale of 1978",
      confidence: "by content",
    },
    question: null,
  };
}

function kindOf(
  name: string,
  unit: string | null,
  { salinityScale: answer }: CastAnswers,
): Pick<CastSalinity, "scale" | "note" | "question"> {
  const stated = statedSalinityKind(name, unit);
  const scale = answer ?? stated ?? "practical";
  return {
    scale,
    note: {
      what: "Kind of salinity",
      taken: KINDS[scale],
      confidence: answer ? "answered" : stated ? "stated in the file" : "assumed",
    },
    question: {
      key: "salinityScale",
      needed: false,
      message: stated
        ? "The column's name or unit says it."
        : "The file does not say which; instruments give the practical one.",
      options: Object.entries(KINDS).map(([value, label]) => ({ value, label })),
      suggestion: stated ?? "practical",
      ...(answer && { answer }),
    },
  };
}
