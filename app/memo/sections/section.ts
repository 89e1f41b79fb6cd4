/** Small pieces that several sections are made of. */
import type { Figure } from "~/figures/figure";
import type { Block, Run, TableColumn } from "../document";

export const NOT_KNOWN = "not known";

export function cell(text: string): Run[] {
  return text === "" ? [] : [{ text }];
}

export function column(label: string, unit = "", align: TableColumn["align"] = "left"): TableColumn {
  return { label, unit, align };
}

/** Facts under a heading of their own; those without a text are left out. */
export function factBlocks(heading: string, facts: readonly (readonly [label: string, text: string])[]): Block[] {
  const rows = facts.filter(([, text]) => text !== "").map(([label, text]) => ({ label, value: cell(text) }));
  return [
    { kind: "heading", level: 2, text: heading },
    { kind: "facts", rows },
  ];
}

export function paragraph(text: string): Block {
  return { kind: "paragraph", style: "body", runs: [{ text }] };
}

/** Numbers figures in the order in which they are shown. */
export class FigureNumbers {
  private last = 0;

  block(figure: Figure, estimateCode: string): Block {
    this.last += 1;
    // A caption that names its estimate already needs no second name.
    const source = figure.caption.includes(estimateCode) ? "" : `Estimate ${estimateCode}.`;
    return { kind: "figure", number: this.last, figure, source };
  }
}
