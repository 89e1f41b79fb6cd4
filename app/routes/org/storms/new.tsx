import { useId } from "react";
import { Form, Link, redirect } from "react-router";
import type { Route } from "./+types/new";
import { Field, FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { OriginalFields } from "~/components/storms/original-fields";
import { SampleFile } from "~/components/storms/sample-file";
import { SubmitButton } from "~/components/submit-button";
import { currentProject } from "~/projects/current-project.server";
import { config } from "~/services/config.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { originalFrom, receiveForm } from "~/storms/receive-original.server";
import { WHOLE_FORM } from "~/storms/refusal";
import { startStorm } from "~/storms/start-record.server";
import { postedName, STORM_NAME_LENGTH } from "~/storms/storm-name";

export async function loader({ context, params }: Route.LoaderArgs) {
  await currentProject(context, params, "project.edit");
  return { uploadLimitBytes: config().uploadLimitBytes };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, tenant, project } = await currentProject(context, params, "project.edit");
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    const record = await startStorm(tenant, project, postedName(form), await originalFrom(form), actor.id);
    const storms = `/o/${params.organisation}/projects/${project.id}/storms`;
    return redirect(`${storms}/${record.stormId}/records/${record.id}`);
  });
}

export default function NewStorm({ loaderData, actionData }: Route.ComponentProps) {
  const errors = actionData?.errors ?? {};
  const nameId = useId();
  return (
    <div className="max-w-2xl">
      <PageTitle>New storm</PageTitle>
      <p className="mb-5 max-w-prose text-slate">
        Bring the wind first. The file is read, and a reading sheet says what each column was taken for; nothing counts
        before you confirm it. Rain and heat can come from the same file or from others.
      </p>
      <Form method="post" encType="multipart/form-data" className="grid gap-5">
        <FormErrors errors={errors[WHOLE_FORM]} />
        <OriginalFields uploadLimitBytes={loaderData.uploadLimitBytes} errors={errors} />
        <Field
          id={nameId}
          label="Name of the storm"
          optional
          hint="Left empty, it is named after the day of its strongest wind."
          errors={errors.name}
        >
          {(described) => (
            <input {...described} name="name" maxLength={STORM_NAME_LENGTH} autoComplete="off" className="input" />
          )}
        </Field>
        <div className="flex flex-wrap gap-2">
          <SubmitButton busy="Reading…">Read it</SubmitButton>
          <Link to=".." relative="path" className="button">
            Cancel
          </Link>
        </div>
      </Form>
      <SampleFile />
    </div>
  );
}
