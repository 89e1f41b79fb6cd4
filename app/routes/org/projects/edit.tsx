import { getFormProps, useForm } from "@conform-to/react";
import { getZodConstraint, parseWithZod } from "@conform-to/zod/v4";
import { data, Form, redirect } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/edit";
import { ConfirmButton } from "~/components/confirm-button";
import { FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { ProjectFactsFields } from "~/components/project-facts-fields";
import { SubmitButton } from "~/components/submit-button";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { projectFactsSchema, TIME_ZONES } from "~/projects/project-schema";
import { changeProject } from "~/projects/save-project.server";
import { readForm } from "~/services/read-form.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, project } = await currentProject(context, params, "project.edit");
  const { name, jobNumber, client, timeZone } = project;
  return {
    facts: { name, jobNumber, client, timeZone },
    timeZones: TIME_ZONES,
    mayDelete: may(organisation, "project.delete"),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const form = await request.clone().formData();
  if (form.get("intent") === "delete") {
    const { tenant, organisation, project } = await currentProject(context, params, "project.delete");
    await tenant.projects.remove({ id: project.id });
    return redirect(`/o/${organisation.slug}`);
  }
  const { tenant, organisation, project } = await currentProject(context, params, "project.edit");
  const submission = await readForm(request, projectFactsSchema);
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const saved = await changeProject(tenant, project.id, submission.value);
  if (saved.fieldErrors) return data(submission.reply({ fieldErrors: saved.fieldErrors }), { status: 400 });
  return redirect(`/o/${organisation.slug}/projects/${project.id}`);
}

export default function EditProject({ actionData, loaderData }: Route.ComponentProps) {
  const [form, fields] = useForm<z.input<typeof projectFactsSchema>, z.output<typeof projectFactsSchema>, string[]>({
    lastResult: actionData,
    defaultValue: loaderData.facts,
    constraint: getZodConstraint(projectFactsSchema),
    onValidate: ({ formData }) => parseWithZod(formData, { schema: projectFactsSchema }),
    shouldRevalidate: "onInput",
  });
  return (
    <div className="max-w-xl">
      <PageTitle>Facts of the project</PageTitle>
      <Form method="post" {...getFormProps(form)} className="grid gap-4">
        <FormErrors errors={form.errors} id={form.errorId} />
        <ProjectFactsFields fields={fields} timeZones={loaderData.timeZones} />
        <div>
          <SubmitButton busy="Saving…">Save</SubmitButton>
        </div>
      </Form>
      {loaderData.mayDelete && (
        <div className="mt-10 border-t border-hairline pt-4">
          <ConfirmButton label="Delete the project" title="Delete this project?" fields={{ intent: "delete" }}>
            Its boxes, storms, original files, water columns, estimates and memos go with it, issued ones too, and their
            share links stop. This cannot be taken back.
          </ConfirmButton>
        </div>
      )}
    </div>
  );
}
