import { getFormProps, getInputProps, useForm } from "@conform-to/react";
import { getZodConstraint, parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/new";
import { FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { ProjectFactsFields } from "~/components/project-facts-fields";
import { SubmitButton } from "~/components/submit-button";
import { CAUTION } from "~/ocean/caution";
import { newProjectSchema, TIME_ZONES } from "~/projects/project-schema";
import { beginProject } from "~/projects/save-project.server";
import { allowed } from "~/services/guard.server";
import { readForm } from "~/services/read-form.server";

export function loader({ context }: Route.LoaderArgs) {
  allowed(context, "project.edit");
  return { timeZones: TIME_ZONES };
}

export async function action({ request, context }: Route.ActionArgs) {
  const { organisation, actor, tenant } = allowed(context, "project.edit");
  const submission = await readForm(request, newProjectSchema);
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const saved = await beginProject(tenant, submission.value, actor.id);
  if (saved.fieldErrors) return data(submission.reply({ fieldErrors: saved.fieldErrors }), { status: 400 });
  return redirect(`/o/${organisation.slug}/projects/${saved.id}`);
}

export default function NewProject({ actionData, loaderData }: Route.ComponentProps) {
  const [form, fields] = useForm<z.input<typeof newProjectSchema>, z.output<typeof newProjectSchema>, string[]>({
    lastResult: actionData,
    constraint: getZodConstraint(newProjectSchema),
    onValidate: ({ formData }) => parseWithZod(formData, { schema: newProjectSchema }),
    shouldRevalidate: "onInput",
  });
  const accepted = fields.cautionsAccepted;
  return (
    <div className="max-w-xl">
      <title>New project · Galeprint</title>
      <PageTitle first>New project</PageTitle>
      <Form method="post" {...getFormProps(form)} className="grid gap-4">
        <FormErrors errors={form.errors} id={form.errorId} />
        <ProjectFactsFields fields={fields} timeZones={loaderData.timeZones} />
        <fieldset className="border border-hairline p-4">
          <legend className="px-1 text-small font-bold text-slate">Cautions</legend>
          <p className="text-slate">{CAUTION}</p>
          <label className="mt-3 flex items-start gap-2.5">
            <input
              {...getInputProps(accepted, { type: "checkbox" })}
              key={accepted.key}
              className="mt-1 size-4 shrink-0 accent-ink"
              aria-describedby={accepted.errors ? accepted.errorId : undefined}
            />
            <span>I have read this and will pass it on with every result.</span>
          </label>
          {accepted.errors && (
            <p id={accepted.errorId} className="mt-1 text-small font-bold text-error">
              {accepted.errors.join(" ")}
            </p>
          )}
        </fieldset>
        <div className="flex gap-2">
          <SubmitButton busy="Beginning…">Begin the project</SubmitButton>
          <Link to=".." relative="path" className="button">
            Cancel
          </Link>
        </div>
      </Form>
    </div>
  );
}
