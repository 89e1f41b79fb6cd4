import PDFDocument from "pdfkit";
import { escapeXml } from "~/figures/plain-markup";
import type { MemoDocument } from "../document";
import { PAGE_POINTS } from "./sheet";

/** What pdfkit does and its types leave out. */
export interface TaggedPdf extends PDFKit.PDFDocument {
  _addInfo(): void;
  info: PDFKit.DocumentInfo & Record<string, unknown>;
}

/** Fields that pdfkit copies into the XMP packet as they are. */
const XMP_FIELDS = ["Title", "Author", "Subject", "Keywords", "Creator", "Producer"] as const;

/** An empty PDF/A-3b document, tagged, with the memo's properties and with its date for a clock. */
export function taggedPdf(memo: MemoDocument): TaggedPdf {
  const date = dateOf(memo);
  const { width, height } = PAGE_POINTS[memo.pageSize];
  const pdf = new PDFDocument({
    size: [width, height],
    margin: 0,
    autoFirstPage: false,
    pdfVersion: "1.7",
    subset: "PDF/A-3b",
    tagged: true,
    displayTitle: true,
    lang: memo.language,
    info: {
      Title: memo.title,
      Author: memo.titleBlock.originator,
      Subject: memo.subtitle,
      Creator: `Galeprint ${memo.engine}`.trim(),
      Producer: "Galeprint",
      CreationDate: date,
      ModDate: date,
    },
  }) as TaggedPdf;
  escapeXmp(pdf);
  return pdf;
}

/** Midnight UTC of the memo's date, a zone's name after it aside: the same memo always gives the same bytes. */
export function dateOf(memo: MemoDocument): Date {
  const date = new Date(`${memo.titleBlock.date.slice(0, 10)}T00:00:00Z`);
  if (Number.isNaN(date.getTime()))
    throw new RangeError(`A memo needs an ISO date (as 2026-11-11) to be printed; it has "${memo.titleBlock.date}".`);
  return date;
}

/** pdfkit 0.20 writes a title with `&` or `<` into the XMP packet unescaped, which makes it unreadable. */
function escapeXmp(pdf: TaggedPdf): void {
  const write = pdf._addInfo.bind(pdf);
  pdf._addInfo = () => {
    const kept = { ...pdf.info };
    for (const field of XMP_FIELDS) {
      const value = pdf.info[field];
      // Characters that XML 1.0 forbids even when escaped would make the packet unreadable, too.
      if (typeof value === "string") pdf.info[field] = escapeXml(value.replace(/[^\P{Cc}\t\n\r]/gu, ""));
    }
    write();
    Object.assign(pdf.info, kept);
  };
}
