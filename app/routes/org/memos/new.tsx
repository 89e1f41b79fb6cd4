import { data, Link, redirect } from "react-router";
import type { Route } from "./+types/new";
import { MemoFields } from "~/components/memo-fields";
import { EmptyState, PageTitle } from "~/components/page-title";
import { estimateChoices } from "~/memo/estimate-choices.server";
import { memoSchema } from "~/memo/memo-schema";
import { beginMemo } from "~/memo/save-memo.server";
import { currentProject } from "~/projects/current-project.server";
import { readForm } from "~/services/read-form.server";

export async function loader({ context, params, request }: Route.LoaderArgs) {
  const { tenant, project } = await currentProject(context, params, "memo.write");
  return {
    choices: await estimateChoices(tenant, project),
    chosen: new URL(request.url).searchParams.getAll("estimate"),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, project, actor, organisation } = await currentProject(context, params, "memo.write");
  const submission = await readForm(request, memoSchema);
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const saved = await beginMemo(tenant, project.id, actor.id, submission.value);
  if (saved.fieldErrors) return data(submission.reply({ fieldErrors: saved.fieldErrors }), { status: 400 });
  return redirect(`/o/${organisation.slug}/projects/${project.id}/memos/${saved.id}`);
}

export default function NewMemo({ actionData, loaderData }: Route.ComponentProps) {
  const { choices, chosen } = loaderData;
  return (
    <>
      <PageTitle>New memo</PageTitle>
      {choices.length === 0 ? (
        <EmptyState title="No estimate yet">A memo points at estimates. Run one from the ledger first.</EmptyState>
      ) : (
        <div className="max-w-2xl">
          <MemoFields
            lastResult={actionData}
            choices={choices}
            values={{ purpose: "client decision", estimates: chosen }}
            submit="Begin the memo"
          >
            <Link to=".." relative="path" className="button">
              Cancel
            </Link>
          </MemoFields>
        </div>
      )}
    </>
  );
}
