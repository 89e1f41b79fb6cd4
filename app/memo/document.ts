/**
 * A memo as data: what the page, the client's link and the PDF all show. It is composed once, holds no reference to
 * anything that can change, survives JSON, and is stored as it stands when the memo is issued.
 */
import type { FitSeverity } from "~/ocean/response";
import type { Figure } from "~/figures/figure";
import type { SmallMark } from "~/figures/small-marks";

export type PageSize = "A4" | "Letter";

/** A colour names a quantity (or ink, or the quieter slate), never a hue: each renderer has its own. */
export type ColourToken = "ink" | "slate" | "wind" | "rain" | "heat" | "density" | "drift" | "shore";

/** A stretch of text in one style. */
export interface Run {
  text: string;
  bold?: boolean;
  italic?: boolean;
  colour?: ColourToken;
  rise?: "super" | "sub";
  /** Absolute address. */
  link?: string;
}

export interface TitleBlock {
  project: string;
  jobNumber: string;
  client: string;
  memoNumber: string;
  revision: string;
  /** As `issued for client decision`; `draft` until then. */
  issuedFor: string;
  originator: string;
  checker: string;
  /** ISO date. */
  date: string;
  /** Empty until issued. */
  stamp: string;
}

export interface HeadlineRow {
  label: string;
  /** Formatted number, without its unit. */
  value: string;
  /** The unit, and a direction where there is one: `km to 128°`. */
  unit: string;
  /** Band, value and trigger level on a line; null where there is nothing to compare the value with. */
  mark: SmallMark | null;
  /** The band in words: `31.6 to 32.2 g/kg`. Empty where there is none. */
  band: string;
  remark: string;
}

export interface TableColumn {
  label: string;
  /** Empty for text. */
  unit: string;
  align: "left" | "right";
}

/** One thing that is known, and what it is called. */
export interface FactRow {
  label: string;
  value: Run[];
}

export interface MemoFitNote {
  severity: FitSeverity;
  /** With the value found here and the limit. */
  message: string;
  source: string;
}

export interface EquationSymbol {
  symbol: Run[];
  meaning: string;
  /** Empty where there is none. */
  unit: string;
}

export interface ReferenceItem {
  id: string;
  text: string;
  link?: string;
}

export type Block =
  | { kind: "heading"; level: 1 | 2; text: string }
  | { kind: "paragraph"; style: "lead" | "body" | "small"; runs: Run[] }
  | { kind: "list"; items: Run[][] }
  | { kind: "headlines"; caption: string; rows: HeadlineRow[] }
  | { kind: "figure"; number: number; figure: Figure; source: string }
  | { kind: "table"; caption: string; columns: TableColumn[]; rows: Run[][][] }
  | { kind: "facts"; rows: FactRow[] }
  | { kind: "fitNotes"; notes: MemoFitNote[] }
  | { kind: "equation"; number: number; name: string; runs: Run[]; symbols: EquationSymbol[]; source: string }
  | { kind: "references"; items: ReferenceItem[] }
  | { kind: "caution"; text: string }
  | { kind: "pageBreak" };

export interface MemoDocument {
  schema: 1;
  pageSize: PageSize;
  /** BCP 47. */
  language: string;
  organisation: string;
  title: string;
  /** The line under the title: `Memo 2617-M2 to Skarrow Water Works · issued for client decision · 2026-11-11`. */
  subtitle: string;
  /** Shown on every sheet where the memo is not the current issued one: `Superseded by revision C`. */
  notice: string;
  titleBlock: TitleBlock;
  /** Stands on the first sheet and at the foot of each. */
  caution: string;
  /** Engine version, for the file's properties. */
  engine: string;
  blocks: Block[];
}

/** A run of plain text. */
export function plain(text: string): Run {
  return { text };
}

/** Text of runs without their styles. */
export function textOf(runs: readonly Run[]): string {
  return runs.map((run) => run.text).join("");
}
