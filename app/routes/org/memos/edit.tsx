import { data, Link, redirect } from "react-router";
import type { Route } from "./+types/edit";
import { ConfirmButton } from "~/components/confirm-button";
import { FormErrors } from "~/components/field";
import { MemoFields } from "~/components/memo-fields";
import { MemoSignatures } from "~/components/memo-signatures";
import { PageTitle } from "~/components/page-title";
import { issueMemo, signMemo } from "~/memo/issue-memo.server";
import { composeDraft } from "~/memo/compose-draft.server";
import { DocumentView } from "~/memo/document-view";
import { estimateChoices } from "~/memo/estimate-choices.server";
import { memoSchema } from "~/memo/memo-schema";
import { changeMemo, estimatesOf } from "~/memo/save-memo.server";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { notFound } from "~/services/guard.server";
import { readForm } from "~/services/read-form.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, project, actor } = await currentProject(context, params, "project.view");
  const memo = await tenant.memos.find(params.memo, { where: { projectId: project.id } });
  if (!memo) notFound();
  const draft = await composeDraft(tenant, organisation, project, memo);
  const { title, question, findings, purpose } = memo;
  return {
    values: { title, question, findings, purpose, estimates: await estimatesOf(tenant, memo.id) },
    choices: await estimateChoices(tenant, project),
    document: draft.document,
    content: draft.content,
    draftPdf: `/o/${organisation.slug}/projects/${project.id}/memos/${memo.id}/draft.pdf`,
    draftedFindings: draft.draftedFindings,
    hindrances: draft.hindrances,
    checker: draft.checkerName,
    mayWrite: may(organisation, "memo.write"),
    mayCheck: may(organisation, "memo.check") && actor.id !== memo.originatorId,
    mayIssue: may(organisation, "memo.issue"),
    isOriginator: actor.id === memo.originatorId,
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, organisation, project, actor } = await currentProject(context, params, "project.view");
  const memo = await tenant.memos.find(params.memo, { where: { projectId: project.id } });
  if (!memo) notFound();
  const form = await request.clone().formData();
  const content = String(form.get("content") ?? "");
  switch (form.get("intent")) {
    case "sign": {
      await currentProject(context, params, "memo.check");
      const refusal = await signMemo({ tenant, organisation, project, memo, actor, content });
      return refusal === null ? redirect(request.url) : data({ refusal, result: undefined }, { status: 400 });
    }
    case "issue": {
      await currentProject(context, params, "memo.issue");
      const issued = await issueMemo({ tenant, organisation, project, memo, actor, content });
      if ("refusal" in issued) return data({ refusal: issued.refusal, result: undefined }, { status: 400 });
      return redirect(`/o/${organisation.slug}/projects/${project.id}/memos/${memo.id}/revisions/${issued.revisionId}`);
    }
    default: {
      await currentProject(context, params, "memo.write");
      const submission = await readForm(request, memoSchema);
      if (submission.status !== "success") {
        return data({ refusal: null, result: submission.reply() }, { status: 400 });
      }
      const saved = await changeMemo(tenant, memo, submission.value);
      return saved.fieldErrors
        ? data({ refusal: null, result: submission.reply({ fieldErrors: saved.fieldErrors }) }, { status: 400 })
        : data({ refusal: null, result: submission.reply() });
    }
  }
}

export default function EditMemo({ actionData, loaderData }: Route.ComponentProps) {
  const { values, choices, document, content, draftPdf, draftedFindings, hindrances, checker } = loaderData;
  const { mayWrite, mayCheck, mayIssue, isOriginator } = loaderData;
  return (
    <>
      <PageTitle
        actions={
          <>
            <a href={draftPdf} className="button">
              Draft as PDF
            </a>
            {mayIssue && hindrances.length === 0 && (
              <ConfirmButton label="Issue a revision" title="Issue this memo?" fields={{ intent: "issue", content }}>
                {checker === null && (
                  <p className="mb-2 font-bold text-ink">
                    Nobody has checked this memo. The title block will say so on every sheet.
                  </p>
                )}
                <p>Text, figures, numbers and inputs are frozen as they stand below. A change is the next revision.</p>
              </ConfirmButton>
            )}
          </>
        }
      >
        {values.title}
      </PageTitle>
      <FormErrors errors={actionData?.refusal ? [actionData.refusal] : null} />
      <div className="grid gap-8 xl:grid-cols-[minmax(20rem,26rem)_minmax(0,1fr)]">
        <div className="grid content-start gap-8">
          {mayWrite && (
            <MemoFields
              lastResult={actionData?.result}
              choices={choices}
              values={values}
              submit="Save"
              draftedFindings={draftedFindings}
            />
          )}
          <MemoSignatures
            hindrances={hindrances}
            checker={checker}
            content={content}
            mayCheck={mayCheck}
            isOriginator={isOriginator}
          />
        </div>
        <section aria-label="Preview" className="min-w-0">
          <DocumentView document={document} titleLevel={2} />
        </section>
      </div>
      <p className="mt-6">
        <Link to=".." relative="path">
          All memos
        </Link>
      </p>
    </>
  );
}
