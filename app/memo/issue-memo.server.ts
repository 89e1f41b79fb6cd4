import { createHash } from "node:crypto";
import type { Actor, CurrentOrganisation } from "~/context";
import type { Memo } from "~/db/models/memo.server";
import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { formatDate } from "~/units/format-time";
import { composeDraft } from "./compose-draft.server";
import { renderPdf } from "./render-pdf.server";
import { revisionLabel } from "./revision-label";
import { stampOf } from "./stamp";

interface Signing {
  tenant: Tenant;
  organisation: Pick<CurrentOrganisation, "name" | "units" | "paperSize">;
  project: Project;
  memo: Memo;
  actor: Actor;
  /** Of the memo that the actor had before them. */
  content: string;
}

const CHANGED = "The memo changed since you opened this page. Read it again as it stands now.";

/** Puts the checker's name to what the memo says now; why it was refused, or null. */
export async function signMemo({
  tenant,
  organisation,
  project,
  memo,
  actor,
  content,
}: Signing): Promise<string | null> {
  if (actor.id === memo.originatorId) return "The originator cannot check their own memo.";
  const draft = await composeDraft(tenant, organisation, project, memo);
  if (draft.content !== content) return CHANGED;
  if (draft.hindrances.length > 0) return draft.hindrances.join(" ");
  await tenant.memos.update(memo.id, { checkerId: actor.id, checkedAt: new Date(), checkedContent: content });
  return null;
}

/**
 * Freezes the memo as its next revision: the document, and the PDF's own bytes.
 * Two people who issue at once get one revision: the second finds its number taken and is refused.
 */
export async function issueMemo(signing: Signing): Promise<{ revisionId: string } | { refusal: string }> {
  const { tenant, organisation, project, memo, actor, content } = signing;
  const draft = await composeDraft(tenant, organisation, project, memo);
  if (draft.content !== content) return { refusal: CHANGED };
  if (draft.hindrances.length > 0) return { refusal: draft.hindrances.join(" ") };
  const sequence = (await tenant.memoRevisions.max("sequence", { memoId: memo.id })) + 1;
  const label = revisionLabel(sequence);
  const issuedAt = new Date();
  const checkerId = draft.checkerName === null ? null : memo.checkerId;
  const issue = {
    revision: label,
    issuedFor: `issued for ${memo.purpose}`,
    checker: draft.checkerName ?? "",
    date: formatDate(issuedAt, project.timeZone),
  };
  const stamp = stampOf(JSON.stringify([tenant.organisationId, memo.id, draft.compose({ ...issue, stamp: "" })]));
  const document = draft.compose({ ...issue, stamp });
  const pdf = await renderPdf(document, { attachments: draft.attachments });
  const pdfSha256 = createHash("sha256").update(pdf).digest("hex");
  return tenant.write(async (inside) => {
    if ((await inside.memoRevisions.max("sequence", { memoId: memo.id })) !== sequence - 1) {
      return { refusal: "Someone else issued this memo a moment ago. Open the list of memos to see their revision." };
    }
    const { id } = await inside.memoRevisions.create({
      memoId: memo.id,
      sequence,
      label,
      purpose: memo.purpose,
      document,
      stamp,
      pdf,
      pdfSha256,
      issuedBy: actor.id,
      checkerId,
      issuedAt,
    });
    return { revisionId: id };
  });
}
