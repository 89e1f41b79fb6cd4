import { Form, Link, redirect } from "react-router";
import type { Route } from "./+types/new-cast";
import { FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { OriginalFields } from "~/components/storms/original-fields";
import { SubmitButton } from "~/components/submit-button";
import { currentProject } from "~/projects/current-project.server";
import { config } from "~/services/config.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { originalFrom, receiveForm } from "~/storms/receive-original.server";
import { WHOLE_FORM } from "~/storms/refusal";
import { startCast } from "~/water/stored-cast.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  await currentProject(context, params, "project.edit");
  return { uploadLimitBytes: config().uploadLimitBytes };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, tenant, project } = await currentProject(context, params, "project.edit");
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    const cast = await startCast(tenant, project.id, await originalFrom(form), actor.id);
    return redirect(`/o/${params.organisation}/projects/${project.id}/water/casts/${cast.id}`);
  });
}

export default function NewCast({ loaderData, actionData }: Route.ComponentProps) {
  const errors = actionData?.errors ?? {};
  return (
    <div className="max-w-2xl">
      <PageTitle>Import a cast</PageTitle>
      <p className="mb-5 max-w-prose text-slate">
        Bring one cast: depth or pressure, temperature, and salinity or conductivity. A sheet then says what each column
        was taken for, with the profile drawn; nothing counts before you confirm it.
      </p>
      <Form method="post" encType="multipart/form-data" className="grid gap-5">
        <FormErrors errors={errors[WHOLE_FORM]} />
        <OriginalFields
          uploadLimitBytes={loaderData.uploadLimitBytes}
          errors={errors}
          accepts="An exchange file, an instrument's ASCII file with its header, a handheld's CSV, or a plain table"
          pasteHint="Copy the cells with their heading row and paste them here."
          placeholder={"depth (m)\ttemperature (°C)\tsalinity (PSS-78)"}
        />
        <div className="flex flex-wrap gap-2">
          <SubmitButton busy="Reading…">Read it</SubmitButton>
          <Link to="../.." relative="path" className="button">
            Cancel
          </Link>
        </div>
      </Form>
    </div>
  );
}
