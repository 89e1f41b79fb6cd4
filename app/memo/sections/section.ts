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

/** A fact a row, its name in bold; facts without a text are left out. */
export function factTable(caption: string, facts: readonly (readonly [label: string, text: string])[]): Block {
  return {
    kind: "table",
    caption,
    columns: [column("Item"), column("What is known")],
    rows: facts.filter(([, text]) => text !== "").map(([label, text]) => [cell(label), cell(text)]),
  };
}

export function paragraph(text: string): Block {
  return { kind: "paragraph", style: "body", runs: [{ text }] };
}

/** Numbers figures in the order in which they are shown. */
export class FigureNumbers {
  private last = 0;

  block(figure: Figure, estimateCode: string): Block {
    this.last += 1;
    return { kind: "figure", number: this.last, figure, source: `Estimate ${estimateCode}.` };
  }
}
