/** All that a memo is composed from. Whoever gathers it reads the database; nothing here does. */
import type { Figure } from "~/figures/figure";
import type { Response } from "~/ocean/response";
import type { Position } from "~/ocean/scenario";
import type { UnitChoices } from "~/units/unit-choices";
import type { PageSize } from "./document";

export interface MemoInput {
  pageSize: PageSize;
  organisation: string;
  units: UnitChoices;
  project: {
    name: string;
    jobNumber: string;
    client: string;
    /** IANA zone or `UTC`. */
    zone: string;
  };
  facts: MemoFacts;
  /** The first one answers the question. */
  estimates: MemoEstimate[];
  boxes: MemoBox[];
  series: MemoSeries[];
  waters: MemoWater[];
  assumptions: MemoAssumption[];
  /** What the methods leave out and what was not done, a sentence each. */
  limits: string[];
  independentCheck: { text: string; by: string; date: string } | null;
  revisions: MemoRevision[];
  distribution: string[];
  attachments: { name: string; description: string }[];
}

export interface MemoFacts {
  number: string;
  title: string;
  revision: string;
  /** As `draft` or `issued for client decision`. */
  issuedFor: string;
  /** `Superseded by revision C`; empty for a current memo. */
  notice: string;
  originator: string;
  checker: string;
  /** ISO date. */
  date: string;
  stamp: string;
  /** The bottom line in the author's words; null takes the drafted one. */
  answer: string | null;
  question: string;
  /** Who may rely on it for what, and what it must not be used for. */
  intendedUse: string;
  /** ISO date; null where none was set. */
  reviewBy: string | null;
  /** Free text between the question and the results. */
  sections: { heading: string; text: string }[];
}

export interface MemoEstimate {
  /** As `2617-07`. */
  code: string;
  boxName: string;
  stormName: string;
  waterName: string;
  methodSheetName: string;
  /** Whether the box has a shore normal. */
  shore: boolean;
  response: Response;
  figures: Figure[];
}

export interface MemoBox {
  name: string;
  corners: Position[];
  /** m² */
  area: number;
  /** m */
  waterDepth: number | null;
  /** m */
  distanceToShore: number | null;
  /** Degrees true, pointing offshore. */
  shoreNormal: number | null;
  whyChosen: string;
}

export interface MemoSeries {
  /** As `Wind and rain, Skarrow buoy`. */
  name: string;
  fileName: string;
  sha256: string;
  rows: number;
  /** ISO UTC */
  first: string;
  last: string;
  /** As `windSpeed (kn), rain (mm/h)`, in the units of the file. */
  channels: string;
  /** Station, position, distance from the box, licence, retrieval date: what is known. */
  source: string;
  /** Zone that the file's times were read in. */
  zone: string;
  /** m above the sea */
  windHeight: number | null;
  averagingMinutes: number | null;
  /** Share of samples missing, 0…1. */
  missingShare: number | null;
  /** As `knots to m/s (× 0.514444)`. */
  steps: string[];
  /** What the tests and persons made of it, a sentence each; empty where it was not tested. */
  quality: string[];
  /** Gaps, dropped rows and repairs, one each. */
  gaps: string[];
}

export interface MemoWater {
  name: string;
  /** As `two layers` or `cast of 41 levels`. */
  kind: string;
  details: { label: string; text: string }[];
  fileName: string | null;
  sha256: string | null;
}

export interface MemoAssumption {
  statement: string;
  basis: string;
  effect: string;
}

export interface MemoRevision {
  revision: string;
  /** ISO date. */
  date: string;
  issuedFor: string;
  reason: string;
  originator: string;
  checker: string;
}
