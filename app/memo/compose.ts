/** Composes a memo from what is known. Pure: the same input gives the same document. */
import { CAUTION } from "~/ocean/caution";
import { authorBlocks } from "./author-text";
import type { Block, MemoDocument, Run } from "./document";
import { headlineRows } from "./headline-rows";
import type { MemoEstimate, MemoInput } from "./memo-input";
import { boxBlocks, inputBlocks } from "./sections/givens";
import { limitBlocks, methodBlocks, referencesOf } from "./sections/method";
import { attachmentBlocks, revisionBlocks } from "./sections/record";
import { budgetBlocks, resultBlocks } from "./sections/results";
import { FigureNumbers } from "./sections/section";
import { sensitivityBlocks } from "./sections/sensitivity";
import { draftAnswer } from "./words";

export function composeMemo(input: MemoInput): MemoDocument {
  const { facts, project } = input;
  return {
    schema: 1,
    pageSize: input.pageSize,
    language: "en-GB",
    organisation: input.organisation,
    title: facts.title.trim() || "Untitled memo",
    subtitle: subtitleOf(input),
    notice: facts.notice,
    titleBlock: {
      project: project.name,
      jobNumber: project.jobNumber,
      client: project.client,
      memoNumber: facts.number,
      revision: facts.revision,
      issuedFor: facts.issuedFor,
      originator: facts.originator,
      checker: facts.checker,
      date: facts.date,
      stamp: facts.stamp,
    },
    caution: CAUTION,
    engine: engineVersions(input.estimates).join(", "),
    blocks: blocksOf(input),
  };
}

function subtitleOf({ facts, project }: MemoInput): string {
  const memo = facts.number ? `Memo ${facts.number}` : "Memo";
  return [project.client ? `${memo} to ${project.client}` : memo, facts.issuedFor, facts.date]
    .filter((part) => part !== "")
    .join(" · ");
}

function engineVersions(estimates: readonly MemoEstimate[]): string[] {
  return [...new Set(estimates.map(({ response }) => response.engine))];
}

/** Height against width of a figure that the first sheet has room for under the answer; a taller one would leave a gap. */
const FIRST_SHEET_FIGURE = 0.36;

function blocksOf(input: MemoInput): Block[] {
  const numbers = new FigureNumbers();
  const references = referencesOf(input);
  const [lead] = input.estimates;
  const [first] = lead?.figures ?? [];
  const figure = lead && first ? [numbers.block(first, lead.code)] : [];
  const figureFits = first !== undefined && first.height / first.width <= FIRST_SHEET_FIGURE;
  return [
    ...answerBlocks(input),
    ...(figureFits ? figure : []),
    ...questionBlocks(input),
    ...(figureFits ? [] : figure),
    ...input.facts.sections.flatMap(({ heading, text }) => titled(heading, authorBlocks(text))),
    ...titled("Results", resultBlocks(input, numbers)),
    ...titled("How sure this is", sensitivityBlocks(input)),
    ...titled("Where the method holds here", fitBlocks(input)),
    ...titled("Study boxes", boxBlocks(input)),
    ...titled("Inputs register", inputBlocks(input)),
    ...titled("Method", methodBlocks(input, references)),
    ...titled("Checks", budgetBlocks(input)),
    ...titled("Limits, and what was not done", limitBlocks(input)),
    ...titled("References", references.length > 0 ? [{ kind: "references", items: references }] : []),
    ...titled("Revision history", revisionBlocks(input)),
    ...titled("Attachments", attachmentBlocks(input)),
  ];
}

/** A section with its heading; nothing where there is nothing to say. */
function titled(text: string, blocks: Block[]): Block[] {
  if (blocks.length === 0) return [];
  return text.trim() === "" ? blocks : [{ kind: "heading", level: 1, text: text.trim() }, ...blocks];
}

function answerBlocks({ estimates, facts, project, units }: MemoInput): Block[] {
  const [lead] = estimates;
  const caution: Block = { kind: "caution", text: CAUTION };
  if (!lead)
    return [
      ...(facts.answer ? [leadParagraph([{ text: facts.answer.trim() }])] : []),
      { kind: "paragraph", style: "body", runs: [{ text: "No estimate is attached to this memo yet." }] },
      caution,
    ];
  const context = { units, zone: project.zone, shore: lead.shore };
  const answer = facts.answer?.trim()
    ? [{ text: facts.answer.trim() }]
    : draftAnswer(lead.response, { ...context, boxName: lead.boxName });
  return [
    leadParagraph(answer),
    {
      kind: "headlines",
      caption: `Headline figures of estimate ${lead.code}: ${lead.boxName}, ${lead.stormName}`,
      rows: headlineRows(lead.response, context),
    },
    caution,
  ];
}

function leadParagraph(runs: Run[]): Block {
  return { kind: "paragraph", style: "lead", runs };
}

function questionBlocks({ facts }: MemoInput): Block[] {
  const question = authorBlocks(facts.question);
  const use = authorBlocks(facts.intendedUse);
  const reviewBy: Block[] = facts.reviewBy
    ? [{ kind: "paragraph", style: "body", runs: [{ text: "Review by: ", bold: true }, { text: facts.reviewBy }] }]
    : [];
  return [...titled("Question", question), ...titled("Intended use", [...use, ...reviewBy])];
}

function fitBlocks({ estimates }: MemoInput): Block[] {
  return estimates.flatMap(({ code, boxName, stormName, response }): Block[] => [
    ...(estimates.length > 1
      ? [{ kind: "heading" as const, level: 2 as const, text: `Estimate ${code}: ${boxName}, ${stormName}` }]
      : []),
    response.fitNotes.length > 0
      ? {
          kind: "fitNotes",
          notes: response.fitNotes.map(({ severity, message, source }) => ({ severity, message, source })),
        }
      : { kind: "paragraph", style: "body", runs: [{ text: "The engine raised no fit notes." }] },
    ...(response.recommendation
      ? [{ kind: "paragraph" as const, style: "body" as const, runs: [{ text: response.recommendation }] }]
      : []),
  ]);
}
