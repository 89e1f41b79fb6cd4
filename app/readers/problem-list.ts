import type { ReadingProblem, Severity } from "./reading";

interface Met {
  severity: Severity;
  code: string;
  column: string | undefined;
  rows: number[];
  count: number;
  what: string;
  toDo: string;
}

const ROWS_NAMED = 5;

/**
 * Collects problems while a file is read. The same problem in the same column is one entry that counts and names the
 * first lines, so a file of a million bad lines still gives a list that a person can read.
 */
export class ProblemList {
  private readonly met = new Map<string, Met>();

  /**
   * Adds a problem, or counts it where it was met before.
   * @param what what is wrong, without a full stop; the first one's words are kept
   * @param toDo what to do about it, a sentence
   */
  add(
    severity: Severity,
    code: string,
    what: string,
    toDo: string,
    where: { row?: number; column?: string | undefined } = {},
  ): void {
    const key = `${severity}|${code}|${where.column ?? ""}`;
    const known = this.met.get(key);
    if (known === undefined) {
      const rows = where.row === undefined ? [] : [where.row];
      this.met.set(key, { severity, code, column: where.column, rows, count: 1, what, toDo });
      return;
    }
    known.count += 1;
    if (where.row !== undefined && known.rows.length < ROWS_NAMED) known.rows.push(where.row);
  }

  /** Turns the errors of single lines into notes, once it was decided to leave those lines out. */
  settleRowErrors(): void {
    for (const entry of this.met.values()) {
      if (entry.severity !== "error" || entry.rows.length === 0) continue;
      entry.severity = "note";
      entry.toDo = "Left out, as answered.";
    }
  }

  /** All problems, errors first, each with a message that says where, what and what to do. */
  toArray(): ReadingProblem[] {
    const weight: Record<Severity, number> = { error: 0, warning: 1, note: 2 };
    return [...this.met.values()]
      .sort((a, b) => weight[a.severity] - weight[b.severity])
      .map((entry) => {
        const problem: ReadingProblem = { severity: entry.severity, code: entry.code, message: sentence(entry) };
        if (entry.rows[0] !== undefined) problem.row = entry.rows[0];
        if (entry.column !== undefined) problem.column = entry.column;
        if (entry.count > 1) problem.count = entry.count;
        return problem;
      });
  }
}

function sentence(entry: Met): string {
  const place = [
    entry.rows[0] === undefined ? "" : `line ${entry.rows[0]}`,
    entry.column === undefined ? "" : `column “${entry.column}”`,
  ].filter((part) => part !== "");
  const where = place.length === 0 ? "" : `${place.join(", ")}: `;
  const more = entry.count - entry.rows.length;
  const lines =
    entry.count > 1 && entry.rows.length > 0
      ? ` (${entry.count} lines: ${entry.rows.join(", ")}${more > 0 ? ` and ${more} more` : ""})`
      : "";
  const text = `${where}${entry.what}${lines}. ${entry.toDo}`.trim();
  return text.charAt(0).toUpperCase() + text.slice(1);
}
