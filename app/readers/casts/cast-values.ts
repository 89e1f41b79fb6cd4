import { isMissingWord } from "../missing-codes";
import { numberFromText, tidyCell } from "../number-text";
import type { ProblemList } from "../problem-list";
import type { CastColumn } from "./cast-columns";
import { CAST_CHANNELS } from "./cast-reading";
import type { CastTable } from "./cast-table";
import { CHANNEL_RULES } from "./cast-vocabulary";

/** The cells of a column as numbers in the unit of the file, NaN where there is none; says nothing of what is wrong. */
export function numbersIn(table: CastTable, index: number): Float64Array {
  return Float64Array.from(table.rows, (cells) => {
    const value = numberFromText(tidyCell(cells[index] ?? "").trim(), table.decimal);
    return value === null || isMissingCode(value, table) ? NaN : value;
  });
}

/**
 * A channel in its own unit, one value a record: NaN where missing, flagged bad, or beyond any sea.
 * `problems` names what was left out, by line and column.
 */
export function valuesOf(table: CastTable, column: CastColumn, problems: ProblemList): Float64Array {
  const { index, unit, channel } = column;
  const flag = table.flagOf.get(index);
  const { min, max } = CHANNEL_RULES[channel].limits;
  return Float64Array.from(table.rows, (cells, k) => {
    const where = { row: table.lines[k] ?? 0, column: column.name };
    const text = tidyCell(cells[index] ?? "").trim();
    const written = numberFromText(text, table.decimal);
    if (written === null) {
      if (!isMissingWord(text)) {
        problems.add(
          "error",
          "unreadableNumber",
          `“${text.slice(0, 30)}” is no number`,
          "Correct it in the file.",
          where,
        );
      }
      return NaN;
    }
    if (isMissingCode(written, table)) return NaN;
    const flagged = flag === undefined ? "" : (cells[flag]?.trim() ?? "");
    if (table.badFlags.includes(flagged) || table.isBadRow(cells)) {
      problems.add("note", "flaggedBad", "values that the file flags as bad", "They were left out.", where);
      return NaN;
    }
    if (table.doubtfulFlags.includes(flagged)) {
      problems.add("note", "flaggedDoubtful", "values that the file flags as doubtful", "They were kept.", where);
    }
    const value = (written - (unit.zero ?? 0)) * unit.factor;
    if (value >= min && value <= max) return value;
    problems.add(
      "warning",
      "beyondSea",
      `values beyond ${min} to ${max}${channel === "salinity" ? "" : ` ${CAST_CHANNELS[channel]}`}, which no sea has`,
      "They were left out: check the unit of the column.",
      where,
    );
    return NaN;
  });
}

function isMissingCode(value: number, { missing }: CastTable): boolean {
  return missing.some((code) => Math.abs(value - code) <= 1e-9 * Math.abs(code));
}
