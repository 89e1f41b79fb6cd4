/** How well a method or number is known here. Shown to users as it stands. */
export type Provenance =
  "published" | "reference library" | "independent computation" | "common practice" | "from memory";

export interface MethodSymbol {
  symbol: string;
  meaning: string;
  unit: string;
}

/** One method of the engine: what it computes, from where, and where it holds. */
export interface MethodSource {
  id: string;
  group:
    | "seawater"
    | "wind and air"
    | "stress"
    | "steady drift"
    | "slab"
    | "heat"
    | "fresh water"
    | "column"
    | "cyclone"
    | "uncertainty"
    | "fit";
  title: string;
  /** Author (year), where published. */
  citation: string;
  /** Only where it was verified. */
  doi?: string;
  /** Plain text; one line a relation. */
  equation: string;
  /** The same as TeX, to be typeset; one string a line. */
  tex: readonly string[];
  symbols: MethodSymbol[];
  validRange: string;
  provenance: Provenance;
  /** What the user should know beside that; empty where there is nothing. */
  remark: string;
}
