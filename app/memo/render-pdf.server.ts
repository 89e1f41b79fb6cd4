/** A memo as a PDF/A-3b file: tagged, fonts embedded, its data attached. The same memo gives the same bytes. */
import type { MemoDocument } from "./document";
import { drawSheets } from "./pdf/draw.server";
import { columnOf, furniture, geometryOf } from "./pdf/furniture";
import { type Fonts, fontSet, shippedFonts } from "./pdf/fonts.server";
import { paginate } from "./pdf/paginate";
import { placeMemo } from "./pdf/place";
import { dateOf, type TaggedPdf, taggedPdf } from "./pdf/tagged-pdf.server";

export interface Attachment {
  /** File name, once only in a memo. */
  name: string;
  /** Media type. */
  type: string;
  description: string;
  bytes: Uint8Array;
}

export interface RenderOptions {
  fonts?: Fonts;
  attachments?: readonly Attachment[];
}

/**
 * Renders a memo.
 * @throws RangeError where the memo's date is no ISO date, or two attachments have the same name
 */
export async function renderPdf(memo: MemoDocument, options: RenderOptions = {}): Promise<Buffer> {
  const pdf = taggedPdf(memo);
  const bytes = collect(pdf);
  const faces = fontSet(pdf, options.fonts ?? shippedFonts());
  const column = columnOf(memo, faces);
  const sheets = paginate(placeMemo(memo, column), geometryOf(memo, column));
  sheets.forEach((sheet, index) => sheet.items.push(...furniture(memo, index + 1, sheets.length, column)));
  drawSheets(pdf, sheets, faces.covers);
  attach(pdf, memo, options.attachments ?? []);
  pdf.end();
  return bytes;
}

function attach(pdf: TaggedPdf, memo: MemoDocument, attachments: readonly Attachment[]): void {
  const date = dateOf(memo);
  const names = new Set<string>();
  for (const { name, type, description, bytes } of attachments) {
    if (names.has(name)) throw new RangeError(`Two attachments of a memo are named "${name}".`);
    names.add(name);
    const file = { name, type, description, creationDate: date, modifiedDate: date, relationship: "Data" };
    pdf.file(Buffer.from(bytes), file);
  }
}

/** How long the last object may take to arrive once everything is drawn, ms: without an end nobody would be told. */
const PATIENCE = 20_000;

function collect(pdf: TaggedPdf): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    const timer = setTimeout(() => reject(new Error("The PDF was drawn but never finished.")), PATIENCE);
    const settle = (then: () => void) => {
      clearTimeout(timer);
      then();
    };
    pdf.on("data", (part: Buffer) => parts.push(part));
    pdf.on("end", () => settle(() => resolve(Buffer.concat(parts))));
    pdf.on("error", (error: Error) => settle(() => reject(error)));
  });
}
