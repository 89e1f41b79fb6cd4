/** The memo's own record: revisions, who it went to, what is attached. */
import type { Block } from "../document";
import type { MemoInput } from "../memo-input";
import { cell, column } from "./section";

export function revisionBlocks({ revisions, distribution }: MemoInput): Block[] {
  const history: Block[] =
    revisions.length === 0
      ? []
      : [
          {
            kind: "table",
            caption: "",
            columns: ["Revision", "Date", "Issued for", "Reason for change", "Originator", "Checker"].map((label) =>
              column(label),
            ),
            rows: revisions.map((entry) => [
              cell(entry.revision),
              cell(entry.date),
              cell(entry.issuedFor),
              cell(entry.reason),
              cell(entry.originator),
              cell(entry.checker),
            ]),
          },
        ];
  const sent: Block[] =
    distribution.length === 0
      ? []
      : [
          {
            kind: "paragraph",
            style: "body",
            runs: [{ text: "Distribution: ", bold: true }, { text: `${distribution.join("; ")}.` }],
          },
        ];
  return [...history, ...sent];
}

export function attachmentBlocks({ attachments }: MemoInput): Block[] {
  if (attachments.length === 0) return [];
  return [
    {
      kind: "table",
      caption: "Files attached to the PDF of this memo.",
      columns: [column("File"), column("Contents")],
      rows: attachments.map(({ name, description }) => [cell(name), cell(description)]),
    },
  ];
}
