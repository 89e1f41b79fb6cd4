import { isMissingWord } from "./missing-codes";
import { tidyCell } from "./number-text";
import { codeTest } from "./missing-codes";
import { numberFromText } from "./number-text";
import type { ColumnProposal } from "./propose-columns";
import type { ColumnReading } from "./reading";
import { columnOf } from "./rows";
import type { SettledColumn } from "./settle-columns";
import type { TextTable } from "./text-table";

/** The list of columns for the reading sheet: what each was taken for, and why. */
export function describeColumns(
  proposals: readonly ColumnProposal[],
  settled: readonly SettledColumn[],
  table: TextTable,
): ColumnReading[] {
  const byIndex = new Map(settled.map((column) => [column.column.index, column]));
  return proposals.map((proposal) => {
    const used = byIndex.get(proposal.index);
    const missingCodes = used?.missingCodes ?? proposal.missingCodes ?? [];
    const reading: ColumnReading = {
      index: proposal.index,
      name: proposal.name,
      statedUnit: proposal.statedUnit,
      role: proposal.role,
      unit: used?.unit.id ?? null,
      missingCodes,
      missing: used?.scan.missing ?? countMissing(table, proposal.index, missingCodes),
      confidence: proposal.confidence,
    };
    if (proposal.note !== null) reading.note = proposal.note;
    return reading;
  });
}

function countMissing(table: TextTable, column: number, codes: readonly string[]): number {
  const isCode = codeTest(codes, table.decimal);
  let missing = 0;
  for (const cell of columnOf(table.rows, column)) {
    const text = tidyCell(cell).trim();
    const value = codes.length === 0 ? null : numberFromText(text, table.decimal);
    if (isMissingWord(text) || isCode(text, value)) missing += 1;
  }
  return missing;
}
