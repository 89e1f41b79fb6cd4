import { squashedName } from "./column-names";
import { isValueRole, type ColumnProposal } from "./propose-columns";
import type { ReadingAnswers, Understood } from "./reading";

const HEIGHT_RULE = "the speed nearest to 10 m, the direction nearest to that height, the gust of the same instrument";

/**
 * Keeps one column for each channel. Of several speeds the one measured nearest to 10 m is taken; the direction is the
 * one nearest to that height and the gust the one of the same instrument; of equals, the first in the file that has
 * values. An answer overrules. The others are left out with a note.
 */
export function chooseCandidates(
  proposals: ColumnProposal[],
  hasValues: (index: number) => boolean,
  answers: ReadingAnswers,
): { columns: ColumnProposal[]; understood: Understood[] } {
  const understood: Understood[] = [];
  const answered = (column: ColumnProposal): boolean => answers.columns?.[String(column.index)] !== undefined;
  const taken = new Map<string, ColumnProposal>();
  const keep = (role: string, group: string[], rank: (column: ColumnProposal) => number[]): ColumnProposal | null => {
    const candidates = proposals.filter((column) => isValueRole(column.role) && group.includes(column.role));
    const best = [...candidates].sort((a, b) => compare(full(a, rank), full(b, rank)))[0] ?? null;
    if (best !== null) taken.set(role, best);
    if (best !== null && candidates.length > 1) {
      const others = candidates.filter((column) => column !== best).map((column) => `“${column.name}”`);
      const confidence = answered(best) ? "answered" : "assumed";
      const rule = best.height === null || answered(best) ? "" : ` by the rule: ${HEIGHT_RULE}`;
      understood.push({
        what: `Column for ${role}`,
        taken: `“${best.name}”${rule}; ${others.join(", ")} left out`,
        confidence,
      });
    }
    return best;
  };
  const full = (column: ColumnProposal, rank: (column: ColumnProposal) => number[]): number[] => [
    answered(column) ? 0 : 1,
    hasValues(column.index) ? 0 : 1,
    ...rank(column),
    column.index,
  ];
  const speed = keep("windSpeed", ["windSpeed"], (column) => [
    distance(column.height, 10),
    column.unit === null ? 1 : 0,
  ]);
  const height = speed?.height ?? 10;
  keep("windFrom", ["windFrom", "windTowards"], (column) => [
    distance(column.height, height),
    column.unit === null ? 1 : 0,
  ]);
  const stem = speed === null ? "" : squashedName(speed.name);
  keep("windGust", ["windGust"], (column) => [
    stem !== "" && squashedName(column.name).startsWith(stem) ? 0 : 1,
    distance(column.height, height),
  ]);
  keep("windU", ["windU"], (column) => [distance(column.height, 10)]);
  const u = taken.get("windU");
  keep("windV", ["windV"], (column) => [distance(column.height, u?.height ?? 10)]);
  const rest = new Set(
    proposals.map((column) => column.role).filter((role) => isValueRole(role) && !role.startsWith("wind")),
  );
  for (const role of rest) keep(role, [role], (column) => [distance(column.height, 2), column.unit === null ? 1 : 0]);
  if (speed !== null && !(u !== undefined && answered(u))) {
    taken.delete("windU");
    taken.delete("windV");
  }
  const chosen = new Set(taken.values());
  const columns = proposals.map((column) => {
    if (!isValueRole(column.role) || chosen.has(column)) return column;
    return { ...column, role: "leftOut" as const, note: `another column was taken for ${column.role}` };
  });
  return { columns, understood };
}

function distance(height: number | null, wanted: number): number {
  return height === null ? 1000 : Math.abs(height - wanted);
}

function compare(a: number[], b: number[]): number {
  for (const [index, value] of a.entries()) {
    const difference = value - (b[index] ?? 0);
    if (difference !== 0) return difference;
  }
  return 0;
}
