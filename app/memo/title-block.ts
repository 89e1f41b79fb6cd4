import type { TitleBlock } from "./document";

export interface TitleBlockCell {
  label: string;
  value: string;
  /** Of the block's width. */
  share: number;
}

/** The cells of the title block from left to right; `sheet` as `1 of 9`. An empty value shows as a dash. */
export function titleBlockCells(block: TitleBlock, sheet: string): TitleBlockCell[] {
  const project = block.jobNumber ? `${block.project} · job ${block.jobNumber}` : block.project;
  const revision = [block.revision, block.issuedFor].filter((part) => part !== "").join(", ");
  const cells: [string, string, number][] = [
    ["Project", project, 0.22],
    ["Memo", block.memoNumber, 0.095],
    ["Sheet", sheet, 0.075],
    ["Revision", revision, 0.15],
    ["Originator", block.originator, 0.115],
    ["Checker", block.checker, 0.115],
    ["Date", block.date, 0.1],
    ["Stamp", block.stamp, 0.13],
  ];
  return cells.map(([label, value, share]) => ({ label, value: value.trim() === "" ? "—" : value, share }));
}
