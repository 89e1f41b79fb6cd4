import { createHash } from "node:crypto";
import type { CurrentOrganisation } from "~/context";
import type { Memo } from "~/db/models/memo.server";
import type { MemoRevision } from "~/db/models/memo-revision.server";
import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { namesOfUsers } from "~/db/unscoped.server";
import { formatDate } from "~/units/format-time";
import { composeMemo } from "./compose";
import { textOf, type MemoDocument } from "./document";
import { hindrancesOf, pointedEstimates, type PointedEstimate } from "./memo-estimates.server";
import { memoAttachments } from "./memo-attachments.server";
import { memoFigures } from "./memo-figures.server";
import type { MemoEstimate, MemoFacts, MemoInput } from "./memo-input";
import { memoNumber } from "./memo-number";
import { registerAssumptions, registerBoxes, registerSeries, registerWaters } from "./memo-register";
import { shippedCoverage } from "./pdf/fonts.server";
import type { Attachment } from "./render-pdf.server";
import { undrawableWords } from "./undrawable-words";
import { draftAnswer } from "./words";

type Organisation = Pick<CurrentOrganisation, "name" | "units" | "paperSize">;

/** What the title block says; a draft says that it is one. */
export interface Issue {
  revision: string;
  issuedFor: string;
  checker: string;
  /** ISO date */
  date: string;
  stamp: string;
}

export interface ComposedDraft {
  document: MemoDocument;
  /** Hash of all that the memo says, whoever signs it and when: what a checker puts their name to. */
  content: string;
  draftedFindings: string;
  /** What the PDF carries. */
  attachments: Attachment[];
  /** What keeps it from being checked and issued, a sentence each. */
  hindrances: string[];
  /** Where the signature in the row is for what the memo says now. */
  checkerName: string | null;
  compose(issue: Issue): MemoDocument;
}

const LIMITS = [
  "Rain is the only fresh water: rivers and outfalls are not included.",
  "The layer is taken as uniform across the box; fronts, tides, waves and the general circulation are not modelled.",
  "One record of wind stands for the whole box.",
];

const UNCHECKED = "not checked";

function memoEstimate(pointed: PointedEstimate, organisation: Organisation, zone: string): MemoEstimate[] {
  const { response, register, code, forcing } = pointed;
  if (!response) return [];
  const { box, storm, water, method } = register;
  return [
    {
      code,
      boxName: box.name,
      stormName: storm.name,
      waterName: water.name,
      methodSheetName: `${method.name}, version ${method.version}`,
      shore: box.shoreNormal !== null,
      response,
      figures: memoFigures({ response, register, forcing }, { zone, units: organisation.units, estimateCode: code }),
    },
  ];
}

function revisionHistory(revisions: MemoRevision[], names: Map<string, string>, zone: string): MemoInput["revisions"] {
  return revisions.map(({ label, issuedAt, purpose, issuedBy, checkerId }) => ({
    revision: label,
    date: formatDate(issuedAt, zone),
    issuedFor: purpose,
    reason: "",
    originator: names.get(issuedBy) ?? "",
    checker: checkerId === null ? UNCHECKED : (names.get(checkerId) ?? ""),
  }));
}

/** The memo as it would be issued now, from the project as it stands. */
export async function composeDraft(
  tenant: Tenant,
  organisation: Organisation,
  project: Project,
  memo: Memo,
): Promise<ComposedDraft> {
  const zone = project.timeZone;
  const pointed = await pointedEstimates(tenant, project, memo.id);
  const revisions = await tenant.memoRevisions.list({
    where: { memoId: memo.id },
    order: [["sequence", "ASC"]],
    without: ["pdf", "document"],
  });
  const people = [memo.originatorId, memo.checkerId, ...revisions.flatMap((row) => [row.issuedBy, row.checkerId])];
  const names = await namesOfUsers(people.filter((id) => id !== null));
  const estimates = pointed.flatMap((entry) => memoEstimate(entry, organisation, zone));
  const registers = pointed.map(({ register }) => register);
  const attachments = await memoAttachments(tenant, pointed);

  const facts = (issue: Issue): MemoFacts => ({
    number: memoNumber(project.jobNumber, memo.number),
    title: memo.title,
    notice: "",
    originator: names.get(memo.originatorId) ?? "",
    answer: memo.findings.trim() === "" ? null : memo.findings,
    question: memo.question,
    intendedUse: `For ${memo.purpose} by ${project.client}, for the boxes and the period stated, and nothing else.`,
    reviewBy: null,
    sections: [],
    ...issue,
  });
  const input: Omit<MemoInput, "facts"> = {
    pageSize: organisation.paperSize,
    organisation: organisation.name,
    units: organisation.units,
    project: { name: project.name, jobNumber: project.jobNumber, client: project.client, zone },
    estimates,
    boxes: registerBoxes(registers),
    series: registerSeries(registers),
    waters: registerWaters(registers, organisation.units),
    assumptions: registerAssumptions(pointed.flatMap(({ assumptions }) => assumptions)),
    limits: LIMITS,
    independentCheck: null,
    revisions: revisionHistory(revisions, names, zone),
    distribution: [],
    attachments: attachments.map(({ name, description }) => ({ name, description })),
  };
  const compose = (issue: Issue) => composeMemo({ ...input, facts: facts(issue) });

  const bare = compose({ revision: "", issuedFor: memo.purpose, checker: "", date: "", stamp: "" });
  const hash = createHash("sha256").update(JSON.stringify(bare));
  for (const { bytes } of attachments) hash.update(bytes);
  const content = hash.digest("hex");
  const isChecked = memo.checkerId !== null && memo.checkedContent === content;
  const checkerName = isChecked && memo.checkerId ? (names.get(memo.checkerId) ?? null) : null;
  const [lead] = estimates;
  const words = lead && { units: organisation.units, zone, shore: lead.shore, boxName: lead.boxName };
  const document = compose({
    revision: "draft",
    issuedFor: "draft",
    checker: checkerName ?? UNCHECKED,
    date: formatDate(new Date(), zone),
    stamp: "",
  });
  const undrawable = undrawableWords(document, shippedCoverage);
  return {
    document,
    content,
    draftedFindings: words ? textOf(draftAnswer(lead.response, words)) : "",
    attachments,
    hindrances: [...hindrancesOf(pointed), ...(undrawable === null ? [] : [undrawable])],
    checkerName,
    compose: (issue) => compose({ ...issue, checker: issue.checker || UNCHECKED }),
  };
}
