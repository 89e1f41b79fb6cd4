import type { MethodSymbol } from "../method-source";

/** Rows of symbol, meaning and unit. */
export function symbols(...rows: [symbol: string, meaning: string, unit: string][]): MethodSymbol[] {
  return rows.map(([symbol, meaning, unit]) => ({ symbol, meaning, unit }));
}
