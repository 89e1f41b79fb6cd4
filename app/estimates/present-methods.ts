/** The engine's methods as the public page shows them, in the order of the work. */
import { FACTORS } from "~/ocean/ensemble/factors";
import { SOURCES, type MethodSource, type Provenance } from "~/ocean/sources";

export interface MethodView {
  id: string;
  title: string;
  citation: string;
  doi: string | null;
  /** MathML, one a line. */
  equations: string[];
  symbols: MethodSource["symbols"];
  validRange: string;
  provenance: Provenance;
  remark: string;
}

export interface MethodGroup {
  id: string;
  name: string;
  methods: MethodView[];
}

/** What each word beside a method means. */
export const PROVENANCES: readonly { name: Provenance; meaning: string }[] = [
  { name: "published", meaning: "read in a paper, handbook or public code, or in a summary that the remark names" },
  { name: "reference library", meaning: "agrees with a library that the field trusts" },
  { name: "independent computation", meaning: "agrees with a second program written from the same formula" },
  { name: "common practice", meaning: "a convention of the trade or of this engine; no source is claimed" },
  { name: "from memory", meaning: "not verified in a text: check it before you rely on it" },
];

const NAMES: Record<MethodSource["group"], string> = {
  seawater: "Seawater",
  "wind and air": "Wind and air",
  stress: "Wind stress and drag laws",
  "steady drift": "Steady drift",
  slab: "Slab with inertial motion",
  heat: "Heat",
  "fresh water": "Fresh water",
  column: "Column",
  cyclone: "Parametric cyclone",
  uncertainty: "Uncertainty",
  fit: "Where a method applies",
};

/** What an ensemble varies, how far, where that comes from, and in which scenarios. */
export const UNCERTAIN_INPUTS = FACTORS.map(({ name, range, basis, when }) => ({ name, range, basis, when }));

/** @param typeset TeX to MathML */
export function presentMethods(typeset: (tex: string) => string): MethodGroup[] {
  const groups = new Map<MethodSource["group"], MethodView[]>();
  for (const source of SOURCES) {
    groups.set(source.group, [...(groups.get(source.group) ?? []), presentMethod(source, typeset)]);
  }
  return [...groups].map(([group, methods]) => ({ id: group.replaceAll(" ", "-"), name: NAMES[group], methods }));
}

export function presentMethod(source: MethodSource, typeset: (tex: string) => string): MethodView {
  const { id, title, citation, doi = null, symbols, validRange, provenance, remark } = source;
  return { id, title, citation, doi, symbols, validRange, provenance, remark, equations: source.tex.map(typeset) };
}
